import { headroomVolts, setResistorVolts, sourceOutputOhms, transferRatio } from './current-source.js';
import type { ProductFacts } from './product-facts.js';
import { stageOf } from './products.js';
import { baseEmitterVolts, collectorAmps, saturationFactor, transistorOutputOhms } from './transistor.js';
import type { Unit } from './unit.js';

export interface Surroundings {
  supplyVolts: number;
  /** Temperature of the circuit in °C. */
  celsius: number;
}

type Circuit = Pick<
  Unit,
  'earlyVolts' | 'beta' | 'mismatch' | 'setResistorError' | 'seriesOhms' | 'leakageOhms' | 'openOutput'
>;

/** Temperature in °C at which the set resistor was chosen. */
const DESIGN_CELSIUS = 23;

/** Gives the current in A that a unit drives into its terminals at a terminal voltage in V. */
export type CurrentSource = (terminalVolts: number, surroundings: Surroundings) => number;

/**
 * Fits a unit with its set resistor: the current is the set current, plus the slope of the output
 * resistance, through the compliance knee near supply minus headroom, plus leakage.
 */
export function assembleSource(product: ProductFacts, unit: Circuit): CurrentSource {
  const setOhms = designSetOhms(product);
  return (terminalVolts, surroundings) => outputAmps(product, unit, terminalVolts, surroundings, setOhms);
}

/** The set resistor in Ω with which a typical unit gives the nominal current at the reference voltage. */
function designSetOhms(product: ProductFacts): number {
  const typical: Circuit = {
    earlyVolts: product.circuit.earlyVolts,
    beta: product.circuit.beta,
    mismatch: 0,
    setResistorError: 0,
    seriesOhms: 0,
    leakageOhms: null,
    openOutput: false,
  };
  const { referenceVolts } = stageOf(product, 'final').testPlan;
  const surroundings = { supplyVolts: product.supplyVolts, celsius: DESIGN_CELSIUS };
  // The whole current is inversely proportional to the resistor, so one trial with 1 Ω tells its value.
  return outputAmps(product, typical, referenceVolts, surroundings, 1) / product.nominalAmps;
}

function outputAmps(
  product: ProductFacts,
  unit: Circuit,
  terminalVolts: number,
  surroundings: Surroundings,
  setOhms: number,
): number {
  if (unit.openOutput) return 0;
  const { circuitKind: kind, circuit } = product;
  const { supplyVolts, celsius } = surroundings;
  const junctionVolts = baseEmitterVolts(celsius);
  const setAmps =
    (setResistorVolts(kind, supplyVolts, junctionVolts, circuit.senseVolts) /
      (setOhms * (1 + unit.setResistorError))) *
    transferRatio(kind, unit.beta) *
    (1 + unit.mismatch);

  const collectorEmitterVolts =
    supplyVolts -
    headroomVolts(kind, junctionVolts, circuit.senseVolts) -
    terminalVolts -
    setAmps * unit.seriesOhms;
  // The set current flows where both transistors see the same V_CE, one V_BE; r_out rules from there on.
  const ohms = sourceOutputOhms(
    kind,
    transistorOutputOhms(unit.earlyVolts, junctionVolts, setAmps),
    unit.beta,
  );
  const zeroAmps = setAmps - junctionVolts / ohms;
  const active = collectorAmps(zeroAmps, collectorEmitterVolts, zeroAmps * ohms);
  const leakage = unit.leakageOhms ? Math.max(0, collectorEmitterVolts) / unit.leakageOhms : 0;
  return active * saturationFactor(collectorEmitterVolts, celsius) + leakage;
}
