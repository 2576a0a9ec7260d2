import { getConnectionToken } from '@nestjs/sequelize';
import fc from 'fast-check';
import type { Sequelize } from 'sequelize-typescript';
import type TestAgent from 'supertest/lib/agent.js';
import type { Verdict } from '../src/analysis/analysis.types.js';
import { countYields } from '../src/analysis/yield/count-yields.js';
import { compareAttempts, isCounted } from '../src/analysis/yield/counted-attempts.js';
import type { YieldResult } from '../src/analysis/yield/yield.types.js';
import { CatalogueService } from '../src/products/catalogue.service.js';
import type { PostedResult } from '../src/results/result.types.js';
import type { UnitDto } from '../src/units/dto/unit.dto.js';
import { findStageYields } from '../src/yield/stage-yields.queries.js';
import { aResult, sweepOf } from './builders.js';
import { createTestApp, startOfTest, type TestApp } from './create-test-app.js';

const minute = 60_000;
const hour = 60 * minute;
const iso = (time: number): string => new Date(time).toISOString();

const kinds: Record<string, { verdict: Verdict; overrides: Partial<PostedResult> }> = {
  pass: { verdict: 'pass', overrides: {} },
  fail: { verdict: 'fail', overrides: { points: sweepOf(1e6) } },
  notProven: {
    verdict: 'notProven',
    overrides: { ammeter: { resolutionAmps: 1e-5 }, points: sweepOf(1e12) },
  },
  stopped: { verdict: 'fail', overrides: { outcome: 'stoppedOnFail', points: [] } },
  aborted: { verdict: 'aborted', overrides: { outcome: 'aborted', abortReason: 'door', points: [] } },
  study: { verdict: 'pass', overrides: { runKind: 'study', study: { id: 'g', trial: 1 } } },
  practice: { verdict: 'pass', overrides: { runKind: 'practice' } },
  unjudged: { verdict: 'unjudged', overrides: { startedAt: '2025-06-01T00:00:00.000Z' } },
};

interface Event {
  kind: string;
  stage: string;
  startSlot: number;
  runMinutes: number | null;
  lot: string | undefined;
  unit: number;
  index: number;
}

const events: fc.Arbitrary<Event[]> = fc
  .array(
    fc.record({
      kind: fc.constantFrom('pass', 'fail', 'notProven', ...Object.keys(kinds)),
      stage: fc.constantFrom('board', 'final'),
      startSlot: fc.nat({ max: 3 }),
      runMinutes: fc.option(fc.nat({ max: 2 })),
      lot: fc.constantFrom(undefined, 'A', 'B'),
      unit: fc.nat({ max: 1 }),
    }),
    { minLength: 1, maxLength: 9 },
  )
  .map((list) => list.map((event, index) => ({ ...event, index })));
/** Some order of arrival, cut into groups that arrive together. */
const arrivals: fc.Arbitrary<Event[][]> = events
  .chain((list) =>
    fc.tuple(
      fc.shuffledSubarray(list, { minLength: list.length }),
      fc.array(fc.integer({ min: 1, max: 5 }), { minLength: list.length, maxLength: list.length }),
    ),
  )
  .map(([order, sizes]) => {
    const rest = [...order];
    return sizes.map((size) => rest.splice(0, size)).filter((group) => group.length > 0);
  });

type Row = YieldResult & { lot: string | null };

