import { isRouteErrorResponse, useRouteError } from 'react-router-dom';
import { ErrorState } from '@/components/ui/error-state';
import { isFetchFailure } from '@/lib/fetch-failure';
import { NotFound } from './not-found';
import { PageNotFetched } from './page-not-fetched';

/** What a route shows when it could not be drawn. */
export function RouteError() {
  const error = useRouteError();
  if (isRouteErrorResponse(error) && error.status === 404) return <NotFound />;
  if (isFetchFailure(error)) return <PageNotFetched />;
  return <ErrorState error={error} title="This page broke" onRetry={() => window.location.reload()} />;
}
