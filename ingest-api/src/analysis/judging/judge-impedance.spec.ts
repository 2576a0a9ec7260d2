import fc from 'fast-check';
import type { Limit, Verdict } from '../analysis.types.js';
import { aLimit, aMeasure, judge, judgementOf, RANK, withSlope } from './analysis.builder.js';

/** A limit of 10 MΩ is one of 100 nS. */
const TEN_MEGOHM = 10e6;

describe('impedance, judged in conductance', () => {
  const table: [string, number, number, Partial<Limit>, Verdict][] = [
    ['guarded: falls by 80 ± 10 nS', 80, 10, {}, 'pass'],
    ['guarded: exactly U inside', 90, 10, {}, 'pass'],
    ['guarded: inside by less than U', 95, 10, {}, 'notProven'],
    ['guarded: outside by less than U', 105, 10, {}, 'notProven'],
    ['guarded: exactly U outside', 110, 10, {}, 'notProven'],
    ['guarded: outside by more than U', 111, 10, {}, 'fail'],
    ['guarded: no slope seen, a bound of 20 MΩ', 0, 50, {}, 'pass'],
    ['guarded: no slope seen, a bound of 5 MΩ', 0, 200, {}, 'notProven'],
    ['guarded: insignificantly rising, within the limit', -20, 50, {}, 'pass'],
    ['guarded: insignificantly rising, meter too coarse', -20, 90, {}, 'notProven'],
    ['guarded: rising, but less than the limit', -50, 10, {}, 'pass'],
    ['guarded: rising more than the limit', -150, 10, {}, 'fail'],
    ['guarded with half the guard band: inside by half of U', 95, 10, { guardFactor: 0.5 }, 'pass'],
    ['simple, adequate: just inside', 99, 30, { rule: 'simple' }, 'pass'],
    ['simple, adequate: just outside', 101, 30, { rule: 'simple' }, 'fail'],
    ['simple, U over a third of the limit: just inside', 99, 34, { rule: 'simple' }, 'notProven'],
    ['simple, U over a third of the limit: far outside', 150, 34, { rule: 'simple' }, 'fail'],
    ['simple, own adequacy of one half: just inside', 99, 34, { rule: 'simple', adequacyRatio: 0.5 }, 'pass'],
    ['upper limit of 10 MΩ: 5 MΩ', 200, 10, { lower: null, upper: TEN_MEGOHM }, 'pass'],
    ['upper limit of 10 MΩ: near it', 105, 10, { lower: null, upper: TEN_MEGOHM }, 'notProven'],
    ['upper limit of 10 MΩ: 20 MΩ', 50, 10, { lower: null, upper: TEN_MEGOHM }, 'fail'],
    ['between 5 and 10 MΩ: 6.7 MΩ', 150, 10, { lower: 5e6, upper: TEN_MEGOHM }, 'pass'],
    ['between 5 and 10 MΩ: 4 MΩ', 250, 10, { lower: 5e6, upper: TEN_MEGOHM }, 'fail'],
    ['a lower limit of 0 asks nothing', 5000, 10, { lower: 0 }, 'pass'],
  ];
  it.each(table)('%s', (_, conductance, uncertainty, limit, verdict) => {
    expect(judge(withSlope(conductance, uncertainty), [aLimit(limit)]).verdict).toBe(verdict);
  });

  it('passes exactly when the displayed bound meets a guarded limit', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -300, max: 300, noNaN: true }),
        fc.double({ min: 0.1, max: 300, noNaN: true }),
        (g, u) => {
          const analysis = withSlope(g, u);
          const boundMeets = analysis.impedance!.lowOhms! >= TEN_MEGOHM * (1 - 1e-9);
          fc.pre(Math.abs(analysis.impedance!.lowOhms! / TEN_MEGOHM - 1) > 1e-9);
          expect(judge(analysis, [aLimit()]).verdict === 'pass').toBe(boundMeets);
        },
      ),
    );
  });

  it('never gives a unit nearer to an ideal source a worse verdict', () => {
    const anyLimit = fc.record({
      rule: fc.constantFrom('guarded' as const, 'simple' as const),
      guardFactor: fc.double({ min: 0, max: 2, noNaN: true }),
    });
    fc.assert(
      fc.property(
        anyLimit,
        fc.double({ min: 0.1, max: 300, noNaN: true }),
        fc.double({ min: -400, max: 400, noNaN: true }),
        fc.double({ min: -0.999, max: 0.999, noNaN: true }),
        (limit, u, worse, share) => {
          const verdicts = [worse, worse * share].map((g) => judge(withSlope(g, u), [aLimit(limit)]).verdict);
          expect(RANK[verdicts[1]!]).toBeGreaterThanOrEqual(RANK[verdicts[0]!]);
        },
      ),
    );
  });

  it('states the probability of conformity of the slope', () => {
    const at = (g: number) =>
      judgementOf(judge(withSlope(g, 20), [aLimit()]).measures, 'outputImpedance').probabilityOfConformity!;
    expect(at(100)).toBeCloseTo(0.5, 10);
    expect(at(80)).toBeCloseTo(0.977249868, 8);
    expect(at(120)).toBeCloseTo(0.022750132, 8);
    expect(at(-120)).toBeCloseTo(0.022750132, 8);
  });

  it('judges what goes with the impedance in conductance too', () => {
    // a = 500 µA and 82.4 nS: a·r = 6068 V; less the supply of 9 V: 6059 V.
    const product = aMeasure({
      name: 'impedanceCurrentProduct',
      unit: 'V',
      value: 6068,
      expandedUncertainty: null,
    });
    const early = aMeasure({
      name: 'effectiveEarlyVoltage',
      unit: 'V',
      value: 6059,
      expandedUncertainty: null,
    });
    const analysis = withSlope(82.4, 0.001, product, early);
    const outcomes = (lower: number) =>
      judge(analysis, [
        aLimit({ measure: 'impedanceCurrentProduct', lower }),
        aLimit({ measure: 'effectiveEarlyVoltage', lower }),
      ]).failedMeasures;
    expect(outcomes(6050)).toEqual([]);
    expect(outcomes(6063)).toEqual(['effectiveEarlyVoltage']);
    expect(outcomes(6075)).toEqual(['impedanceCurrentProduct', 'effectiveEarlyVoltage']);
  });
});
