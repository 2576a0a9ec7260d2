import type { ProofRow } from '@/types/api';
import type { ProofCase } from '../proof-cases';
import { ProofMark } from './proof-mark';
import styles from './proof-table.module.css';

const MOST_DIGITS = 15;

/** Every figure of every case: what was published, what this server computed just now, how far they agree. */
export function ProofTable({ cases }: { cases: ProofCase[] }) {
  return (
    <div className={styles.frame} role="region" aria-label="Published and computed figures" tabIndex={0}>
      <table className={styles.table}>
        <caption className="visually-hidden">Published and computed figures, case by case</caption>
        <thead>
          <tr>
            <th scope="col">Figure</th>
            <th scope="col">Published</th>
            <th scope="col">Computed</th>
            <th scope="col" className={styles.end}>
              Digits agreeing
            </th>
            <th scope="col" className={styles.end}>
              Required
            </th>
            <th scope="col">Result</th>
          </tr>
        </thead>
        {cases.map((one) => (
          <tbody key={one.caseId}>
            <CaseHead proofCase={one} />
            {one.rows.map((row, place) => (
              <FigureRow key={`${row.quantity} ${place}`} row={row} />
            ))}
          </tbody>
        ))}
      </table>
    </div>
  );
}

function CaseHead({ proofCase: { caseId, title, source, status } }: { proofCase: ProofCase }) {
  return (
    <tr className={styles.case}>
      <th scope="rowgroup" colSpan={6}>
        <span className={styles.title}>{title}</span> <code>{caseId}</code>
        <span className={styles.source}>
          {source} ({status})
        </span>
      </th>
    </tr>
  );
}

function FigureRow({ row }: { row: ProofRow }) {
  const agreeing =
    row.agreeingDigits >= MOST_DIGITS ? 'all 15' : String(Math.floor(row.agreeingDigits * 10) / 10);
  return (
    <tr className={row.ok ? undefined : styles.shortRow}>
      <th scope="row" className={styles.quantity}>
        {row.quantity}
      </th>
      <td className={styles.figure}>{row.published}</td>
      <td className={styles.figure}>{row.computed}</td>
      <td className={`figures ${styles.end}`}>{agreeing}</td>
      <td className={`figures ${styles.end}`}>{row.requiredDigits}</td>
      <td>
        <ProofMark isOk={row.ok} />
      </td>
    </tr>
  );
}
