import fc from 'fast-check';
import { normalQuantile } from '../distributions/normal.js';
import { exactInterval, largestShareWithoutFailure } from './exact-interval.js';
import { wilsonInterval } from './wilson-interval.js';
import { yieldShare } from './yield-share.js';

const counts = fc
  .integer({ min: 1, max: 100_000 })
  .chain((total) => fc.tuple(fc.integer({ min: 0, max: total }), fc.constant(total)));

describe('Wilson interval', () => {
  it('holds exactly the shares that a score test would not reject', () => {
    const z = normalQuantile(0.975);
    fc.assert(
      fc.property(counts, ([passed, total]) => {
        const { low, high } = wilsonInterval(passed, total)!;
        const score = (share: number) => (passed / total - share) / Math.sqrt((share * (1 - share)) / total);
        if (passed > 0) expect(score(low)).toBeCloseTo(z, 6);
        if (passed < total) expect(score(high)).toBeCloseTo(-z, 6);
      }),
    );
  });

  it('mirrors when passes and fails change places, and holds the share', () => {
    fc.assert(
      fc.property(counts, fc.boolean(), ([passed, total], continuityCorrected) => {
        const { low, high } = wilsonInterval(passed, total, { continuityCorrected })!;
        const mirrored = wilsonInterval(total - passed, total, { continuityCorrected })!;
        expect(mirrored.low).toBeCloseTo(1 - high, 12);
        expect(mirrored.high).toBeCloseTo(1 - low, 12);
        expect(low).toBeLessThanOrEqual(passed / total);
        expect(high).toBeGreaterThanOrEqual(passed / total);
        expect(low).toBeGreaterThanOrEqual(0);
        expect(high).toBeLessThanOrEqual(1);
      }),
    );
  });

  it('is 0 at the lower end when none passed and 1 at the upper end when all did', () => {
    expect(wilsonInterval(0, 20)?.low).toBe(0);
    expect(wilsonInterval(20, 20)?.high).toBe(1);
  });

  it('knows nothing without a unit', () => {
    expect(wilsonInterval(0, 0)).toBeNull();
    expect(exactInterval(0, 0)).toBeNull();
    expect(yieldShare(0, 0)).toEqual({ passed: 0, total: 0, share: null, low: null, high: null });
  });

  it.each([
    [-1, 5],
    [6, 5],
    [1.5, 5],
    [NaN, 5],
    [1, Infinity],
  ])('refuses %p of %p', (passed, total) => {
    expect(() => wilsonInterval(passed, total)).toThrow(RangeError);
    expect(() => exactInterval(passed, total)).toThrow(RangeError);
  });
});

describe('exact interval', () => {
  it('ends in the closed form when nothing failed', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 5000 }), (total) => {
        expect(exactInterval(0, total, 0.9)!.high).toBeCloseTo(largestShareWithoutFailure(total, 0.95), 10);
      }),
    );
  });

  it('cannot say anything of failures without units', () => {
    expect(() => largestShareWithoutFailure(0)).toThrow(RangeError);
  });
});
