import type { LimitFacts, ProductFacts } from './product-facts.js';
import type { RandomSource } from './random.js';

export type Defect = 'leakyTransistor' | 'wrongSetResistor' | 'crackedJoint' | 'openOutput';

/** What one unit on the line really is; no station ever sees these figures. */
export interface Unit {
  partNumber: string;
  serialNumber: string;
  lot: string;
  earlyVolts: number;
  beta: number;
  mismatch: number;
  setResistorError: number;
  /** Resistance in series with the output: a sound joint has next to none. */
  seriesOhms: number;
  /** Leakage across the output transistor; null when it does not leak. */
  leakageOhms: number | null;
  openOutput: boolean;
  defect: Defect | null;
}

export interface UnitIdentity {
  serialNumber: string;
  lot: string;
}

/** How a lot or a request bends the draw. */
export interface DrawOptions {
  /** Early voltage of the lot's wafers in V, in place of the product's typical one. */
  earlyVolts?: number;
  /** A defect for sure, or none for sure (null); left out: by chance. */
  defect?: Defect | null;
}

/** Share of units with a defect of assembly (invented; gives a first-pass yield near 97 %). */
const DEFECT_SHARE = 0.025;

const defectKinds: readonly [Defect, ...Defect[]] = [
  'leakyTransistor',
  'leakyTransistor',
  'wrongSetResistor',
  'crackedJoint',
  'openOutput',
];

/** Draws a unit from a source of its own (fork one by the unit's running number). */
export function drawUnit(
  product: ProductFacts,
  identity: UnitIdentity,
  random: RandomSource,
  options: DrawOptions = {},
): Unit {
  const { circuit } = product;
  const sound: Unit = {
    partNumber: product.partNumber,
    ...identity,
    earlyVolts: random.normal(options.earlyVolts ?? circuit.earlyVolts, circuit.earlyVoltsSpread),
    beta: random.normal(circuit.beta, circuit.betaSpread),
    mismatch: random.normal(0, circuit.mismatchSpread),
    setResistorError: random.normal(0, circuit.setResistorSpread),
    seriesOhms: 0.1,
    leakageOhms: null,
    openOutput: false,
    defect: null,
  };
  const drawn = random.chance(DEFECT_SHARE) ? random.pick(defectKinds) : null;
  const defect = options.defect === undefined ? drawn : options.defect;
  return defect ? { ...sound, ...damage(defect, product, random), defect } : sound;
}

function damage(defect: Defect, product: ProductFacts, random: RandomSource): Partial<Unit> {
  switch (defect) {
    case 'leakyTransistor':
      return { leakageOhms: impedanceFloorOhms(product) * random.between(0.55, 0.9) };
    case 'wrongSetResistor':
      // The neighbouring value of the E96 series, 2.4 % away, was fitted.
      return { setResistorError: random.chance(0.5) ? 0.0243 : -0.0238 };
    case 'crackedJoint':
      return { seriesOhms: random.between(2.1, 3.5) / product.nominalAmps };
    case 'openOutput':
      return { openOutput: true };
  }
}

function impedanceFloorOhms(product: ProductFacts): number {
  const floors = product.stages
    .flatMap((stage): readonly LimitFacts[] => stage.limits)
    .filter((limit) => limit.measure === 'outputImpedance')
    .map((limit) => limit.lower ?? Infinity);
  return Math.min(...floors);
}
