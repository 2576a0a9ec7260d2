import { useMemo } from 'react';
import { EmptyState } from '@/components/ui/empty-state';
import type { Product, YieldReport } from '@/types/api';
import { targetOf } from '../targets';
import { trendScale } from '../trend-scale';
import { isFiltered, type YieldQuery } from '../yield-query';
import { FailingMeasures } from './failing-measures';
import { Headline } from './headline';
import { Retests } from './retests';
import { SplitTable } from './split-table';
import { TrendFigure } from './trend-figure';
import styles from './yield-page.module.css';

export interface YieldPageProps {
  report: YieldReport;
  query: YieldQuery;
  products: Product[];
  /** The figures are those of the question before, until the new ones are there. */
  isPending: boolean;
}

export function YieldPage({ report, query, products, isPending }: YieldPageProps) {
  const target = targetOf(products, query.partNumber, query.stage);
  const scale = useMemo(() => trendScale(report, target), [report, target]);
  const { split } = query;
  if (report.whole.firstPass.total === 0) return <NoUnits query={query} />;
  return (
    <div className={isPending ? styles.pending : undefined} aria-busy={isPending}>
      <Headline report={report} query={query} target={target} />
      <TrendFigure report={report} query={query} scale={scale} target={target} />
      {split && report.groups.length > 0 && (
        <div className={styles.part}>
          <SplitTable report={report} query={{ ...query, split }} products={products} scale={scale} />
        </div>
      )}
      <div className={styles.columns}>
        <div>
          <FailingMeasures report={report} query={query} />
        </div>
        <div>
          <Retests report={report} />
        </div>
      </div>
    </div>
  );
}

function NoUnits({ query }: { query: YieldQuery }) {
  return isFiltered(query) ? (
    <EmptyState title="No first attempt fits.">Take a filter away, or widen the period.</EmptyState>
  ) : (
    <EmptyState title="No unit had its first attempt in this period.">
      Choose other days. Golden, study and practice runs don&apos;t count, nor do aborted ones.
    </EmptyState>
  );
}
