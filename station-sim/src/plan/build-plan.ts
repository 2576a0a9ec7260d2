import { goldenUnits } from '../circuit/golden-units.js';
import type { ProductFacts, StageName } from '../circuit/product-facts.js';
import { productByPartNumber, products } from '../circuit/products.js';
import type { RandomSource } from '../circuit/random.js';
import { stations } from '../circuit/stations.js';
import { drawUnit, type Unit } from '../circuit/unit.js';
import { unitOptionsOf, type Scenario } from './scenarios.js';
import { lotName, serialNumber } from './serial-numbers.js';

export interface PlanOptions {
  scenario: Scenario;
  /** How many stations of the line take part, from the first. */
  stations: number;
  /** The week the units were made in. */
  madeAt: Date;
}

/** One unit put on one station for one stage. */
export interface PlannedTest {
  scenario: Scenario;
  /** This unit's or golden run's place in the plan. */
  number: number;
  runKind: 'production' | 'golden';
  unit: Unit;
  stage: StageName;
  station: string;
  fixture: string;
  channel: string;
  operator: string;
  /** Whether the unit is moved on by what its result says. */
  followed: boolean;
}

/** One test in so many is a golden run. */
const GOLDEN_SHARE = 1 / 30;

/** Simulated lots are numbered from here, apart from those of seeded histories. */
const FIRST_LOT = 51;

/** More Wilson mirrors are made than anything else. */
const productMix: readonly [string, ...string[]] = [
  'FH-R500-W',
  'FH-R500-W',
  'FH-R500-M',
  'FH-T250-C',
  'FH-B15K-A',
];

const operators: readonly [string, ...string[]] = ['B104', 'B117', 'B122', 'B131'];

/**
 * The first test of every unit, in order and without end but for `one-fail`; what follows depends on the answers
 * (see `nextTest`). Pure: same options and source, same plan.
 */
export function* buildPlan(options: PlanOptions, random: RandomSource): Generator<PlannedTest, void> {
  const draw = random.fork('plan');
  // Another seed means other serial numbers, so that a second run does not test the first run's units again.
  const firstNumber = draw.integer(10_000, 900_000);
  if (options.scenario === 'one-fail') {
    const product = productByPartNumber('FH-R500-W');
    const unit = newUnit(product, firstNumber, options, random);
    yield { ...placement(0, options, draw), ...unitTest(unit), followed: false };
    return;
  }
  for (let index = 0; ; index++) {
    const placed = placement(index, options, draw);
    if (draw.chance(GOLDEN_SHARE)) {
      yield { ...placed, ...goldenTest(draw) };
    } else {
      const product = productByPartNumber(draw.pick(productMix));
      yield { ...placed, ...unitTest(newUnit(product, firstNumber + index, options, random)) };
    }
  }
}

function unitTest(unit: Unit) {
  return { runKind: 'production', unit, stage: 'board', followed: true } as const;
}

function goldenTest(draw: RandomSource) {
  const unit = draw.pick(goldenUnits);
  return { runKind: 'golden', unit, stage: 'final', followed: false } as const;
}

function newUnit(product: ProductFacts, running: number, options: PlanOptions, random: RandomSource): Unit {
  const identity = {
    serialNumber: serialNumber(product, options.madeAt, running),
    lot: lotName(options.madeAt, FIRST_LOT + products.indexOf(product)),
  };
  return drawUnit(
    product,
    identity,
    random.fork(`unit ${running}`),
    unitOptionsOf(options.scenario, product),
  );
}

function placement(index: number, options: PlanOptions, draw: RandomSource) {
  const facts = stations[index % options.stations] ?? stations[0];
  return {
    scenario: options.scenario,
    number: index,
    station: facts.station,
    fixture: draw.pick(facts.fixtures),
    channel: String(1 + (Math.floor(index / options.stations) % 8)),
    operator: draw.pick(operators),
  };
}
