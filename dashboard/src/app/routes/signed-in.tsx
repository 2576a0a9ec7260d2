import { useQuery } from '@tanstack/react-query';
import { Navigate, Outlet, ScrollRestoration, useLocation, useNavigate } from 'react-router-dom';
import { Shell } from '@/components/layouts/shell';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { paths } from '@/config/paths';
import { LineStrip } from '@/features/line/components/line-strip';
import { Person } from '@/features/session/components/person';
import { SessionContext, sessionOptions } from '@/lib/session';
import { useBarcodeScan } from '@/lib/use-barcode-scan';
import { LiveProvider } from '../live-provider';

/** Lets signed-in people through to the pages and sends others to the sign-in, from where they come back. */
export function SignedInRoute() {
  const { data, error, isPending, refetch } = useQuery(sessionOptions());
  const location = useLocation();
  if (isPending) return <Loading label="Ampkeep" lines={1} />;
  if (error && !data) return <ErrorState error={error} onRetry={() => void refetch()} />;
  if (!data) return <Navigate to={paths.signIn(location.pathname + location.search)} replace />;
  return (
    <SessionContext.Provider value={data.user}>
      <LiveProvider>
        <ScannedUnits />
        <Shell strip={<LineStrip />} person={<Person />}>
          <Outlet />
        </Shell>
        <ScrollRestoration />
      </LiveProvider>
    </SessionContext.Provider>
  );
}

/** A barcode scanned anywhere opens its unit. */
function ScannedUnits() {
  const navigate = useNavigate();
  useBarcodeScan((code) => void navigate(paths.units({ search: code, open: 'exact' })));
  return null;
}
