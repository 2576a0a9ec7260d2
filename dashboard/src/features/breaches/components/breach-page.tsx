import { Link } from 'react-router-dom';
import { PageHeader } from '@/components/ui/page-header';
import { Section } from '@/components/ui/section';
import { paths } from '@/config/paths';
import type { BreachDetail } from '@/types/api';
import { BreachDecision } from './breach-decision';
import { BreachEvents } from './breach-events';
import { BreachFacts } from './breach-facts';
import { BreachMails } from './breach-mails';
import styles from './breach-page.module.css';

export function BreachPage({ breach }: { breach: BreachDetail }) {
  const shown = breach.events.length;
  const note = breach.eventCount > shown ? `the ${shown} newest of ${breach.eventCount}` : 'newest first';
  return (
    <>
      <PageHeader title={breach.title} lead={<Link to={paths.breaches()}>All breaches</Link>} />
      <div className={styles.columns}>
        <div>
          <Section title="The breach">
            <BreachFacts breach={breach} />
          </Section>
          <BreachDecision breach={breach} />
          <Section title="Mails">
            <BreachMails mails={breach.mails} />
          </Section>
        </div>
        <Section title="Results that broke the limit" note={note}>
          <BreachEvents events={breach.events} />
        </Section>
      </div>
    </>
  );
}
