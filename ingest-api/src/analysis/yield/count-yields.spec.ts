import fc from 'fast-check';
import type { Verdict } from '../analysis.types.js';
import { addCounts, countYields } from './count-yields.js';
import { unitContribution } from './unit-contribution.js';
import { aYieldResult, type LineResult } from './yield-result.builder.js';
import { NO_UNITS, type YieldCounts, type YieldResult } from './yield.types.js';

const at = (hour: number) => `2026-11-30T${String(hour).padStart(2, '0')}:00:00.000Z`;

/** One unit's results, given as `hour: verdict`. */
const history = (
  serialNumber: string,
  ...attempts: [number, Verdict, Partial<LineResult>?][]
): LineResult[] =>
  attempts.map(([hour, verdict, overrides]) =>
    aYieldResult({
      resultId: `${serialNumber}-${hour}`,
      serialNumber,
      startedAt: at(hour),
      finishedAt: at(hour),
      verdict,
      ...overrides,
    }),
  );

describe('yields counted from scratch', () => {
  it('knows a unit by its first and by its latest attempt', () => {
    const results = [
      ...history('A', [8, 'pass']),
      ...history('B', [8, 'fail'], [9, 'pass']),
      ...history('C', [8, 'notProven'], [9, 'fail']),
    ];
    const [only] = countYields(results, { maxAttempts: () => 2 });
    expect(only).toMatchObject({
      partNumber: 'FH-R500-W',
      stage: 'final',
      counts: {
        total: 3,
        firstPassed: 1,
        firstFailed: 1,
        firstNotProven: 1,
        latestPassed: 2,
        latestFailed: 1,
        latestNotProven: 0,
        open: 0,
      },
      firstPass: { passed: 1, total: 3 },
      final: { passed: 2, total: 3 },
    });
  });

  it('counts a unit as open while it has not passed and has attempts left', () => {
    const results = [
      ...history('A', [8, 'fail']),
      ...history('B', [8, 'fail'], [9, 'fail']),
      ...history('C', [8, 'fail'], [9, 'pass']),
    ];
    expect(countYields(results, { maxAttempts: () => 2 })[0]?.counts.open).toBe(1);
    expect(countYields(results)[0]?.counts.open).toBe(2);
  });

  it('orders attempts by when they were made, not by when they came', () => {
    const late = history('A', [7, 'fail']);
    expect(countYields([...history('A', [8, 'pass']), ...late])[0]?.counts).toMatchObject({
      firstFailed: 1,
      latestPassed: 1,
    });
  });

  it('compares instants, so that another offset changes nothing', () => {
    const early = history('A', [7, 'fail', { startedAt: '2026-11-30T09:30:00.000+02:00' }]);
    expect(countYields([...history('A', [8, 'pass']), ...early])[0]?.counts.firstFailed).toBe(1);
  });

  it('breaks ties by the end of the attempt, then by its identifier', () => {
    const same = { startedAt: at(8) };
    const byEnd = [
      aYieldResult({ ...same, resultId: 'a', finishedAt: at(10), verdict: 'pass' }),
      aYieldResult({ ...same, resultId: 'b', finishedAt: at(9), verdict: 'fail' }),
    ];
    expect(countYields(byEnd)[0]?.counts).toMatchObject({ firstFailed: 1, latestPassed: 1 });
    const byId = byEnd.map((result) => ({ ...result, finishedAt: null }));
    expect(countYields(byId)[0]?.counts).toMatchObject({ firstPassed: 1, latestFailed: 1 });
  });

  it.each<[string, Partial<LineResult>]>([
    ['golden unit', { runKind: 'golden' }],
    ['study', { runKind: 'study' }],
    ['practice', { runKind: 'practice' }],
    ['aborted run', { outcome: 'aborted', verdict: 'aborted' }],
    ['unjudged result', { verdict: 'unjudged' }],
    ['voided result', { voided: true }],
  ])('leaves out a %s', (_, overrides) => {
    expect(countYields([aYieldResult(overrides)])).toEqual([]);
    const later = history('W1', [9, 'fail']);
    expect(countYields([aYieldResult(overrides), ...later])[0]?.counts).toMatchObject({
      total: 1,
      firstFailed: 1,
    });
  });

  it('keeps stages, products and equal serial numbers of different products apart', () => {
    const results = [
      aYieldResult({ resultId: 'a' }),
      aYieldResult({ resultId: 'b', stage: 'board', verdict: 'fail' }),
      aYieldResult({ resultId: 'c', partNumber: 'FH-T250-C' }),
    ];
    expect(countYields(results).map((y) => [y.partNumber, y.stage, y.counts.firstPassed])).toEqual([
      ['FH-R500-W', 'board', 0],
      ['FH-R500-W', 'final', 1],
      ['FH-T250-C', 'final', 1],
    ]);
  });

  it('puts a unit into the period of its first attempt and follows it beyond', () => {
    const results = [...history('A', [8, 'fail'], [12, 'pass']), ...history('B', [11, 'pass'])];
    const morning = countYields(results, { from: at(6), until: at(11) });
    expect(morning[0]?.counts).toMatchObject({ total: 1, firstFailed: 1, latestPassed: 1 });
    const noon = countYields(results, { from: at(11), until: at(14) });
    expect(noon[0]?.counts).toMatchObject({ total: 1, firstPassed: 1 });
  });

  it('splits by the attribute of the first attempt', () => {
    const results = history('A', [8, 'fail', { station: 'north-1' }], [9, 'pass', { station: 'south-1' }]);
    const split = countYields(results, { splitBy: ({ station }) => station });
    expect(split).toHaveLength(1);
    expect(split[0]).toMatchObject({ split: 'north-1', counts: { latestPassed: 1 } });
  });

  it('counts a result once under its corrected serial number', () => {
    const scanned = aYieldResult({ serialNumber: 'WRONG' });
    const corrected = { ...scanned, serialNumber: 'W1' };
    expect(countYields([scanned, corrected])[0]?.counts.total).toBe(1);
  });
});

