import { Disclosure } from '@/components/ui/disclosure';
import { RoleNote } from '@/components/ui/role-note';
import { Section } from '@/components/ui/section';
import { useHasRole } from '@/lib/session';
import type { Breach, Role } from '@/types/api';
import { AcknowledgeForm } from './acknowledge-form';
import { CloseForm } from './close-form';
import styles from './decision-form.module.css';

/** The server decides; these only spare people forms that would be refused. */
const mayAcknowledge: readonly Role[] = ['productionEngineer', 'qualityLead'];
const mayClose: readonly Role[] = ['qualityLead'];

/** The next step of a breach that is not closed, for those who may take it. */
export function BreachDecision({ breach: { breachId, state } }: { breach: Breach }) {
  const canAcknowledge = useHasRole(...mayAcknowledge);
  const canClose = useHasRole(...mayClose);
  if (state === 'closed') return null;
  if (state === 'acknowledged') {
    return (
      <Section title="Close">
        <RoleNote roles={mayClose} act="close a breach" />
        {canClose && <CloseForm breachId={breachId} isPrimary />}
      </Section>
    );
  }
  return (
    <Section title="Acknowledge">
      <RoleNote roles={mayAcknowledge} act="acknowledge a breach" />
      {canAcknowledge && <AcknowledgeForm breachId={breachId} />}
      {canClose && (
        <div className={styles.second}>
          <Disclosure summary="Close it at once">
            <CloseForm breachId={breachId} isPrimary={false} />
          </Disclosure>
        </div>
      )}
    </Section>
  );
}
