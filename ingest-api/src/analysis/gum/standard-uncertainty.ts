/**
 * Standard uncertainties of quantities of which only limits are known, from the standard deviation of the
 * distribution assumed between them. Arguments and results have the unit of the quantity.
 *
 * @see JCGM 100:2008 (GUM), 4.3.7, 4.3.9, F.2.2.1
 */

/** Equally likely anywhere within ±halfWidth: u = a/√3. The usual reading of an accuracy specification. */
export function rectangularUncertainty(halfWidth: number): number {
  return halfWidth / Math.sqrt(3);
}

/** Falling linearly to zero at ±halfWidth (a sum of two equal rectangular ones): u = a/√6. */
export function triangularUncertainty(halfWidth: number): number {
  return halfWidth / Math.sqrt(6);
}

/** A cyclic variation of amplitude halfWidth, seen at a random phase: arc-sine distribution, u = a/√2. */
export function arcSineUncertainty(halfWidth: number): number {
  return halfWidth / Math.sqrt(2);
}

/**
 * One reading of an instrument that resolves δ: rectangular over ±δ/2, u = δ/√12 = 0.29·δ.
 *
 * Valid for a single reading. The rounding errors of the readings of one sweep are not independent; for a slope
 * they are bounded instead, see the slope's uncertainty.
 */
export function resolutionUncertainty(resolution: number): number {
  return resolution / Math.sqrt(12);
}
