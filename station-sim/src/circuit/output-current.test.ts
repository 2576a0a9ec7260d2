import { describe, expect, it } from 'vitest';
import { assembleSource } from './output-current.js';
import type { ProductFacts } from './product-facts.js';
import { productByPartNumber, products, stageOf } from './products.js';
import { createRandom } from './random.js';
import { drawUnit, type Unit } from './unit.js';

const at23 = (product: ProductFacts) => ({ supplyVolts: product.supplyVolts, celsius: 23 });

const typical = (product: ProductFacts, overrides: Partial<Unit> = {}): Unit => ({
  ...drawUnit(product, { serialNumber: 'X1', lot: 'L1' }, createRandom(1), { defect: null }),
  earlyVolts: product.circuit.earlyVolts,
  beta: product.circuit.beta,
  mismatch: 0,
  setResistorError: 0,
  ...overrides,
});

describe('output current', () => {
  it.each(products)('is nominal at the reference voltage for a typical $partNumber', (product) => {
    const source = assembleSource(product, typical(product));
    const amps = source(stageOf(product, 'final').testPlan.referenceVolts, at23(product));
    expect(amps / product.nominalAmps).toBeCloseTo(1, 5);
  });

  it('falls along a straight line whose Early voltage is that of the mirror', () => {
    const product = productByPartNumber('FH-R500-M');
    const source = assembleSource(product, typical(product, { earlyVolts: 80 }));
    const conductance = (source(0, at23(product)) - source(4, at23(product))) / 4;
    expect(source(0, at23(product)) / conductance - product.supplyVolts).toBeCloseTo(80, 3);
  });

  it('gives a typical Wilson module about 12 MΩ', () => {
    const product = productByPartNumber('FH-R500-W');
    const source = assembleSource(product, typical(product));
    const ohms = 6 / (source(0, at23(product)) - source(6, at23(product)));
    expect(ohms / 1e6).toBeGreaterThan(12);
    expect(ohms / 1e6).toBeLessThan(12.5);
  });

  it.each(products)(
    'stays within the tolerance to the end of the promised range for $partNumber',
    (product) => {
      const source = assembleSource(product, typical(product));
      const { complianceHighVolts: high, complianceTolerance } = product;
      const slope = (source(0, at23(product)) - source(high / 2, at23(product))) / (high / 2);
      const expected = source(0, at23(product)) - slope * high;
      expect(source(high, at23(product))).toBeGreaterThan((1 - complianceTolerance) * expected);
    },
  );

  it('breaks down near supply minus headroom', () => {
    const product = productByPartNumber('FH-R500-W');
    const source = assembleSource(product, typical(product));
    expect(source(8.2, at23(product))).toBeGreaterThan(0.99 * product.nominalAmps);
    expect(source(8.36, at23(product))).toBe(0);
  });

  it('loses compliance to a cracked joint', () => {
    const product = productByPartNumber('FH-R500-W');
    const source = assembleSource(product, typical(product, { seriesOhms: 3000 }));
    expect(source(8, at23(product))).toBe(0);
    expect(source(4, at23(product)) / product.nominalAmps).toBeCloseTo(1, 2);
  });

  it('rises as the circuit warms, because V_BE falls', () => {
    const product = productByPartNumber('FH-R500-M');
    const source = assembleSource(product, typical(product));
    const warm = source(4, { supplyVolts: 9, celsius: 33 }) / source(4, { supplyVolts: 9, celsius: 23 });
    expect(1e6 * (warm - 1)).toBeGreaterThan(2000);
    expect(1e6 * (warm - 1)).toBeLessThan(3000);
  });
});
