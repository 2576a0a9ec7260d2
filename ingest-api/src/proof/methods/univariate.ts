import { meanInterval } from '../../analysis/gum/mean-interval.js';
import { univariateSummary } from '../../analysis/statistics/univariate-summary.js';
import lew from '../cases/univ-nist-lew.json';
import lottery from '../cases/univ-nist-lottery.json';
import mavro from '../cases/univ-nist-mavro.json';
import numAcc1 from '../cases/univ-nist-numacc1.json';
import numAcc2 from '../cases/univ-nist-numacc2.json';
import numAcc4 from '../cases/univ-nist-numacc4.json';
import piDigits from '../cases/univ-nist-pidigits.json';
import heatFlow from '../cases/univ-nist-zarr13.json';
import { proof, type Computed, type Proof } from '../proof.types.js';

function summary({ y }: { y: number[] }): Computed {
  const { count, mean, standardDeviation, lag1Autocorrelation } = univariateSummary(y);
  return { n: count, mean, sd: standardDeviation, lag1_autocorrelation: lag1Autocorrelation ?? NaN };
}

export const univariateProofs: readonly Proof[] = [
  ...[lew, lottery, mavro, numAcc1, numAcc2, numAcc4, piDigits].map((set) => proof(set, summary)),
  proof(heatFlow, ({ y, confidence }) => {
    const { count, standardDeviation } = univariateSummary(y);
    const { mean, factor, low, high } = meanInterval(y, confidence);
    return { n: count, mean, sd: standardDeviation, t: factor, lower: low, upper: high };
  }),
];
