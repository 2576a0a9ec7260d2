import type { MeasureJudgement } from '../analysis/analysis.types.js';
import { breachEventText, breachTitle, howBad } from './breach-words.js';

const aJudgement = (overrides: Partial<MeasureJudgement> = {}): MeasureJudgement => ({
  name: 'outputImpedance',
  unit: 'Ω',
  value: 3.10437e6,
  expandedUncertainty: 1e5,
  low: 3e6,
  high: 3.2e6,
  bound: 'exact',
  reason: null,
  limit: { measure: 'outputImpedance', lower: 5e6, upper: null, rule: 'guarded', guardFactor: 1 },
  outcome: 'fail',
  probabilityOfConformity: 0,
  ...overrides,
});

describe('words of a breach', () => {
  it('names what broke and where', () => {
    expect(breachTitle('outputImpedance', 'FH-R500-W', 'final')).toBe(
      'Output impedance out of limits: FH-R500-W at final',
    );
    expect(breachTitle('stoppedOnFail', 'FH-R500-W', 'final')).toBe('Stopped on a fail: FH-R500-W at final');
  });

  it('says how bad it is in a few words', () => {
    expect(howBad(aJudgement())).toBe('output impedance 3.104 MΩ, at least 5 MΩ required');
    expect(howBad(null)).toBe('stopped on a fail');
  });

  it('names both limits, an upper limit, and a bound as a bound', () => {
    const limit = { measure: 'setpointError', rule: 'simple', guardFactor: 1 } as const;
    const error = { name: 'setpointError', unit: '%', value: 1.25 } as const;
    expect(howBad(aJudgement({ ...error, limit: { ...limit, lower: -1, upper: 1 } }))).toBe(
      'setpoint error 1.25 %, −1 % to 1 % required',
    );
    expect(
      howBad(aJudgement({ ...error, bound: 'atMost', limit: { ...limit, lower: null, upper: 1 } })),
    ).toBe('setpoint error at most 1.25 %, at most 1 % allowed');
  });

  it('says that a measure has no value', () => {
    expect(howBad(aJudgement({ value: null, reason: 'notMeasured' }))).toBe(
      'output impedance without a value',
    );
  });

  it('tells the judging of an event as a sentence', () => {
    expect(breachEventText(aJudgement())).toMatch(/^Output impedance is .* is required, so it fails/);
    expect(breachEventText(null)).toBe('The station stopped the test on a fail.');
  });
});
