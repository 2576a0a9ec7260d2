import { IsOptional, Matches } from 'class-validator';

export class AuditQueryDto {
  /**
   * `nextCursor` of the page before.
   * @example "69"
   */
  @IsOptional()
  @Matches(/^[1-9]\d{0,14}$/, { message: 'cursor must be the nextCursor of a page' })
  cursor?: string;
}