describe('results that arrive in any order, one by one or together', () => {
  let test: TestApp;
  let viewer: TestAgent;
  const known: Row[] = [];
  let run = 0;
  beforeAll(async () => {
    test = await createTestApp();
    viewer = await test.as('viewer');
  });
  afterAll(() => test.close());

  function toPost({ kind, stage, lot, startSlot, runMinutes, unit, index }: Event): PostedResult {
    const startedAt = startOfTest - 24 * hour + startSlot * 7 * hour;
    return aResult({
      resultId: `00000000-0000-4000-8000-${(run * 100 + index).toString(16).padStart(12, '0')}`,
      serialNumber: `R${run}x${unit}`,
      stage,
      lot,
      startedAt: iso(startedAt),
      finishedAt: runMinutes === null ? undefined : iso(startedAt + runMinutes * minute),
      ...kinds[kind]!.overrides,
    });
  }

  function toRow(post: PostedResult, verdict: Verdict): Row {
    const { resultId, partNumber, serialNumber, stage, startedAt, outcome } = post;
    const { finishedAt = null, runKind = 'production', lot = null } = post;
    const row = { resultId, partNumber, serialNumber, stage, startedAt, finishedAt, runKind, outcome, lot };
    return { ...row, verdict, voided: false };
  }

  async function postAll(groups: readonly Event[][]): Promise<Row[]> {
    const rows: Row[] = [];
    for (const group of groups) {
      const posts = group.map((event) => ({ post: toPost(event), verdict: kinds[event.kind]!.verdict }));
      await Promise.all(posts.map(({ post }) => test.post(post).expect(201)));
      rows.push(...posts.map(({ post, verdict }) => toRow(post, verdict)));
    }
    return rows;
  }

  async function expectUnit(serialNumber: string, rows: readonly Row[]): Promise<void> {
    const own = rows.filter((row) => row.serialNumber === serialNumber).sort(compareAttempts);
    const { body: unit } = await viewer.get(`/api/v1/units/FH-R500-W/${serialNumber}`).expect(200);
    for (const { stage, results } of (unit as UnitDto).stages) {
      const atStage = own.filter((row) => row.stage === stage);
      const counted = atStage.filter(isCounted).map(({ resultId }) => resultId);
      const expected = atStage.map(({ resultId, verdict }) => ({
        resultId,
        verdict,
        attempt: counted.includes(resultId) ? counted.indexOf(resultId) + 1 : null,
      }));
      const shown = results.map(({ resultId, verdict, attempt }) => ({ resultId, verdict, attempt }));
      expect(shown).toHaveLength(expected.length);
      expect(shown).toEqual(expect.arrayContaining(expected));
      expect(shown.flatMap(({ attempt }) => attempt ?? [])).toEqual(counted.map((_, i) => i + 1));
    }
    const { body: list } = await viewer.get(`/api/v1/units?search=${serialNumber}`).expect(200);
    expect(list.items[0].latest.resultId).toBe(own.at(-1)!.resultId);
    expect(unit.lot).toBe(own.findLast(({ lot }) => lot !== null)?.lot ?? null);
  }

  it('are numbered alike, with the same latest result and lot', async () => {
    await fc.assert(
      fc.asyncProperty(arrivals, async (groups) => {
        run += 1;
        const rows = await postAll(groups);
        known.push(...rows);
        for (const serialNumber of new Set(rows.map((row) => row.serialNumber))) {
          await expectUnit(serialNumber, rows);
        }
      }),
      { numRuns: 40, seed: 3 },
    );
  });

  it('give the yields of a recount from scratch, for every period', async () => {
    const sequelize = test.app.get<Sequelize>(getConnectionToken());
    const { stages } = test.app.get(CatalogueService, { strict: false }).find('FH-R500-W')!;
    const edges = [
      0,
      ...[-24, -17, -10, -3].flatMap((h) => [startOfTest + h * hour, startOfTest + h * hour + 1]),
      1e13,
    ];
    const periods = edges.flatMap((from) => edges.filter((to) => to > from).map((to) => [from, to] as const));
    for (const [from, until] of periods) {
      const rows = await findStageYields(sequelize, from, until);
      const recount = countYields(known, { from: iso(from), until: iso(until), maxAttempts: () => 3 });
      const expected = recount.map(({ stage, counts }) => ({
        stageId: stages.find(({ name }) => name === stage)!.stageId,
        ...counts,
      }));
      expect(rows).toHaveLength(expected.length);
      expect(rows).toEqual(expect.arrayContaining(expected));
    }
    expect(known.length).toBeGreaterThan(100);
  });
});
