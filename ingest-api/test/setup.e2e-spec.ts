import { InvalidError } from '../src/common/errors.js';
import type { SiteDescription } from '../src/site-setup/site-description.js';
import { SiteSetupService } from '../src/site-setup/site-setup.service.js';
import { aProduct, aResult } from './builders.js';
import { createTestApp, startOfTest, type TestApp } from './create-test-app.js';

describe('setting up a site', () => {
  let test: TestApp;
  beforeEach(async () => {
    test = await createTestApp();
  });
  afterEach(() => test.close());
  const apply = (site: SiteDescription) =>
    test.app.get(SiteSetupService, { strict: false }).apply(site, 'setup');
  const products = async () => (await (await test.as('viewer')).get('/api/v1/products').expect(200)).body;

  it('adds products with plans and released limits, and stations with instruments, ready for the first post', async () => {
    const report = await apply({
      products: [aProduct({ partNumber: 'FH-T250-C' })],
      stations: [
        {
          station: 'south-1',
          line: 'south',
          instruments: [{ kind: 'ammeter', serialNumber: 'AM-0100', readingAccuracyPercent: 0.01 }],
        },
      ],
    });
    expect(report.filter((line) => !line.startsWith('warning'))).toEqual([
      'product FH-T250-C: added with 2 stage(s), limit set 1 released',
      'station south-1: added with 1 instrument(s)',
    ]);
    const added = (await products()).find(
      ({ partNumber }: { partNumber: string }) => partNumber === 'FH-T250-C',
    );
    expect(added.stages[0]).toMatchObject({
      stage: 'board',
      position: 1,
      testPlan: { version: 1, referenceVolts: 4, dwellMs: 0, repeatFirst: false, upAndDown: false },
      limitSet: { version: 1, releasedBy: 'setup', releasedAt: new Date(startOfTest).toISOString() },
    });
    const post = aResult({
      partNumber: 'FH-T250-C',
      ammeter: { serialNumber: 'AM-0100', resolutionAmps: 1e-8 },
    });
    const { body } = await test.post(post, await test.keyFor('south-1')).expect(201);
    expect(body).toMatchObject({ verdict: 'pass', limitSetVersion: 1 });
    const audit = await (await test.as('administrator')).get('/api/v1/audit').expect(200);
    expect(
      audit.body.items.map(({ action, subject }: Record<string, string>) => `${action} ${subject}`),
    ).toEqual(expect.arrayContaining(['product.created FH-T250-C', 'station.created south-1']));
  });

  it('leaves alone what exists, and says so', async () => {
    const before = await products();
    const report = await apply({
      products: [aProduct({ nominalAmps: 1, stages: [aProduct().stages[0]!] })],
      stations: [
        { station: 'north-1', line: 'elsewhere' },
        { station: 'north-9', line: 'north', instruments: [{ kind: 'ammeter', serialNumber: 'AM-0031' }] },
      ],
    });
    expect(report.filter((line) => !line.startsWith('warning'))).toEqual([
      'product FH-R500-W: exists, left as it is',
      'station north-1: exists, left as it is',
      'station north-9: added with 0 instrument(s); ammeter AM-0031 exists, left where it is',
    ]);
    expect(await products()).toEqual(before);
    const stations = await (await test.as('viewer')).get('/api/v1/stations').expect(200);
    expect(stations.body[0].instruments).toHaveLength(2);
  });

  it('adds nothing of a file that holds one fault', async () => {
    const site: SiteDescription = {
      products: [aProduct({ partNumber: 'GOOD' }), aProduct({ partNumber: 'BAD', complianceHighVolts: -1 })],
      stations: [{ station: 'south-1', line: 'south' }],
    };
    await expect(apply(site)).rejects.toThrow(InvalidError);
    expect((await products()).map(({ partNumber }: { partNumber: string }) => partNumber)).toEqual([
      'FH-R500-W',
    ]);
  });

  it('puts limits into force when the file says', async () => {
    const [board] = aProduct().stages;
    await apply({
      products: [
        aProduct({ partNumber: 'NEW', stages: [{ ...board!, effectiveAt: '2026-12-01T00:00:00Z' }] }),
      ],
      stations: [],
    });
    const now = await test.post(aResult({ partNumber: 'NEW', serialNumber: 'A' })).expect(201);
    expect(now.body).toMatchObject({ verdict: 'unjudged', limitSetVersion: null });
    test.clock.now = Date.parse('2026-12-01T00:00:01Z');
    const later = await test
      .post(aResult({ partNumber: 'NEW', serialNumber: 'A', startedAt: '2026-12-01T00:00:00.000Z' }))
      .expect(201);
    expect(later.body).toMatchObject({ verdict: 'pass', limitSetVersion: 1, attempt: 1 });
  });
});
