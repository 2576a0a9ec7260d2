import { conformityProbability, type ToleranceInterval } from './conformity-probability.js';
import { findRoot } from './find-root.js';
import { integrate } from './integrate.js';
import type { Prior } from './prior.js';

export interface Inspection {
  prior: Prior;
  /** u of one measurement, normal and unbiased, in the unit of the quantity; > 0. */
  standardUncertainty: number;
  tolerance: ToleranceInterval;
  /** Where a measured value is accepted; default: the tolerance itself (no guard band). */
  acceptance?: ToleranceInterval;
}

/** All as shares of the whole production. */
export interface GlobalRisk {
  /** Consumer's risk: outside the tolerance and accepted. */
  falseAccept: number;
  /** Producer's risk: inside the tolerance and rejected. */
  falseReject: number;
  /** Outside the tolerance, whether accepted or not. */
  nonconforming: number;
  accepted: number;
  /** Outside the tolerance among the accepted: falseAccept/accepted. */
  falseAcceptOfAccepted: number;
}

/**
 * Risks of an inspection over a whole production, before anything is measured:
 *
 * `R_C = ∫_outside f(η)·P(accept | η) dη`, `R_P = ∫_inside f(η)·(1 − P(accept | η)) dη`,
 *
 * with the density f of the true values and `P(accept | η) = Φ((A_U − η)/u) − Φ((A_L − η)/u)`. Some tables state
 * R_C as a share of all units, others as a share of the accepted ones: both are returned.
 *
 * @throws RangeError when the standard uncertainty is not positive
 * @see JCGM 106:2012, clause 9
 */
export function globalRisk({
  prior,
  standardUncertainty,
  tolerance,
  acceptance = tolerance,
}: Inspection): GlobalRisk {
  if (!(standardUncertainty > 0)) {
    throw new RangeError(`globalRisk requires a standard uncertainty above 0, got ${standardUncertainty}`);
  }
  const accept = (value: number): number => conformityProbability(value, standardUncertainty, acceptance);
  const accepted = (value: number): number => prior.density(value) * accept(value);
  const rejected = (value: number): number => prior.density(value) * (1 - accept(value));
  const low = Math.max(prior.support.low, tolerance.lower ?? -Infinity);
  const high = Math.min(prior.support.high, tolerance.upper ?? Infinity);
  const over = (f: (value: number) => number, from: number, to: number): number =>
    from < to ? integrateInPieces(f, from, to, standardUncertainty) : 0;
  const falseAccept = over(accepted, prior.support.low, low) + over(accepted, high, prior.support.high);
  const rightAccept = over(accepted, low, high);
  return {
    falseAccept,
    falseReject: over(rejected, low, high),
    nonconforming: nonconformingShare(prior, tolerance),
    accepted: falseAccept + rightAccept,
    falseAcceptOfAccepted: falseAccept / (falseAccept + rightAccept),
  };
}

/**
 * Share of a production outside the tolerance.
 *
 * @see JCGM 106:2012, 9.3
 */
function nonconformingShare(prior: Prior, { lower, upper }: ToleranceInterval): number {
  const below = lower === null ? 0 : prior.cumulative(lower);
  const above = upper === null ? 0 : 1 - prior.cumulative(upper);
  return below + above;
}

/**
 * Guard band w that brings the consumer's risk R_C down to a target, when every limit is moved inwards by w.
 *
 * A negative w comes out where the risk without guard band is already below the target: limits could be moved
 * outwards (shared to the producer's advantage); whoever never widens limits takes 0 instead.
 *
 * @param target - R_C as a share of the whole production, e.g. 0.001
 * @returns in the unit of the quantity
 * @throws RangeError when no guard band within ten standard uncertainties reaches the target
 * @see JCGM 106:2012, 9.5.3
 */
export function guardBandForRisk(inspection: Omit<Inspection, 'acceptance'>, target: number): number {
  const { tolerance, standardUncertainty } = inspection;
  const excess = (guardBand: number): number =>
    globalRisk({ ...inspection, acceptance: movedInwards(tolerance, guardBand) }).falseAccept - target;
  const reach = 10 * standardUncertainty;
  return findRoot(excess, -reach, reach, 1e-13 * standardUncertainty);
}

/** Acceptance interval after a guard band: both limits moved inwards by w. */
export function movedInwards({ lower, upper }: ToleranceInterval, guardBand: number): ToleranceInterval {
  return {
    lower: lower === null ? null : lower + guardBand,
    upper: upper === null ? null : upper - guardBand,
  };
}

/** The probability of acceptance changes within a few u of a limit, so pieces of that size keep the rule exact. */
function integrateInPieces(f: (value: number) => number, from: number, to: number, scale: number): number {
  const edge = Math.min(8 * scale, (to - from) / 2);
  return integrate(f, from, from + edge) + integrate(f, from + edge, to - edge) + integrate(f, to - edge, to);
}
