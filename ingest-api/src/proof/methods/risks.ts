import { normalQuantile } from '../../analysis/distributions/normal.js';
import { conformityProbability } from '../../analysis/risk/conformity-probability.js';
import { globalRisk, guardBandForRisk, movedInwards } from '../../analysis/risk/global-risk.js';
import { guardBandInStandardUncertainties, riskOfGuardFactor } from '../../analysis/risk/guard-factor.js';
import { gammaPrior, normalPrior } from '../../analysis/risk/prior.js';
import bearing from '../cases/jcgm106-bearing.json';
import deaver from '../cases/risk-deaver.json';
import falseAccept from '../cases/risk-false-accept.json';
import manual from '../cases/risk-suncal-manual.json';
import conformance from '../cases/rule-conformance-probability.json';
import { proof, type Computed, type Proof } from '../proof.types.js';

function between([lower = NaN, upper = NaN]: readonly number[]): { lower: number; upper: number } {
  return { lower, upper };
}

/** The gamma density is given in words in the case file: shape 4, scale 1/4. */
function bearingFigures({
  upper_limit: upper,
  u_measurement: u,
  target_consumer_risk: target,
}: typeof bearing.inputs): Computed {
  const inspection = {
    prior: gammaPrior(4, 1 / 4),
    standardUncertainty: u,
    tolerance: { lower: null, upper },
  };
  const unguarded = globalRisk(inspection);
  const guardBand = guardBandForRisk(inspection, target);
  const guarded = globalRisk({ ...inspection, acceptance: movedInwards(inspection.tolerance, guardBand) });
  return {
    fraction_nonconforming: unguarded.nonconforming,
    consumer_risk_no_guard_band: unguarded.falseAccept,
    producer_risk_no_guard_band: unguarded.falseReject,
    guard_band: guardBand,
    acceptance_limit_for_risk_0_001: upper - guardBand,
    producer_risk_with_guard_band: guarded.falseReject,
  };
}

/** Limits ±1, so the process deviation follows from the probability of being in tolerance. */
function falseAcceptFigures({
  limits,
  in_tolerance_probability: probabilities,
}: typeof falseAccept.inputs): Computed {
  const tolerance = between(limits);
  return Object.fromEntries(
    probabilities.map((probability) => {
      const processStdDev = tolerance.upper / normalQuantile((1 + Number(probability)) / 2);
      const prior = normalPrior(0, processStdDev);
      const risk = globalRisk({ prior, standardUncertainty: processStdDev / 4, tolerance });
      return [
        probability,
        {
          unconditional_percent: 100 * risk.falseAccept,
          conditional_percent: 100 * risk.falseAcceptOfAccepted,
        },
      ];
    }),
  );
}

export const riskProofs: readonly Proof[] = [
  proof(conformance, ({ y, u, TL, TU }) => {
    const probability = conformityProbability(y, u, { lower: TL, upper: TU });
    const wellInside = conformityProbability(y, u, { lower: null, upper: TU });
    const coverageFactor = 2;
    return {
      conformance_probability: probability,
      probability_outside:
        conformityProbability(y, u, { lower: null, upper: TL }) +
        riskOfGuardFactor((TU - y) / u / coverageFactor),
      guard_factor_95_one_sided_times_u: guardBandInStandardUncertainties(0.05),
      guard_factor_95_one_sided_times_U: guardBandInStandardUncertainties(0.05) / coverageFactor,
      guard_factor_97_7_one_sided_times_U: guardBandInStandardUncertainties(1 - wellInside) / coverageFactor,
    };
  }),
  proof(bearing, bearingFigures),
  proof(deaver, ({ process_sd: processStdDev, measurement_sd: standardUncertainty, limits }) => {
    const prior = normalPrior(0, processStdDev);
    const risk = globalRisk({ prior, standardUncertainty, tolerance: between(limits) });
    return { false_accept: risk.falseAccept, false_reject: risk.falseReject };
  }),
  proof(falseAccept, falseAcceptFigures),
  proof(manual, (inputs) => {
    const inspection = {
      prior: normalPrior(inputs.process_mean, inputs.process_sd),
      standardUncertainty: inputs.u_measurement,
      tolerance: between(inputs.limits),
    };
    const risk = globalRisk(inspection);
    return {
      false_accept: risk.falseAccept,
      false_reject: risk.falseReject,
      guard_band_for_false_accept_0_005: guardBandForRisk(inspection, inputs.target_false_accept),
    };
  }),
];
