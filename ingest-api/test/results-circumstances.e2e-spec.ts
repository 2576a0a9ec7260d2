import { randomUUID } from 'node:crypto';
import { CatalogueService } from '../src/products/catalogue.service.js';
import { LimitSet } from '../src/products/models/limit-set.model.js';
import type { PostedResult } from '../src/results/result.types.js';
import { Writer } from '../src/database/writer.js';
import { aFailingResult, aResult, sweepOf } from './builders.js';
import { createTestApp, startOfTest, type TestApp } from './create-test-app.js';

const hour = 3_600_000;
const iso = (time: number): string => new Date(time).toISOString();

describe('a result that is odd but can be stored', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await createTestApp();
  });
  afterAll(() => test.close());
  const flagsOf = async (overrides: Partial<PostedResult>): Promise<string[]> =>
    (await test.post(aResult({ serialNumber: randomUUID(), ...overrides })).expect(201)).body.flags;

  it.each<[flag: string, overrides: Partial<PostedResult>, near: Partial<PostedResult>]>([
    ['loadAboveSupply', { supplyVolts: 7 }, { supplyVolts: 8 }],
    [
      'finishedBeforeStarted',
      { finishedAt: '2026-11-30T08:15:30.119Z' },
      { finishedAt: '2026-11-30T08:15:30.120Z' },
    ],
    ['clockSkew', { sentAt: iso(startOfTest - 30_001) }, { sentAt: iso(startOfTest - 30_000) }],
    ['clockSkew', { sentAt: iso(startOfTest + 30_001) }, { sentAt: iso(startOfTest + 30_000) }],
    ['planOutdated', { testPlanVersion: 7 }, { testPlanVersion: 1 }],
    ['verdictMismatch', { stationVerdict: 'fail' }, { stationVerdict: 'pass' }],
    [
      'verdictMismatch',
      { points: sweepOf(1e6), stationVerdict: 'pass' },
      { points: sweepOf(1e6), stationVerdict: 'fail' },
    ],
    [
      'instrumentMismatch',
      { ammeter: { serialNumber: 'AM-0031', readingAccuracyPercent: 0.5 } },
      { ammeter: { serialNumber: 'AM-9', readingAccuracyPercent: 0.5 } },
    ],
    ['resolutionAssumed', { ammeter: { rangeAmps: 0.001 } }, { ammeter: { resolutionAmps: 1e-9 } }],
  ])('is flagged %s, and not when it is just within', async (flag, odd, near) => {
    expect(await flagsOf(odd)).toContain(flag);
    expect(await flagsOf(near)).not.toContain(flag);
  });

  it('warns of an overdue calibration, an owed golden check, an old plan and a wrong clock', async () => {
    const { body } = await test
      .post(aResult({ serialNumber: 'WARN', testPlanVersion: 9, sentAt: iso(startOfTest - hour) }))
      .expect(201);
    const codes = body.warnings.map((warning: { code: string }) => warning.code).sort();
    expect(codes).toEqual(['calibrationOverdue', 'clockSuspect', 'goldenDue', 'planOutdated']);
    expect(body.verdict).toBe('pass');
  });

  it('is told when its meter range is too coarse to prove the limit', async () => {
    const coarse = { serialNumber: 'COARSE', ammeter: { rangeAmps: 0.01, resolutionAmps: 1e-5 } };
    const points = sweepOf(1e12, 0.0005);
    const { body } = await test.post(aResult({ ...coarse, points })).expect(201);
    expect(body).toMatchObject({ verdict: 'notProven', disposition: 'retestElsewhere' });
    expect(body.warnings.map((warning: { code: string }) => warning.code)).toContain('rangeTooCoarse');
    const impedance = body.measures.find((measure: { name: string }) => measure.name === 'outputImpedance');
    expect(impedance).toMatchObject({ bound: 'atLeast', expandedUncertainty: null, high: null });
    expect(impedance.value).toBeLessThan(1e12);
  });

  it('takes overload codes as overload, never as current', async () => {
    const points = aResult().points.map((point, index) =>
      index === 7 ? { ...point, outputAmps: 9.9e37 } : point,
    );
    const { body } = await test.post(aResult({ serialNumber: 'OVER', points })).expect(201);
    expect(body.flags).toContain('overload');
    const viewer = await test.as('viewer');
    const detail = await viewer.get(body.links.self).expect(200);
    expect(detail.body.sweep.points[7]).toMatchObject({ overload: true, inFit: false, deviationPpm: null });
    expect(detail.body.sweep.points[6]).toMatchObject({ overload: false, inFit: true });
    for (const { value } of detail.body.measures) expect(Math.abs(value ?? 0)).toBeLessThan(1e30);
  });

  it('may have no point at all when the run was stopped or aborted', async () => {
    const stopped = await test
      .post(aResult({ serialNumber: 'DEAD', outcome: 'stoppedOnFail', points: [], stationVerdict: 'fail' }))
      .expect(201);
    expect(stopped.body).toMatchObject({
      verdict: 'fail',
      attempt: 1,
      attemptsLeft: 2,
      disposition: 'retest',
    });
    const aborted = await test
      .post(aResult({ serialNumber: 'DEAD', outcome: 'aborted', abortReason: 'door opened', points: [] }))
      .expect(201);
    expect(aborted.body).toMatchObject({
      verdict: 'aborted',
      attempt: null,
      attemptsLeft: 2,
      disposition: 'retest',
    });
  });

  it('of a dead, a shorted or an open unit is a fail, not an error', async () => {
    const all = (amps: number) => aResult().points.map((point) => ({ ...point, outputAmps: amps }));
    for (const [serialNumber, points] of [
      ['DEAD-0', all(0)],
      ['SHORT-1', all(0.4)],
      ['BACKWARDS', all(-0.0005)],
    ] as const) {
      const { body } = await test.post(aResult({ serialNumber, points })).expect(201);
      expect([serialNumber, body.verdict]).toEqual([serialNumber, 'fail']);
      expect(body.failedMeasures).toContain('setpointError');
    }
  });

  it('measured before the first limits is unjudged and waits', async () => {
    const { body } = await test
      .post(aResult({ serialNumber: 'EARLY', startedAt: '2025-12-31T23:59:59.999Z' }))
      .expect(201);
    expect(body).toMatchObject({
      verdict: 'unjudged',
      attempt: null,
      limitSetVersion: null,
      disposition: 'hold',
    });
  });

  it('is judged by the limits in force when it was measured, and says when newer ones came since', async () => {
    const catalogue = test.app.get(CatalogueService, { strict: false });
    const { stageId, limitSets } = catalogue.find('FH-R500-W')!.stages[1]!;
    const stricter = limitSets[0]!.limits.map((limit) =>
      limit.measure === 'outputImpedance' ? { ...limit, lower: 50e6 } : limit,
    );
    await test.app.get(Writer).run((transaction) =>
      LimitSet.create(
        {
          stageId,
          version: 2,
          limits: stricter,
          releasedBy: 'test',
          releasedAt: startOfTest - hour,
          effectiveAt: startOfTest - hour,
        },
        { transaction },
      ),
    );
    await catalogue.reload();
    const at = (startedAt: number) =>
      test.post(aResult({ serialNumber: 'LIMITS', stage: 'final', startedAt: iso(startedAt) })).expect(201);
    const before = await at(startOfTest - hour - 1);
    expect(before.body).toMatchObject({ verdict: 'pass', limitSetVersion: 1 });
    expect(before.body.flags).toContain('supersededLimits');
    const after = await at(startOfTest - hour);
    expect(after.body).toMatchObject({
      verdict: 'fail',
      limitSetVersion: 2,
      failedMeasures: ['outputImpedance'],
    });
    expect(after.body.flags).not.toContain('supersededLimits');
  });
});

