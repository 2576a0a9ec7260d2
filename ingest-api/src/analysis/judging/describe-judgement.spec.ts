import type { Limit, Measure, MeasureJudgement } from '../analysis.types.js';
import { aComplianceMeasure, aLimit, aMeasure, anImpedance, anImpedanceMeasure } from './analysis.builder.js';
import { describeJudgement } from './describe-judgement.js';

const judged = (measure: Measure, overrides: Partial<MeasureJudgement> = {}): MeasureJudgement => ({
  ...measure,
  limit: null,
  outcome: null,
  probabilityOfConformity: null,
  ...overrides,
});
const impedance = (g: number, u: number) => anImpedanceMeasure(anImpedance(g, u));
const setpoint: Limit = aLimit({ measure: 'setpointError', lower: -1, upper: 1 });

describe('the judging in words', () => {
  const table: [string, MeasureJudgement][] = [
    [
      'Output impedance is 12.14 MΩ (11.85 to 12.44 MΩ); at least 10 MΩ is required, so it passes (probability of conformity over 99.9 %).',
      judged(impedance(82.38e-9, 2e-9), { limit: aLimit(), outcome: 'pass', probabilityOfConformity: 1 }),
    ],
    [
      'Output impedance is at least 893 kΩ; at least 1 MΩ is required, which this measurement can neither prove nor rule out (probability of conformity 96.3 %).',
      judged(impedance(0.1e-6, 1.0193e-6), {
        limit: aLimit({ lower: 1e6 }),
        outcome: 'notProven',
        reason: 'guardBand',
        probabilityOfConformity: 0.9634,
      }),
    ],
    [
      'Setpoint error is 1.400 ± 0.020 %; from −1 % to 1 % is required, so it fails (probability of conformity below 0.1 %).',
      judged(aMeasure({ value: 1.4 }), { limit: setpoint, outcome: 'fail', probabilityOfConformity: 0 }),
    ],
    [
      'Linearity error is at most 41.3 ppm; at most 100 ppm is allowed, so it passes.',
      judged(aMeasure({ name: 'linearityError', unit: 'ppm', value: 41.231, bound: 'atMost' }), {
        limit: aLimit({ measure: 'linearityError', lower: null, upper: 100 }),
        outcome: 'pass',
      }),
    ],
    [
      'Load regulation has no value: it was not measured; at most 0.2 % is allowed, so it is not proven.',
      judged(aMeasure({ name: 'loadRegulation', value: null, reason: 'notMeasured' }), {
        limit: aLimit({ measure: 'loadRegulation', lower: null, upper: 0.2 }),
        outcome: 'notProven',
      }),
    ],
    [
      'Relative slope has no value: fewer than 3 voltages; nothing limits it.',
      judged(
        aMeasure({
          name: 'relativeSlope',
          unit: 'ppm/V',
          value: null,
          reason: 'notComputed: fewer than 3 voltages',
        }),
      ),
    ],
    [
      'Compliance voltage is at least 5 V; at least 8 V is required, which is not proven: the points do not cover the promised range.',
      judged(aComplianceMeasure({ value: 5, reason: 'rangeNotCovered' }), {
        limit: aLimit({ measure: 'complianceVoltage', lower: 8 }),
        outcome: 'notProven',
      }),
    ],
    [
      'Compliance voltage is at most 0 V; at least 8 V is required, so it fails: no point carries a tenth of the nominal current.',
      judged(aComplianceMeasure({ value: 0, bound: 'atMost', reason: 'noCurrent' }), {
        limit: aLimit({ measure: 'complianceVoltage', lower: 8 }),
        outcome: 'fail',
      }),
    ],
  ];
  it.each(table)('%s', (sentence, measure) => {
    expect(describeJudgement(measure)).toBe(sentence);
  });
});
