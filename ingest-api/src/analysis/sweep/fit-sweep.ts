import type { LineFit, PreparedPoint } from '../analysis.types.js';
import { areWeights, lineThrough } from './line-through.js';
import { countSteps } from './same-voltage.js';

/** Two load steps always lie on a line; the third can contradict it. */
const FEWEST_STEPS = 3;

export interface SweepFit {
  fit: LineFit | null;
  /** Load steps (different voltages) among the fitted points. */
  steps: number;
  /** Some points carry a standard deviation and others none, or one of zero: no weights were used. */
  weightsUnused: boolean;
}

/**
 * Fits I = a + b·V through the chosen points: ordinary least squares, or weighted when *every* point carries its
 * own standard deviation (> 0, none over 10,000 times another). Standard errors of a weighted fit are those from the
 * residuals (scaled by √(χ²/ν)), so that both kinds take the same t factor.
 *
 * @param points - by ascending voltage
 * @param sameVolts - voltages within this tolerance are one load step
 * @returns fit null with fewer than 3 load steps
 */
export function fitSweep(points: readonly PreparedPoint[], sameVolts: number): SweepFit {
  const steps = countSteps(
    points.map((point) => point.loadVolts),
    sameVolts,
  );
  const weighted = areWeights(points);
  const weightsUnused = !weighted && points.some((point) => point.outputAmpsStdDev !== null);
  return { fit: steps < FEWEST_STEPS ? null : lineThrough(points, weighted), steps, weightsUnused };
}
