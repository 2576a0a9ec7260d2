import type { ProofDto } from '../src/proof/dto/proof.dto.js';
import { runProof } from '../src/proof/run-proof.js';
import { createTestApp, type TestApp } from './create-test-app.js';

describe('proof of the computations', () => {
  let test: TestApp;
  beforeAll(async () => {
    test = await createTestApp();
  });
  afterAll(() => test.close());

  const ask = async (): Promise<ProofDto> => {
    const person = await test.as('qualityLead');
    const { body } = await person.get('/api/v1/proof').expect(200);
    return body as ProofDto;
  };

  it('recomputes every case in a worker and finds no shortfall', async () => {
    const proof = await ask();
    expect(proof.rows).toEqual(runProof());
    expect(proof).toMatchObject({ passed: proof.rows.length, failed: 0 });
  });

  it('says when it was computed, and by which version', async () => {
    expect(await ask()).toMatchObject({ computedAt: '2026-11-30T12:00:00.000Z', version: '0.1.0' });
  });

  it('answers people who ask at the same time', async () => {
    const proofs = await Promise.all([ask(), ask(), ask()]);
    expect(new Set(proofs.map(({ passed }) => passed)).size).toBe(1);
  });
});
