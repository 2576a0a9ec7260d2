import { tQuantile } from '../distributions/student-t.js';
import type { LineFit, PreparedPoint } from '../analysis.types.js';

export interface Curvature {
  /** Largest departure of the quadratic component from the line, in A. */
  bowAmps: number;
  /** Standard deviation of what line and quadratic leave over; null with fewer than 4 points. */
  scatterAmps: number | null;
  curved: boolean;
}

/**
 * Tells whether the residuals of a fit are curved rather than random.
 *
 * The part of V² that is orthogonal to the line is fitted to the residuals. They are curved when its bow exceeds
 * 1.2 of the steps the readings are written in (two half-widths of 0.6·δ can bend three points) **and** its coefficient
 * is significant (t test, two-sided 1 %). With fewer than 5 points the test has next to no degrees of freedom and
 * the bow alone decides: three points are never known to be random.
 *
 * @param points - the fitted points, at one level where there are several ammeter ranges
 * @param writtenStepAmps - δ, or the last decimal place of the readings when δ is not known
 */
export function findCurvature(
  points: readonly PreparedPoint[],
  fit: LineFit,
  writtenStepAmps: number,
): Curvature {
  const n = points.length;
  const { shape, sumOfSquares } = orthogonalQuadratic(points);
  const residual = (point: PreparedPoint) =>
    point.outputAmps - fit.interceptAmps - fit.slopeSiemens * point.loadVolts;
  let product = 0;
  let residualSquares = 0;
  let largestShape = 0;
  for (let i = 0; i < n; i++) {
    const e = residual(points[i]!);
    product += shape[i]! * e;
    residualSquares += e * e;
    largestShape = Math.max(largestShape, Math.abs(shape[i]!));
  }
  if (!(sumOfSquares > 0)) return { bowAmps: 0, scatterAmps: null, curved: false };
  const bowAmps = (Math.abs(product) / sumOfSquares) * largestShape;
  const explained = (product * product) / sumOfSquares;
  const left = Math.max(0, residualSquares - explained);
  const degreesOfFreedom = fit.degreesOfFreedom - 1;
  const scatterAmps = degreesOfFreedom > 0 ? Math.sqrt(left / degreesOfFreedom) : null;
  const bent = bowAmps > 1.2 * writtenStepAmps;
  const significant =
    degreesOfFreedom < 2 || explained > tQuantile(0.995, degreesOfFreedom) ** 2 * (left / degreesOfFreedom);
  return { bowAmps, scatterAmps, curved: bent && significant };
}

/** V² made orthogonal to 1 and V, scaled by the span so that its size is about 1. */
function orthogonalQuadratic(points: readonly PreparedPoint[]): {
  shape: number[];
  sumOfSquares: number;
} {
  const n = points.length;
  const low = points[0]?.loadVolts ?? 0;
  const span = (points.at(-1)?.loadVolts ?? 0) - low || 1;
  const x = points.map((point) => (point.loadVolts - low) / span);
  const meanX = x.reduce((sum, value) => sum + value, 0) / n;
  const d = x.map((value) => value - meanX);
  const s2 = d.reduce((sum, value) => sum + value * value, 0);
  const s3 = d.reduce((sum, value) => sum + value ** 3, 0);
  const shape = d.map((value) => value * value - s2 / n - (s2 > 0 ? s3 / s2 : 0) * value);
  const sumOfSquares = shape.reduce((sum, value) => sum + value * value, 0);
  return { shape, sumOfSquares: sumOfSquares > 1e-9 * n ? sumOfSquares : 0 };
}
