import { PageHeader } from '@/components/ui/page-header';
import { Section } from '@/components/ui/section';
import type { ReactNode } from 'react';
import styles from './connect-page.module.css';
import { ReferenceLinks } from './reference-links';

/** The worked first post, with what an integrator looks things up in beside it. */
export function ConnectPage({ children }: { children: ReactNode }) {
  return (
    <>
      <PageHeader
        title="Connect a station"
        lead="From a key to the first accepted result in a few minutes, with what your own station will do."
      />
      <div className={styles.columns}>
        <div>{children}</div>
        <Section title="To look things up">
          <ReferenceLinks />
        </Section>
      </div>
    </>
  );
}
