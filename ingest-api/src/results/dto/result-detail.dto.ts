import type { Bound, PointDirection } from '../../analysis/analysis.types.js';
import type { Disposition } from '../result.types.js';
import { AnsweredMeasureDto, CodedTextDto } from './answer.dto.js';
import { RunItemDto } from './run-item.dto.js';

export class JudgedMeasureDto extends AnsweredMeasureDto {
  /** @example "Output impedance" */
  label!: string;
  /** The judging in words. */
  sentence!: string;
}

export class SweepPointDto {
  /** Place in the post, from 0. */
  index!: number;
  loadVolts!: number;
  outputAmps!: number;
  /** Deviation from the reference current. */
  deviationPpm!: number | null;
  direction!: PointDirection | null;
  /** The straight line was fitted through it. */
  inFit!: boolean;
  overload!: boolean;
}

export class SweepLinePointDto {
  loadVolts!: number;
  deviationPpm!: number;
  lowPpm!: number;
  highPpm!: number;
}

export class SweepFitDto {
  interceptAmps!: number;
  /** dI/dV; the output conductance is its negative. */
  slopeSiemens!: number;
  /** k ≈ 2, resolution, gain and drift included. */
  expandedSlopeUncertaintySiemens!: number;
  residualStdDevAmps!: number;
  rSquared!: number;
  degreesOfFreedom!: number;
}

export class SweepDto {
  referenceVolts!: number;
  referenceAmps!: number | null;
  complianceLowVolts!: number;
  complianceHighVolts!: number;
  /** τ as a fraction. */
  complianceTolerance!: number;
  resolutionAmps!: number | null;
  points!: SweepPointDto[];
  /** The fit with its uncertainty band, over the range that was fitted. */
  line!: SweepLinePointDto[];
  /** The slope that the limit allows, through the reference point; empty without such a limit. */
  limitLine!: SweepLinePointDto[];
  complianceVolts!: number | null;
  complianceBound!: Bound;
  kneeFound!: boolean;
  fit!: SweepFitDto | null;
}

/** Everything about one result. */
export class ResultDetailDto extends RunItemDto {
  finishedAt!: string | null;
  sentAt!: string | null;
  /** A badge code. */
  operator!: string | null;
  fixture!: string | null;
  channel!: string | null;
  programName!: string | null;
  programVersion!: string | null;
  ambientCelsius!: number | null;
  supplyVolts!: number | null;
  abortReason!: string | null;
  stationVerdict!: 'pass' | 'fail' | null;
  routedOn!: 'hub' | 'station' | null;
  notes!: string | null;
  testPlanVersion!: number | null;
  limitSetVersion!: number | null;
  disposition!: Disposition;
  nextStage!: string | null;
  attemptsLeft!: number | null;
  measures!: JudgedMeasureDto[];
  sweep!: SweepDto;
  /** The flags with their meaning. */
  flagTexts!: CodedTextDto[];
  warnings!: CodedTextDto[];
}
