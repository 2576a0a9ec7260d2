import fc from 'fast-check';
import { decideConformity, type ConformityOutcome, type ConformityQuestion } from './decide-conformity.js';

const question = (overrides: Partial<ConformityQuestion>): ConformityQuestion => ({
  value: 0,
  expandedUncertainty: 1,
  tolerance: { lower: null, upper: null },
  rule: 'guarded',
  guardFactor: 1,
  largestAdequateUncertainty: 2,
  ...overrides,
});

const UPPER = { lower: null, upper: 10 };
const LOWER = { lower: 10, upper: null };
const BOTH = { lower: 10, upper: 20 };

/** U = 1 in every row; w = guard factor × 1. */
const table: [string, Partial<ConformityQuestion>, ConformityOutcome][] = [
  ['guarded, upper limit, well inside', { tolerance: UPPER, value: 5 }, 'pass'],
  ['guarded, upper limit, exactly w inside', { tolerance: UPPER, value: 9 }, 'pass'],
  ['guarded, upper limit, less than w inside', { tolerance: UPPER, value: 9.001 }, 'notProven'],
  ['guarded, upper limit, on the limit', { tolerance: UPPER, value: 10 }, 'notProven'],
  ['guarded, upper limit, exactly w outside', { tolerance: UPPER, value: 11 }, 'notProven'],
  ['guarded, upper limit, more than w outside', { tolerance: UPPER, value: 11.001 }, 'fail'],
  ['guarded, lower limit, exactly w inside', { tolerance: LOWER, value: 11 }, 'pass'],
  ['guarded, lower limit, less than w inside', { tolerance: LOWER, value: 10.999 }, 'notProven'],
  ['guarded, lower limit, exactly w outside', { tolerance: LOWER, value: 9 }, 'notProven'],
  ['guarded, lower limit, more than w outside', { tolerance: LOWER, value: 8.999 }, 'fail'],
  ['guarded, both limits, in the middle', { tolerance: BOTH, value: 15 }, 'pass'],
  ['guarded, both limits, near the lower', { tolerance: BOTH, value: 10.5 }, 'notProven'],
  ['guarded, both limits, near the upper', { tolerance: BOTH, value: 19.5 }, 'notProven'],
  ['guarded, both limits, beyond the lower', { tolerance: BOTH, value: 8 }, 'fail'],
  ['guarded, both limits, beyond the upper', { tolerance: BOTH, value: 22 }, 'fail'],
  [
    'guarded, tolerance narrower than 2w, middle',
    { tolerance: { lower: 10, upper: 11 }, value: 10.5 },
    'notProven',
  ],
  [
    'guarded, factor 0.8225 (5 % risk), inside by it',
    { tolerance: UPPER, value: 9.1775, guardFactor: 0.8225 },
    'pass',
  ],
  ['guarded, factor 0, on the limit', { tolerance: UPPER, value: 10, guardFactor: 0 }, 'pass'],
  ['guarded, factor 0, just outside', { tolerance: UPPER, value: 10.001, guardFactor: 0 }, 'fail'],
  ['guarded, factor 2, inside by U only', { tolerance: UPPER, value: 9, guardFactor: 2 }, 'notProven'],
  ['simple, adequate, just inside', { rule: 'simple', tolerance: UPPER, value: 9.999 }, 'pass'],
  ['simple, adequate, on the limit', { rule: 'simple', tolerance: UPPER, value: 10 }, 'pass'],
  ['simple, adequate, just outside', { rule: 'simple', tolerance: UPPER, value: 10.001 }, 'fail'],
  ['simple, adequate, lower limit, just outside', { rule: 'simple', tolerance: LOWER, value: 9.999 }, 'fail'],
  [
    'simple, exactly adequate',
    { rule: 'simple', tolerance: UPPER, value: 9.5, largestAdequateUncertainty: 1 },
    'pass',
  ],
  [
    'simple, inadequate, just inside',
    { rule: 'simple', tolerance: UPPER, value: 9.5, largestAdequateUncertainty: 0.99 },
    'notProven',
  ],
  [
    'simple, inadequate, well inside',
    { rule: 'simple', tolerance: UPPER, value: 8, largestAdequateUncertainty: 0.5 },
    'pass',
  ],
  [
    'simple, inadequate, well outside',
    { rule: 'simple', tolerance: UPPER, value: 12, largestAdequateUncertainty: 0.5 },
    'fail',
  ],
  ['no uncertainty at all, on the limit', { tolerance: UPPER, value: 10, expandedUncertainty: 0 }, 'pass'],
];

describe('one value against one tolerance', () => {
  it.each(table)('%s', (_, overrides, outcome) => {
    expect(decideConformity(question(overrides))).toBe(outcome);
  });

  it('takes a limit met but for binary rounding as met', () => {
    const met = question({ tolerance: { lower: 10, upper: null }, value: 10.1, expandedUncertainty: 0.1 });
    expect(met.value - 10).toBeLessThan(0.1);
    expect(decideConformity(met)).toBe('pass');
  });

  it('never leaves a simple rule with an adequate meter unproven', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -100, max: 100, noNaN: true }),
        fc.double({ min: 0, max: 2, noNaN: true }),
        (value, u) => {
          const outcome = decideConformity(
            question({ rule: 'simple', tolerance: BOTH, value, expandedUncertainty: u }),
          );
          expect(outcome).not.toBe('notProven');
        },
      ),
    );
  });

  it('never gets worse when the value moves away from a limit', () => {
    const rank = { fail: 0, notProven: 1, pass: 2 };
    const anyRule = fc.record({
      rule: fc.constantFrom('guarded' as const, 'simple' as const),
      guardFactor: fc.double({ min: 0, max: 3, noNaN: true }),
      expandedUncertainty: fc.double({ min: 0, max: 20, noNaN: true }),
    });
    const value = fc.double({ min: -50, max: 50, noNaN: true });
    fc.assert(
      fc.property(anyRule, value, fc.double({ min: 0.001, max: 50, noNaN: true }), (rule, worse, gain) => {
        const outcomes = [worse, worse + gain].map((v) =>
          decideConformity(question({ ...rule, tolerance: LOWER, value: v })),
        );
        expect(rank[outcomes[1]!]).toBeGreaterThanOrEqual(rank[outcomes[0]!]);
      }),
    );
  });
});
