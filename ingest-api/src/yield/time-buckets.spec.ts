import { timeBuckets } from './time-buckets.js';

const hours = ({ startAt, endAt }: { startAt: number; endAt: number }): number =>
  (endAt - startAt) / 3_600_000;

describe('timeBuckets', () => {
  it('gives the day of the autumn clock change 25 hours and the spring one 23', () => {
    expect(timeBuckets('2026-10-24', '2026-10-26', 'day', 'Europe/London').map(hours)).toEqual([24, 25, 24]);
    expect(timeBuckets('2026-03-28', '2026-03-30', 'day', 'Europe/London').map(hours)).toEqual([24, 23, 24]);
  });

  it('counts the doubled hour twice', () => {
    const buckets = timeBuckets('2026-10-25', '2026-10-25', 'hour', 'Europe/London');
    expect(buckets).toHaveLength(25);
    expect(new Set(buckets.map(hours))).toEqual(new Set([1]));
  });

  it('begins weeks on Monday and cuts the first and last at the period', () => {
    const buckets = timeBuckets('2026-11-25', '2026-12-01', 'week', 'UTC');
    expect(buckets.map(({ startAt }) => new Date(startAt).toISOString().slice(0, 10))).toEqual([
      '2026-11-25',
      '2026-11-30',
    ]);
    expect(buckets.map(hours)).toEqual([5 * 24, 2 * 24]);
  });

  it('leaves no gap and no overlap', () => {
    const buckets = timeBuckets('2026-01-01', '2026-12-31', 'week', 'America/New_York');
    expect(buckets.slice(1).every(({ startAt }, index) => startAt === buckets[index]!.endAt)).toBe(true);
  });

  it.each([
    ['2026-02-30', '2026-03-01', 'day', '/from'],
    ['2026-03-02', '2026-03-01', 'day', '/to'],
    ['2020-01-01', '2026-03-01', 'hour', '/by'],
  ] as const)('refuses %s to %s by %s', (from, to, by, pointer) => {
    expect(() => timeBuckets(from, to, by, 'UTC')).toThrow(
      expect.objectContaining({ errors: [expect.objectContaining({ pointer })] }),
    );
  });
});
