import type {
  AnalysisFlag,
  Measure,
  MeasureName,
  ProductSpec,
  SweepAnalysis,
  SweepInput,
  SweepPoint,
} from '../analysis.types.js';

/** The Wilson mirror of the demonstration scenario: 500 µA held to 1 % from 0 to 8 V on a 9 V supply. */
export function aProduct(overrides: Partial<ProductSpec> = {}): ProductSpec {
  return {
    nominalAmps: 500e-6,
    supplyVolts: 9,
    complianceLowVolts: 0,
    complianceHighVolts: 8,
    complianceTolerance: 0.01,
    circuitKind: 'wilsonMirror',
    hasEmitterResistors: false,
    ...overrides,
  };
}

/** The example sweep of the station contract, 12.14 MΩ. */
export function aSweep(overrides: Partial<SweepInput> = {}): SweepInput {
  return {
    points: [
      [0, 0.00050188],
      [1.2, 0.00050177],
      [2.4, 0.00050167],
      [3.6, 0.00050158],
      [4.8, 0.00050148],
      [6, 0.00050137],
      [7.2, 0.00050128],
      [8, 0.00050122],
    ].map(([loadVolts = 0, outputAmps = 0], i) => ({ loadVolts, outputAmps, elapsedMs: 900 * i })),
    ammeter: {
      rangeAmps: 0.001,
      resolutionAmps: 1e-8,
      readingAccuracyPercent: 0.02,
      rangeAccuracyPercent: 0.005,
      burdenOhms: 10,
    },
    voltmeter: { inputOhms: 1e10, spansAmmeter: false },
    product: aProduct(),
    plan: { referenceVolts: 4 },
    ...overrides,
  };
}

/** Points at the given load voltages with the currents of a characteristic. */
export function pointsOf(loadVolts: readonly number[], outputAmps: (volts: number) => number): SweepPoint[] {
  return loadVolts.map((volts) => ({ loadVolts: volts, outputAmps: outputAmps(volts) }));
}

/** Equal steps from low to high, ends included. */
export function steps(low: number, high: number, count: number): number[] {
  return Array.from({ length: count }, (_, i) => low + ((high - low) * i) / (count - 1));
}

export function measureOf(analysis: SweepAnalysis, name: MeasureName): Measure {
  const measure = analysis.measures.find((candidate) => candidate.name === name);
  if (measure === undefined) throw new Error(`no measure ${name}`);
  return measure;
}

export function hasFlag(analysis: SweepAnalysis, flag: AnalysisFlag): boolean {
  return analysis.flags.includes(flag);
}
