import { useLocation, useNavigate, useSearchParams } from 'react-router-dom';
import { Button } from './button';
import styles from './pager.module.css';

export interface PagerProps {
  nextCursor: string | null;
  /** What is paged, for the name of the group: "units". */
  label: string;
}

const stateOf = (state: unknown): { isPaged?: boolean } =>
  typeof state === 'object' && state !== null ? state : {};

/** Older and newer pages of a list that is kept by cursor in the address. */
export function Pager({ nextCursor, label }: PagerProps) {
  const [search, setSearch] = useSearchParams();
  const location = useLocation();
  const navigate = useNavigate();
  const isFirst = !search.has('cursor');
  if (isFirst && nextCursor === null) return null;

  const goOlder = () => {
    const next = new URLSearchParams(search);
    next.set('cursor', nextCursor ?? '');
    setSearch(next, { state: { isPaged: true } });
  };
  const goNewer = () => {
    // Who came by "Older" goes back the same way; who came by a link goes to the newest.
    if (stateOf(location.state).isPaged) return void navigate(-1);
    const next = new URLSearchParams(search);
    next.delete('cursor');
    setSearch(next);
  };

  return (
    <div className={`${styles.pager} no-print`} role="group" aria-label={`Pages of ${label}`}>
      <Button onClick={goNewer} isDisabled={isFirst}>
        Newer
      </Button>
      <Button onClick={goOlder} isDisabled={nextCursor === null}>
        Older
      </Button>
    </div>
  );
}
