// Taken once: looking up a global at every addition is slow where globals are isolated.
const { abs } = Math;

/**
 * A running sum that keeps the digits an addition loses (Neumaier's form of compensated summation). The error is
 * about one rounding of the result, however many numbers there are, unless they cancel almost completely.
 *
 * Source: A. Neumaier, Z. Angew. Math. Mech. 54 (1974) 39 (from memory).
 */
export class CompensatedSum {
  private sum = 0;
  private lost = 0;

  add(value: number): void {
    const next = this.sum + value;
    this.lost += abs(this.sum) >= abs(value) ? this.sum - next + value : value - next + this.sum;
    this.sum = next;
  }

  get total(): number {
    return this.sum + this.lost;
  }
}

/** Compensated sum of the numbers; the sum of no numbers is 0. Cost: linear. */
export function compensatedSum(values: ArrayLike<number>): number {
  const sum = new CompensatedSum();
  for (let i = 0; i < values.length; i++) sum.add(values[i]!);
  return sum.total;
}

/** Compensated arithmetic mean; throws a RangeError when there are no numbers. */
export function compensatedMean(values: ArrayLike<number>): number {
  if (values.length === 0) throw new RangeError('mean requires at least one value');
  return compensatedSum(values) / values.length;
}
