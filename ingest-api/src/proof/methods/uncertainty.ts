import { combineUncertainties, withProductTerms } from '../../analysis/gum/combine-uncertainties.js';
import { expandedUncertainty, wholeDegreesOfFreedom } from '../../analysis/gum/expanded-uncertainty.js';
import { largestChanceRatio, repeatedDays } from '../../analysis/gum/repeated-days.js';
import {
  arcSineUncertainty,
  rectangularUncertainty,
  resolutionUncertainty,
  triangularUncertainty,
} from '../../analysis/gum/standard-uncertainty.js';
import { tFactor } from '../../analysis/distributions/student-t.js';
import divisors from '../cases/gum-divisors.json';
import product from '../cases/gum-g4-welch.json';
import endGauge from '../cases/gum-h1-end-gauge.json';
import dailyMeans from '../cases/gum-h5-daily-means.json';
import { proof, type Computed, type Proof } from '../proof.types.js';

/** l = l_S + d − l_S·(δα·θ + α_S·δθ); lengths in nm, temperatures in °C. */
function endGaugeFigures(inputs: typeof endGauge.inputs): Computed {
  const length = inputs.ls_nm;
  const difference = combineUncertainties([
    { standardUncertainty: inputs.u_d0, degreesOfFreedom: inputs.nu_d0 },
    { standardUncertainty: inputs.u_d1, degreesOfFreedom: inputs.nu_d1 },
    { standardUncertainty: inputs.u_d2, degreesOfFreedom: inputs.nu_d2 },
  ]);
  const expansionDifference = rectangularUncertainty(inputs.d_alpha_half_width);
  const temperatureDifference = rectangularUncertainty(inputs.d_theta_half_width);
  const combined = combineUncertainties([
    { standardUncertainty: inputs.u_ls, degreesOfFreedom: inputs.nu_ls },
    {
      standardUncertainty: difference.standardUncertainty,
      degreesOfFreedom: difference.effectiveDegreesOfFreedom,
    },
    {
      standardUncertainty: expansionDifference,
      sensitivity: -length * inputs.theta_bar,
      degreesOfFreedom: inputs.nu_d_alpha,
    },
    {
      standardUncertainty: temperatureDifference,
      sensitivity: -length * inputs.alpha_s,
      degreesOfFreedom: inputs.nu_d_theta,
    },
  ]);
  const [ls = NaN, , dAlpha = NaN, dTheta = NaN] = combined.contributions;
  const [d0 = NaN, d1 = NaN, d2 = NaN] = difference.contributions;
  const wholeDf = wholeDegreesOfFreedom(combined.effectiveDegreesOfFreedom);
  const temperature = Math.hypot(inputs.u_theta_bar, arcSineUncertainty(inputs.cyclic_half_width));
  return {
    l_nm: length + inputs.d_nm,
    uc_nm: combined.standardUncertainty,
    components_nm: { ls, d0, d1, d2, d_alpha: dAlpha, d_theta: dTheta },
    u_d_nm: difference.standardUncertainty,
    df_d: difference.effectiveDegreesOfFreedom,
    nu_eff: combined.effectiveDegreesOfFreedom,
    nu_eff_truncated: wholeDf,
    t99: tFactor(0.99, wholeDf),
    U99_nm: expandedUncertainty(combined.standardUncertainty, wholeDf, 0.99),
    uc_second_order_nm: withProductTerms(combined.standardUncertainty, [
      { mixedDerivative: -length, firstUncertainty: expansionDifference, secondUncertainty: temperature },
      {
        mixedDerivative: -length,
        firstUncertainty: rectangularUncertainty(inputs.alpha_s_half_width),
        secondUncertainty: temperatureDifference,
      },
    ]),
  };
}

export const uncertaintyProofs: readonly Proof[] = [
  proof(divisors, ({ half_width: halfWidth, resolution }) => ({
    rectangular_half_width_1: rectangularUncertainty(halfWidth),
    triangular_half_width_1: triangularUncertainty(halfWidth),
    arcsine_half_width_1: arcSineUncertainty(halfWidth),
    resolution_1: resolutionUncertainty(resolution),
    resolution_1_exact: resolutionUncertainty(resolution),
  })),
  proof(product, ({ relative_u_percent: relative, n }) => {
    const combined = combineUncertainties(
      relative.map((standardUncertainty, i) => ({
        standardUncertainty,
        degreesOfFreedom: (n[i] ?? NaN) - 1,
      })),
    );
    const wholeDf = wholeDegreesOfFreedom(combined.effectiveDegreesOfFreedom);
    return {
      uc_percent: combined.standardUncertainty,
      nu_eff: combined.effectiveDegreesOfFreedom,
      t95: tFactor(0.95, wholeDf),
      U95_percent: expandedUncertainty(combined.standardUncertainty, wholeDf, 0.95),
    };
  }),
  proof(endGauge, endGaugeFigures),
  proof(dailyMeans, (inputs) => {
    const microvolts = 1e6;
    const days = repeatedDays({
      means: inputs.daily_means_V,
      standardDeviations: inputs.daily_sd_uV.map((deviation) => deviation / microvolts),
      readingsPerDay: inputs.readings_per_day,
    });
    return {
      mean_V: days.mean,
      sd_of_daily_means_uV: days.standardDeviationOfMeans * microvolts,
      s_a_uV: days.betweenAsReading * microvolts,
      s_b_uV: days.within * microvolts,
      F: days.fRatio,
      u_mean_uV: days.uncertaintyOfMean * microvolts,
      between_day_sd_uV: days.betweenDays * microvolts,
      F_crit_0_95_9_40: largestChanceRatio(days.betweenDf, days.withinDf, 0.95),
      F_crit_0_975_9_40: largestChanceRatio(days.betweenDf, days.withinDf, 0.975),
    };
  }),
];
