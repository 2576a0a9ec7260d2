import { Type } from 'class-transformer';
import { IsInt, IsOptional, IsString, Max, MaxLength, Min } from 'class-validator';

export class PageQueryDto {
  /** From an earlier page's `nextCursor`; left out for the newest. */
  @IsOptional()
  @IsString()
  @MaxLength(40)
  cursor?: string;

  /** Items per page. */
  @IsOptional()
  @Type(() => Number)
  @IsInt()
  @Min(1)
  @Max(200)
  limit?: number = 50;
}
