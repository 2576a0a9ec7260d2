import type { YieldBucket, YieldMarker } from '@/types/api';

/** Changes that fell into one step of the trend: one line in the chart, one letter, all their texts. */
export interface ChangeMark {
  letter: string;
  bucket: number;
  /** Place within the step, 0 to 1. */
  within: number;
  changes: YieldMarker[];
}

/** Gathers changes by step and names each gathering by a letter: A to Z, then AA. */
export function markChanges(buckets: YieldBucket[], markers: YieldMarker[]): ChangeMark[] {
  const marks: ChangeMark[] = [];
  for (const marker of markers) {
    const bucket = buckets.findIndex(({ startAt, endAt }) => startAt <= marker.at && marker.at < endAt);
    const step = buckets[bucket];
    if (!step) continue;
    const known = marks.find((mark) => mark.bucket === bucket);
    if (known) known.changes.push(marker);
    else
      marks.push({
        letter: letterOf(marks.length),
        bucket,
        within: placeWithin(step, marker.at),
        changes: [marker],
      });
  }
  return marks;
}

function placeWithin({ startAt, endAt }: YieldBucket, at: string): number {
  const start = Date.parse(startAt);
  return (Date.parse(at) - start) / (Date.parse(endAt) - start);
}

const letterOf = (place: number): string =>
  (place >= 26 ? letterOf(Math.floor(place / 26) - 1) : '') + String.fromCharCode(65 + (place % 26));
