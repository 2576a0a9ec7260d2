import { chdtr, chdtri, compiled, incbet, ndtr, ndtri, stdtri } from 'cephes';
import fc from 'fast-check';
import { betaCdf, betaQuantile } from './beta.js';
import { chiSquareCdf, chiSquareQuantile } from './chi-square.js';
import { fCdf, fQuantile } from './f.js';
import { normalCdf, normalQuantile } from './normal.js';
import { tCdf, tFactor, tQuantile } from './student-t.js';

/**
 * Second opinion: the same functions of the Cephes library (S. L. Moshier), which shares no code with ours.
 * Where it has no quantile for fractional parameters, its distribution function is asked at our quantile.
 */
beforeAll(() => compiled);

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
/** Spread evenly over the decades. */
const overDecades = (min: number, max: number) => between(Math.log(min), Math.log(max)).map(Math.exp);
const probability = between(0.001, 0.999);
/** At the middle the t distribution of Cephes loses its digits (df/(df + t²) rounds to 1). */
const offCentre = probability.filter((p) => Math.abs(p - 0.5) > 0.005);

function expectDigits(actual: number, expected: number, relative: number): void {
  const size = Math.max(Math.abs(actual), Math.abs(expected));
  expect(Math.abs(actual - expected)).toBeLessThanOrEqual(relative * size);
}

const cephesT = (t: number, df: number): number => {
  const tail = 0.5 * incbet(df / 2, 0.5, df / (df + t * t));
  return t < 0 ? tail : 1 - tail;
};
const cephesF = (ratio: number, df1: number, df2: number): number =>
  incbet(df1 / 2, df2 / 2, (df1 * ratio) / (df1 * ratio + df2));

describe('second opinion on the distributions', () => {
  it('normal: 12 digits, also far out in the tail', () => {
    fc.assert(fc.property(between(-8, 8), (z) => expectDigits(normalCdf(z), ndtr(z), 1e-13)));
    fc.assert(
      fc.property(overDecades(1e-12, 0.999999), (p) => expectDigits(normalQuantile(p), ndtri(p), 1e-12)),
    );
  });

  it('Student t: quantiles 11 digits for whole, 9 for fractional degrees of freedom', () => {
    fc.assert(
      fc.property(offCentre, fc.integer({ min: 1, max: 600 }), (p, df) =>
        expectDigits(tQuantile(p, df), stdtri(df, p), 1e-11),
      ),
    );
    fc.assert(
      fc.property(offCentre, overDecades(0.5, 600), (p, df) =>
        expectDigits(cephesT(tQuantile(p, df), df), p, 1e-9),
      ),
    );
    fc.assert(
      fc.property(between(0.01, 10), overDecades(1, 600), (t, df) => {
        expectDigits(tCdf(t, df), cephesT(t, df), 1e-10);
        expectDigits(tCdf(-t, df), cephesT(-t, df), 1e-10);
      }),
    );
  });

  it('Student t: 9 digits of the closed forms for 1 and 2 degrees of freedom, however near the middle', () => {
    const nearCentre = fc
      .tuple(overDecades(1e-12, 0.4), fc.constantFrom(-1, 1))
      .map(([distance, side]) => 0.5 + side * distance);
    fc.assert(
      fc.property(nearCentre, (p) => {
        const distance = p - 0.5;
        expectDigits(tQuantile(p, 1), Math.tan(Math.PI * distance), 1e-9);
        expectDigits(tQuantile(p, 2), (2 * distance) / Math.sqrt(2 * p * (1 - p)), 1e-9);
      }),
    );
  });

  it('F: 11 digits', () => {
    const df = overDecades(1, 300);
    fc.assert(
      fc.property(overDecades(0.05, 20), df, df, (ratio, df1, df2) =>
        expect(Math.abs(fCdf(ratio, df1, df2) - cephesF(ratio, df1, df2))).toBeLessThan(1e-11),
      ),
    );
    fc.assert(
      fc.property(probability, df, df, (p, df1, df2) =>
        expectDigits(cephesF(fQuantile(p, df1, df2), df1, df2), p, 1e-11),
      ),
    );
  });

  it('chi-square: 11 digits up to 1000 degrees of freedom, 4 in probability above', () => {
    fc.assert(
      fc.property(overDecades(1, 1000), between(0.2, 2.5), (df, share) =>
        expect(Math.abs(chiSquareCdf(share * df, df) - chdtr(df, share * df))).toBeLessThan(1e-11),
      ),
    );
    fc.assert(
      fc.property(probability, overDecades(1, 1000), (p, df) =>
        expectDigits(chiSquareQuantile(p, df), chdtri(df, 1 - p), 1e-11),
      ),
    );
    fc.assert(
      fc.property(probability, overDecades(1001, 20_000), (p, df) => {
        expect(Math.abs(chdtr(df, chiSquareQuantile(p, df)) - p)).toBeLessThan(1e-4);
        expect(chiSquareCdf(chiSquareQuantile(p, df), df)).toBeCloseTo(p, 9);
        expect(
          Math.abs(chiSquareCdf(df * (0.9 + 0.2 * p), df) - chdtr(df, df * (0.9 + 0.2 * p))),
        ).toBeLessThan(1e-4);
      }),
    );
  });

  it('beta: 10 digits, also for the counts of a large lot', () => {
    const parameter = overDecades(0.5, 2000);
    fc.assert(
      fc.property(between(0, 1), parameter, parameter, (x, a, b) =>
        expect(Math.abs(betaCdf(x, a, b) - incbet(a, b, x))).toBeLessThan(1e-11),
      ),
    );
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 50_000 }),
        fc.integer({ min: 1, max: 50_000 }),
        (passed, failed) => {
          expectDigits(incbet(passed + 1, failed, betaQuantile(0.975, passed + 1, failed)), 0.975, 1e-10);
        },
      ),
    );
  });
});

describe('the limiting cases', () => {
  it('has the normal distribution for t with infinite degrees of freedom', () => {
    expect(tQuantile(0.975, Infinity)).toBe(normalQuantile(0.975));
    expect(tCdf(1.5, Infinity)).toBe(normalCdf(1.5));
  });

  it('has infinite normal quantiles at the ends', () => {
    expect(normalQuantile(0)).toBe(-Infinity);
    expect(normalQuantile(1)).toBe(Infinity);
  });

  it('returns the same quantile when asked again', () => {
    expect(tQuantile(0.975, 10)).toBe(tQuantile(0.975, 10));
    expect(tFactor(0.95, 10)).toBe(tQuantile(0.975, 10));
  });

  it('refuses probabilities and parameters that are none', () => {
    expect(() => tQuantile(1.5, 3)).toThrow('requires a probability from 0 to 1');
    expect(() => tQuantile(0.9, 0)).toThrow('requires degrees of freedom above 0');
    expect(() => fQuantile(0.9, 1, -1)).toThrow(RangeError);
    expect(() => chiSquareQuantile(NaN, 3)).toThrow(RangeError);
    expect(() => betaQuantile(0.5, 0, 1)).toThrow(RangeError);
  });
});
