import { useQuery } from '@tanstack/react-query';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { rightsOptions } from '@/features/settings/api/get-rights';
import { RightsTable } from '@/features/settings/components/rights-table';
import { SettingsFrame } from '@/features/settings/components/settings-frame';

export function RightsRoute() {
  return (
    <SettingsFrame
      title="Rights"
      lead="Who may do what, as the server enforces it: this table is read from the one it decides by."
    >
      <Rights />
    </SettingsFrame>
  );
}

function Rights() {
  const { data, error, refetch } = useQuery(rightsOptions());
  if (error && !data) return <ErrorState error={error} onRetry={() => void refetch()} />;
  if (!data) return <Loading label="the rights" lines={14} />;
  return <RightsTable rights={data} />;
}
