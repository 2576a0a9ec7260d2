import type { YieldResult } from './yield.types.js';

/**
 * Whether a result is an attempt that counts: production, not voided, neither aborted nor unjudged.
 * (`notProven` counts, as not passed.)
 */
export function isCounted(result: YieldResult): boolean {
  return (
    result.runKind === 'production' &&
    !result.voided &&
    result.outcome !== 'aborted' &&
    result.verdict !== 'aborted' &&
    result.verdict !== 'unjudged'
  );
}

/**
 * Order of a unit's attempts at a stage: by `startedAt`, then `finishedAt` (none first), then `resultId`.
 *
 * Times are compared as instants, to the millisecond, whatever their offset; the identifier makes the order total,
 * so that it never hangs on the order of arrival.
 *
 * @returns negative when `a` is the earlier attempt, as a sort function does
 */
export function compareAttempts(a: YieldResult, b: YieldResult): number {
  return (
    Date.parse(a.startedAt) - Date.parse(b.startedAt) ||
    finishedInstant(a) - finishedInstant(b) ||
    (a.resultId < b.resultId ? -1 : Number(a.resultId > b.resultId))
  );
}

function finishedInstant({ finishedAt }: YieldResult): number {
  return finishedAt === null ? Number.MIN_SAFE_INTEGER : Date.parse(finishedAt);
}
