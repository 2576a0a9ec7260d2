import fc from 'fast-check';
import { examplePost } from '../src/results/example-post.js';
import type { PostedResult } from '../src/results/result.types.js';
import { absurdPosts } from './absurd-posts.builder.js';

/** A body as it goes over the wire. */
export type HostileBody = string | Uint8Array<ArrayBuffer>;

/** Every property of the contract filled in, so that each can be spoilt. */
const fullPost: PostedResult = {
  ...examplePost,
  stage: 'board',
  startedAt: '2026-11-30T11:58:00.000Z',
  finishedAt: '2026-11-30T11:58:20.000Z',
  sentAt: '2026-11-30T11:59:59.000Z',
  testPlanVersion: 1,
  unitCelsius: 25,
  humidityPercent: 40,
  dwellMs: 300,
  warmUpSeconds: 60,
  load: { kind: 'resistor', serialNumber: 'R-7' },
  fixtureLeakageOhms: 1e11,
  study: { id: 'gauge-1', trial: 1, appraiser: 'B117', part: '3' },
  abortReason: 'none',
  notes: 'nothing odd',
  points: examplePost.points.map((point) => ({
    ...point,
    loadOhms: 1000,
    direction: 'up',
    outputAmpsStdDev: 1e-9,
    ammeterRangeAmps: 0.001,
    overload: false,
  })),
};

const oddStrings = fc.constantFrom(
  '',
  ' ',
  '.',
  '..',
  '__proto__',
  'constructor',
  'null',
  '%',
  '_%_',
  "'; DROP TABLE results; --",
  '<img src=x onerror=alert(1)>',
  '=1+1',
  '../../etc/passwd',
  '%2e%2e/%00',
  'a/b?c#d',
  'W\u0000X',
  '\u202eW1',
  'Ω µ ± 測定 🔩',
  '\ud83d\ude00'.repeat(32),
  'e\u0301\u0327'.repeat(12),
  'x'.repeat(64),
  'x'.repeat(65),
  'x'.repeat(20_000),
  '\ud800',
  'urn:uuid:0193f3a2-6f0e-7c52-9a3e-5b1f4c0d2e11',
  '0193F3A2-6F0E-7C52-9A3E-5B1F4C0D2E11',
  '2026-11-30T23:59:60Z',
  '2026-02-30T00:00:00Z',
  '0000-01-01T00:00:00+23:59',
  '9999-12-31T23:59:59-23:59',
  '2026-11-30 08:15:30z',
  '2026-11-30T08:15:30+0530',
  '2026-11-30T08:15:30.123456789012345Z',
);

/** Numbers as they may be written; those that JSON.stringify can't write are put in as text afterwards. */
const oddNumberTexts = [
  ...'0 -0 -1 0.5 5e-324 1e-320 1e-300 1e15 1e38 -1e38 9.9e37 -9.9E+37 8.9e36 1e39 1e308 1e400 -1e999'.split(
    ' ',
  ),
  '9007199254740993',
  `1${'0'.repeat(300)}`,
  `0.${'3'.repeat(300)}`,
];
const numberMark = '\u0001number:';
const oddNumbers = fc.constantFrom(...oddNumberTexts).map((text) => `${numberMark}${text}`);
const writeNumbers = (text: string): string => text.replace(/"\\u0001number:([^"]*)"/g, '$1');

const nested = (levels: number): unknown => (levels === 0 ? 1 : [nested(levels - 1)]);
const oddValues: fc.Arbitrary<unknown> = fc.oneof(
  oddStrings,
  oddNumbers,
  fc.constantFrom(null, true, false, [], {}, [[]], { toJSON: 1, constructor: 2 }, nested(20), nested(2000)),
  fc.jsonValue({ maxDepth: 2 }),
);

type Path = (string | number)[];

function pathsOf(value: unknown, path: Path = []): Path[] {
  if (value === null || typeof value !== 'object') return [path];
  return [path, ...Object.entries(value).flatMap(([key, inner]) => pathsOf(inner, [...path, key]))];
}

function spoil(
  post: unknown,
  path: Path,
  change: (holder: Record<string, unknown>, key: string) => void,
): void {
  const holder = path.slice(0, -1).reduce((inner, key) => (inner as Record<string, unknown>)?.[key], post);
  if (holder !== null && typeof holder === 'object')
    change(holder as Record<string, unknown>, String(path.at(-1)));
}

const paths = pathsOf(fullPost).filter((path) => path.length > 0);
const spoiling = fc.record({
  path: fc.constantFrom(...paths),
  value: oddValues,
  how: fc.constantFrom('replace', 'replace', 'remove', 'add', 'twice'),
  name: oddStrings,
});

/** A valid post with one to three places spoilt. */
const spoiltPosts: fc.Arbitrary<HostileBody> = fc
  .tuple(fc.array(spoiling, { minLength: 1, maxLength: 3 }), fc.uuid())
  .map(([spoilings, resultId]) => {
    const post = structuredClone({ ...fullPost, resultId }) as unknown;
    let twice = '';
    for (const { path, how, name, ...spoiling } of spoilings) {
      const value = structuredClone(spoiling.value);
      spoil(post, path, (holder, key) => {
        if (how === 'remove') delete holder[key];
        else if (how === 'add')
          Object.defineProperty(holder, name, {
            value,
            enumerable: true,
            configurable: true,
            writable: true,
          });
        else holder[key] = value;
      });
      if (how === 'twice') twice += `,"notes":${JSON.stringify(value)}`;
    }
    const text = writeNumbers(JSON.stringify(post));
    return twice === '' ? text : text.replace(/}$/, `${writeNumbers(twice)}}`);
  });

const strayBodies: fc.Arbitrary<HostileBody> = fc.oneof(
  fc.json({ maxDepth: 4 }),
  fc.string({ unit: 'binary', maxLength: 200 }),
  fc.uint8Array({ maxLength: 200 }).map((bytes) => new Uint8Array(bytes)),
  fc.nat({ max: 1200 }).map((length) => JSON.stringify(fullPost).slice(0, length)),
  fc.constantFrom(
    '',
    'null',
    '[]',
    '{}',
    '{"a":'.repeat(5000),
    '['.repeat(20_000),
    `[${'1,'.repeat(10_000)}1]`,
    `{${'"a":1,'.repeat(5000)}"a":1}`,
    '\ufeff{}',
  ),
);

/** Bodies of every hostile kind, mixed. */
export const hostileBodies: fc.Arbitrary<HostileBody> = fc.oneof(
  { weight: 2, arbitrary: strayBodies },
  { weight: 4, arbitrary: spoiltPosts },
  { weight: 4, arbitrary: absurdPosts.map((post) => JSON.stringify(post)) },
);
