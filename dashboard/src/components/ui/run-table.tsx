import { Link } from 'react-router-dom';
import { paths } from '@/config/paths';
import type { RunItem } from '@/types/api';
import { measureName } from '@/utils/measure-names';
import { DataTable, type DataColumn } from './data-table';
import { Impedance } from './impedance';
import styles from './run-table.module.css';
import { SlopeMark } from './slope-mark';
import { TimeText } from './time-text';
import { VerdictMark } from './verdict-mark';

const kindWords: Record<RunItem['runKind'], string | null> = {
  production: null,
  golden: 'golden unit',
  study: 'study',
  practice: 'practice',
};

const columns: DataColumn<RunItem>[] = [
  {
    key: 'unit',
    head: 'Unit',
    isRowHead: true,
    isTight: true,
    cell: (run) => (
      <span className={styles.unit}>
        <SlopeMark slope={run.slope} size={40} />
        <Link className="figures" to={paths.unit(run.partNumber, run.serialNumber, run.resultId)}>
          {run.serialNumber}
        </Link>
      </span>
    ),
  },
  {
    key: 'verdict',
    head: 'Verdict',
    isTight: true,
    isSelfExplaining: true,
    cell: (run) => <VerdictMark verdict={run.verdict} />,
  },
  {
    key: 'impedance',
    head: 'Output impedance',
    align: 'end',
    isTight: true,
    isSelfExplaining: true,
    cell: (run) => <Impedance slope={run.slope} />,
  },
  {
    key: 'part',
    head: 'Part number',
    isTight: true,
    isSelfExplaining: true,
    cell: (run) => <span className="figures">{run.partNumber}</span>,
  },
  { key: 'stage', head: 'Stage', isSelfExplaining: true, cell: (run) => <StageOfRun run={run} /> },
  { key: 'station', head: 'Station', isSelfExplaining: true, cell: (run) => run.station },
  { key: 'why', head: 'Failed', cell: (run) => run.failedMeasures.map(measureName).join(', ') },
  {
    key: 'at',
    head: 'Tested',
    align: 'end',
    isTight: true,
    isSelfExplaining: true,
    cell: (run) => <TimeText at={run.startedAt} show="short" />,
  },
];

function StageOfRun({ run }: { run: RunItem }) {
  const words = [
    run.stage,
    run.attempt !== null && run.attempt > 1 ? `attempt ${run.attempt}` : null,
    kindWords[run.runKind],
  ];
  return words.filter(Boolean).join(', ');
}

/** Runs one a line, each with its slope mark and the way to its curve. */
export function RunTable({ caption, runs }: { caption: string; runs: RunItem[] }) {
  return <DataTable caption={caption} columns={columns} rows={runs} rowKey={(run) => run.resultId} />;
}
