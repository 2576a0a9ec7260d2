import type { SweepAnalysis } from '../../analysis/analysis.types.js';
import { earlyOutputResistance } from '../../analysis/circuit/early-effect.js';
import { impedanceFromSlope } from '../../analysis/circuit/impedance-from-slope.js';
import {
  twoTransistorMirrorError,
  twoTransistorMirrorRatio,
  twoTransistorMirrorResistance,
  wilsonMirrorError,
  wilsonMirrorRatio,
  wilsonMirrorResistance,
} from '../../analysis/circuit/mirror.js';
import { analyseSweep } from '../../analysis/sweep/analyse-sweep.js';
import early from '../cases/elec-early-ro.json';
import mirrors from '../cases/elec-mirror-wilson.json';
import norton from '../cases/elec-norton-line.json';
import norris from '../cases/elec-rout-from-norris.json';
import { proof, type Proof } from '../proof.types.js';

/** The ideal source goes through the whole analysis of a posted sweep, on a meter that resolves 1 pA. */
function analyseNorton(inputs: typeof norton.inputs): SweepAnalysis {
  const [lowest = 0] = inputs.V_load;
  return analyseSweep({
    points: inputs.V_load.map((loadVolts, i) => ({ loadVolts, outputAmps: inputs.I_out[i] ?? NaN })),
    ammeter: { resolutionAmps: 1e-12 },
    voltmeter: {},
    product: {
      nominalAmps: inputs.I_nominal,
      supplyVolts: 12,
      complianceLowVolts: lowest,
      complianceHighVolts: inputs.V_load.at(-1) ?? NaN,
      complianceTolerance: 0.01,
      circuitKind: 'other',
      hasEmitterResistors: false,
    },
    plan: { referenceVolts: lowest },
  });
}

function valueOf(analysis: SweepAnalysis, name: string): number {
  return analysis.measures.find((measure) => measure.name === name)?.value ?? NaN;
}

export const circuitProofs: readonly Proof[] = [
  proof(norris, ({ slope_dI_dV: slope, u_slope: slopeStdError, df }) => {
    const impedance = impedanceFromSlope(slope, slopeStdError, df);
    return {
      r_out: impedance.ohms,
      u_r_out: impedance.standardUncertainty,
      rel_u: impedance.relativeUncertainty,
      U95: impedance.expandedUncertainty,
    };
  }),
  proof(mirrors, ({ beta, r_o_ohm: transistorOhms }) => ({
    simple_ratio: twoTransistorMirrorRatio(beta),
    simple_error_percent: 100 * twoTransistorMirrorError(beta),
    wilson_ratio: wilsonMirrorRatio(beta),
    wilson_error_percent: 100 * wilsonMirrorError(beta),
    simple_output_resistance_ohm: twoTransistorMirrorResistance(transistorOhms),
    wilson_output_resistance_ohm: wilsonMirrorResistance(beta, transistorOhms),
  })),
  proof(early, ({ VA_V: earlyVolts, IC_A: [first = NaN, second = NaN, third = NaN] }) => ({
    VA100_V_ro_ohm: {
      '0.1mA': earlyOutputResistance(earlyVolts, first),
      '1mA': earlyOutputResistance(earlyVolts, second),
      '10mA': earlyOutputResistance(earlyVolts, third),
    },
    with_VCE: { VA_100_VCE_10_IC_1mA: earlyOutputResistance(earlyVolts, second, 10) },
  })),
  proof(norton, (inputs) => {
    const analysis = analyseNorton(inputs);
    const regulation = valueOf(analysis, 'loadRegulation');
    const span = (inputs.V_load.at(-1) ?? NaN) - (inputs.V_load[0] ?? NaN);
    return {
      slope: analysis.fit?.slopeSiemens ?? NaN,
      intercept: analysis.fit?.interceptAmps ?? NaN,
      r_out_ohm: valueOf(analysis, 'outputImpedance'),
      effective_early_voltage_V: valueOf(analysis, 'impedanceCurrentProduct'),
      open_circuit_equivalent_V: valueOf(analysis, 'impedanceCurrentProduct'),
      load_regulation_percent_of_nominal: regulation,
      load_regulation_percent_per_volt: regulation / span,
    };
  }),
];
