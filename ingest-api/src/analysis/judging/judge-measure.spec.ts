import type { Limit, Measure, SweepAnalysis, Verdict } from '../analysis.types.js';
import {
  aComplianceMeasure,
  aLimit,
  aMeasure,
  anAnalysis,
  judge,
  judgementOf,
  withSlope,
} from './analysis.builder.js';

describe('other measures, judged as they stand', () => {
  const table: [string, Partial<Measure>, Partial<Limit>, Verdict][] = [
    ['guarded, inside both limits', { value: 0.4 }, { lower: -1, upper: 1 }, 'pass'],
    ['guarded, U from the upper limit', { value: 0.99 }, { lower: -1, upper: 1 }, 'notProven'],
    ['guarded, beyond the lower limit', { value: -1.03 }, { lower: -1, upper: 1 }, 'fail'],
    ['simple, adequate, just inside', { value: 0.99 }, { lower: -1, upper: 1, rule: 'simple' }, 'pass'],
    [
      'simple, U over a third of the tolerance',
      { value: 0.9, expandedUncertainty: 0.7 },
      { lower: -1, upper: 1, rule: 'simple' },
      'notProven',
    ],
    [
      'simple, one limit, U over a third of it',
      { value: 0.9, expandedUncertainty: 0.4 },
      { lower: null, upper: 1, rule: 'simple' },
      'notProven',
    ],
    ['at most 0.04, limit 0.05', { value: 0.04, bound: 'atMost' }, { lower: null, upper: 0.05 }, 'pass'],
    ['at most 0.04, limit 0.03', { value: 0.04, bound: 'atMost' }, { lower: null, upper: 0.03 }, 'notProven'],
    [
      'at most 0.04, its uncertainty unstated',
      { value: 0.04, bound: 'atMost', expandedUncertainty: null },
      { lower: null, upper: 0.05 },
      'notProven',
    ],
    [
      'at most 0.04 drawn from an estimate of 0.035',
      { value: 0.04, estimate: 0.035, bound: 'atMost' },
      { lower: null, upper: 0.05 },
      'notProven',
    ],
    [
      'no value',
      { value: null, expandedUncertainty: null, reason: 'notMeasured' },
      { lower: -1, upper: 1 },
      'notProven',
    ],
    ['no uncertainty', { value: 0.4, expandedUncertainty: null }, { lower: -1, upper: 1 }, 'notProven'],
    ['a limit with both sides open', { value: 40 }, { lower: null, upper: null }, 'pass'],
  ];
  it.each(table)('%s', (_, measure, limit, verdict) => {
    const analysis = withSlope(82, 2, aMeasure(measure));
    expect(judge(analysis, [aLimit({ measure: 'setpointError', ...limit })]).verdict).toBe(verdict);
  });

  it('measures the adequacy of a one-sided current limit from the nominal current', () => {
    const current = aMeasure({
      name: 'referenceCurrent',
      unit: 'A',
      value: 497e-6,
      expandedUncertainty: 2e-6,
    });
    const limit = aLimit({ measure: 'referenceCurrent', lower: 496e-6, rule: 'simple' });
    expect(judge(withSlope(82, 2, current), [limit]).verdict).toBe('notProven');
    expect(judge(withSlope(82, 2, { ...current, expandedUncertainty: 1e-6 }), [limit]).verdict).toBe('pass');
  });
});

describe('missing values and short ranges', () => {
  it('leaves a limited measure without value unproven and says why', () => {
    const analysis = anAnalysis({
      fit: null,
      measures: [
        aMeasure({ name: 'loadRegulation', value: null, expandedUncertainty: null, reason: 'notMeasured' }),
        aComplianceMeasure(),
      ],
    });
    const { verdict, measures } = judge(analysis, [
      aLimit({ measure: 'loadRegulation', lower: null, upper: 0.2 }),
    ]);
    expect(verdict).toBe('notProven');
    expect(judgementOf(measures, 'loadRegulation')).toMatchObject({
      outcome: 'notProven',
      reason: 'notMeasured',
      probabilityOfConformity: null,
    });
  });

  it('lists a limited measure that the analysis does not know of', () => {
    const { verdict, measures } = judge(withSlope(82, 2), [
      aLimit({ measure: 'sweepHysteresis', lower: null, upper: 50 }),
    ]);
    expect(verdict).toBe('notProven');
    expect(judgementOf(measures, 'sweepHysteresis')).toMatchObject({
      value: null,
      unit: 'ppm',
      outcome: 'notProven',
      reason: 'notMeasured',
    });
  });

  it('keeps the reason of an impedance that could not be computed', () => {
    const impedance = aMeasure({
      name: 'outputImpedance',
      unit: 'Ω',
      value: null,
      expandedUncertainty: null,
      reason: 'notComputed: fewer than 3 voltages',
    });
    const analysis: SweepAnalysis = {
      ...anAnalysis(),
      fit: null,
      impedance: null,
      measures: [impedance, aComplianceMeasure()],
    };
    const { measures } = judge(analysis, [aLimit()]);
    expect(judgementOf(measures, 'outputImpedance')).toMatchObject({
      outcome: 'notProven',
      reason: 'notComputed: fewer than 3 voltages',
    });
  });

  it.each(['outputImpedance', 'relativeSlope', 'impedanceCurrentProduct', 'effectiveEarlyVoltage'] as const)(
    'proves no %s from a part of the promised range, neither good nor bad',
    (name) => {
      const slope = aMeasure({ name, unit: 'V', value: 1, expandedUncertainty: 0.001 });
      const analysis: SweepAnalysis = {
        ...anAnalysis(),
        measures: [slope, aComplianceMeasure({ value: 5 })],
        flags: ['rangeNotCovered'],
      };
      for (const limit of [
        aLimit({ measure: name, lower: null, upper: 1e9 }),
        aLimit({ measure: name, lower: 1e9 }),
      ]) {
        const { measures } = judge(analysis, [limit]);
        expect(judgementOf(measures, name)).toMatchObject({
          outcome: 'notProven',
          reason: 'rangeNotCovered',
        });
      }
    },
  );

  it('still fails another measure when the range is not covered', () => {
    const analysis: SweepAnalysis = {
      ...anAnalysis(),
      measures: [aMeasure({ value: 5 }), aComplianceMeasure({ value: 5 })],
      flags: ['rangeNotCovered'],
    };
    const { verdict, failedMeasures } = judge(analysis, [
      aLimit({ measure: 'setpointError', lower: -1, upper: 1 }),
    ]);
    expect(verdict).toBe('fail');
    expect(failedMeasures).toEqual(['setpointError']);
  });
});
