import { products } from './products.js';
import { createRandom } from './random.js';
import { drawUnit, type Unit } from './unit.js';

/** One kept unit per product; always the same circuits, whatever a run's seed. */
export const goldenUnits: readonly Unit[] = products.map((product) =>
  drawUnit(
    product,
    { serialNumber: `GOLD-${product.serialPrefix}-01`, lot: 'GOLDEN' },
    createRandom('golden units of the line'),
    { defect: null },
  ),
);

/** @throws RangeError for a product without a golden unit */
export function goldenUnitOf(partNumber: string): Unit {
  const unit = goldenUnits.find((candidate) => candidate.partNumber === partNumber);
  if (!unit) throw new RangeError(`No golden unit of ${partNumber}`);
  return unit;
}
