import { useQuery } from '@tanstack/react-query';
import { Navigate, useSearchParams } from 'react-router-dom';
import { SignInLayout } from '@/components/layouts/sign-in-layout';
import { paths } from '@/config/paths';
import { SignInForm } from '@/features/session/components/sign-in-form';
import { sessionOptions } from '@/lib/session';

export function SignInRoute() {
  const { data: session } = useQuery(sessionOptions());
  const [search] = useSearchParams();
  if (session) return <Navigate to={insideAddress(search.get('from'))} replace />;
  return (
    <SignInLayout>
      <SignInForm />
    </SignInLayout>
  );
}

/** Only addresses inside the dashboard: a crafted link must not lead elsewhere after the sign-in. */
function insideAddress(from: string | null): string {
  return from && /^\/(?![/\\])/.test(from) ? from : paths.today();
}
