import { IsIn, IsOptional, IsString, Matches, MaxLength } from 'class-validator';
import { PageQueryDto } from '../../common/page-query.dto.js';
import { verdicts } from '../../results/dto/result-query.dto.js';

export const askedResults = ['latest', 'firstAttempt'] as const;
export type AskedResult = (typeof askedResults)[number];

const DAY_FORM = /^\d{4}-\d{2}-\d{2}$/;

export class UnitQueryDto extends PageQueryDto {
  /** Beginning of a serial number, in any case. */
  @IsOptional() @IsString() @MaxLength(64) search?: string;
  @IsOptional() @IsString() @MaxLength(64) partNumber?: string;
  @IsOptional() @IsString() @MaxLength(64) lot?: string;
  /**
   * Which of a unit's results the filters below are about: its latest, or its first counted attempt at a stage, by
   * which yields are counted.
   */
  @IsOptional() @IsIn(askedResults) of?: AskedResult = 'latest';
  /**
   * First site day on which the result started.
   * @example "2026-11-17"
   */
  @IsOptional() @Matches(DAY_FORM, { message: 'from must be a day, YYYY-MM-DD' }) from?: string;
  /**
   * Last site day on which the result started, itself included.
   * @example "2026-11-30"
   */
  @IsOptional() @Matches(DAY_FORM, { message: 'to must be a day, YYYY-MM-DD' }) to?: string;
  @IsOptional() @IsString() @MaxLength(64) stage?: string;
  @IsOptional() @IsString() @MaxLength(64) station?: string;
  @IsOptional() @IsString() @MaxLength(64) fixture?: string;
  @IsOptional() @IsString() @MaxLength(64) programVersion?: string;
  @IsOptional() @IsIn(verdicts) verdict?: (typeof verdicts)[number];
  /**
   * A measure that the result failed.
   * @example "outputImpedance"
   */
  @IsOptional() @IsString() @MaxLength(64) failedMeasure?: string;
}
