import type { Proof, ProofRow } from '@/types/api';

export interface ProofCase {
  caseId: string;
  title: string;
  source: string;
  status: ProofRow['status'];
  rows: ProofRow[];
  shortfalls: number;
}

/** The rows by their case. Cases that fall short come first, and in them the rows that do; else the server's order. */
export function proofCases(rows: readonly ProofRow[]): ProofCase[] {
  const byId = new Map<string, ProofCase>();
  for (const row of rows) {
    const { caseId, title, source, status } = row;
    const known = byId.get(caseId) ?? { caseId, title, source, status, rows: [], shortfalls: 0 };
    known.rows.push(row);
    known.shortfalls += row.ok ? 0 : 1;
    byId.set(caseId, known);
  }
  return [...byId.values()]
    .map((one) => ({ ...one, rows: one.rows.toSorted((a, b) => Number(a.ok) - Number(b.ok)) }))
    .sort((a, b) => Number(b.shortfalls > 0) - Number(a.shortfalls > 0));
}

const figures = (count: number): string => `${count} ${count === 1 ? 'figure' : 'figures'}`;

/** What it comes to, as one sentence. */
export function proofSummary({ passed, failed }: Proof, cases: number): string {
  const of = `${cases} ${cases === 1 ? 'case' : 'cases'}`;
  if (failed === 0) {
    return passed === 1
      ? 'The one figure agrees to the digits required.'
      : `All ${figures(passed)} of ${of} agree to the digits required.`;
  }
  return `${figures(failed)} of ${passed + failed} ${failed === 1 ? 'falls' : 'fall'} short of the digits required.`;
}
