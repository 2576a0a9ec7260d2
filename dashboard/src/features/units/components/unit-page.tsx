import { useQueries, useQuery } from '@tanstack/react-query';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { Section } from '@/components/ui/section';
import type { ResultDetail, RunItem, Unit } from '@/types/api';
import { resultOptions } from '@/lib/get-result';
import { AttemptList } from './attempt-list';
import { MeasureTable } from './measure-table';
import { RawPost } from './raw-post';
import { ResultFacts } from './result-facts';
import { ResultRemarks } from './result-remarks';
import { SweepFigure } from './sweep-figure';
import { UnitHead } from './unit-head';
import styles from './unit-page.module.css';

const MOST_OVERLAID = 3;

export interface UnitPageProps {
  unit: Unit;
  shown: RunItem;
}

export function UnitPage({ unit, shown }: UnitPageProps) {
  const { data: result, error, refetch } = useQuery(resultOptions(shown.resultId));
  const earlier = useEarlierResults(unit, shown);
  return (
    <>
      <UnitHead unit={unit} shown={shown} />
      {result && <ResultRemarks result={result} />}
      <div className={styles.columns}>
        <div>
          {result && <SweepFigure result={result} earlier={earlier} />}
          {!result && error && <ErrorState error={error} onRetry={() => void refetch()} />}
          {!result && !error && <Loading label="the sweep" lines={12} />}
        </div>
        <div>
          <Section title="Attempts">
            <AttemptList unit={unit} shownResultId={shown.resultId} />
          </Section>
        </div>
      </div>
      {result && <Judging result={result} />}
    </>
  );
}

function Judging({ result }: { result: ResultDetail }) {
  return (
    <>
      <Section
        title="Judging"
        note={`${result.stage}, ${result.attempt === null ? 'not counted' : `attempt ${result.attempt}`}`}
      >
        <MeasureTable measures={result.measures} />
      </Section>
      <Section title="Conditions">
        <ResultFacts result={result} />
      </Section>
      <RawPost resultId={result.resultId} />
    </>
  );
}

/** Kept outside the component, so that the same answers give the same array and the chart is not drawn anew. */
const loadedOnly = (queries: { data: ResultDetail | undefined }[]): ResultDetail[] =>
  queries.flatMap(({ data }) => (data ? [data] : []));

/** Results at the same stage before the shown one, at most three, oldest first. */
function useEarlierResults(unit: Unit, shown: RunItem): ResultDetail[] {
  const results = unit.stages.find(({ stage }) => stage === shown.stage)?.results ?? [];
  const before = results.filter(({ startedAt }) => startedAt < shown.startedAt).slice(-MOST_OVERLAID);
  return useQueries({ queries: before.map(({ resultId }) => resultOptions(resultId)), combine: loadedOnly });
}
