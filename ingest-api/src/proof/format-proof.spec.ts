import { formatProof } from './format-proof.js';
import type { ProofRow } from './proof.types.js';

const aRow = (overrides: Partial<ProofRow> = {}): ProofRow => ({
  caseId: 'reg-nist-norris',
  title: 'StRD linear regression: Norris',
  source: 'NIST StRD',
  status: 'source read',
  quantity: 'estimate.B1',
  published: '1.00211681802045',
  computed: '1.00211681802045',
  agreeingDigits: 14,
  requiredDigits: 11,
  ok: true,
  ...overrides,
});

describe('the proof as text', () => {
  it('heads each case with its title and source once', () => {
    const lines = formatProof([aRow(), aRow({ quantity: 'estimate.B0' })]).split('\n');
    expect(lines.filter((line) => line.includes('NIST StRD'))).toHaveLength(1);
    expect(lines[0]).toBe('reg-nist-norris: StRD linear regression: Norris');
    expect(lines.at(-1)).toBe(
      '1 cases, 2 figures (2 source read, 0 from memory, 0 derived): 2 agree, 0 fall short',
    );
  });

  it('shows published and computed value with the digits that agree', () => {
    expect(formatProof([aRow()])).toMatch(
      /estimate\.B1 +source read +1\.00211681802045 +1\.00211681802045 +14 of 11\n/,
    );
  });

  it('marks a row that falls short and names it again at the end', () => {
    const text = formatProof([aRow(), aRow({ quantity: 'se.B1', agreeingDigits: 9, ok: false })]);
    expect(text).toMatch(/se\.B1.* 9 of 11 +FALLS SHORT/);
    expect(text.split('\n').at(-1)).toBe('  falls short: reg-nist-norris, se.B1');
  });
});
