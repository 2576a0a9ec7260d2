import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { SlopeMark } from '@/components/ui/slope-mark';
import { TimeText } from '@/components/ui/time-text';
import { paths } from '@/config/paths';
import { useNow } from '@/lib/now';
import type { Station } from '@/types/api';
import { stationsOptions } from '@/lib/get-stations';
import styles from './line-strip.module.css';
import { stationTroubles } from './station-trouble';

const MOST_CELLS = 8;

interface StripCell {
  station: Station;
  troubles: string[];
}

/** The stations, alive: troubled ones first, counts per line for those that find no room, one count on a phone. */
export function LineStrip() {
  const { data, isError } = useQuery(stationsOptions());
  const now = useNow();
  if (isError && !data) return <p className={styles.words}>The stations could not be loaded.</p>;
  const cells = (data ?? [])
    .filter(({ active }) => active)
    .map((station) => ({ station, troubles: stationTroubles(station, now) }))
    .sort(
      (a, b) => b.troubles.length - a.troubles.length || a.station.station.localeCompare(b.station.station),
    );
  if (data && cells.length === 0) return <p className={styles.words}>No station is connected yet.</p>;
  return (
    <>
      <ul className={styles.strip} aria-label="Stations">
        {cells.slice(0, MOST_CELLS).map((cell) => (
          <li key={cell.station.station} className={styles.cell}>
            <StationCell {...cell} />
          </li>
        ))}
        {countsPerLine(cells.slice(MOST_CELLS)).map(([line, count]) => (
          <li key={line} className={styles.more}>
            {line}: {count} more
          </li>
        ))}
      </ul>
      <p className={styles.count}>{stripSummary(cells)}</p>
    </>
  );
}

function StationCell({ station, troubles }: StripCell) {
  return (
    <Link to={paths.units({ station: station.station })} className={styles.station}>
      {station.latest && <SlopeMark slope={station.latest.slope} size={32} />}
      <span>
        <span className={styles.name}>{station.station}</span>
        {troubles.length > 0 ? (
          <span className={styles.trouble}>{troubles.join(', ')}</span>
        ) : (
          <span className={styles.since}>
            <TimeText at={station.lastPostAt} show="relative" none="no post yet" />
          </span>
        )}
      </span>
    </Link>
  );
}

function countsPerLine(cells: StripCell[]): [string, number][] {
  const counts = new Map<string, number>();
  for (const { station } of cells) counts.set(station.line, (counts.get(station.line) ?? 0) + 1);
  return [...counts];
}

function stripSummary(cells: StripCell[]): string {
  const troubled = cells.filter(({ troubles }) => troubles.length > 0);
  const stations = `${cells.length} ${cells.length === 1 ? 'station' : 'stations'}`;
  if (troubled.length === 0) return `${stations}, all well`;
  return `${stations}, ${troubled.length} in trouble: ${troubled.map(({ station }) => station.station).join(', ')}`;
}
