import { unitContribution } from './unit-contribution.js';
import { NO_UNITS, type YieldCounts, type YieldResult } from './yield.types.js';
import { yieldShare, type YieldShare } from './yield-share.js';

export interface YieldQuestion<Row extends YieldResult> {
  /** The period, ISO 8601: first attempts with from ≤ startedAt < until. Left out: no end on that side. */
  from?: string;
  until?: string;
  /** Attribute of the first attempt to split by besides part number and stage, e.g. its station. */
  splitBy?: (first: Row) => string | null;
  /** Largest number of attempts at a stage; default: no limit. */
  maxAttempts?: (partNumber: string, stage: string) => number;
}

/** The yields of one product at one stage (and one value of the split). */
export interface StageYield {
  partNumber: string;
  stage: string;
  /** Null when nothing was split, or the first attempt lacks the attribute. */
  split: string | null;
  counts: YieldCounts;
  /** First attempt passed. */
  firstPass: YieldShare;
  /** Latest attempt to date passed. */
  final: YieldShare;
}

/**
 * Counts the yields from scratch: the reference that every faster way (queries, rollups) must agree with.
 *
 * - A unit is a part number and a serial number. Its attempts at a stage are ordered by time, not by arrival.
 * - The cohort of a period holds the units whose **first** counted attempt falls in it; the split uses the
 *   attributes of that attempt. Golden, study, practice, aborted, unjudged and voided results don't count.
 * - First-pass yield: first attempt passed. Final yield: latest attempt to date passed, even if it came after the
 *   period; units still open are counted beside it. `notProven` counts as not passed in both.
 *
 * Independent of the order of the rows; a `resultId` given twice counts once. Cost n·log n.
 *
 * @param results - all results of the units concerned, not only those of the period: whether an attempt is a
 *   unit's first can't be told otherwise
 * @returns sorted by part number, stage and split; nothing for groups without units
 */
export function countYields<Row extends YieldResult>(
  results: readonly Row[],
  question: YieldQuestion<Row> = {},
): StageYield[] {
  const groups = new Map<string, Omit<StageYield, 'firstPass' | 'final'>>();
  for (const rows of resultsByUnit(results).values()) {
    const { partNumber, stage } = rows[0] as Row;
    const contribution = unitContribution(rows, question.maxAttempts?.(partNumber, stage) ?? Infinity);
    if (contribution === null || !isInPeriod(contribution.first.startedAt, question)) continue;
    const split = question.splitBy?.(contribution.first) ?? null;
    const key = JSON.stringify([partNumber, stage, split]);
    const counts = groups.get(key)?.counts ?? NO_UNITS;
    groups.set(key, { partNumber, stage, split, counts: addCounts(counts, contribution.counts) });
  }
  return [...groups.entries()]
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .map(([, group]) => ({
      ...group,
      firstPass: yieldShare(group.counts.firstPassed, group.counts.total),
      final: yieldShare(group.counts.latestPassed, group.counts.total),
    }));
}

/** Sums two counts field by field; `sign` −1 takes the second out of the first. */
export function addCounts(a: YieldCounts, b: YieldCounts, sign: 1 | -1 = 1): YieldCounts {
  const fields = Object.keys(NO_UNITS) as (keyof YieldCounts)[];
  return Object.fromEntries(
    fields.map((field) => [field, a[field] + sign * b[field]]),
  ) as unknown as YieldCounts;
}

function resultsByUnit<Row extends YieldResult>(results: readonly Row[]): Map<string, Row[]> {
  const units = new Map<string, Row[]>();
  // By identifier first: a corrected serial number moves a result to another unit, it must not stay in both.
  for (const result of new Map(results.map((row) => [row.resultId, row])).values()) {
    const key = JSON.stringify([result.partNumber, result.serialNumber, result.stage]);
    const rows = units.get(key);
    if (rows === undefined) units.set(key, [result]);
    else rows.push(result);
  }
  return units;
}

function isInPeriod(startedAt: string, { from, until }: { from?: string; until?: string }): boolean {
  const instant = Date.parse(startedAt);
  return (
    (from === undefined || instant >= Date.parse(from)) &&
    (until === undefined || instant < Date.parse(until))
  );
}
