import { IsBoolean, IsISO8601, IsOptional, IsString, Length } from 'class-validator';

export class CreateApiKeyDto {
  /**
   * What tells this key from the station's others.
   * @example "rack PC, bay 2"
   */
  @IsString()
  @Length(1, 80)
  label!: string;

  /** A practice key's results are judged and shown, never counted. */
  @IsBoolean()
  practice!: boolean;

  /**
   * When it stops working; null for never.
   * @example "2027-12-01T00:00:00.000Z"
   */
  @IsOptional()
  @IsISO8601({ strict: true })
  expiresAt?: string | null;
}
