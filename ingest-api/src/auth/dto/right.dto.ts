import { ApiProperty } from '@nestjs/swagger';
import { type Role, roles } from '../roles.js';

export const accessKinds = ['public', 'station', 'anySignedIn', 'roles'] as const;
export type AccessKind = (typeof accessKinds)[number];

/** One row of the table of rights. */
export class RightDto {
  /** @example "PATCH" */
  method!: string;

  /** @example "/api/v1/users/{userId}" */
  path!: string;

  /** @example "Change an account's name, role or password, disable or enable it" */
  summary!: string;

  /** `station`: with an API key, and by the people of `roles`, if any. */
  @ApiProperty({ enum: accessKinds, example: 'roles' })
  access!: AccessKind;

  /** The roles of people who may use it. */
  @ApiProperty({ enum: roles, enumName: 'Role', isArray: true, example: ['administrator'] })
  roles!: Role[];
}
