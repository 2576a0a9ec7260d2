import type { Cohort, Yield, YieldBucket, YieldReport } from '@/types/api';
import { percentText } from '@/utils/format-figure';
import { bucketName } from '../bucket-names';
import type { Step } from '../yield-query';

/** "96.0 % (90.2 % to 98.4 %)", or a dash. */
export function shareWords({ share, low, high }: Yield): string {
  if (share === null || low === null || high === null) return '–';
  return `${percentText(share)} (${percentText(low)} to ${percentText(high)})`;
}

/** The three shares as counts: "96 pass, 1 not proven, 3 fail". */
export function countWords({ firstPass, notProven, failed }: Cohort): string {
  return `${firstPass.passed} pass, ${notProven} not proven, ${failed} fail`;
}

/** What a pointer over a step of the trend reads. */
export function bucketTip(bucket: YieldBucket, by: Step, timeZone: string): string {
  const name = bucketName(bucket, by, timeZone);
  if (bucket.firstPass.total === 0) return `${name}\nno units`;
  return [
    name,
    `first pass ${shareWords(bucket.firstPass)}`,
    `final      ${shareWords(bucket.final)}`,
    bucket.rolledThroughput ? `all stages ${shareWords(bucket.rolledThroughput)}` : '',
    `${bucket.firstPass.total} units: ${countWords(bucket)}`,
  ]
    .filter(Boolean)
    .join('\n');
}

/** The trend in a sentence, for those who don't see it. */
export function trendWords({ buckets, by, timeZone, whole }: YieldReport): string {
  const counted = buckets.filter(({ firstPass }) => firstPass.share !== null);
  const lowest = counted.reduce<YieldBucket | null>(
    (low, bucket) => ((bucket.firstPass.share ?? 1) < (low?.firstPass.share ?? 1) ? bucket : low),
    null,
  );
  const overall = `First-pass and final yield by ${by}, ${counted.length} steps with units. First pass over all: ${shareWords(whole.firstPass)}.`;
  return lowest
    ? `${overall} Lowest: ${bucketName(lowest, by, timeZone)}, ${shareWords(lowest.firstPass)}.`
    : overall;
}
