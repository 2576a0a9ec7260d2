import { IsString, MaxLength } from 'class-validator';
import type { Verdict } from '../../analysis/analysis.types.js';

export class UnitRouteQueryDto {
  /** Where the unit stands. */
  @IsString()
  @MaxLength(64)
  stage!: string;
}

/** May this unit be tested here now? */
export class UnitRouteDto {
  partNumber!: string;
  serialNumber!: string;
  stage!: string;
  mayBeTested!: boolean;
  /** Why not, in words; null when it may. */
  reason!: string | null;
  /** Counted results at this stage so far. */
  attempts!: number;
  attemptsLeft!: number;
  /** Of its latest attempt at this stage. */
  latestVerdict!: Verdict | null;
  priorStage!: string | null;
  /** Null when there is no prior stage. */
  priorStagePassed!: boolean | null;
  lotHeld!: boolean;
}
