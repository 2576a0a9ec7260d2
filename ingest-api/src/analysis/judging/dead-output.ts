import type { ProductSpec, SweepAnalysis } from '../analysis.types.js';

/** An output that nowhere reaches this share of its nominal current delivers no current worth the name. */
const DEAD_SHARE = 0.5;

/**
 * Whether the output is dead: open, short-circuited inside, or connected the wrong way round.
 *
 * Such a unit often has a flat characteristic, so its slope alone would pass. It is dead when no point reaches
 * half of the nominal current (common practice; no source). An overloaded point counts as current delivered, for
 * the meter could not show how much. Without any point nothing is claimed.
 */
export function isDead(analysis: SweepAnalysis, product: ProductSpec): boolean {
  const least = DEAD_SHARE * product.nominalAmps;
  return (
    analysis.points.length > 0 &&
    analysis.points.every((point) => !point.overload && point.outputAmps < least)
  );
}
