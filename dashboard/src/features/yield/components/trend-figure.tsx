import { useCallback, useMemo } from 'react';
import { useNavigate } from 'react-router-dom';
import { Chart } from '@/components/ui/chart';
import { Disclosure } from '@/components/ui/disclosure';
import { Section } from '@/components/ui/section';
import { VerdictMark } from '@/components/ui/verdict-mark';
import type { ChartPalette } from '@/theme/chart-palette';
import type { YieldReport } from '@/types/api';
import type { YieldScale } from '@/utils/yield-scale';
import { markChanges } from '../mark-changes';
import { pointLink } from '../units-link';
import type { YieldQuery } from '../yield-query';
import { ChangeList } from './change-list';
import styles from './trend-figure.module.css';
import { trendOption, TREND_HEIGHT } from './trend-option';
import { TrendTable } from './trend-table';
import { trendWords } from './trend-words';

export interface TrendFigureProps {
  report: YieldReport;
  query: YieldQuery;
  scale: YieldScale;
  target: number | null;
}

/** The trend: yields above, units by verdict beneath, what changed and the same figures as a table below. */
export function TrendFigure({ report, query, scale, target }: TrendFigureProps) {
  const navigate = useNavigate();
  const marks = useMemo(() => markChanges(report.buckets, report.markers), [report]);
  const option = useCallback(
    (palette: ChartPalette) => trendOption(report, marks, scale, target, palette),
    [report, marks, scale, target],
  );
  const openUnits = useCallback(
    (index: number) => {
      const bucket = report.buckets[index];
      if (bucket && bucket.firstPass.total > 0) void navigate(pointLink(query, bucket, report.timeZone));
    },
    [report, query, navigate],
  );
  return (
    <Section
      title="Trend"
      note="shaded: 95 % interval of first pass; click a step for the units that pull it down"
    >
      <Chart label={trendWords(report)} height={TREND_HEIGHT} option={option} onPick={openUnits} />
      <p className={styles.key}>
        Units by first attempt: <VerdictMark verdict="fail" /> solid, at the bottom;{' '}
        <VerdictMark verdict="notProven" /> outlined; <VerdictMark verdict="pass" /> pale, on top.
      </p>
      <ChangeList marks={marks} />
      <Disclosure summary="The trend as a table" isPrinted>
        <TrendTable report={report} query={query} />
      </Disclosure>
    </Section>
  );
}
