import { useQuery } from '@tanstack/react-query';
import { useParams, useSearchParams } from 'react-router-dom';
import { EmptyState } from '@/components/ui/empty-state';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { PageHeader } from '@/components/ui/page-header';
import { unitOptions } from '@/features/units/api/get-unit';
import { UnitPage } from '@/features/units/components/unit-page';
import type { RunItem, Unit } from '@/types/api';

export function UnitRoute() {
  const { partNumber = '', serialNumber = '' } = useParams();
  const [search] = useSearchParams();
  const { data: unit, error, refetch } = useQuery(unitOptions(partNumber, serialNumber));
  if (!unit) {
    return (
      <>
        <PageHeader title={`${serialNumber} ${partNumber}`} />
        {error ? (
          <ErrorState error={error} onRetry={() => void refetch()} />
        ) : (
          <Loading label="the unit" lines={12} />
        )}
      </>
    );
  }
  const shown = chooseResult(unit, search.get('result'));
  if (!shown) return <EmptyState title="This unit has no results." />;
  return <UnitPage key={shown.resultId} unit={unit} shown={shown} />;
}

/** The result the address asks for, else the newest. */
function chooseResult(unit: Unit, resultId: string | null): RunItem | null {
  const results = unit.stages.flatMap((stage) => stage.results);
  const asked = results.find((result) => result.resultId === resultId);
  const newestFirst = [...results].sort((a, b) => b.startedAt.localeCompare(a.startedAt));
  return asked ?? newestFirst[0] ?? null;
}
