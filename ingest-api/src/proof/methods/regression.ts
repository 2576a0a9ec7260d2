import { predictOnLine } from '../../analysis/gum/predict-on-line.js';
import {
  fitLineThroughOrigin,
  type LineThroughOrigin,
} from '../../analysis/statistics/fit-line-through-origin.js';
import { fitLine, type StraightLine } from '../../analysis/statistics/fit-line.js';
import { fitYorkLine } from '../../analysis/statistics/fit-york-line.js';
import { lineAnova } from '../../analysis/statistics/line-anova.js';
import thermometer from '../cases/gum-h3-thermometer.json';
import linewidth from '../cases/reg-nist-linewidth.json';
import noInt1 from '../cases/reg-nist-noint1.json';
import noInt2 from '../cases/reg-nist-noint2.json';
import norris from '../cases/reg-nist-norris.json';
import pearson from '../cases/reg-york-pearson.json';
import { proof, type Computed, type Proof } from '../proof.types.js';

function anovaFigures(fit: StraightLine | LineThroughOrigin): Computed {
  const anova = lineAnova(fit);
  return {
    df_regression: anova.regressionDf,
    ss_regression: fit.regressionSumOfSquares,
    ms_regression: anova.regressionMeanSquare,
    F: anova.fRatio ?? NaN,
    df_residual: anova.residualDf,
    ss_residual: fit.residualSumOfSquares,
    ms_residual: anova.residualMeanSquare,
  };
}

function throughOrigin({ x, y }: { x: number[]; y: number[] }): Computed {
  const fit = fitLineThroughOrigin(x, y);
  return {
    estimate: { B1: fit.slope },
    se: { B1: fit.slopeStdError },
    residual_sd: fit.residualStdDev,
    r_squared: fit.rSquared,
    anova: anovaFigures(fit),
  };
}

export const regressionProofs: readonly Proof[] = [
  proof(norris, ({ x, y }) => {
    const fit = fitLine(x, y);
    return {
      estimate: { B0: fit.intercept, B1: fit.slope },
      se: { B0: fit.interceptStdError, B1: fit.slopeStdError },
      residual_sd: fit.residualStdDev,
      r_squared: fit.rSquared,
      anova: anovaFigures(fit),
    };
  }),
  proof(noInt1, throughOrigin),
  proof(noInt2, throughOrigin),
  proof(linewidth, ({ x, y }) => {
    const fit = fitLine(x, y);
    return {
      intercept: fit.intercept,
      se_intercept: fit.interceptStdError,
      slope: fit.slope,
      se_slope: fit.slopeStdError,
      residual_sd: fit.residualStdDev,
      r_squared: fit.rSquared,
      df: fit.degreesOfFreedom,
    };
  }),
  proof(thermometer, (inputs) => {
    const fromReference = inputs.t_C.map((celsius) => celsius - inputs.t0_C);
    const fit = fitLine(fromReference, inputs.b_C);
    const predicted = predictOnLine(fit, inputs.predict_at_C - inputs.t0_C);
    return {
      y1_intercept: fit.intercept,
      u_y1: fit.interceptStdError,
      y2_slope: fit.slope,
      u_y2: fit.slopeStdError,
      correlation: fit.correlation,
      s: fit.residualStdDev,
      df: fit.degreesOfFreedom,
      sum_of_squared_residuals: fit.residualSumOfSquares,
      b_at_30C: predicted.value,
      u_b_at_30C: predicted.standardUncertainty,
    };
  }),
  proof(pearson, (inputs) => {
    const line = fitYorkLine(
      inputs.x.map((x, i) => ({
        x,
        y: inputs.y[i] ?? NaN,
        xStdDev: 1 / Math.sqrt(inputs.weight_x[i] ?? NaN),
        yStdDev: 1 / Math.sqrt(inputs.weight_y[i] ?? NaN),
      })),
    );
    const scale = Math.sqrt(line.chiSquared / line.degreesOfFreedom);
    return {
      intercept: line.intercept,
      slope: line.slope,
      sigma_intercept: line.interceptStdError,
      sigma_slope: line.slopeStdError,
      sigma_intercept_scaled: scale * line.interceptStdError,
      sigma_slope_scaled: scale * line.slopeStdError,
      correlation: line.correlation,
      chi2: line.chiSquared,
      sqrt_chi2_over_df: scale,
    };
  }),
];
