import { IsString, MaxLength } from 'class-validator';

export class SignInDto {
  /** @example "rosalind.hart@fernhollow.example" */
  @IsString()
  @MaxLength(254)
  email!: string;

  /** @example "correct horse battery" */
  @IsString()
  @MaxLength(1000)
  password!: string;
}
