import type { JudgedMeasure, Sweep, SweepPoint } from '@/types/api';

const REFERENCE_AMPS = 0.00050148;
const SLOPE_SIEMENS = 8.24e-8;
const MEASURED: [loadVolts: number, outputAmps: number][] = [
  [0, 0.00050188],
  [1.2, 0.00050177],
  [2.4, 0.00050167],
  [3.6, 0.00050158],
  [4.8, 0.00050148],
  [6, 0.00050137],
  [7.2, 0.00050128],
  [8, 0.00050122],
];

const deviationPpm = (outputAmps: number) => (outputAmps / REFERENCE_AMPS - 1) * 1e6;
const linePpm = (loadVolts: number, slopeSiemens: number) =>
  ((-slopeSiemens * (loadVolts - 4.8)) / REFERENCE_AMPS) * 1e6;

export function aPoint(index: number, loadVolts: number, outputAmps: number): SweepPoint {
  return {
    index,
    loadVolts,
    outputAmps,
    deviationPpm: deviationPpm(outputAmps),
    direction: null,
    inFit: true,
    overload: false,
  };
}

export function aSweep(overrides: Partial<Sweep> = {}): Sweep {
  return {
    referenceVolts: 4.8,
    referenceAmps: REFERENCE_AMPS,
    complianceLowVolts: 0,
    complianceHighVolts: 8,
    complianceTolerance: 0.01,
    resolutionAmps: 1e-8,
    points: MEASURED.map(([loadVolts, outputAmps], index) => aPoint(index, loadVolts, outputAmps)),
    line: [0, 2, 4, 6, 8].map((loadVolts) => ({
      loadVolts,
      deviationPpm: linePpm(loadVolts, SLOPE_SIEMENS),
      lowPpm: linePpm(loadVolts, SLOPE_SIEMENS) - 12 - Math.abs(loadVolts - 4.8) * 4,
      highPpm: linePpm(loadVolts, SLOPE_SIEMENS) + 12 + Math.abs(loadVolts - 4.8) * 4,
    })),
    limitLine: [0, 8].map((loadVolts) => {
      const limit = linePpm(loadVolts, 1e-7);
      return { loadVolts, deviationPpm: limit, lowPpm: limit, highPpm: limit };
    }),
    complianceVolts: 8,
    complianceBound: 'atLeast',
    kneeFound: false,
    fit: {
      interceptAmps: 0.000501876,
      slopeSiemens: SLOPE_SIEMENS,
      expandedSlopeUncertaintySiemens: 2e-9,
      residualStdDevAmps: 5.2e-9,
      rSquared: 0.9995,
      degreesOfFreedom: 6,
    },
    ...overrides,
  };
}

export function aMeasure(overrides: Partial<JudgedMeasure> = {}): JudgedMeasure {
  return {
    name: 'outputImpedance',
    label: 'Output impedance',
    unit: 'Ω',
    value: 12.14e6,
    expandedUncertainty: 0.295e6,
    low: 11.85e6,
    high: 12.44e6,
    bound: 'exact',
    limit: { lower: 10e6, upper: null, rule: 'guarded', guardFactor: 1 },
    outcome: 'pass',
    probabilityOfConformity: 0.9999,
    reason: null,
    sentence:
      'Output impedance 12.14 MΩ lies above its lower limit of 10 MΩ by more than the uncertainty: pass.',
    ...overrides,
  };
}
