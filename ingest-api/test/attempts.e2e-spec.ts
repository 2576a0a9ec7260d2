import type TestAgent from 'supertest/lib/agent.js';
import type { PostedResult } from '../src/results/result.types.js';
import type { UnitDto, UnitItemDto } from '../src/units/dto/unit.dto.js';
import { Writer } from '../src/database/writer.js';
import { aFailingResult, aResult, sweepOf } from './builders.js';
import { createTestApp, startOfTest, type TestApp } from './create-test-app.js';

const minute = 60_000;
const iso = (time: number): string => new Date(time).toISOString();
const unclear: Partial<PostedResult> = { ammeter: { resolutionAmps: 1e-5 }, points: sweepOf(1e12) };
describe('attempts', () => {
  let test: TestApp;
  let viewer: TestAgent;
  beforeAll(async () => {
    test = await createTestApp();
    viewer = await test.as('viewer');
  });
  afterAll(() => test.close());

  const unitOf = async (serialNumber: string): Promise<UnitDto> =>
    (await viewer.get(`/api/v1/units/FH-R500-W/${serialNumber}`).expect(200)).body;
  const itemOf = async (serialNumber: string): Promise<UnitItemDto> =>
    (await viewer.get(`/api/v1/units?search=${serialNumber}`).expect(200)).body.items[0];
  const attemptsOf = async (serialNumber: string): Promise<(number | null)[]> =>
    (await unitOf(serialNumber)).stages[0]!.results.map(({ attempt }) => attempt);
  const at = (minutes: number): Partial<PostedResult> => ({
    startedAt: iso(startOfTest - 600 * minute + minutes * minute),
  });

  it('are counted, and what is left is told until the unit goes to repair', async () => {
    const unit = { serialNumber: 'U-1' };
    const answers = [];
    for (const post of [
      aFailingResult({ ...unit, ...at(1) }),
      aResult({ ...unit, ...unclear, ...at(2) }),
      aFailingResult({ ...unit, ...at(3) }),
      aFailingResult({ ...unit, ...at(4) }),
    ]) {
      answers.push((await test.post(post).expect(201)).body);
    }
    expect(
      answers.map(({ attempt, attemptsLeft, disposition }) => [attempt, attemptsLeft, disposition]),
    ).toEqual([
      [1, 2, 'retest'],
      [2, 1, 'retestElsewhere'],
      [3, 0, 'repair'],
      [4, 0, 'repair'],
    ]);
  });

  it('of the next stage ask whether the latest of the prior stage passed', async () => {
    const unit = { serialNumber: 'U-2' };
    const final = async (minutes: number) =>
      (await test.post(aResult({ ...unit, stage: 'final', ...at(minutes) })).expect(201)).body;
    expect(await final(1)).toMatchObject({ priorStagePassed: false, disposition: 'stop', nextStage: null });
    await test.post(aFailingResult({ ...unit, ...at(2) })).expect(201);
    expect(await final(3)).toMatchObject({ priorStagePassed: false, disposition: 'stop' });
    const passed = await test.post(aResult({ ...unit, ...at(4) })).expect(201);
    expect(passed.body).toMatchObject({
      priorStagePassed: null,
      disposition: 'next',
      nextStage: 'final',
      attempt: 2,
    });
    expect(await final(5)).toMatchObject({
      priorStagePassed: true,
      disposition: 'next',
      nextStage: null,
      attempt: 3,
    });
    await test.post(aFailingResult({ ...unit, ...at(3.5) })).expect(201);
    expect(await final(6)).toMatchObject({ priorStagePassed: true });
  });

  it('are numbered anew when a late result arrives, whose own answer counts it in its place', async () => {
    const unit = { serialNumber: 'U-3' };
    await test.post(aFailingResult({ ...unit, ...at(10) })).expect(201);
    await test.post(aResult({ ...unit, ...at(20) })).expect(201);
    const late = await test.post(aFailingResult({ ...unit, ...at(5) })).expect(201);
    expect(late.body).toMatchObject({ attempt: 1, attemptsLeft: 0 });
    const { stages } = await unitOf('U-3');
    expect(stages[0]).toMatchObject({ verdict: 'pass' });
    expect(stages[0]!.results.map(({ attempt, verdict }) => [attempt, verdict])).toEqual([
      [1, 'fail'],
      [2, 'fail'],
      [3, 'pass'],
    ]);
    expect(await itemOf('U-3')).toMatchObject({
      latest: { attempt: 3 },
      stages: [{ attempts: 3, verdict: 'pass' }, {}],
    });
  });

  it('that started together are told apart by their end, then by their id; one without end comes first', async () => {
    const unit = { serialNumber: 'U-4', ...at(1) };
    const ends = ['1969-12-31T23:59:59.000Z', iso(startOfTest), iso(startOfTest), undefined];
    const posts = ends.map((finishedAt, i) =>
      aResult({ ...unit, finishedAt, resultId: `00000000-0000-4000-8000-00000000000${9 - i}` }),
    );
    for (const post of posts) await test.post(post).expect(201);
    const { stages } = await unitOf('U-4');
    expect(stages[0]!.results.map(({ resultId }) => resultId.at(-1))).toEqual(['6', '9', '7', '8']);
    expect(await attemptsOf('U-4')).toEqual([1, 2, 3, 4]);
  });

  it('are those of one unit, not of its namesake of another spelling', async () => {
    for (const serialNumber of ['u-5', 'U-5', 'U-5\u0301', 'Ú-5']) {
      const { body } = await test.post(aResult({ serialNumber })).expect(201);
      expect([serialNumber, body.attempt]).toEqual([serialNumber, 1]);
    }
  });

  it('leave a unit without a lot alone when a lot is called null', async () => {
    const writer = test.app.get(Writer);
    let goOn = (): void => undefined;
    let held: Promise<void> = Promise.resolve();
    await new Promise<void>((begun) => {
      held = writer.run(() => {
        begun();
        return new Promise<void>((resolve) => (goOn = resolve));
      });
    });
    const posts = Promise.all([
      test.post(aResult({ serialNumber: 'U-6', lot: 'null' })).expect(201),
      test.post(aResult({ serialNumber: 'U-7', lot: undefined })).expect(201),
    ]);
    // Both wait, so both are stored by the same statements.
    const { queue } = writer as unknown as { queue: unknown[] };
    while (queue.length < 2) await new Promise((resolve) => setImmediate(resolve));
    goOn();
    await Promise.all([held, posts]);
    expect((await unitOf('U-6')).lot).toBe('null');
    expect((await unitOf('U-7')).lot).toBeNull();
  });
});
