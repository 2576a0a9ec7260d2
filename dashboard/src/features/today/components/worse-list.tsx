import { Link } from 'react-router-dom';
import { paths } from '@/config/paths';
import type { TodayChange } from '@/types/api';
import styles from './worse-list.module.css';

function unitsBehind({ kind, partNumber, stage, station }: TodayChange): string {
  const query: Record<string, string> = {};
  if (partNumber !== null) query.partNumber = partNumber;
  if (stage !== null) query.stage = stage;
  if (station !== null) query.station = station;
  if (kind === 'notProven') query.verdict = 'notProven';
  return paths.units(query);
}

const sentence = (text: string) => (/[.!?]$/.test(text) ? text : `${text}.`);

/** What is getting worse, a sentence each, with the way to the units behind it. */
export function WorseList({ changes }: { changes: TodayChange[] }) {
  if (changes.length === 0) return <p className={styles.none}>Nothing is getting worse.</p>;
  return (
    <ul>
      {changes.map((change) => (
        <li
          key={`${change.kind} ${change.partNumber} ${change.stage} ${change.station}`}
          className={styles.change}
        >
          {change.partNumber !== null && (
            <strong className={styles.where}>
              {change.partNumber} {change.stage}:{' '}
            </strong>
          )}
          {sentence(change.text)} <Link to={unitsBehind(change)}>See the units</Link>
        </li>
      ))}
    </ul>
  );
}
