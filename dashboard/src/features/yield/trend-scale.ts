import type { YieldReport } from '@/types/api';
import { yieldScale, type YieldScale } from '@/utils/yield-scale';

/**
 * One scale for the trend and its small multiples. It holds every share, not every interval: those of a step with
 * two or three units reach so far that they would flatten all others; they are cut at the
 * frame, as is a step of a group with few units.
 */
export function trendScale(
  { whole, buckets, groups, rolledThroughput }: YieldReport,
  target: number | null,
): YieldScale {
  const shares = [
    ...buckets.flatMap((bucket) => [bucket.firstPass, bucket.final, bucket.rolledThroughput]),
    ...groups.map((group) => group.firstPass),
  ].map((figures) => figures?.share ?? 1);
  const low = Math.min(whole.firstPass.low ?? 1, rolledThroughput?.low ?? 1, ...shares);
  return yieldScale([{ ...whole.firstPass, low }], [target]);
}
