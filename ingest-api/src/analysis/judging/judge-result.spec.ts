import fc from 'fast-check';
import type { Limit, Measure, MeasureJudgement, SweepAnalysis, Verdict } from '../analysis.types.js';
import {
  aComplianceMeasure,
  aLimit,
  aMeasure,
  anAnalysis,
  anImpedance,
  anImpedanceMeasure,
  aProduct,
} from './analysis.builder.js';
import { describeJudgement } from './describe-judgement.js';
import { MEASURE_NAMES } from './measure-names.js';
import { judgeResult } from './judge-result.js';
import { analyseSweep } from '../sweep/analyse-sweep.js';
import { aSweep, pointsOf, steps } from '../sweep/sweep.builder.js';

const judge = (
  analysis: SweepAnalysis,
  limits: readonly Limit[] | null,
  outcome: 'completed' | 'stoppedOnFail' | 'aborted' = 'completed',
) => judgeResult({ analysis, outcome, limits, product: aProduct() });

/** A sweep whose conductance is ĝ ± U, in nS, with any measures besides impedance and compliance. */
const withSlope = (conductance: number, uncertainty: number, ...measures: Measure[]): SweepAnalysis => {
  const impedance = anImpedance(conductance * 1e-9, uncertainty * 1e-9);
  return anAnalysis({
    impedance,
    measures: [anImpedanceMeasure(impedance), ...measures, aComplianceMeasure()],
  });
};

