import type { ReactNode } from 'react';
import styles from './data-table.module.css';

export interface DataColumn<Row> {
  key: string;
  head: ReactNode;
  /** The head as text beside the stacked cell, where `head` is more than text. */
  headText?: string;
  cell: (row: Row) => ReactNode;
  align?: 'start' | 'end';
  /** The cell that names the row: a row header, first line of the stacked form on a phone. */
  isRowHead?: boolean;
  /** Takes no more room than it needs. */
  isTight?: boolean;
  /** Needs no head beside it where a phone stacks the row: a mark, a name, a clock time. */
  isSelfExplaining?: boolean;
}

export interface DataTableProps<Row> {
  /** Says what the table holds; hidden, but read out. */
  caption: string;
  columns: DataColumn<Row>[];
  rows: Row[];
  rowKey: (row: Row) => string;
  /** On phones: `stack` lets the cells of a row flow behind its name, each with its head, `scroll` moves sideways. */
  narrow?: 'stack' | 'scroll';
  /** Marks one row as the chosen one. */
  currentKey?: string | null;
}

/** A ruled table. Order and paging belong to the page; wide tables stack or scroll on a phone. */
export function DataTable<Row>({
  caption,
  columns,
  rows,
  rowKey,
  narrow = 'stack',
  currentKey,
}: DataTableProps<Row>) {
  const scroll = narrow === 'scroll' ? { tabIndex: 0, role: 'region', 'aria-label': caption } : {};
  return (
    <div className={styles.frame} {...scroll}>
      <table className={`${styles.table} ${narrow === 'stack' ? styles.stack : ''}`}>
        <caption className="visually-hidden">{caption}</caption>
        <thead>
          <tr>
            {columns.map((column) => (
              <th key={column.key} scope="col" className={cellClass(column)}>
                {column.head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)} aria-current={currentKey === rowKey(row) ? 'true' : undefined}>
              {columns.map((column) => (
                <Cell key={column.key} column={column} row={row} />
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function Cell<Row>({ column, row }: { column: DataColumn<Row>; row: Row }) {
  const label = column.isSelfExplaining ? undefined : headText(column);
  return column.isRowHead ? (
    <th scope="row" className={cellClass(column)}>
      {column.cell(row)}
    </th>
  ) : (
    <td className={cellClass(column)} data-label={label}>
      {column.cell(row)}
    </td>
  );
}

function headText<Row>({ head, headText: text }: DataColumn<Row>): string | undefined {
  return text ?? (typeof head === 'string' ? head : undefined);
}

function cellClass<Row>({ align, isTight }: DataColumn<Row>): string {
  return [align === 'end' && styles.end, isTight && styles.tight].filter(Boolean).join(' ');
}
