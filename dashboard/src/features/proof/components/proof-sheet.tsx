import { EmptyState } from '@/components/ui/empty-state';
import { Facts } from '@/components/ui/facts';
import { Section } from '@/components/ui/section';
import { TimeText } from '@/components/ui/time-text';
import { useSite } from '@/lib/site';
import type { Proof } from '@/types/api';
import { proofCases, proofSummary } from '../proof-cases';
import styles from './proof-sheet.module.css';
import { ProofTable } from './proof-table';

/** The evidence: what it comes to, of which installation, and every figure behind it. */
export function ProofSheet({ proof }: { proof: Proof }) {
  const site = useSite();
  const cases = proofCases(proof.rows);
  if (cases.length === 0) {
    return (
      <EmptyState title="No case was computed.">
        The server knows no published case to prove itself by.
      </EmptyState>
    );
  }
  return (
    <>
      <Section title="What it comes to">
        <p className={proof.failed > 0 ? styles.short : styles.summary}>
          {proofSummary(proof, cases.length)}
        </p>
        <Facts
          facts={[
            ['Installation', site.name],
            ['Version', <span className="figures">{proof.version}</span>],
            ['Computed', <TimeText at={proof.computedAt} show="full" />],
            ['Agreeing', <span className="figures">{proof.passed}</span>],
            ['Falling short', <span className="figures">{proof.failed}</span>],
          ]}
        />
      </Section>
      <Section
        title="Figure by figure"
        note="Source read: the printed figure was seen. From memory: recalled, then recomputed. Derived: computed independently."
      >
        <ProofTable cases={cases} />
      </Section>
    </>
  );
}
