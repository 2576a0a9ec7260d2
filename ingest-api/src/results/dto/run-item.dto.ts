import type { Bound, Outcome, Verdict } from '../../analysis/analysis.types.js';
import type { RunKind } from '../result.types.js';
import type { RunItemRow } from '../run-items.queries.js';

/** What the slope mark is drawn from; S and A. */
export class SlopeMarkDto {
  conductanceSiemens!: number | null;
  /** Expanded, k ≈ 2. */
  expandedUncertaintySiemens!: number | null;
  /** The slope that the limit allows. */
  limitSiemens!: number | null;
  impedanceOhms!: number | null;
  impedanceBound!: Bound;
  referenceAmps!: number | null;
}

/** One result in a list. */
export class RunItemDto {
  /** @example "0193f3a2-6f0e-7c52-9a3e-5b1f4c0d2e11" */
  resultId!: string;
  receivedAt!: string;
  startedAt!: string;
  /** @example "FH-R500-W" */
  partNumber!: string;
  /** @example "W26480417" */
  serialNumber!: string;
  lot!: string | null;
  /** @example "final" */
  stage!: string;
  /** @example "north-2" */
  station!: string;
  /** Null where attempts aren't counted. */
  attempt!: number | null;
  verdict!: Verdict;
  runKind!: RunKind;
  outcome!: Outcome;
  slope!: SlopeMarkDto;
  failedMeasures!: string[];
  flags!: string[];
}

export function toRunItemDto(row: RunItemRow): RunItemDto {
  return {
    resultId: row.resultUuid,
    receivedAt: new Date(row.receivedAt).toISOString(),
    startedAt: new Date(row.startedAt).toISOString(),
    partNumber: row.partNumber,
    serialNumber: row.serialNumber,
    lot: row.lot,
    stage: row.stage,
    station: row.station,
    attempt: row.attempt,
    verdict: row.verdict,
    runKind: row.runKind,
    outcome: row.outcome,
    slope: {
      conductanceSiemens: row.conductanceSiemens,
      expandedUncertaintySiemens: row.conductanceUncertainty,
      limitSiemens: row.limitSiemens,
      impedanceOhms: row.impedanceOhms,
      impedanceBound: row.impedanceBound,
      referenceAmps: row.referenceAmps,
    },
    failedMeasures: JSON.parse(row.failedMeasures) as string[],
    flags: JSON.parse(row.flags) as string[],
  };
}
