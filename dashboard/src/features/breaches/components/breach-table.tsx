import { Link } from 'react-router-dom';
import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { SlopeMark } from '@/components/ui/slope-mark';
import { TimeText } from '@/components/ui/time-text';
import { paths } from '@/config/paths';
import type { Breach } from '@/types/api';
import { stateWords } from '../breach-state';
import styles from './breach-table.module.css';

const columns: DataColumn<Breach>[] = [
  {
    key: 'title',
    head: 'What broke',
    isRowHead: true,
    cell: (breach) => (
      <span className={styles.title}>
        <span className={styles.mark}>{breach.latest && <SlopeMark slope={breach.latest.slope} />}</span>
        <Link to={paths.breach(breach.breachId)}>{breach.title}</Link>
      </span>
    ),
  },
  {
    key: 'count',
    head: 'Results',
    align: 'end',
    isTight: true,
    cell: ({ eventCount }) => <span className="figures">{eventCount}</span>,
  },
  { key: 'opened', head: 'Since', isTight: true, cell: ({ openedAt }) => <TimeText at={openedAt} /> },
  {
    key: 'last',
    head: 'Last',
    isTight: true,
    cell: ({ lastEventAt }) => <TimeText at={lastEventAt} show="relative" />,
  },
  {
    key: 'state',
    head: 'State',
    isSelfExplaining: true,
    cell: (breach) => <StateOfBreach breach={breach} />,
  },
];

function StateOfBreach({ breach }: { breach: Breach }) {
  if (breach.state === 'open') return <span className={styles.open}>{stateWords.open}</span>;
  const who = breach.state === 'closed' ? breach.closedBy : breach.acknowledgedBy;
  const at = breach.state === 'closed' ? breach.closedAt : breach.acknowledgedAt;
  return (
    <>
      {stateWords[breach.state]} by {who ?? 'somebody'}, <TimeText at={at} />
    </>
  );
}

export function BreachTable({ breaches }: { breaches: Breach[] }) {
  return (
    <DataTable
      caption="Breaches"
      columns={columns}
      rows={breaches}
      rowKey={({ breachId }) => String(breachId)}
    />
  );
}
