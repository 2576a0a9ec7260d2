import { ApiProperty } from '@nestjs/swagger';
import { type Role, roles } from '../roles.js';

const accessKinds = ['public', 'station', 'anySignedIn', 'roles'] as const;
export type AccessKind = (typeof accessKinds)[number];

/** One row of the table of rights. */
export class RightDto {
  /** @example "POST" */
  method!: string;

  /** @example "/api/v1/users" */
  path!: string;

  /** @example "Create an account" */
  summary!: string;

  /** Who may use it; `roles` names the people. `station`: with an API key, besides people, if any. */
  @ApiProperty({ enum: accessKinds, example: 'roles' })
  access!: AccessKind;

  @ApiProperty({ enum: roles, enumName: 'Role', isArray: true, example: ['administrator'] })
  roles!: Role[];
}
