import { Link } from 'react-router-dom';
import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { Impedance } from '@/components/ui/impedance';
import { SlopeMark } from '@/components/ui/slope-mark';
import { TimeText } from '@/components/ui/time-text';
import { VerdictMark } from '@/components/ui/verdict-mark';
import { paths } from '@/config/paths';
import type { UnitItem, UnitStageState } from '@/types/api';
import type { UnitFilter } from '../unit-filter';
import styles from './unit-table.module.css';

/** The columns tell of the result that was asked for: the latest, or the first attempt. */
const columnsFor = (of: UnitFilter['of']): DataColumn<UnitItem>[] => [
  {
    key: 'unit',
    head: 'Unit',
    isRowHead: true,
    isTight: true,
    cell: ({ partNumber, serialNumber, latest, asked }) => (
      <span className={styles.unit}>
        <SlopeMark slope={asked.slope} size={48} />
        <Link
          className="figures"
          to={paths.unit(
            partNumber,
            serialNumber,
            asked.resultId === latest.resultId ? undefined : asked.resultId,
          )}
        >
          {serialNumber}
        </Link>
      </span>
    ),
  },
  {
    key: 'verdict',
    head: of === 'firstAttempt' ? 'First verdict' : 'Latest verdict',
    isTight: true,
    isSelfExplaining: true,
    cell: ({ asked }) => <VerdictMark verdict={asked.verdict} />,
  },
  {
    key: 'impedance',
    head: 'Output impedance',
    align: 'end',
    isTight: true,
    isSelfExplaining: true,
    cell: ({ asked }) => <Impedance slope={asked.slope} />,
  },
  {
    key: 'part',
    head: 'Part number',
    isTight: true,
    isSelfExplaining: true,
    cell: ({ partNumber }) => <span className="figures">{partNumber}</span>,
  },
  {
    key: 'lot',
    head: 'Lot',
    isTight: true,
    cell: ({ lot }) => lot && <span className="figures">{lot}</span>,
  },
  {
    key: 'stages',
    head: 'Stages',
    isSelfExplaining: true,
    cell: ({ stages }) => <StageStates stages={stages} />,
  },
  {
    key: 'station',
    head: 'Station',
    isTight: true,
    isSelfExplaining: true,
    cell: ({ asked }) => asked.station,
  },
  {
    key: 'tested',
    head: of === 'firstAttempt' ? 'First tested' : 'Last tested',
    align: 'end',
    isTight: true,
    isSelfExplaining: true,
    cell: ({ asked }) => <TimeText at={asked.startedAt} show="short" />,
  },
];

function StageStates({ stages }: { stages: UnitStageState[] }) {
  return (
    <span className={styles.stages}>
      {stages.map(({ stage, attempts, verdict }) => (
        <span key={stage} className={`${styles.stage} ${attempts === 0 ? styles.ahead : ''}`}>
          {verdict && <VerdictMark verdict={verdict} size={12} isWordHidden />} {stage}
          {attempts === 0 && ' not yet'}
          {attempts > 1 && <span className={styles.attempts}> {attempts} attempts</span>}
        </span>
      ))}
    </span>
  );
}

export function UnitTable({ units, of }: { units: UnitItem[]; of?: UnitFilter['of'] }) {
  return (
    <DataTable
      caption="Units, last tested first"
      columns={columnsFor(of)}
      rows={units}
      rowKey={({ partNumber, serialNumber }) => `${partNumber} ${serialNumber}`}
    />
  );
}
