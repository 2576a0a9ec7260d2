import { Link } from 'react-router-dom';
import { EmptyState } from '@/components/ui/empty-state';
import { PageHeader } from '@/components/ui/page-header';
import { paths } from '@/config/paths';

export function NotFound() {
  return (
    <>
      <PageHeader title="No such page" />
      <EmptyState title="Nothing is kept at this address.">
        Go to <Link to={paths.today()}>Today</Link>, or search for a unit under{' '}
        <Link to={paths.units()}>Units</Link>.
      </EmptyState>
    </>
  );
}
