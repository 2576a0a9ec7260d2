import { IsBoolean, IsISO8601, IsOptional, IsRFC3339, IsString, Length, Matches } from 'class-validator';

export class CreateApiKeyDto {
  /**
   * What tells this key from the station's others.
   * @example "rack PC, bay 2"
   */
  @IsString()
  @Length(1, 80)
  @Matches(/\S/, { message: 'label must say something' })
  label!: string;

  /** A practice key's results are judged and shown, never counted. */
  @IsBoolean()
  practice!: boolean;

  /**
   * When it stops working, RFC 3339 with zone; null for never.
   * @example "2027-12-01T00:00:00.000Z"
   */
  @IsOptional()
  @IsISO8601({ strict: true })
  @IsRFC3339()
  expiresAt?: string | null;
}
