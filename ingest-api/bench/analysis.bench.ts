import type { Limit, ProductSpec, SweepInput } from '../src/analysis/analysis.types.js';
import { judgeResult } from '../src/analysis/judging/judge-result.js';
import { analyseSweep } from '../src/analysis/sweep/analyse-sweep.js';
import { seededRandom } from '../src/proof/simulation/seeded-random.js';

const product: ProductSpec = {
  nominalAmps: 500e-6,
  supplyVolts: 9,
  complianceLowVolts: 0,
  complianceHighVolts: 8,
  complianceTolerance: 0.01,
  circuitKind: 'twoTransistorMirror',
  hasEmitterResistors: false,
};

/** A limit on every measure, so that all of them are judged. */
const limits: Limit[] = [
  { measure: 'referenceCurrent', lower: 495e-6, upper: 505e-6, rule: 'guarded', guardFactor: 1 },
  { measure: 'setpointError', lower: -1, upper: 1, rule: 'simple', guardFactor: 1 },
  { measure: 'outputImpedance', lower: 8e6, upper: null, rule: 'guarded', guardFactor: 1 },
  { measure: 'relativeSlope', lower: null, upper: 250, rule: 'simple', guardFactor: 1 },
  { measure: 'loadRegulation', lower: -0.3, upper: 0.3, rule: 'guarded', guardFactor: 1 },
  { measure: 'linearityError', lower: null, upper: 100, rule: 'guarded', guardFactor: 1 },
  { measure: 'settlingDrift', lower: -50, upper: 50, rule: 'guarded', guardFactor: 1 },
  { measure: 'sweepHysteresis', lower: null, upper: 50, rule: 'guarded', guardFactor: 1 },
  { measure: 'impedanceCurrentProduct', lower: 4000, upper: null, rule: 'guarded', guardFactor: 1 },
  { measure: 'effectiveEarlyVoltage', lower: 4000, upper: null, rule: 'guarded', guardFactor: 1 },
];

/** Sweeps of different units, so that no branch is learnt by heart: the first point is repeated at the end. */
function sweepsOf(pointCount: number, sweeps: number): SweepInput[] {
  const random = seededRandom(pointCount);
  return Array.from({ length: sweeps }, () => {
    const conductance = 1e-7 * random.uniform();
    const setAmps = 500e-6 * (1 + 0.004 * random.normal());
    const points = Array.from({ length: pointCount }, (_, i) => {
      const loadVolts = i === pointCount - 1 ? 0 : (8 * i) / (pointCount - 2);
      const trueAmps = setAmps - conductance * loadVolts + 4e-9 * random.normal();
      return { loadVolts, outputAmps: Math.round(trueAmps * 1e8) / 1e8, elapsedMs: 900 * i };
    });
    return {
      points,
      ammeter: {
        rangeAmps: 1e-3,
        resolutionAmps: 1e-8,
        readingAccuracyPercent: 0.02,
        rangeAccuracyPercent: 0.005,
        burdenOhms: 10,
      },
      voltmeter: {},
      product,
      plan: { referenceVolts: 4 },
    };
  });
}

/** Median time (µs) of analysing and judging one sweep, each timed by itself after a warm-up. */
function medianMicroseconds(sweeps: readonly SweepInput[], rounds: number): number {
  const times = new Float64Array(rounds);
  for (let round = -rounds; round < rounds; round++) {
    const sweep = sweeps[(round + rounds) % sweeps.length]!;
    const start = process.hrtime.bigint();
    judgeResult({ analysis: analyseSweep(sweep), outcome: 'completed', limits, product });
    if (round >= 0) times[round] = Number(process.hrtime.bigint() - start) / 1000;
  }
  return times.sort()[rounds >> 1]!;
}

for (const [pointCount, rounds, aim] of [
  [12, 20_000, 40],
  [500, 400, 5000],
] as const) {
  const median = medianMicroseconds(sweepsOf(pointCount, 64), rounds);
  const digits = median < 100 ? 1 : 0;
  const outcome = median <= aim ? 'met' : 'missed';
  process.stdout.write(
    `analysis ${pointCount} points: ${median.toFixed(digits)} µs (aim ${aim}) ${outcome}\n`,
  );
}
