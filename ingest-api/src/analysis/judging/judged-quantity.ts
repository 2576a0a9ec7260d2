import type { Limit, Measure, MeasureName, ProductSpec, SweepAnalysis } from '../analysis.types.js';
import { conformityProbability, type ToleranceInterval } from '../risk/conformity-probability.js';
import { IMPEDANCE_MEASURES } from './measure-names.js';

interface Estimate {
  value: number;
  expandedUncertainty: number;
}

/** A measure and its limit on the scale on which they are compared. */
export interface JudgedQuantity extends Estimate {
  tolerance: ToleranceInterval;
  /** What `adequacyRatio` is a share of, on the same scale. */
  toleranceWidth: number;
  probabilityOfConformity: number;
}

/** U is stated with a coverage factor of about 2. */
const COVERAGE_FACTOR = 2;

/**
 * Brings a measure and its limit onto the scale on which they are judged.
 *
 * Impedance and what is proportional to it are judged in **conductance**, because the uncertainty is symmetric
 * there and guard bands in ohms would be lopsided: a lower limit R on the impedance means |g| ≤ 1/R, an upper one
 * |g| ≥ 1/R. The size |ĝ| is compared whatever its sign: an ideal source has g = 0, and a current that rises with
 * the load voltage is as far from ideal as one that falls. (The displayed bound 1/(|ĝ| + U) is the same statement,
 * so what is displayed as "at least R" passes a guarded limit R.) For `a·r_out` and `a·r_out − supply` the limit L
 * means G = a/L and G = a/(L + supply); the uncertainty of a, parts per million, is left out.
 *
 * Every other measure is judged as it stands; of a bound, the estimate behind it.
 *
 * @returns null when the measure has no value to compare, or no uncertainty
 */
export function judgedQuantity(
  measure: Measure,
  limit: Limit,
  analysis: SweepAnalysis,
  product: ProductSpec,
): JudgedQuantity | null {
  if (IMPEDANCE_MEASURES.has(measure.name)) return inConductance(measure, limit, analysis, product);
  const estimate = estimateOf(measure);
  if (estimate === null) return null;
  const { value, expandedUncertainty } = estimate;
  const tolerance = { lower: limit.lower, upper: limit.upper };
  return {
    value,
    expandedUncertainty,
    tolerance,
    toleranceWidth: widthOf(tolerance, idealValue(measure.name, product)),
    probabilityOfConformity: conformityProbability(value, expandedUncertainty / COVERAGE_FACTOR, tolerance),
  };
}

/** Behind a bound stands the estimate it was drawn from; without U the bound itself is all that is known. */
function estimateOf({ value, estimate, expandedUncertainty, bound }: Measure): Estimate | null {
  if (value === null) return null;
  if (bound === 'exact' || expandedUncertainty === null) {
    return expandedUncertainty === null ? null : { value, expandedUncertainty };
  }
  const behind = bound === 'atMost' ? value - expandedUncertainty : value + expandedUncertainty;
  return { value: estimate ?? behind, expandedUncertainty };
}

function inConductance(
  measure: Measure,
  limit: Limit,
  analysis: SweepAnalysis,
  product: ProductSpec,
): JudgedQuantity | null {
  const factor = conductanceFactor(measure.name, analysis);
  // A significantly rising current has no impedance to show, but a slope to judge.
  const absent = measure.value === null && measure.reason !== 'risingCurrent';
  if (absent || analysis.impedance === null || factor === null) return null;
  const { conductanceSiemens, expandedUncertaintySiemens } = analysis.impedance;
  const offset = measure.name === 'effectiveEarlyVoltage' ? product.supplyVolts : 0;
  const tolerance = {
    lower: limit.upper === null ? null : largestConductance(factor, limit.upper + offset),
    upper: limit.lower === null ? null : largestConductance(factor, limit.lower + offset),
  };
  return {
    value: Math.abs(conductanceSiemens),
    expandedUncertainty: expandedUncertaintySiemens,
    tolerance,
    toleranceWidth: widthOf(tolerance, 0),
    probabilityOfConformity: probabilityOfSize(
      conductanceSiemens,
      expandedUncertaintySiemens / COVERAGE_FACTOR,
      tolerance,
    ),
  };
}

function conductanceFactor(name: MeasureName, analysis: SweepAnalysis): number | null {
  if (name === 'outputImpedance') return 1;
  return analysis.fit === null ? null : analysis.fit.interceptAmps;
}

/** A limit of 0 or less asks nothing of an impedance: null. */
function largestConductance(factor: number, limit: number): number | null {
  return limit > 0 ? factor / limit : null;
}

/** Probability that |g| lies within the tolerance when g is normal about ĝ: the inner interval taken from the outer. */
function probabilityOfSize(
  conductance: number,
  standardUncertainty: number,
  { lower, upper }: ToleranceInterval,
): number {
  const within = (size: number): number =>
    conformityProbability(conductance, standardUncertainty, { lower: -size, upper: size });
  const notAbove = upper === null ? 1 : within(upper);
  const below = lower === null ? 0 : within(lower);
  return Math.max(0, notAbove - below);
}

/** Where a one-sided tolerance begins: the value of a perfect unit. Null where perfection has no finite value. */
function idealValue(name: MeasureName, product: ProductSpec): number | null {
  if (name === 'referenceCurrent') return product.nominalAmps;
  return name === 'complianceVoltage' ? null : 0;
}

/**
 * Width of the tolerance: upper − lower (JCGM 106, 3.3.5); for a one-sided limit the distance from a perfect unit
 * to the limit, or the limit's own size where a perfect unit has no finite value.
 */
function widthOf({ lower, upper }: ToleranceInterval, ideal: number | null): number {
  if (lower !== null && upper !== null) return Math.max(0, upper - lower);
  const limit = lower ?? upper ?? Infinity;
  return Math.abs(limit - (ideal ?? 0));
}
