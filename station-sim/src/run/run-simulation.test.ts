import { describe, expect, it } from 'vitest';
import { createRandom } from '../circuit/random.js';
import { buildPlan } from '../plan/build-plan.js';
import type { Scenario } from '../plan/scenarios.js';
import type { PostResult } from '../send/post-result.js';
import type { Spool, SpooledPost } from '../send/spool.js';
import { anAnswer, aPost } from '../testing/builders.js';
import { createVirtualClock } from '../testing/virtual-clock.js';
import type { ResultPost } from '../types/result-post.js';
import { outageOf } from './outage.js';
import { runSimulation } from './run-simulation.js';

/** Judges by the station's verdict, as a hub would, and remembers what it took. */
function aHub(
  answerFor: (post: ResultPost, number: number) => Awaited<ReturnType<PostResult>> | null = () => null,
) {
  const taken: ResultPost[] = [];
  let number = 0;
  const send: PostResult = (_key, post) => {
    const special = answerFor(post, number++);
    if (special) return Promise.resolve(special);
    taken.push(post);
    const passed = post.stationVerdict === 'pass';
    return Promise.resolve({
      kind: 'accepted',
      answer: anAnswer({ verdict: passed ? 'pass' : 'fail', disposition: passed ? 'next' : 'retest' }),
    });
  };
  return { taken, send };
}

function aSpool(leftOver: readonly SpooledPost[] = []) {
  const waiting = new Map(leftOver.map((spooled) => [spooled.post.resultId, spooled]));
  const spool: Spool = {
    leftOver,
    add: (spooled) => Promise.resolve(void waiting.set(spooled.post.resultId, spooled)),
    remove: (resultId) => Promise.resolve(void waiting.delete(resultId)),
    close: () => Promise.resolve(),
  };
  return { waiting, spool };
}

async function run(
  options: { count?: number; seed?: number; scenario?: Scenario; start?: string; stop?: AbortSignal } = {},
  send: PostResult = aHub().send,
  spool: Spool = aSpool().spool,
) {
  const random = createRandom(options.seed ?? 42);
  const { scenario = 'steady', count = 60 } = options;
  const planOptions = { scenario, stations: 3, madeAt: new Date('2026-11-26') } as const;
  const plan = buildPlan(planOptions, random);
  return runSimulation(
    { plan, stations: 3, testsPerSecond: 2, count, outage: outageOf(scenario, count) },
    {
      clock: createVirtualClock(options.start),
      send,
      spool,
      keys: { 'north-1': 'amk_1', 'north-2': 'amk_2', 'north-3': 'amk_3' },
      random,
      stop: options.stop ?? new AbortController().signal,
      onProgress: () => undefined,
    },
  );
}

