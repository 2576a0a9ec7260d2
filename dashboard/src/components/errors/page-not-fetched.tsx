import { useEffect, useRef } from 'react';
import { ErrorState } from '@/components/ui/error-state';
import { ApiError } from '@/lib/api-error';
import { useLiveConnection } from '@/lib/live-state';

const notFetched = new ApiError({
  code: 'pageNotFetched',
  status: 0,
  detail:
    'The server does not answer, or it was just renewed. The page opens by itself when the connection is back.',
});

/** In place of a page whose code did not arrive; after an outage it opens the page by itself. */
export function PageNotFetched() {
  const { state } = useLiveConnection();
  const wasLost = useRef(false);
  useEffect(() => {
    if (state === 'lost') wasLost.current = true;
    else if (state === 'live' && wasLost.current) window.location.reload();
  }, [state]);
  return (
    <ErrorState
      error={notFetched}
      title="This page could not be fetched"
      onRetry={() => window.location.reload()}
    />
  );
}
