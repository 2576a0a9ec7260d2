import { compensatedSum } from './compensated-sum.js';

/** A point with standard deviations of both coordinates. */
export interface UncertainPoint {
  x: number;
  y: number;
  xStdDev: number;
  yStdDev: number;
  /** Correlation of the errors of x and y in this point; default 0. */
  errorCorrelation?: number;
}

export interface YorkLine {
  intercept: number;
  slope: number;
  /** Trusting the given standard deviations; times √(χ²/ν) where only their ratios are trusted. */
  interceptStdError: number;
  slopeStdError: number;
  correlation: number;
  chiSquared: number;
  degreesOfFreedom: number;
}

const CONVERGED = 1e-15;
const LARGEST_NUMBER_OF_STEPS = 200;

/**
 * Straight line through points that are uncertain in both coordinates (York's unified equations).
 *
 * Starting from the ordinary slope, repeat with the weights `ω = 1/σ²`, `α = √(ω_x·ω_y)`:
 *
 * `W = ω_x·ω_y/(ω_x + b²·ω_y − 2·b·r·α)`, `x̄ = ΣWx/ΣW`, `ȳ = ΣWy/ΣW`, `u = x − x̄`, `v = y − ȳ`,
 * `β = W·(u/ω_y + b·v/ω_x − (b·u + v)·r/α)`, `b = ΣWβv/ΣWβu`
 *
 * until b stands still. The standard errors use the adjusted points `x̄ + β` and trust the given deviations; two
 * conventions circulate, the other multiplies them by √(χ²/ν). The correlation also uses the adjusted points.
 *
 * @throws RangeError with fewer than three points, a deviation that is not positive, or x all equal
 * @see D. York et al., Am. J. Phys. 72 (2004) 367
 */
export function fitYorkLine(points: readonly UncertainPoint[]): YorkLine {
  if (points.length < 3) throw new RangeError('fitYorkLine requires at least three points');
  if (points.some(({ xStdDev, yStdDev }) => !(xStdDev > 0 && yStdDev > 0))) {
    throw new RangeError('fitYorkLine requires positive standard deviations');
  }
  let slope = ordinarySlope(points);
  let step = nextSlope(points, slope);
  for (let i = 0; i < LARGEST_NUMBER_OF_STEPS && !isSettled(step.slope, slope); i++) {
    slope = step.slope;
    step = nextSlope(points, slope);
  }
  return conclude(points, step);
}

interface YorkStep {
  slope: number;
  weights: Float64Array;
  meanX: number;
  meanY: number;
  /** β: the adjusted x is meanX + β. */
  adjustments: Float64Array;
}

function nextSlope(points: readonly UncertainPoint[], slope: number): YorkStep {
  const weights = Float64Array.from(points, (point) => weightOf(point, slope));
  const totalWeight = compensatedSum(weights);
  const weighted = (term: (point: UncertainPoint, index: number) => number): number =>
    compensatedSum(Float64Array.from(points, (point, i) => (weights[i] ?? 0) * term(point, i)));
  const meanX = weighted((point) => point.x) / totalWeight;
  const meanY = weighted((point) => point.y) / totalWeight;
  const adjustments = Float64Array.from(points, (point, i) => {
    const u = point.x - meanX;
    const v = point.y - meanY;
    const shared = (point.errorCorrelation ?? 0) * point.xStdDev * point.yStdDev;
    const pull = u * point.yStdDev ** 2 + slope * v * point.xStdDev ** 2 - (slope * u + v) * shared;
    return (weights[i] ?? 0) * pull;
  });
  const numerator = weighted((point, i) => (adjustments[i] ?? 0) * (point.y - meanY));
  const denominator = weighted((point, i) => (adjustments[i] ?? 0) * (point.x - meanX));
  return { slope: numerator / denominator, weights, meanX, meanY, adjustments };
}

/** W in variances: 1/(σ_y² + b²·σ_x² − 2·b·r·σ_x·σ_y), the inverse variance of y − b·x. */
function weightOf({ xStdDev, yStdDev, errorCorrelation = 0 }: UncertainPoint, slope: number): number {
  return 1 / (yStdDev ** 2 + (slope * xStdDev) ** 2 - 2 * slope * errorCorrelation * xStdDev * yStdDev);
}

function conclude(points: readonly UncertainPoint[], step: YorkStep): YorkLine {
  const { slope, weights, meanX, meanY, adjustments } = step;
  const totalWeight = compensatedSum(weights);
  const weighted = (term: (index: number) => number): number =>
    compensatedSum(Float64Array.from(weights, (weight, i) => weight * term(i)));
  const meanAdjustment = weighted((i) => adjustments[i] ?? 0) / totalWeight;
  const adjustedMeanX = meanX + meanAdjustment;
  const slopeStdError = 1 / Math.sqrt(weighted((i) => ((adjustments[i] ?? 0) - meanAdjustment) ** 2));
  const interceptStdError = Math.sqrt(1 / totalWeight + (adjustedMeanX * slopeStdError) ** 2);
  const intercept = meanY - slope * meanX;
  const residual = (point: UncertainPoint | undefined): number =>
    point === undefined ? 0 : point.y - intercept - slope * point.x;
  return {
    intercept,
    slope,
    interceptStdError,
    slopeStdError,
    correlation: (-adjustedMeanX * slopeStdError) / interceptStdError,
    chiSquared: weighted((i) => residual(points[i]) ** 2),
    degreesOfFreedom: points.length - 2,
  };
}

function ordinarySlope(points: readonly UncertainPoint[]): number {
  const meanX = compensatedSum(points.map(({ x }) => x)) / points.length;
  const sxx = compensatedSum(points.map(({ x }) => (x - meanX) ** 2));
  if (!(sxx > 0)) throw new RangeError('fitYorkLine requires at least two different x');
  return compensatedSum(points.map(({ x, y }) => (x - meanX) * y)) / sxx;
}

function isSettled(next: number, previous: number): boolean {
  return Math.abs(next - previous) <= CONVERGED * Math.abs(next);
}
