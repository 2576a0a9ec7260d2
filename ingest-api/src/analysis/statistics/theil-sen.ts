import { medianInPlace } from './median.js';

export interface RobustLine {
  intercept: number;
  slope: number;
}

/**
 * Theil–Sen line: the slope is the median of the slopes of all pairs with different x, the intercept the
 * median of y − slope·x. Up to about 29 % of the points may lie anywhere without spoiling it.
 *
 * @param leastRun - pairs whose x differ by no more than this are skipped; 0 unless given
 *
 * Throws a RangeError when no two x differ by more than that. Cost: quadratic in time and memory (500 points: 124,750 slopes).
 *
 * Source: H. Theil (1950), P. K. Sen, J. Am. Stat. Assoc. 63 (1968) 1379 (from memory).
 *
 * @example theilSenLine([0, 1, 2, 3, 4], [0, 1, 2, 3, 40]) // { intercept: 0, slope: 1 }
 */
export function theilSenLine(x: ArrayLike<number>, y: ArrayLike<number>, leastRun = 0): RobustLine {
  const n = x.length;
  const slopes = new Float64Array((n * (n - 1)) / 2);
  let count = 0;
  for (let i = 0; i < n; i++) {
    for (let j = i + 1; j < n; j++) {
      const run = x[j]! - x[i]!;
      if (Math.abs(run) > leastRun) slopes[count++] = (y[j]! - y[i]!) / run;
    }
  }
  if (count === 0) throw new RangeError('theilSenLine requires at least two different x');
  const slope = medianInPlace(slopes, count);
  const offsets = new Float64Array(n);
  for (let i = 0; i < n; i++) offsets[i] = y[i]! - slope * x[i]!;
  return { intercept: medianInPlace(offsets), slope };
}
