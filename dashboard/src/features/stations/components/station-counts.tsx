import { Link } from 'react-router-dom';
import { paths } from '@/config/paths';
import type { Station } from '@/types/api';

/** Posts accepted today; they lead to the intake. */
export function PostsToday({ station: { station, postsToday } }: { station: Station }) {
  if (postsToday === 0) return <span className="figures">0</span>;
  return (
    <Link
      className="figures"
      to={paths.intake({ kind: 'accepted', station })}
      aria-label={`${postsToday} posts today`}
    >
      {postsToday}
    </Link>
  );
}

/** Posts refused today; they lead to their reasons. */
export function RefusedToday({ station: { station, refusedToday } }: { station: Station }) {
  if (refusedToday === 0) return <span className="figures">0</span>;
  return (
    <Link
      className="figures"
      to={paths.intake({ kind: 'refused', station })}
      aria-label={`${refusedToday} refused today`}
    >
      {refusedToday}
    </Link>
  );
}
