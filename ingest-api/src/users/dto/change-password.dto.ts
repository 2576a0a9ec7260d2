import { IsString, MaxLength } from 'class-validator';

export class ChangePasswordDto {
  /** @example "correct horse battery" */
  @IsString()
  @MaxLength(1000)
  currentPassword!: string;

  /**
   * At least 12 characters, at most 72 bytes.
   * @example "three blue resistors"
   */
  @IsString()
  @MaxLength(1000)
  newPassword!: string;
}
