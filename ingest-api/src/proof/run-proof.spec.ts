import { readdirSync } from 'node:fs';
import { join } from 'node:path';
import { runProof, PROOFS } from './run-proof.js';
import { proof } from './proof.types.js';

const rows = runProof();

describe('the proof of the computations', () => {
  it.each(rows.map((row) => [row.caseId, row.quantity, row.published, row.computed, row] as const))(
    '%s: %s %s, computed %s',
    (_, __, ___, ____, row) => {
      expect(row).toMatchObject({ ok: true });
    },
  );

  it('covers every case file, each figure at least once', () => {
    const proven = new Set(rows.map(({ caseId }) => caseId));
    const files = readdirSync(join(__dirname, 'cases')).map((file) => file.replace(/\.json$/, ''));
    expect([...proven].sort()).toEqual(files.sort());
    const figures = PROOFS.reduce((sum, { proofCase }) => sum + proofCase.figures.length, 0);
    expect(rows.length).toBeGreaterThanOrEqual(figures);
  });

  it('requires digits of every row', () => {
    expect(rows.filter((row) => row.requiredDigits < 1)).toEqual([]);
  });

  it('takes a wrong result for a shortfall', () => {
    const [first] = PROOFS;
    const wrong = proof(first!.proofCase, () => scaled(first!.compute(), 1 + 1e-6));
    expect(
      runProof([wrong])
        .filter(({ ok }) => ok)
        .map(({ quantity }) => quantity),
    ).toEqual([]);
  });

  it('refuses a case with a figure that nothing computes', () => {
    const [first] = PROOFS;
    expect(() => runProof([proof(first!.proofCase, () => ({}))])).toThrow('which is not computed');
  });
});

function scaled(computed: ReturnType<(typeof PROOFS)[number]['compute']>, factor: number): typeof computed {
  if (typeof computed === 'number') return computed * factor;
  return Object.fromEntries(
    Object.entries(computed).map(([name, part]) => [name, scaled(part as typeof computed, factor)]),
  );
}
