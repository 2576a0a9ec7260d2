const LARGEST_NUMBER_OF_STEPS = 200;

/**
 * Root of a continuous function between two points where it has different signs, by the secant rule kept inside
 * the bracket ("Illinois"): the end that stays twice has its value halved, so that both ends close in.
 *
 * @param f - continuous on [low, high]
 * @param tolerance - width of the bracket at which to stop, in the unit of the argument
 * @throws RangeError when f has the same sign at both ends
 * @see M. Dowell, P. Jarratt, BIT 11 (1971) 168 (from memory)
 */
export function findRoot(f: (x: number) => number, low: number, high: number, tolerance = 1e-13): number {
  let [a, b] = [low, high];
  let [fa, fb] = [f(a), f(b)];
  if (fa * fb > 0) throw new RangeError('findRoot requires different signs at the two ends');
  for (let step = 0; step < LARGEST_NUMBER_OF_STEPS && fb !== 0 && Math.abs(b - a) > tolerance; step++) {
    const x = b - (fb * (b - a)) / (fb - fa);
    const fx = f(x);
    if (fx * fb < 0) [a, fa] = [b, fb];
    else fa /= 2;
    [b, fb] = [x, fx];
  }
  return b;
}
