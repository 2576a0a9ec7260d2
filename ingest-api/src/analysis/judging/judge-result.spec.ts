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
import { analyseSweep } from '../sweep/analyse-sweep.js';
import { aProduct, aSweep, pointsOf, steps } from '../sweep/sweep.builder.js';
import { judgeResult } from './judge-result.js';

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
    expect(judgementOf(measures, 'complianceVoltage').reason).toBe('noCurrent');
  });

  it.each([
    ['at the end of the range only', [8, 8, 8], 0],
    ['beyond the range', [8.3, 8.4, 8.5], 0],
    ['with resistors, so that no load voltage comes about', [0, 0, 0, 0], 1],
  ])('fails an output without current tested %s', (_, loadVolts, complianceLowVolts) => {
    const product = aProduct({ complianceLowVolts });
    const analysis = analyseSweep(aSweep({ points: pointsOf(loadVolts, () => 0), product }));
    const { verdict, failedMeasures } = judgeResult({ analysis, outcome: 'completed', limits: [], product });
    expect(verdict).toBe('fail');
    expect(failedMeasures).toEqual(['complianceVoltage']);
    expect(analysis.flags).toContain('complianceShort');
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
