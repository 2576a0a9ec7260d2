import { ApiProperty } from '@nestjs/swagger';
import { type Role, roles } from '../../auth/roles.js';
import type { User } from '../models/user.model.js';

/** An account. */
export class UserDto {
  /** @example 3 */
  userId!: number;

  /**
   * What the person signs in with, in lower case.
   * @example "rosalind.hart@fernhollow.example"
   */
  email!: string;

  /** @example "Rosalind Hart" */
  displayName!: string;

  @ApiProperty({ enum: roles, enumName: 'Role', example: 'qualityLead' })
  role!: Role;

  /** A disabled account can't sign in; its name stays in the records. */
  active!: boolean;

  /** @example "2026-11-02T07:30:00.000Z" */
  createdAt!: string;

  /**
   * Null until the first time.
   * @example "2026-11-30T06:02:11.000Z"
   */
  lastSignInAt!: string | null;
}

export function toUserDto(user: User): UserDto {
  return {
    userId: user.userId,
    email: user.email,
    displayName: user.displayName,
    role: user.role,
    active: user.active,
    createdAt: new Date(user.createdAt).toISOString(),
    lastSignInAt: user.lastSignInAt === null ? null : new Date(user.lastSignInAt).toISOString(),
  };
}
