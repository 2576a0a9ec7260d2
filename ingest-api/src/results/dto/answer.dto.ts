import type { Bound, Verdict } from '../../analysis/analysis.types.js';
import type { Disposition } from '../result.types.js';

export class CodedTextDto {
  /** @example "goldenDue" */
  code!: string;
  text!: string;
}

export class LimitInForceDto {
  lower!: number | null;
  upper!: number | null;
  rule!: 'guarded' | 'simple';
  /** Guard band w = guardFactor · U. */
  guardFactor!: number;
}

export class AnsweredMeasureDto {
  /** @example "outputImpedance" */
  name!: string;
  value!: number | null;
  /** @example "Ω" */
  unit!: string;
  /** Half width of the 95 % interval; null where it has no meaning, as for a bound. */
  expandedUncertainty!: number | null;
  low!: number | null;
  high!: number | null;
  bound!: Bound;
  limit!: LimitInForceDto | null;
  /** Null when nothing limits this measure. */
  outcome!: 'pass' | 'fail' | 'notProven' | null;
  probabilityOfConformity!: number | null;
  /** Why there is no value. */
  reason!: string | null;
}

export class ResultLinksDto {
  /** Where this result can be read again with the same key. */
  self!: string;
  /** The unit's page for people. */
  unit!: string;
}

/** What a station learns of its post. 2xx means that it is on disk. */
export class ResultAnswerDto {
  /** @example "0193f3a2-6f0e-7c52-9a3e-5b1f4c0d2e11" */
  resultId!: string;
  receivedAt!: string;
  verdict!: Verdict;
  /** Number among the unit's counted results at this stage; null when it isn't counted. */
  attempt!: number | null;
  /** Where the unit shall go. */
  disposition!: Disposition;
  nextStage!: string | null;
  attemptsLeft!: number | null;
  /** Null when there is no prior stage. */
  priorStagePassed!: boolean | null;
  lotHeld!: boolean;
  testPlanVersion!: number | null;
  limitSetVersion!: number | null;
  measures!: AnsweredMeasureDto[];
  failedMeasures!: string[];
  warnings!: CodedTextDto[];
  flags!: string[];
  links!: ResultLinksDto;
}
