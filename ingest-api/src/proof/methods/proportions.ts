import { exactInterval, largestShareWithoutFailure } from '../../analysis/yield/exact-interval.js';
import { processYields } from '../../analysis/yield/process-yields.js';
import { wilsonInterval, type ShareInterval } from '../../analysis/yield/wilson-interval.js';
import newcombe from '../cases/prop-newcombe-1998.json';
import handbook from '../cases/prop-nist-7241.json';
import zeroFailures from '../cases/prop-zero-failures.json';
import sixSigma from '../cases/yield-sixsigma-rty.json';
import { proof, type Proof } from '../proof.types.js';

function ends(interval: ShareInterval | null): [number, number] {
  return interval === null ? [NaN, NaN] : [interval.low, interval.high];
}

export const proportionProofs: readonly Proof[] = [
  proof(newcombe, ({ cases, confidence }) =>
    Object.fromEntries(
      cases.map(([count = NaN, total = NaN]) => [
        `${count}/${total}`,
        {
          wilson: ends(wilsonInterval(count, total, { confidence })),
          wilson_continuity: ends(wilsonInterval(count, total, { confidence, continuityCorrected: true })),
          clopper_pearson: ends(exactInterval(count, total, confidence)),
        },
      ]),
    ),
  ),
  proof(handbook, ({ k, n, confidence }) => {
    const wilson = ends(wilsonInterval(k, n, { confidence }));
    return {
      exact_two_sided_90: ends(exactInterval(k, n, confidence)),
      wilson_two_sided_90: wilson,
      wilson_one_sided_lower_95: wilson[0],
    };
  }),
  proof(zeroFailures, ({ confidence }) => ({
    upper_one_sided_95_0_of_20: largestShareWithoutFailure(20, confidence),
    upper_two_sided_95_0_of_100: ends(exactInterval(0, 100, confidence))[1],
    wilson_upper_0_of_10: ends(wilsonInterval(0, 10, { confidence }))[1],
    wilson_lower_10_of_10: ends(wilsonInterval(10, 10, { confidence }))[0],
    wilson_5_of_10: ends(wilsonInterval(5, 10, { confidence })),
    wilson_8_of_10: ends(wilsonInterval(8, 10, { confidence })),
  })),
  proof(sixSigma, ({ defects, rework, units }) => {
    const yields = processYields(
      units,
      defects.map((count, i) => ({ defects: count, rework: rework[i] ?? NaN })),
    );
    return {
      yield_: yields.yield,
      first_time_yield: yields.firstTimeYield,
      rolled_throughput_yield: yields.rolledThroughput,
      defects: yields.defects,
      dpmo: yields.defectsPerMillion,
    };
  }),
];
