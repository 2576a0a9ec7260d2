import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { EmptyState } from '@/components/ui/empty-state';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { Pager } from '@/components/ui/pager';
import { auditOptions } from '@/features/settings/api/get-audit';
import { AuditTable } from '@/features/settings/components/audit-table';
import { SettingsFrame } from '@/features/settings/components/settings-frame';
import { seesAudit } from '@/features/settings/settings-tabs';

export function AuditRoute() {
  return (
    <SettingsFrame
      title="Audit trail"
      lead="What people changed, newest first. Its rows can be neither changed nor removed."
      roles={seesAudit}
      act="read the audit trail"
    >
      <Trail />
    </SettingsFrame>
  );
}

function Trail() {
  const [search] = useSearchParams();
  const { data, error, refetch } = useQuery(auditOptions(search.get('cursor')));
  if (error && !data) return <ErrorState error={error} onRetry={() => void refetch()} />;
  if (!data) return <Loading label="the audit trail" lines={12} />;
  if (data.items.length === 0) return <EmptyState title="Nothing was done yet." />;
  return (
    <>
      <AuditTable entries={data.items} />
      <Pager nextCursor={data.nextCursor} label="the audit trail" />
    </>
  );
}
