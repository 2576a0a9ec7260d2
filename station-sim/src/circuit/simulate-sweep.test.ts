import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { goldenUnits } from './golden-units.js';
import { productByPartNumber, products, stageOf } from './products.js';
import { createRandom } from './random.js';
import { simulateSweep, type TestRun } from './simulate-sweep.js';
import { benchFor, stationByName, type BenchState } from './stations.js';
import { fitLine } from './station-verdict.js';
import { drawUnit, type DrawOptions } from './unit.js';

const aRun = (overrides: Partial<TestRun> = {}): TestRun => {
  const product = overrides.product ?? productByPartNumber('FH-R500-W');
  return {
    product,
    stage: stageOf(product, 'final'),
    runKind: 'production',
    startedAt: new Date('2026-11-30T08:15:30.120Z'),
    operator: 'B117',
    programVersion: '3.4.1',
    ambientCelsius: 23.4,
    ...overrides,
  };
};

const aSweep = (
  options: {
    seed?: number;
    serial?: string;
    draw?: DrawOptions;
    bench?: BenchState;
    run?: Partial<TestRun>;
  } = {},
) => {
  const run = aRun(options.run);
  const identity = { serialNumber: options.serial ?? 'W26480417', lot: 'L2648-2' };
  const random = createRandom(options.seed ?? 42).fork(identity.serialNumber);
  const unit = drawUnit(run.product, identity, random, options.draw ?? { defect: null });
  return simulateSweep(unit, benchFor(stationByName('north-1'), run.product, options.bench), run, random);
};

describe('a simulated sweep', () => {
  it('is the same for the same seed and another for another seed', () => {
    fc.assert(
      fc.property(fc.integer(), (seed) => {
        expect(aSweep({ seed })).toEqual(aSweep({ seed }));
        expect(aSweep({ seed }).resultId).not.toBe(aSweep({ seed: seed + 1 }).resultId);
      }),
      { numRuns: 30 },
    );
  });

  it('keeps its readings when it starts at another time, under another id', () => {
    const later = aSweep({ run: { startedAt: new Date('2026-12-02T10:00:00Z') } });
    expect(later.points).toEqual(aSweep().points);
    expect(later.resultId).not.toBe(aSweep().resultId);
  });

  it('has a version 7 id of the moment it started', () => {
    const { resultId } = aSweep();
    expect(resultId).toMatch(/^[0-9a-f]{8}-[0-9a-f]{4}-7[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/);
    const time = Number.parseInt(resultId.replace('-', '').slice(0, 12), 16);
    expect(new Date(time).toISOString()).toBe('2026-11-30T08:15:30.120Z');
  });

  it('steps through the plan and back to the first load', () => {
    const sweep = aSweep();
    expect(sweep.points.map((point) => Math.round(point.loadVolts * 10) / 10)).toEqual([
      0, 1.2, 2.4, 3.6, 4.8, 6, 7.2, 8, 0,
    ]);
    expect(sweep.points.at(-1)?.direction).toBe('repeat');
  });

  it('reads multiples of the resolution of its range', () => {
    for (const { outputAmps } of aSweep().points) {
      expect(outputAmps / 1e-8).toBeCloseTo(Math.round(outputAmps / 1e-8), 6);
    }
  });

  it('cannot tell the points apart on a coarse range', () => {
    const { points } = aSweep({ bench: { rangeAmps: 0.1 } });
    expect(new Set(points.map((point) => point.outputAmps)).size).toBeLessThanOrEqual(3);
  });

  it.each(products)('recovers an output impedance above the limit from a sound $partNumber', (product) => {
    const { points, stationVerdict } = aSweep({ run: { product } });
    const floor = stageOf(product, 'final').limits[0]?.lower ?? 0;
    expect(-1 / fitLine(points.slice(0, -1)).slopeSiemens).toBeGreaterThan(floor);
    expect(stationVerdict).toBe('pass');
  });

  it('covers the promised range with its last step', () => {
    const highest = Math.max(...aSweep().points.map((point) => point.loadVolts));
    expect(highest).toBeGreaterThanOrEqual(7.999);
  });

  it('stops after two steps of a dead unit', () => {
    const sweep = aSweep({ draw: { defect: 'openOutput' } });
    expect(sweep).toMatchObject({ outcome: 'stoppedOnFail', stationVerdict: 'fail' });
    expect(sweep.points).toHaveLength(2);
  });

  it.each(['leakyTransistor', 'wrongSetResistor', 'crackedJoint'] as const)(
    'fails a unit with a %s',
    (defect) => {
      for (const product of products) {
        expect(aSweep({ run: { product }, draw: { defect } }).stationVerdict).toBe('fail');
      }
    },
  );

  it('loses current at high load through a poor contact', () => {
    const { points, stationVerdict } = aSweep({ bench: { contactOhms: 2500 } });
    expect(points[7]?.outputAmps).toBeLessThan(0.9 * 0.0005);
    expect(points[3]?.outputAmps).toBeGreaterThan(0.99 * 0.0005);
    expect(stationVerdict).toBe('fail');
  });

  it('ends early with a reason when it is broken off', () => {
    const sweep = aSweep({ run: { abortReason: 'guardOpened' } });
    expect(sweep.outcome).toBe('aborted');
    expect(sweep.points.length).toBeLessThan(8);
    expect(sweep.stationVerdict).toBeUndefined();
  });

  it('lets 95 to 99 % of ordinary units pass', () => {
    let passed = 0;
    for (let number = 0; number < 800; number++) {
      const product = products[number % products.length] ?? products[0];
      if (aSweep({ serial: `S${number}`, draw: {}, run: { product } }).stationVerdict === 'pass') passed++;
    }
    expect(passed / 800).toBeGreaterThan(0.95);
    expect(passed / 800).toBeLessThan(0.99);
  });

  it('passes every golden unit', () => {
    for (const unit of goldenUnits) {
      const run = aRun({ product: productByPartNumber(unit.partNumber), runKind: 'golden' });
      const sweep = simulateSweep(
        unit,
        benchFor(stationByName('south-1'), run.product),
        run,
        createRandom(7),
      );
      expect(sweep).toMatchObject({ runKind: 'golden', stationVerdict: 'pass' });
    }
  });
});
