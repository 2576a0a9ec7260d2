import { useQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { PageHeader } from '@/components/ui/page-header';
import { paths } from '@/config/paths';
import { refusedPostOptions } from '@/features/intake/api/get-refused-post';
import { RefusedPostPage } from '@/features/intake/components/refused-post-page';

export function RefusedPostRoute() {
  const { intakeId = '' } = useParams();
  const { data, error, refetch } = useQuery(refusedPostOptions(intakeId));
  if (data) return <RefusedPostPage post={data} />;
  return (
    <>
      <PageHeader
        title="Refused post"
        lead={<Link to={paths.intake({ kind: 'refused' })}>All refused posts</Link>}
      />
      {error ? (
        <ErrorState error={error} onRetry={() => void refetch()} />
      ) : (
        <Loading label="the post" lines={12} />
      )}
    </>
  );
}
