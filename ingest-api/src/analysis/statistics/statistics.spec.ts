import { compensatedSum } from './compensated-sum.js';
import { medianInPlace } from './median.js';
import { theilSenLine } from './theil-sen.js';
import { univariateSummary } from './univariate-summary.js';

describe('compensatedSum', () => {
  it('keeps what a plain sum loses', () => {
    expect(compensatedSum([1, 1e100, 1, -1e100])).toBe(2);
    expect(compensatedSum([])).toBe(0);
  });
});

describe('univariateSummary', () => {
  it('reaches the certified digits of the NumAcc4 set', () => {
    const values = Array.from({ length: 1001 }, (_, i) =>
      i === 0 ? 10000000.2 : i % 2 === 1 ? 10000000.1 : 10000000.3,
    );
    const summary = univariateSummary(values);
    expect(summary.mean).toBe(10000000.2);
    expect(summary.standardDeviation).toBeCloseTo(0.1, 8);
    expect(summary.lag1Autocorrelation).toBeCloseTo(-0.999, 7);
  });

  it('has no autocorrelation of equal values', () => {
    expect(univariateSummary([3, 3, 3])).toEqual({
      count: 3,
      mean: 3,
      standardDeviation: 0,
      lag1Autocorrelation: null,
    });
    expect(() => univariateSummary([3])).toThrow('at least two values');
  });
});

describe('medianInPlace', () => {
  it('takes the middle, or the mean of the two middle values', () => {
    expect(medianInPlace(Float64Array.of(5, 1, 4, 2, 3))).toBe(3);
    expect(medianInPlace(Float64Array.of(4, 1, 3, 2))).toBe(2.5);
    expect(medianInPlace(Float64Array.of(7))).toBe(7);
    expect(medianInPlace(Float64Array.of(2, 2, 2, 2))).toBe(2);
    expect(medianInPlace(Float64Array.of(9, 1, 0, 0), 2)).toBe(5);
  });
});

describe('theilSenLine', () => {
  it('is not moved by one wild point in five', () => {
    expect(theilSenLine([0, 1, 2, 3, 4], [0, 1, 2, 3, 40])).toEqual({ intercept: 0, slope: 1 });
  });

  it('ignores pairs at the same place and refuses points that are all there', () => {
    expect(theilSenLine([0, 0, 1], [1, 1, 3]).slope).toBe(2);
    expect(() => theilSenLine([1, 1], [1, 2])).toThrow('two different x');
  });
});
