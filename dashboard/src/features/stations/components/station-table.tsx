import { Link } from 'react-router-dom';
import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { SlopeMark } from '@/components/ui/slope-mark';
import { TimeText } from '@/components/ui/time-text';
import { paths } from '@/config/paths';
import type { Station } from '@/types/api';
import { calibrationFact, clockFact, stateFact } from '../station-words';
import { FactText } from './fact-text';
import { GoldenDue } from './golden-due';
import { PostsToday, RefusedToday } from './station-counts';
import styles from './station-table.module.css';

const columns: DataColumn<Station>[] = [
  {
    key: 'station',
    head: 'Station',
    isRowHead: true,
    isTight: true,
    cell: (station) => (
      <span className={styles.station}>
        <span className={styles.mark}>
          {station.latest && <SlopeMark slope={station.latest.slope} size={40} />}
        </span>
        <Link to={paths.station(station.station)}>{station.station}</Link>
      </span>
    ),
  },
  { key: 'line', head: 'Line', cell: ({ line }) => line },
  { key: 'state', head: 'State', isSelfExplaining: true, cell: (row) => <FactText fact={stateFact(row)} /> },
  {
    key: 'last',
    head: 'Last post',
    isTight: true,
    cell: ({ lastPostAt }) => <TimeText at={lastPostAt} show="relative" />,
  },
  {
    key: 'posts',
    head: 'Posts today',
    align: 'end',
    isTight: true,
    cell: (row) => <PostsToday station={row} />,
  },
  {
    key: 'refused',
    head: 'Refused today',
    align: 'end',
    isTight: true,
    cell: (row) => <RefusedToday station={row} />,
  },
  { key: 'clock', head: 'Clock', cell: (row) => <FactText fact={clockFact(row)} /> },
  { key: 'golden', head: 'Golden check', cell: (row) => <GoldenDue station={row} /> },
  {
    key: 'calibration',
    head: 'Calibration',
    cell: (row) => <FactText fact={calibrationFact(row.instruments)} />,
  },
];

export function StationTable({ stations }: { stations: Station[] }) {
  return <DataTable caption="Stations" columns={columns} rows={stations} rowKey={({ station }) => station} />;
}
