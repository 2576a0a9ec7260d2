/** Past this many remembered quantiles the cache starts afresh, so that odd inputs can't fill the memory. */
const LARGEST_CACHE = 10_000;

/**
 * Remembers the results of a slow function of a probability and one parameter.
 *
 * Quantiles are found by iteration and the analysis asks for the same few (t at 0.975 and n − 2) for every
 * sweep of a plan, so remembering them saves most of their cost.
 *
 * @param compute - the function to remember; must depend on nothing but its two arguments
 * @returns a function with the same results
 */
export function cacheQuantile(
  compute: (probability: number, parameter: number) => number,
): (probability: number, parameter: number) => number {
  const remembered = new Map<number, Map<number, number>>();
  let size = 0;
  return (probability, parameter) => {
    const known = remembered.get(parameter)?.get(probability);
    if (known !== undefined) return known;
    if (size >= LARGEST_CACHE) {
      remembered.clear();
      size = 0;
    }
    const quantile = compute(probability, parameter);
    const row = remembered.get(parameter) ?? new Map<number, number>();
    row.set(probability, quantile);
    remembered.set(parameter, row);
    size += 1;
    return quantile;
  };
}
