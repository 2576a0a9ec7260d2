import { errorText, isApiError } from '@/lib/api-error';
import styles from './states.module.css';

export interface ErrorStateProps {
  error: unknown;
  /** Left out where trying again makes no sense. */
  onRetry?: () => void;
  title?: string;
}

export function ErrorState({ error, onRetry, title }: ErrorStateProps) {
  const isMissing = isApiError(error) && error.status === 404;
  return (
    <div className={styles.error} role="alert">
      <p className={styles.title}>{title ?? (isMissing ? 'Not found' : 'This could not be loaded')}</p>
      <p className={styles.words}>{errorText(error)}</p>
      {onRetry && !isMissing && (
        // Not the library's button: this one belongs to the first paint.
        <button type="button" className="plain-button" onClick={onRetry}>
          Try again
        </button>
      )}
    </div>
  );
}
