import tQuantile from '@stdlib/stats-base-dists-t-quantile';

const twoSided95: number[] = [];

/**
 * Quantile of Student's t distribution: the value that t with ν degrees of freedom stays below with the
 * given probability. ν need not be whole (Welch–Satterthwaite). Throws a RangeError unless
 * 0 < probability < 1 and ν > 0.
 *
 * @example studentTQuantile(0.975, 10) // 2.2281388519649…
 */
export function studentTQuantile(probability: number, degreesOfFreedom: number): number {
  if (!(probability > 0 && probability < 1)) throw new RangeError('probability must lie between 0 and 1');
  if (!(degreesOfFreedom > 0)) throw new RangeError('degrees of freedom must be positive');
  return tQuantile(probability, degreesOfFreedom);
}

/**
 * Factor of a two-sided 95 % interval, t(ν, 0.975), remembered for whole ν because every sweep asks for it.
 * 12.706 at ν = 1, 2.228 at 10, 1.960 for very large ν.
 */
export function coverageFactor95(degreesOfFreedom: number): number {
  const known = twoSided95[degreesOfFreedom];
  if (known !== undefined) return known;
  const factor = studentTQuantile(0.975, degreesOfFreedom);
  if (Number.isInteger(degreesOfFreedom) && degreesOfFreedom <= 1000) twoSided95[degreesOfFreedom] = factor;
  return factor;
}
