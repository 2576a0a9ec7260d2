import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { Impedance } from '@/components/ui/impedance';
import { SlopeMark } from '@/components/ui/slope-mark';
import { VerdictMark } from '@/components/ui/verdict-mark';
import { paths } from '@/config/paths';
import { errorText } from '@/lib/api-error';
import type { IntakeItem } from '@/types/api';
import { newestPostsOptions } from '../api/get-arrival';
import { resultOptions } from '@/lib/get-result';
import styles from './arrival.module.css';

/** Waits for the post with this id and says what became of it, as it happens. */
export function Arrival({ resultId }: { resultId: string }) {
  const { data, error } = useQuery(newestPostsOptions());
  const arrived = data?.items.find((item) => item.resultId === resultId);
  return (
    <div role="status" className={styles.arrival}>
      {arrived ? (
        <Arrived item={arrived} resultId={resultId} />
      ) : error ? (
        <p>The intake cannot be read: {errorText(error)}</p>
      ) : (
        <p className={styles.waiting}>
          Waiting for the post <code>{resultId}</code>. It appears here by itself.
        </p>
      )}
    </div>
  );
}

function Arrived({ item, resultId }: { item: IntakeItem; resultId: string }) {
  if (item.kind === 'accepted') return <Accepted resultId={resultId} station={item.station} />;
  return (
    <p>
      <strong className={styles.refused}>Refused with {item.status}.</strong> {item.errors[0]?.detail}{' '}
      <Link to={paths.refusedPost(item.intakeId)}>See what to mend</Link>
    </p>
  );
}

function Accepted({ resultId, station }: { resultId: string; station: string }) {
  const { data: result } = useQuery(resultOptions(resultId));
  if (!result) return <p>It arrived from {station}.</p>;
  return (
    <p className={styles.accepted}>
      <SlopeMark slope={result.slope} size={56} isDecorative />
      <span>It arrived from {station}.</span>
      <VerdictMark verdict={result.verdict} />
      <span>
        Output impedance <Impedance slope={result.slope} />
      </span>
      <Link to={paths.unit(result.partNumber, result.serialNumber, resultId)}>See its curve</Link>
    </p>
  );
}