describe('any order and repetition of arrivals, voids and rejudgements', () => {
  type Event =
    | { kind: 'arrival'; row: LineResult }
    | { kind: 'void'; id: string }
    | { kind: 'rejudge'; id: string; verdict: Verdict };

  const verdict = fc.constantFrom<Verdict>('pass', 'fail', 'notProven', 'unjudged');
  const rows = fc
    .array(
      fc.record({
        serialNumber: fc.constantFrom('A', 'B', 'C'),
        stage: fc.constantFrom('board', 'final'),
        hour: fc.integer({ min: 0, max: 5 }),
        runKind: fc.constantFrom('production' as const, 'production' as const, 'golden' as const),
        outcome: fc.constantFrom('completed' as const, 'completed' as const, 'aborted' as const),
        verdict,
      }),
      { maxLength: 25 },
    )
    .map((list) =>
      list.map(({ hour, ...row }, i) =>
        aYieldResult({ ...row, resultId: `r-${i}`, startedAt: at(hour), finishedAt: null }),
      ),
    );

  const story = rows.chain((results) => {
    const ids = results.map((row) => row.resultId);
    const voids = fc.subarray(ids).map((list) => list.map((id): Event => ({ kind: 'void', id })));
    const rejudged = fc
      .tuple(fc.subarray(ids), fc.infiniteStream(verdict))
      .map(([list, verdicts]) =>
        list.map((id): Event => ({ kind: 'rejudge', id, verdict: verdicts.next().value as Verdict })),
      );
    return fc.tuple(voids, rejudged).chain(([v, r]) => {
      const events: Event[] = [...results.map((row): Event => ({ kind: 'arrival', row })), ...v, ...r];
      const disturbed = fc
        .tuple(fc.shuffledSubarray(events, { minLength: events.length }), fc.subarray(events))
        .map(([all, again]) => [...all, ...again]);
      return fc.record({ events: fc.constant(events), disturbed });
    });
  });

  /** Keeps a running tally: each event takes the unit's old contribution out and puts its new one in. */
  function runningTally(events: readonly Event[]): YieldCounts {
    const arrived = new Map<string, LineResult>();
    const voided = new Set<string>();
    const rejudged = new Map<string, Verdict>();
    const effective = ({ serialNumber, stage }: YieldResult) =>
      [...arrived.values()]
        .filter((row) => row.serialNumber === serialNumber && row.stage === stage)
        .map((row) => ({
          ...row,
          voided: voided.has(row.resultId),
          verdict: rejudged.get(row.resultId) ?? row.verdict,
        }));
    let tally: YieldCounts = NO_UNITS;
    for (const event of events) {
      const row = event.kind === 'arrival' ? event.row : arrived.get(event.id);
      const before = row === undefined ? null : unitContribution(effective(row), 3);
      if (event.kind === 'arrival') arrived.set(event.row.resultId, event.row);
      else if (event.kind === 'void') voided.add(event.id);
      else rejudged.set(event.id, event.verdict);
      const after = row === undefined ? null : unitContribution(effective(row), 3);
      if (before !== null) tally = addCounts(tally, before.counts, -1);
      if (after !== null) tally = addCounts(tally, after.counts);
    }
    return tally;
  }

  function recount(events: readonly Event[]): YieldCounts {
    const voided = new Set(events.flatMap((event) => (event.kind === 'void' ? [event.id] : [])));
    const rejudged = new Map(
      events.flatMap((event) => (event.kind === 'rejudge' ? [[event.id, event.verdict]] : [])),
    );
    const results = events.flatMap((event) =>
      event.kind === 'arrival'
        ? [
            {
              ...event.row,
              voided: voided.has(event.row.resultId),
              verdict: rejudged.get(event.row.resultId) ?? event.row.verdict,
            },
          ]
        : [],
    );
    return countYields(results, { maxAttempts: () => 3 }).reduce(
      (sum, { counts }) => addCounts(sum, counts),
      NO_UNITS,
    );
  }

  it('leads to exactly the recount from scratch', () => {
    fc.assert(
      fc.property(story, ({ events, disturbed }) => {
        const expected = recount(events);
        expect(recount(disturbed)).toEqual(expected);
        expect(runningTally(disturbed)).toEqual(expected);
      }),
      { numRuns: 500 },
    );
  });

  it('shares every unit out to passed, failed and not proven, first and latest', () => {
    fc.assert(
      fc.property(story, ({ events }) => {
        const counts = recount(events);
        expect(counts.firstPassed + counts.firstFailed + counts.firstNotProven).toBe(counts.total);
        expect(counts.latestPassed + counts.latestFailed + counts.latestNotProven).toBe(counts.total);
        expect(counts.open).toBeLessThanOrEqual(counts.total - counts.latestPassed);
      }),
    );
  });
});
