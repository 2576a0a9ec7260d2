import fc from 'fast-check';
import { aLimit, judge, judgementOf, RANK } from './analysis.builder.js';
import { describeJudgement } from './describe-judgement.js';
import { MEASURE_NAMES } from './measure-names.js';
import { analyseSweep } from '../sweep/analyse-sweep.js';
import { aSweep, pointsOf, steps } from '../sweep/sweep.builder.js';

describe('whole sweeps', () => {
  const limits = [aLimit(), aLimit({ measure: 'setpointError', lower: -1, upper: 1 })];

  it('passes the example of the station contract', () => {
    const { verdict, measures } = judge(analyseSweep(aSweep()), limits);
    expect(verdict).toBe('pass');
    expect(describeJudgement(judgementOf(measures, 'outputImpedance'))).toBe(
      'Output impedance is 12.14 MΩ (11.85 to 12.44 MΩ); at least 10 MΩ is required, so it passes (probability of conformity over 99.9 %).',
    );
  });

  it('judges a rising current by the size of its slope and says so', () => {
    const rising = analyseSweep(
      aSweep({ points: pointsOf(steps(0, 8, 9), (volts) => 500e-6 + 1e-6 * volts) }),
    );
    const { measures, failedMeasures } = judge(rising, limits);
    expect(failedMeasures).toEqual(['outputImpedance']);
    expect(describeJudgement(judgementOf(measures, 'outputImpedance'))).toBe(
      'Output impedance has no value: the current rises with the load voltage; at least 10 MΩ is required, so it fails (probability of conformity below 0.1 %).',
    );
  });

  it('leaves a limit on a measure that does not apply to the circuit unproven', () => {
    const limit = aLimit({ measure: 'effectiveEarlyVoltage', lower: 50 });
    expect(
      judgementOf(judge(analyseSweep(aSweep()), [limit]).measures, 'effectiveEarlyVoltage'),
    ).toMatchObject({
      outcome: 'notProven',
      reason: 'notApplicable',
    });
  });

  it('never gives a better source a worse verdict, as long as the same meter measures it', () => {
    const verdictAt = (slope: number) => {
      const sweep = aSweep({ points: pointsOf(steps(0, 8, 9), (volts) => 500e-6 - slope * volts) });
      return RANK[judge(analyseSweep(sweep), [aLimit()]).verdict];
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
