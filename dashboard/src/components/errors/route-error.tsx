import { isRouteErrorResponse, useRouteError } from 'react-router-dom';
import { ErrorState } from '@/components/ui/error-state';
import { NotFound } from './not-found';

/** What a route shows when it could not be drawn. */
export function RouteError() {
  const error = useRouteError();
  if (isRouteErrorResponse(error) && error.status === 404) return <NotFound />;
  return <ErrorState error={error} title="This page broke" onRetry={() => window.location.reload()} />;
}