describe('a result that does not count', () => {
  let test: TestApp;
  let practiceKey: string;
  beforeAll(async () => {
    test = await createTestApp();
    practiceKey = await test.keyFor('north-1', { practice: true });
  });
  afterAll(() => test.close());

  const yieldsToday = async () => {
    const viewer = await test.as('viewer');
    const { body } = await viewer.get('/api/v1/today').expect(200);
    return body.products[0].stages[0].firstPass.total;
  };
  const breaches = async () => {
    const viewer = await test.as('viewer');
    return (await viewer.get('/api/v1/breaches').expect(200)).body.items.length;
  };

  it.each<[string, Partial<PostedResult>, string]>([
    ['a golden unit', { runKind: 'golden', serialNumber: 'GOLD-1' }, 'golden'],
    ['a golden unit posted as production', { serialNumber: 'GOLD-1' }, 'golden'],
    ['a study', { runKind: 'study', study: { id: 'g1', trial: 1 } }, 'study'],
    ['practice', { runKind: 'practice' }, 'practice'],
  ])('%s is judged and shown, without number, yield or breach', async (_, overrides, runKind) => {
    const before = [await yieldsToday(), await breaches()];
    const { body } = await test
      .post(aFailingResult({ serialNumber: `K-${runKind}`, ...overrides }))
      .expect(201);
    expect(body).toMatchObject({ verdict: 'fail', attempt: null, attemptsLeft: null });
    expect(body.flags.includes('goldenPostedAsProduction')).toBe(
      overrides.serialNumber === 'GOLD-1' && !overrides.runKind,
    );
    const viewer = await test.as('viewer');
    const { body: detail } = await viewer.get(body.links.self).expect(200);
    expect(detail.runKind).toBe(runKind);
    expect([await yieldsToday(), await breaches()]).toEqual(before);
  });

  it.each<[string, Partial<PostedResult>]>([
    ['production', {}],
    ['golden', { runKind: 'golden', serialNumber: 'GOLD-1' }],
    ['study', { runKind: 'study', study: { id: 'g1', trial: 1 } }],
  ])('whatever a practice key posts is practice, %s too', async (_, overrides) => {
    const before = [await yieldsToday(), await breaches()];
    const { body } = await test
      .post(aFailingResult({ serialNumber: 'P-1', ...overrides }), practiceKey)
      .expect(201);
    expect(body.attempt).toBeNull();
    const viewer = await test.as('viewer');
    expect((await viewer.get(body.links.self).expect(200)).body.runKind).toBe('practice');
    expect([await yieldsToday(), await breaches()]).toEqual(before);
  });

  it('a failing golden unit stops the station; a passing one settles the check that was owed', async () => {
    const golden = {
      runKind: 'golden',
      serialNumber: 'GOLD-1',
      startedAt: iso(startOfTest - 60_000),
    } as const;
    const failed = await test.post(aFailingResult(golden)).expect(201);
    expect(failed.body.disposition).toBe('stop');
    const passed = await test.post(aResult(golden)).expect(201);
    expect(passed.body.disposition).toBe('next');
    const next = await test.post(aResult({ serialNumber: 'AFTER' })).expect(201);
    const codes = next.body.warnings.map((warning: { code: string }) => warning.code);
    expect(codes).not.toContain('goldenDue');
  });
});
