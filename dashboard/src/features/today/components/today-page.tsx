import { EmptyState } from '@/components/ui/empty-state';
import { PageHeader } from '@/components/ui/page-header';
import { RunTable } from '@/components/ui/run-table';
import { Section } from '@/components/ui/section';
import type { Today } from '@/types/api';
import { formatDay } from '@/utils/format-time';
import { BreachDayBook } from './breach-day-book';
import styles from './today-page.module.css';
import { todaySummary } from './today-summary';
import { WorseList } from './worse-list';
import { YieldFigure } from './yield-figure';

export function TodayPage({ today }: { today: Today }) {
  return (
    <>
      <PageHeader title="Today" lead={`${formatDay(today.date)}. ${todaySummary(today)}`} />
      <div className={styles.columns}>
        <div>
          <Section title="First-pass yield" note="bar: 95 % interval, stroke: share, flag: target">
            {today.products.length > 0 ? (
              <YieldFigure products={today.products} />
            ) : (
              <EmptyState title="No product is set up yet.">
                Yields appear here with the first product.
              </EmptyState>
            )}
          </Section>
          <Section title="Getting worse">
            <WorseList changes={today.worse} />
          </Section>
        </div>
        <Section title="Open breaches">
          <BreachDayBook breaches={today.openBreaches} />
        </Section>
      </div>
      <div className={styles.run}>
        <Section title="Units as they come" note="the 30 newest results, newest first">
          {today.recent.length > 0 ? (
            <RunTable caption="The 30 newest results" runs={today.recent} />
          ) : (
            <EmptyState title="No result has come in yet.">
              As soon as a station posts its first sweep, it appears here by itself.
            </EmptyState>
          )}
        </Section>
      </div>
    </>
  );
}
