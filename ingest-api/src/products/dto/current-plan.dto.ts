import { IsString, MaxLength } from 'class-validator';
import { LimitSetDto, TestPlanDto } from './product.dto.js';

export class CurrentPlanQueryDto {
  /** @example "FH-R500-W" */
  @IsString()
  @MaxLength(64)
  partNumber!: string;

  /** @example "final" */
  @IsString()
  @MaxLength(64)
  stage!: string;
}

/** What a station needs to test a product at a stage now. */
export class CurrentPlanDto {
  partNumber!: string;
  stage!: string;
  nominalAmps!: number;
  supplyVolts!: number;
  complianceLowVolts!: number;
  complianceHighVolts!: number;
  maxAttempts!: number;
  /** Safety caution of the product, if it needs one. */
  caution!: string | null;
  testPlan!: TestPlanDto | null;
  limitSet!: LimitSetDto | null;
  /** Any of these proves the station. */
  goldenSerialNumbers!: string[];
  /** Until when this station shall have measured a golden unit; the past when it is owed; null when none is asked for. */
  goldenCheckDueAt!: string | null;
}
