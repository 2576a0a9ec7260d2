import fc from 'fast-check';
import { examplePost } from '../src/results/example-post.js';
import type { PostedResult } from '../src/results/result.types.js';

const extreme = (least: number, most: number): fc.Arbitrary<number> =>
  fc.oneof(fc.constantFrom(least, most), fc.double({ min: least, max: most, noNaN: true }));
const positive = fc.oneof(
  fc.constantFrom(1e-30, 1e-29, 1e-9, 1, 1e15),
  fc.double({ min: 1e-30, max: 1e15, noNaN: true }),
);
const reading = fc.oneof(
  fc.constantFrom(0, -0, 0.0005, 9.9e37, -9.9e37, 1e38, -1e38, 8.9e36, 5e-324, -1e-320),
  fc.double({ min: -1e38, max: 1e38, noNaN: true }),
  fc.double({ min: -12, max: 12, noNaN: true }),
  fc.double({ min: 4.9e-4, max: 5.1e-4, noNaN: true }),
);
const names = fc
  .oneof(
    fc.constantFrom(
      'W1',
      'GOLD-1',
      'null',
      '0',
      '1e3',
      '%',
      '_',
      'a/b',
      'ü',
      '🔩',
      "'",
      '"',
      '<b>',
      '...',
      '~1',
      '\\',
    ),
    { weight: 4, arbitrary: fc.string({ minLength: 1, maxLength: 20, unit: 'grapheme' }) },
  )
  .filter((name) => /^(?!\.{1,2}$)[^\s\p{C}](?:[^\p{C}]*[^\s\p{C}])?$/u.test(name) && [...name].length <= 64);
const times = fc.oneof(
  fc.constantFrom(
    '2026-11-30T12:04:59.999Z',
    '0001-01-01T00:00:00Z',
    '1969-12-31T23:59:59.999Z',
    '2026-11-30T17:30:00.5+05:30',
  ),
  fc
    .date({ min: new Date('2025-12-01'), max: new Date('2026-11-30T12:00:00Z'), noInvalidDate: true })
    .map((date) => date.toISOString()),
);

const optional = { requiredKeys: [] as never[] };
const oddPoints = fc.array(
  fc.record(
    {
      loadVolts: reading,
      outputAmps: reading,
      loadOhms: extreme(0, 1e15),
      elapsedMs: extreme(0, 1e9),
      direction: fc.constantFrom('up', 'down', 'repeat'),
      outputAmpsStdDev: positive,
      ammeterRangeAmps: positive,
      overload: fc.boolean(),
    },
    { requiredKeys: ['loadVolts', 'outputAmps'] },
  ),
  { minLength: 3, maxLength: 12 },
);

/** Allowed by the schema, and absurd: what the computing has to live with. */
export const absurdPosts: fc.Arbitrary<PostedResult> = fc.record(
  {
    resultId: fc.uuid(),
    partNumber: fc.constant('FH-R500-W'),
    stage: fc.constantFrom('board', 'final'),
    serialNumber: names,
    lot: names,
    runKind: fc.constantFrom('production', 'golden', 'practice'),
    outcome: fc.constantFrom('completed', 'stoppedOnFail', 'aborted'),
    abortReason: fc.constantFrom('door', '\u0000', '<script>', '\u2028'),
    startedAt: times,
    finishedAt: times,
    sentAt: fc.oneof(times, fc.constant('9999-12-31T23:59:59.999Z')),
    testPlanVersion: fc.integer({ min: 1, max: 1e6 }),
    supplyVolts: reading,
    fixtureLeakageOhms: positive,
    ammeter: fc.record(
      {
        serialNumber: fc.constantFrom('AM-0031', 'AM-9'),
        rangeAmps: positive,
        resolutionAmps: positive,
        readingAccuracyPercent: extreme(0, 100),
        rangeAccuracyPercent: extreme(0, 100),
        burdenOhms: extreme(0, 1e12),
      },
      optional,
    ),
    voltmeter: fc.record(
      {
        serialNumber: fc.constantFrom('VM-0107', 'VM-9'),
        rangeVolts: positive,
        resolutionVolts: positive,
        inputOhms: positive,
        spansAmmeter: fc.boolean(),
      },
      optional,
    ),
    notes: fc.string({ maxLength: 100, unit: 'binary-ascii' }),
    extra: fc.dictionary(
      names,
      fc.oneof(names, fc.double({ noNaN: true, noDefaultInfinity: true }), fc.boolean(), fc.constant(null)),
      { maxKeys: 5 },
    ),
    points: fc.oneof(oddPoints, fc.constant(examplePost.points)),
  },
  {
    requiredKeys: [
      'resultId',
      'partNumber',
      'stage',
      'serialNumber',
      'outcome',
      'abortReason',
      'startedAt',
      'points',
    ],
  },
);
