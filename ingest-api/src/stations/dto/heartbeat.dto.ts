import { IsISO8601, IsOptional } from 'class-validator';

export class PostHeartbeatDto {
  /**
   * The station's own clock; shows how far it is off.
   * @example "2026-11-30T08:15:42.010Z"
   */
  @IsOptional()
  @IsISO8601({ strict: true, strictSeparator: true })
  sentAt?: string;
}

export class HeartbeatDto {
  /** Set the station's clock by it. */
  serverTime!: string;
  /** Server minus station; null without sentAt. */
  clockSkewSeconds!: number | null;
}
