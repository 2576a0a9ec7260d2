import { IsIn, IsOptional, IsString, MaxLength } from 'class-validator';
import { PageQueryDto } from '../../common/page-query.dto.js';
import { verdicts } from '../../results/dto/result-query.dto.js';

export class UnitQueryDto extends PageQueryDto {
  /** Beginning of a serial number, in any case. */
  @IsOptional() @IsString() @MaxLength(64) search?: string;
  @IsOptional() @IsString() @MaxLength(64) partNumber?: string;
  @IsOptional() @IsString() @MaxLength(64) lot?: string;
  /** Of the unit's latest result. */
  @IsOptional() @IsString() @MaxLength(64) stage?: string;
  /** Of the unit's latest result. */
  @IsOptional() @IsString() @MaxLength(64) station?: string;
  /** Of the unit's latest result. */
  @IsOptional() @IsIn(verdicts) verdict?: (typeof verdicts)[number];
}
