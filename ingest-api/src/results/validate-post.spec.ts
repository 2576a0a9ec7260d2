import { aResult } from '../../test/builders.js';
import { examplePost } from './example-post.js';
import { findFaults } from './validate-post.js';

const pointersOf = (value: unknown): string[] => findFaults(value).map(({ pointer }) => pointer);

describe('checking a post against the schema', () => {
  it('finds no fault in the example of the docs', () => {
    expect(findFaults(examplePost)).toEqual([]);
    expect(findFaults(aResult())).toEqual([]);
  });

  it('tells all faults of a post of ordinary size, up to fifty', () => {
    expect(pointersOf({ ...aResult(), a: 1, b: 2, notes: 3 })).toEqual(['/a', '/b', '/notes']);
    expect(findFaults({ ...aResult(), points: Array.from({ length: 60 }, () => ({})) })).toHaveLength(50);
  });

  it('tells one fault of what is far too large, instead of counting them for a minute', () => {
    const crowd = Object.fromEntries(Array.from({ length: 50_000 }, (_, index) => [`k${index}`, 1]));
    expect(findFaults(crowd)).toHaveLength(1);
    expect(findFaults({ ...aResult(), points: Array.from({ length: 50_000 }, () => ({})) })).toHaveLength(1);
    expect(findFaults({ ...aResult(), extra: crowd })).toHaveLength(1);
  });

  it('takes 500 points with every property as ordinary', () => {
    const point = {
      loadVolts: 1,
      outputAmps: 1,
      loadOhms: 1,
      elapsedMs: 1,
      direction: 'up',
      overload: false,
    };
    const full = { ...point, outputAmpsStdDev: 1, ammeterRangeAmps: 1 };
    const points = Array.from({ length: 500 }, () => full);
    expect(findFaults({ ...aResult(), points })).toEqual([]);
    expect(pointersOf({ ...aResult(), points: points.map((one, i) => (i % 250 === 0 ? {} : one)) })).toEqual([
      '/points/0/loadVolts',
      '/points/0/outputAmps',
      '/points/250/loadVolts',
      '/points/250/outputAmps',
    ]);
  });

  it.each([
    ['loadVolt', 'loadVolts'],
    ['LoadVolts', 'loadVolts'],
    ['outputAmp', 'outputAmps'],
    ['ouputAmps', 'outputAmps'],
  ])('guesses that %s was meant to be %s', (written, meant) => {
    const [fault] = findFaults(
      aResult({ points: [{ [written]: 1, loadVolts: 0, outputAmps: 0 }, ...examplePost.points] }),
    );
    expect(fault?.detail).toContain(`did you mean "${meant}"?`);
  });

  it('guesses nothing where nothing is near', () => {
    const [fault] = findFaults({ ...aResult(), temperature: 23 });
    expect(fault?.detail).toBe(
      '"temperature" is no property of this contract. Values of your own go into "extra".',
    );
  });

  it.each([
    'a',
    'W26480417',
    '測定',
    '🔩',
    'a b',
    '...',
    '.a',
    '-',
    "O'Neil",
    'x'.repeat(64),
    '🔩'.repeat(64),
  ])('takes the name %s', (serialNumber) => expect(findFaults(aResult({ serialNumber }))).toEqual([]));

  it.each(['', ' ', 'a ', ' a', '.', '..', 'a\tb', 'a\u0000', '\u200b', '\u202eW1', 'x'.repeat(65)])(
    'refuses the name %j',
    (serialNumber) => expect(pointersOf(aResult({ serialNumber }))).toContain('/serialNumber'),
  );

  it.each([
    '2026-11-30T08:15:30Z',
    '2026-11-30T08:15:30.123456789Z',
    '2026-11-30T08:15:30+05:30',
    '2026-11-30t08:15:30z',
    '0001-01-01T00:00:00Z',
  ])('takes the time %s, which is an instant', (startedAt) => {
    expect(findFaults(aResult({ startedAt }))).toEqual([]);
    expect(Date.parse(startedAt)).not.toBeNaN();
  });

  it.each([
    '2026-11-30',
    '2026-11-30T08:15',
    '2026-11-30T08:15:30',
    '2026-11-31T08:15:30Z',
    '2026-11-30T24:00:00Z',
    '30.11.2026 08:15',
    '1796000000',
    'now',
  ])('refuses the time %s', (startedAt) =>
    expect(pointersOf(aResult({ startedAt }))).toEqual(['/startedAt']),
  );
});