const of = (measures: MeasureJudgement[], name: string): MeasureJudgement =>
  measures.find((m) => m.name === name)!;

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
    const rank: Record<Verdict, number> = { fail: 0, notProven: 1, pass: 2, unjudged: -1, aborted: -1 };
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
          expect(rank[verdicts[1]!]).toBeGreaterThanOrEqual(rank[verdicts[0]!]);
        },
      ),
    );
  });

  it('states the probability of conformity of the slope', () => {
    const at = (g: number) =>
      of(judge(withSlope(g, 20), [aLimit()]).measures, 'outputImpedance').probabilityOfConformity!;
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
    expect(of(measures, 'loadRegulation')).toMatchObject({
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
    expect(of(measures, 'sweepHysteresis')).toMatchObject({
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
    expect(of(measures, 'outputImpedance')).toMatchObject({
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
        expect(of(measures, name)).toMatchObject({ outcome: 'notProven', reason: 'rangeNotCovered' });
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

describe('compliance voltage, limited whether or not anyone released a limit for it', () => {
  const exact = (value: number) =>
    aComplianceMeasure({
      value,
      expandedUncertainty: 0.05,
      low: value - 0.05,
      high: value + 0.05,
      bound: 'exact',
    });
  const table: [string, Measure, Partial<SweepAnalysis>, Limit[], Verdict][] = [
    ['no knee up to the end of the range', aComplianceMeasure(), {}, [], 'pass'],
    [
      'no knee, last step just short of the end, range covered',
      aComplianceMeasure({ value: 7.7 }),
      {},
      [],
      'pass',
    ],
    [
      'no knee, range not covered',
      aComplianceMeasure({ value: 5 }),
      { flags: ['rangeNotCovered'] },
      [],
      'notProven',
    ],
    ['knee above the range', exact(8.4), {}, [], 'pass'],
    ['knee at the end of the range', exact(8.01), {}, [], 'notProven'],
    ['knee inside the range', exact(6.2), {}, [], 'fail'],
    [
      'could not be told',
      aComplianceMeasure({ value: null, reason: 'notComputed: fewer than 4 points' }),
      {},
      [],
      'notProven',
    ],
    [
      'released limit above the range, tested beyond it',
      aComplianceMeasure({ value: 8.6 }),
      {},
      [aLimit({ measure: 'complianceVoltage', lower: 8.5 })],
      'pass',
    ],
    [
      'released limit above the range, not tested so far',
      aComplianceMeasure(),
      {},
      [aLimit({ measure: 'complianceVoltage', lower: 8.5 })],
      'notProven',
    ],
    [
      'released limit below the promise does not soften it',
      exact(7.5),
      {},
      [aLimit({ measure: 'complianceVoltage', lower: 7 })],
      'fail',
    ],
    [
      'released upper limit stays open without a knee',
      aComplianceMeasure(),
      {},
      [aLimit({ measure: 'complianceVoltage', lower: null, upper: 9 })],
      'notProven',
    ],
  ];
  it.each(table)('%s', (_, measure, overrides, limits, verdict) => {
    expect(judge(anAnalysis({ measures: [measure], ...overrides }), limits).verdict).toBe(verdict);
  });

  it('fails an output without current although its characteristic is flat', () => {
    const analysis = analyseSweep(aSweep({ points: pointsOf(steps(0, 8, 9), () => 2e-9) }));
    const { verdict, failedMeasures, measures } = judge(analysis, [aLimit()]);
    expect(verdict).toBe('fail');
    expect(failedMeasures).toEqual(['complianceVoltage']);
    expect(of(measures, 'complianceVoltage').reason).toBe('noCurrent');
  });
});

describe('whole sweeps', () => {
  const limits = [aLimit(), aLimit({ measure: 'setpointError', lower: -1, upper: 1 })];

  it('passes the example of the station contract', () => {
    const { verdict, measures } = judge(analyseSweep(aSweep()), limits);
    expect(verdict).toBe('pass');
    expect(describeJudgement(of(measures, 'outputImpedance'))).toBe(
      'Output impedance is 12.14 MΩ (11.85 to 12.44 MΩ); at least 10 MΩ is required, so it passes (probability of conformity over 99.9 %).',
    );
  });

  it('judges a rising current by the size of its slope and says so', () => {
    const rising = analyseSweep(
      aSweep({ points: pointsOf(steps(0, 8, 9), (volts) => 500e-6 + 1e-6 * volts) }),
    );
    const { measures, failedMeasures } = judge(rising, limits);
    expect(failedMeasures).toEqual(['outputImpedance']);
    expect(describeJudgement(of(measures, 'outputImpedance'))).toBe(
      'Output impedance has no value: the current rises with the load voltage; at least 10 MΩ is required, so it fails (probability of conformity below 0.1 %).',
    );
  });

  it('leaves a limit on a measure that does not apply to the circuit unproven', () => {
    const limit = aLimit({ measure: 'effectiveEarlyVoltage', lower: 50 });
    expect(of(judge(analyseSweep(aSweep()), [limit]).measures, 'effectiveEarlyVoltage')).toMatchObject({
      outcome: 'notProven',
      reason: 'notApplicable',
    });
  });

  it('never gives a better source a worse verdict, as long as the same meter measures it', () => {
    const rank: Record<Verdict, number> = { fail: 0, notProven: 1, pass: 2, unjudged: -1, aborted: -1 };
    const verdictAt = (slope: number) => {
      const sweep = aSweep({ points: pointsOf(steps(0, 8, 9), (volts) => 500e-6 - slope * volts) });
      return rank[judge(analyseSweep(sweep), [aLimit()]).verdict];
    };
    const slope = fc.double({ min: 0, max: 400e-9, noNaN: true });
    fc.assert(
      fc.property(slope, fc.double({ min: 0, max: 1, noNaN: true }), (worse, share) => {
        expect(verdictAt(worse * share)).toBeGreaterThanOrEqual(verdictAt(worse));
      }),
    );
  });
});

describe('any sweep that a station can post', () => {
  const point = fc.record({
    loadVolts: fc.double({ min: -60, max: 60, noNaN: true }),
    outputAmps: fc.oneof(
      fc.double({ min: -1e-3, max: 1e-3, noNaN: true }),
      fc.constantFrom(0, 5e-4, 5.01e-4, 1e-300, 1e300),
    ),
    overload: fc.boolean(),
  });
  const limits = MEASURE_NAMES.flatMap((measure) => [
    aLimit({ measure, lower: 0.5, upper: 1e7, rule: 'simple' }),
  ]);

  it('gets a verdict, probabilities from 0 to 1, and sentences without a hole', () => {
    fc.assert(
      fc.property(fc.array(point, { maxLength: 20 }), (points) => {
        const { verdict, measures } = judge(analyseSweep(aSweep({ points })), limits);
        expect(['pass', 'fail', 'notProven']).toContain(verdict);
        for (const measure of measures) {
          expect(measure.probabilityOfConformity ?? 0).toBeGreaterThanOrEqual(0);
          expect(measure.probabilityOfConformity ?? 1).toBeLessThanOrEqual(1);
          expect(describeJudgement(measure)).not.toMatch(/NaN|Infinity|null|undefined/);
        }
      }),
      { numRuns: 500 },
    );
  });
});

describe('the verdict', () => {
  const table: [string, SweepAnalysis, Limit[] | null, 'completed' | 'stoppedOnFail' | 'aborted', Verdict][] =
    [
      ['completed, all inside', withSlope(82, 2), [aLimit()], 'completed', 'pass'],
      ['completed, one fails', withSlope(150, 2), [aLimit()], 'completed', 'fail'],
      [
        'completed, one fails and one is not proven',
        withSlope(150, 2, aMeasure({ value: null })),
        [aLimit(), aLimit({ measure: 'setpointError', lower: -1 })],
        'completed',
        'fail',
      ],
      ['completed, no released limits', withSlope(82, 2), null, 'completed', 'unjudged'],
      [
        'completed, an empty released set: the built-in limit alone',
        withSlope(82, 2),
        [],
        'completed',
        'pass',
      ],
      ['stopped on a fail, all inside', withSlope(82, 2), [aLimit()], 'stoppedOnFail', 'fail'],
      [
        'stopped on a fail, nothing measured',
        anAnalysis({ points: [], measures: [] }),
        [aLimit()],
        'stoppedOnFail',
        'fail',
      ],
      ['stopped on a fail, no released limits', withSlope(82, 2), null, 'stoppedOnFail', 'fail'],
      ['aborted, one outside', withSlope(150, 2), [aLimit()], 'aborted', 'aborted'],
      ['aborted, no released limits', withSlope(82, 2), null, 'aborted', 'aborted'],
    ];
  it.each(table)('%s', (_, analysis, limits, outcome, verdict) => {
    expect(judge(analysis, limits, outcome).verdict).toBe(verdict);
  });

  it.each([
    ['without released limits', null, 'completed' as const],
    ['when aborted', [aLimit()], 'aborted' as const],
  ])('judges no measure %s, but keeps the figures', (_, limits, outcome) => {
    const { measures, failedMeasures } = judge(withSlope(150, 2), limits, outcome);
    expect(measures.map((m) => m.outcome)).toEqual([null, null]);
    expect(measures.every((m) => m.limit === null && m.value !== null)).toBe(true);
    expect(failedMeasures).toEqual([]);
  });
});
