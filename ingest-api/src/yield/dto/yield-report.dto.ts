import { YieldDto } from '../../today/dto/today.dto.js';
import type { BucketKind } from './yield-query.dto.js';

/** A cohort: units whose first counted attempt falls in a time. */
export class CohortDto {
  firstPass!: YieldDto;
  final!: YieldDto;
  /** Units whose first attempt failed. */
  failed!: number;
  /** Units whose first attempt could not be told. */
  notProven!: number;
  /** Units that have not passed yet and may be tested again. */
  openUnits!: number;
}

export class YieldBucketDto extends CohortDto {
  startAt!: string;
  endAt!: string;
  /** Product of the stages' first-pass yields; only of a single product and all its stages. */
  rolledThroughput!: YieldDto | null;
}

export class YieldGroupDto extends CohortDto {
  /** Null where the first attempt didn't say. */
  name!: string | null;
  buckets!: YieldDto[];
}

export class FailingMeasureDto {
  measure!: string;
  label!: string;
  /** First attempts that failed it. */
  units!: number;
  /** Share of all named failures up to and including this one. */
  cumulativeShare!: number;
}

export class RetestsDto {
  /** Units tested more than once. */
  retested!: number;
  total!: number;
  /**
   * Of these, passed at the second attempt. Many of them, with nothing changed between, are a sign of a
   * measuring problem.
   */
  passedOnSecond!: number;
}

export class AbortsDto {
  aborted!: number;
  /** All production runs, aborted ones included. */
  total!: number;
}

export class YieldMarkerDto {
  at!: string;
  kind!: 'limitSet' | 'testPlan' | 'program';
  text!: string;
}

export class YieldReportDto {
  from!: string;
  to!: string;
  by!: BucketKind;
  timeZone!: string;
  whole!: CohortDto;
  rolledThroughput!: YieldDto | null;
  buckets!: YieldBucketDto[];
  /** Empty without a split; the largest first. */
  groups!: YieldGroupDto[];
  failingMeasures!: FailingMeasureDto[];
  retests!: RetestsDto;
  aborts!: AbortsDto;
  markers!: YieldMarkerDto[];
}
