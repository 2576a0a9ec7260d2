import type { Outcome, Verdict } from '../analysis.types.js';

export type RunKind = 'production' | 'golden' | 'study' | 'practice';

/** What the yields need to know of a result; rows may carry more (lot, station, …), which splits can use. */
export interface YieldResult {
  resultId: string;
  partNumber: string;
  serialNumber: string;
  stage: string;
  /** ISO 8601. */
  startedAt: string;
  finishedAt: string | null;
  runKind: RunKind;
  outcome: Outcome;
  /** The effective verdict: that of the latest signed rejudgement, else the first judgement. */
  verdict: Verdict;
  voided: boolean;
}

/** The counts of one cohort: units by their first attempt and by their latest. */
export interface YieldCounts {
  /** Units whose first counted attempt falls in the period. */
  total: number;
  firstPassed: number;
  firstFailed: number;
  firstNotProven: number;
  /** Latest attempt to date, whenever that was. */
  latestPassed: number;
  latestFailed: number;
  latestNotProven: number;
  /** Units that have not passed yet and may still be tested again. */
  open: number;
}

export const NO_UNITS: Readonly<YieldCounts> = {
  total: 0,
  firstPassed: 0,
  firstFailed: 0,
  firstNotProven: 0,
  latestPassed: 0,
  latestFailed: 0,
  latestNotProven: 0,
  open: 0,
};
