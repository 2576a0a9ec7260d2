import { useQuery } from '@tanstack/react-query';
import { Navigate, useSearchParams } from 'react-router-dom';
import { EmptyState } from '@/components/ui/empty-state';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { PageHeader } from '@/components/ui/page-header';
import { Pager } from '@/components/ui/pager';
import { paths } from '@/config/paths';
import { unitsOptions } from '@/features/units/api/get-units';
import { UnitFilters } from '@/features/units/components/unit-filters';
import { UnitTable } from '@/features/units/components/unit-table';
import { isFiltered, readUnitFilter } from '@/features/units/unit-filter';
import type { UnitItem } from '@/types/api';

export function UnitsRoute() {
  const [search] = useSearchParams();
  const filter = readUnitFilter(search);
  const { data, error, refetch, isPlaceholderData } = useQuery(unitsOptions(filter));
  const scanned =
    search.get('open') === 'exact' && !isPlaceholderData ? onlyUnit(data?.items, filter.search) : null;
  if (scanned) return <Navigate to={paths.unit(scanned.partNumber, scanned.serialNumber)} replace />;

  return (
    <>
      <PageHeader
        title="Units"
        lead="Every unit that was tested, last tested first. A barcode scanned anywhere opens its unit."
      />
      <UnitFilters filter={filter} />
      {error && !data && <ErrorState error={error} onRetry={() => void refetch()} />}
      {!data && !error && <Loading label="the units" lines={12} />}
      {data && data.items.length > 0 && <UnitTable units={data.items} of={filter.of} />}
      {data?.items.length === 0 && <NoUnits isFilterSet={isFiltered(filter)} />}
      {data && <Pager nextCursor={data.nextCursor} label="units" />}
    </>
  );
}

function onlyUnit(units: UnitItem[] | undefined, serialNumber: string | undefined): UnitItem | null {
  const matching = (units ?? []).filter(
    (unit) => unit.serialNumber.toLowerCase() === serialNumber?.toLowerCase(),
  );
  return matching.length === 1 ? (matching[0] ?? null) : null;
}

function NoUnits({ isFilterSet }: { isFilterSet: boolean }) {
  return isFilterSet ? (
    <EmptyState title="No unit fits.">Check the serial number, or take a filter away.</EmptyState>
  ) : (
    <EmptyState title="No unit has been tested yet.">
      Units appear here with the first result a station posts.
    </EmptyState>
  );
}
