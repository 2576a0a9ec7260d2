import { useLiveConnection } from '@/lib/live-state';
import { useSite } from '@/lib/site';
import { formatTime } from '@/utils/format-time';
import styles from './connection-notice.module.css';

/** Says that the page has stopped following the line, and since when. */
export function ConnectionNotice() {
  const { state, lastHeardAt } = useLiveConnection();
  const { timeZone } = useSite();
  return (
    <div role="status">
      {state === 'lost' && (
        <p className={styles.notice}>
          Connection lost. What you see is as of{' '}
          <span className="figures">
            {formatTime(new Date(lastHeardAt).toISOString(), timeZone, 'clock')}
          </span>
          ; this page keeps trying and will catch up by itself.
        </p>
      )}
    </div>
  );
}
