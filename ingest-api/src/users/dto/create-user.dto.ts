import { ApiProperty } from '@nestjs/swagger';
import { IsIn, IsString, Length, Matches, MaxLength } from 'class-validator';
import { type Role, roles } from '../../auth/roles.js';
import { EMAIL_PATTERN } from '../email-address.js';

export class CreateUserDto {
  /** @example "tomasz.reed@fernhollow.example" */
  @Matches(EMAIL_PATTERN, { message: 'email must be a mail address' })
  email!: string;

  /** @example "Tomasz Reed" */
  @IsString()
  @Length(1, 80)
  @Matches(/\S/, { message: 'displayName must not be blank' })
  displayName!: string;

  @ApiProperty({ enum: roles, enumName: 'Role', example: 'integrator' })
  @IsIn(roles)
  role!: Role;

  /**
   * The first password, to be changed by its owner. At least 12 characters, at most 72 bytes.
   * @example "three blue resistors"
   */
  @IsString()
  @MaxLength(1000)
  password!: string;
}
