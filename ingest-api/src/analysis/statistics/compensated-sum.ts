/**
 * Sum of the numbers with a running correction for the digits an addition loses (Neumaier's form of
 * compensated summation). The error is about one rounding of the result, however many numbers there are,
 * unless they cancel almost completely. The sum of no numbers is 0.
 *
 * Source: A. Neumaier, Z. Angew. Math. Mech. 54 (1974) 39 (from memory). Cost: linear.
 */
export function compensatedSum(values: ArrayLike<number>): number {
  let sum = 0;
  let lost = 0;
  for (let i = 0; i < values.length; i++) {
    const value = values[i]!;
    const next = sum + value;
    lost += Math.abs(sum) >= Math.abs(value) ? sum - next + value : value - next + sum;
    sum = next;
  }
  return sum + lost;
}

/** Compensated arithmetic mean; throws a RangeError when there are no numbers. */
export function compensatedMean(values: ArrayLike<number>): number {
  if (values.length === 0) throw new RangeError('mean requires at least one value');
  return compensatedSum(values) / values.length;
}
