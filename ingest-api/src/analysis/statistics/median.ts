/**
 * Median of the first `count` numbers of the array: the middle one, or the mean of the two middle ones.
 * **Reorders the array** (selection in place, no copy: the seed line takes the median of 100,000 slopes).
 * Throws a RangeError when there are no numbers. Cost: linear on average.
 */
export function medianInPlace(values: Float64Array, count = values.length): number {
  if (count < 1) throw new RangeError('median requires at least one value');
  const middle = count >> 1;
  const upper = selectInPlace(values, count, middle);
  if (count % 2 === 1) return upper;
  let lower = values[0]!;
  for (let i = 1; i < middle; i++) lower = Math.max(lower, values[i]!);
  return lower + (upper - lower) / 2;
}

/** Moves the rank-th smallest to its place, smaller ones before it (Hoare's selection). */
function selectInPlace(values: Float64Array, count: number, rank: number): number {
  let left = 0;
  let right = count - 1;
  while (left < right) {
    const pivot = values[(left + right) >> 1]!;
    let i = left;
    let j = right;
    while (i <= j) {
      while (values[i]! < pivot) i++;
      while (values[j]! > pivot) j--;
      if (i <= j) {
        const held = values[i]!;
        values[i++] = values[j]!;
        values[j--] = held;
      }
    }
    if (rank <= j) right = j;
    else if (rank >= i) left = i;
    else break;
  }
  return values[rank]!;
}
