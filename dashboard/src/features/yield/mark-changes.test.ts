import { describe, expect, it } from 'vitest';
import { aYieldBucket } from '@/testing/yield-builders';
import { markChanges } from './mark-changes';

const buckets = Array.from({ length: 28 }, (_, day) =>
  aYieldBucket({
    startAt: new Date(Date.UTC(2026, 10, 1 + day)).toISOString(),
    endAt: new Date(Date.UTC(2026, 10, 2 + day)).toISOString(),
  }),
);
const change = (at: string) => ({ at, kind: 'program' as const, text: at });

describe('markChanges', () => {
  it('gives changes of one step one letter, at the place of the first', () => {
    const marks = markChanges(buckets, [
      change('2026-11-02T06:00:00.000Z'),
      change('2026-11-02T18:00:00.000Z'),
    ]);
    expect(marks).toMatchObject([{ letter: 'A', bucket: 1, within: 0.25, changes: [{}, {}] }]);
  });

  it('goes on after Z', () => {
    const marks = markChanges(
      buckets,
      buckets.map(({ startAt }) => change(startAt)),
    );
    expect(marks.slice(25).map(({ letter }) => letter)).toEqual(['Z', 'AA', 'AB']);
  });

  it('leaves out what lies outside the period', () => {
    expect(markChanges(buckets, [change('2026-10-31T23:59:59.000Z')])).toEqual([]);
  });
});
