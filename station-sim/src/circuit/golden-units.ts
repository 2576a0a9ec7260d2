import type { ProductFacts } from './product-facts.js';
import { products } from './products.js';
import { createRandom } from './random.js';
import { drawUnit, type Unit } from './unit.js';

/** One kept unit per product; always the same circuits, whatever a run's seed. */
export const goldenUnits = products.map((product) => drawGoldenUnit(product)) as [Unit, ...Unit[]];

function drawGoldenUnit(product: ProductFacts): Unit {
  const identity = { serialNumber: `GOLD-${product.serialPrefix}-01`, lot: 'GOLDEN' };
  return drawUnit(product, identity, createRandom(`golden unit of ${product.partNumber}`), { defect: null });
}

/** @throws RangeError for a product without a golden unit */
export function goldenUnitOf(partNumber: string): Unit {
  const unit = goldenUnits.find((candidate) => candidate.partNumber === partNumber);
  if (!unit) throw new RangeError(`No golden unit of ${partNumber}`);
  return unit;
}
