import type { ProofRow } from './proof.types.js';

const COLUMNS: readonly { heading: string; width: number; of: (row: ProofRow) => string }[] = [
  { heading: 'quantity', width: 52, of: (row) => row.quantity },
  { heading: 'status', width: 11, of: (row) => row.status },
  { heading: 'published', width: 22, of: (row) => row.published },
  { heading: 'computed', width: 22, of: (row) => row.computed },
  { heading: 'digits', width: 8, of: (row) => `${row.agreeingDigits} of ${row.requiredDigits}` },
];

/**
 * The proof as text for a terminal or a file: one table a case under its title and source, then a summary line.
 *
 * Rows that fall short are marked, and listed again at the end.
 */
export function formatProof(rows: readonly ProofRow[]): string {
  const lines: string[] = [];
  let caseId = '';
  for (const row of rows) {
    if (row.caseId !== caseId) {
      caseId = row.caseId;
      lines.push('', `${caseId}: ${row.title}`, `  ${row.source}`, `  ${heading()}`);
    }
    lines.push(formatRow(row));
  }
  return [...lines, '', ...summary(rows)].join('\n').trimStart();
}

function heading(): string {
  return COLUMNS.map((column) => column.heading.padEnd(column.width))
    .join('  ')
    .trimEnd();
}

function formatRow(row: ProofRow): string {
  const cells = COLUMNS.map(({ width, of }) => of(row).padEnd(width)).join('  ');
  return `  ${cells}${row.ok ? '' : '  FALLS SHORT'}`.trimEnd();
}

function summary(rows: readonly ProofRow[]): string[] {
  const short = rows.filter(({ ok }) => !ok);
  const cases = new Set(rows.map(({ caseId }) => caseId)).size;
  const counts = (['source read', 'from memory', 'derived'] as const)
    .map((status) => `${rows.filter((row) => row.status === status).length} ${status}`)
    .join(', ');
  return [
    `${cases} cases, ${rows.length} figures (${counts}): ${rows.length - short.length} agree, ${short.length} fall short`,
    ...short.map((row) => `  falls short: ${row.caseId}, ${row.quantity}`),
  ];
}
