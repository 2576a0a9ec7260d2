import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { Figure } from '@/components/ui/figure';
import { Hint } from '@/components/ui/hint';
import { VerdictMark } from '@/components/ui/verdict-mark';
import type { JudgedMeasure, LimitInForce } from '@/types/api';
import { figureText, probabilityText } from '@/utils/format-figure';
import styles from './measure-table.module.css';

const columns: DataColumn<JudgedMeasure>[] = [
  { key: 'measure', head: 'Measure', isRowHead: true, cell: ({ label }) => label },
  {
    key: 'outcome',
    head: 'Outcome',
    isTight: true,
    isSelfExplaining: true,
    cell: ({ outcome }) =>
      outcome ? <VerdictMark verdict={outcome} /> : <span className={styles.none}>no limit</span>,
  },
  {
    key: 'value',
    head: 'Value',
    align: 'end',
    isTight: true,
    isSelfExplaining: true,
    cell: (measure) => <MeasureValue measure={measure} />,
  },
  {
    key: 'limit',
    head: 'Limit',
    align: 'end',
    isTight: true,
    cell: ({ limit, unit }) => limit && <span className="figures">{limitText(limit, unit)}</span>,
  },
  {
    key: 'probability',
    head: (
      <Hint text="How probable it is, by the measurement and its uncertainty, that the true value keeps the limit.">
        Conforms with
      </Hint>
    ),
    headText: 'Conforms with',
    align: 'end',
    isTight: true,
    cell: ({ probabilityOfConformity: probability }) =>
      probability === null ? null : <span className="figures">{probabilityText(probability)}</span>,
  },
  {
    key: 'words',
    head: 'In words',
    isSelfExplaining: true,
    cell: ({ sentence }) => <span className={styles.words}>{sentence}</span>,
  },
];

function MeasureValue({ measure: { value, unit, bound, expandedUncertainty } }: { measure: JudgedMeasure }) {
  return <Figure value={value} unit={unit} bound={bound} uncertainty={expandedUncertainty} hasUncertainty />;
}

function limitText({ lower, upper }: LimitInForce, unit: string): string {
  if (lower !== null && upper !== null) return `${figureText(lower, unit)} to ${figureText(upper, unit)}`;
  if (lower !== null) return `≥ ${figureText(lower, unit)}`;
  return upper === null ? '' : `≤ ${figureText(upper, unit)}`;
}

/** Each measure with its limit, its outcome and the judging in words. */
export function MeasureTable({ measures }: { measures: JudgedMeasure[] }) {
  return (
    <DataTable
      caption="Measures and their judging"
      columns={columns}
      rows={measures}
      rowKey={({ name }) => name}
    />
  );
}
