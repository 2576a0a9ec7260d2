import { DateTime } from 'luxon';
import type { ProductFacts } from '../circuit/product-facts.js';

/** Year and ISO week in four digits: 2648 is week 48 of 2026. */
function weekCode(at: Date): string {
  return DateTime.fromJSDate(at, { zone: 'utc' }).toFormat('kkWW');
}

export function serialNumber(product: ProductFacts, madeAt: Date, running: number): string {
  return `${product.serialPrefix}${weekCode(madeAt)}${String(running).padStart(4, '0')}`;
}

export function lotName(madeAt: Date, running: number): string {
  return `L${weekCode(madeAt)}-${running}`;
}
