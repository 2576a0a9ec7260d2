/** What a fit has to say for a prediction: both parameters, their standard uncertainties and correlation. */
export interface LineParameters {
  intercept: number;
  slope: number;
  interceptStdError: number;
  slopeStdError: number;
  /** Correlation of intercept and slope. */
  correlation: number;
}

/**
 * Value of a fitted line at x with its standard uncertainty:
 *
 * `ŷ = a + b·x`, `u² = u_a² + x²·u_b² + 2·x·r·u_a·u_b`
 *
 * The covariance must not be left out: intercept and slope are estimated from the same points, and far from x = 0
 * the two errors cancel for the most part.
 *
 * @see JCGM 100:2008 (GUM), H.3.3 to H.3.4
 */
export function predictOnLine(
  line: LineParameters,
  x: number,
): { value: number; standardUncertainty: number } {
  const { interceptStdError: fromIntercept, correlation } = line;
  const fromSlope = x * line.slopeStdError;
  const variance = fromIntercept ** 2 + fromSlope ** 2 + 2 * correlation * fromIntercept * fromSlope;
  return { value: line.intercept + line.slope * x, standardUncertainty: Math.sqrt(Math.max(0, variance)) };
}
