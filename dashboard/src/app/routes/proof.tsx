import { useQuery } from '@tanstack/react-query';
import { Button } from '@/components/ui/button';
import { ErrorState } from '@/components/ui/error-state';
import { proofOptions } from '@/features/proof/api/get-proof';
import { ProofProgress } from '@/features/proof/components/proof-progress';
import { ProofSheet } from '@/features/proof/components/proof-sheet';
import { SettingsFrame } from '@/features/settings/components/settings-frame';
import { seesProof } from '@/features/settings/settings-tabs';
import { useHasRole } from '@/lib/session';

export function ProofRoute() {
  const isAllowed = useHasRole(...seesProof);
  const { data, error, refetch, isFetching } = useQuery({ ...proofOptions(), enabled: isAllowed });
  const compute = () => void refetch();
  return (
    <SettingsFrame
      title="Proof of the computations"
      lead="Published cases, computed anew by this server when you open the page: evidence that this installation computes correctly."
      actions={
        <>
          <Button onClick={compute} isBusy={isFetching}>
            {isFetching ? 'Computing' : 'Compute again'}
          </Button>
          <Button kind="primary" onClick={() => window.print()} isDisabled={!data}>
            Print
          </Button>
        </>
      }
      roles={seesProof}
      act="see the proof"
    >
      {isFetching && <ProofProgress />}
      {!isFetching && error && <ErrorState error={error} onRetry={compute} />}
      {!isFetching && data && <ProofSheet proof={data} />}
    </SettingsFrame>
  );
}
