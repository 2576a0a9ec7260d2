import { ApiPropertyOptional } from '@nestjs/swagger';
import { IsBoolean, IsIn, IsString, Length, Matches, MaxLength, ValidateIf } from 'class-validator';
import { type Role, roles } from '../../auth/roles.js';

/** Absent is unchanged; null is no value here and is refused. */
const IfGiven = () => ValidateIf((_, value) => value !== undefined);

/** What is left out stays as it is. */
export class UpdateUserDto {
  /** @example "Tomasz Reed-Hale" */
  @IfGiven()
  @IsString()
  @Length(1, 80)
  @Matches(/\S/, { message: 'displayName must not be blank' })
  displayName?: string;

  @ApiPropertyOptional({ enum: roles, enumName: 'Role', example: 'productionEngineer' })
  @IfGiven()
  @IsIn(roles)
  role?: Role;

  /** False disables the account and ends its sessions at once. */
  @IfGiven()
  @IsBoolean()
  active?: boolean;

  /**
   * A new password; ends the account's sessions. At least 12 characters, at most 72 bytes.
   * @example "seven amber cascodes"
   */
  @IfGiven()
  @IsString()
  @MaxLength(1000)
  password?: string;
}