describe('a simulation', () => {
  it('posts as many results as asked for and leaves nothing in the spool', async () => {
    const hub = aHub();
    const { waiting, spool } = aSpool();
    const tally = await run({ count: 60 }, hub.send, spool);
    expect(tally).toMatchObject({ tested: 60, accepted: 60, waiting: 0, refused: 0 });
    expect(new Set(hub.taken.map((post) => post.resultId)).size).toBe(60);
    expect(waiting.size).toBe(0);
  });

  it('posts the same sweeps for the same seed, at whatever time', async () => {
    const first = aHub();
    const second = aHub();
    await run({ seed: 7 }, first.send);
    await run({ seed: 7, start: '2026-12-01T13:00:00Z' }, second.send);
    const sweeps = (posts: ResultPost[]) => posts.map((post) => [post.serialNumber, post.stage, post.points]);
    expect(sweeps(first.taken)).toEqual(sweeps(second.taken));
  });

  it('takes units from board to final, never before the board test was over', async () => {
    const hub = aHub();
    await run({ count: 80 }, hub.send);
    const finals = hub.taken.filter((post) => post.stage === 'final' && post.runKind === 'production');
    expect(finals.length).toBeGreaterThan(10);
    for (const final of finals) {
      const board = hub.taken.find(
        (post) => post.stage === 'board' && post.serialNumber === final.serialNumber,
      );
      expect(Date.parse(board?.finishedAt ?? '')).toBeLessThanOrEqual(Date.parse(final.startedAt));
    }
  });

  it('tests a failed unit again with other readings', async () => {
    const hub = aHub();
    await run({ count: 400 }, hub.send);
    const failed = hub.taken.find((post) => post.stationVerdict === 'fail');
    const tries = hub.taken.filter(
      (post) => post.serialNumber === failed?.serialNumber && post.stage === failed.stage,
    );
    expect(tries.length).toBeGreaterThan(1);
    expect(tries[0]?.resultId).not.toBe(tries[1]?.resultId);
  });

  it('loses nothing when the hub is away for a while, and routes by its own verdict meanwhile', async () => {
    const hub = aHub((_post, number) =>
      number < 15 ? { kind: 'tryAgain', reason: '503', retryAfterMs: null } : null,
    );
    const { waiting, spool } = aSpool();
    const tally = await run({ count: 40 }, hub.send, spool);
    expect(tally).toMatchObject({ tested: 40, accepted: 40, waiting: 0 });
    expect(hub.taken.some((post) => post.routedOn === 'station')).toBe(true);
    expect(waiting.size).toBe(0);
  });

  it('keeps what it could not send in the spool', async () => {
    const { waiting, spool } = aSpool();
    const down: PostResult = () => Promise.resolve({ kind: 'tryAgain', reason: 'down', retryAfterMs: null });
    const tally = await run({ count: 10 }, down, spool);
    expect(tally).toMatchObject({ tested: 10, accepted: 0, waiting: 10 });
    expect(waiting.size).toBe(10);
  });

  it('ends soon when it is stopped, with everything kept', async () => {
    const stop = new AbortController();
    const { waiting, spool } = aSpool();
    const down: PostResult = () => {
      stop.abort();
      return Promise.resolve({ kind: 'tryAgain', reason: 'down', retryAfterMs: null });
    };
    const tally = await run({ count: 0, stop: stop.signal }, down, spool);
    expect(tally.tested).toBeLessThan(3);
    expect(waiting.size).toBe(tally.tested);
  });

  it('sends first what an earlier run left behind', async () => {
    const hub = aHub();
    const leftOver = { station: 'north-2', post: aPost({ resultId: 'left-over' }) };
    const tally = await run({ count: 5 }, hub.send, aSpool([leftOver]).spool);
    expect(tally).toMatchObject({ replayed: 1, tested: 5, accepted: 6 });
    expect(hub.taken[0]?.resultId).toBe('left-over');
  });

  it('stops when a key is not let in, and keeps the results', async () => {
    const { waiting, spool } = aSpool();
    const locked: PostResult = () =>
      Promise.resolve({ kind: 'blocked', status: 401, reason: '401 Unknown key' });
    const tally = await run({ count: 50 }, locked, spool);
    expect(tally.blocked).toBe('401 Unknown key');
    expect(tally.tested).toBeLessThan(5);
    expect(waiting.size).toBe(tally.tested);
  });

  it('posts exactly one failing unit for one-fail', async () => {
    const hub = aHub();
    const tally = await run({ scenario: 'one-fail', count: 100 }, hub.send);
    expect(tally).toMatchObject({ tested: 1, accepted: 1, verdicts: { fail: 1 } });
    expect(hub.taken).toHaveLength(1);
  });

  describe('with an outage', () => {
    it('loses nothing: what waited arrives late, out of order, and units went on meanwhile', async () => {
      const hub = aHub();
      const { waiting, spool } = aSpool();
      const tally = await run({ scenario: 'outage', count: 100 }, hub.send, spool);
      expect(tally).toMatchObject({ tested: 100, accepted: 100, waiting: 0 });
      expect(new Set(hub.taken.map((post) => post.resultId)).size).toBe(100);
      expect(waiting.size).toBe(0);

      const late = hub.taken.filter(
        (post) => Date.parse(post.sentAt ?? '') - Date.parse(post.finishedAt ?? '') > 1000,
      );
      expect(late.length).toBeGreaterThan(30);
      const starts = late.map((post) => post.startedAt);
      expect(starts).not.toEqual([...starts].sort());
      expect(late.some((post) => post.routedOn === 'station')).toBe(true);
    });

    it('leaves what still waits in the spool when it is stopped', async () => {
      const stop = new AbortController();
      const { waiting, spool } = aSpool();
      const tested: SpooledPost[] = [];
      const stopping: Spool = {
        ...spool,
        add: async (spooled) => {
          await spool.add(spooled);
          if (tested.push(spooled) === 30) stop.abort();
        },
      };
      const tally = await run({ scenario: 'outage', count: 100, stop: stop.signal }, aHub().send, stopping);
      expect(tally.waiting).toBe(10);
      expect([...waiting.values()]).toEqual(tested.slice(-10));
    });
  });
});
