import { VerdictMark } from '@/components/ui/verdict-mark';
import type { Verdict, Yield, YieldReport } from '@/types/api';
import { percentText } from '@/utils/format-figure';
import { standingToTarget } from '@/utils/yield-scale';
import { Link } from 'react-router-dom';
import { unitsLink } from '../units-link';
import type { YieldQuery } from '../yield-query';
import styles from './headline.module.css';

export interface HeadlineProps {
  report: YieldReport;
  query: YieldQuery;
  target: number | null;
}

/** The period in three figures and its three shares. */
export function Headline({ report, query, target }: HeadlineProps) {
  const { whole, rolledThroughput } = report;
  return (
    <div className={styles.headline}>
      <BigYield name="First pass" figures={whole.firstPass} note={targetWords(whole.firstPass, target)} />
      <BigYield
        name="Final"
        figures={whole.final}
        note={whole.openUnits > 0 ? `${whole.openUnits} still open` : 'none open'}
      />
      {rolledThroughput && (
        <BigYield name="Through all stages" figures={rolledThroughput} note="at first pass" />
      )}
      <Shares report={report} query={query} />
    </div>
  );
}

function BigYield({ name, figures, note }: { name: string; figures: Yield; note: string }) {
  const { share, low, high } = figures;
  return (
    <p className={styles.yield}>
      <span className={styles.name}>{name}</span>
      <span className={styles.share}>{share === null ? '–' : percentText(share)}</span>
      <span className={styles.interval}>
        {low !== null && high !== null && `${percentText(low)} to ${percentText(high)}`}
      </span>
      <span className={styles.note}>{note}</span>
    </p>
  );
}

function targetWords(figures: Yield, target: number | null): string {
  if (target === null) return `of ${figures.total}`;
  const words = { below: 'below target', met: 'meets target', open: 'target' };
  return `${words[standingToTarget(figures, target) ?? 'open']} ${percentText(target, 0)}`;
}

/** Pass, not proven and fail of the first attempts, by length, shape, colour and word; each leads to its units. */
function Shares({ report, query }: Omit<HeadlineProps, 'target'>) {
  const { firstPass, notProven, failed } = report.whole;
  const parts: { verdict: Verdict; count: number }[] = [
    { verdict: 'pass', count: firstPass.passed },
    { verdict: 'notProven', count: notProven },
    { verdict: 'fail', count: failed },
  ];
  return (
    <div className={styles.shares}>
      <span className={styles.name}>First attempts</span>
      <div className={styles.bar} aria-hidden>
        {parts.map(({ verdict, count }) => (
          <span key={verdict} className={styles[verdict]} style={{ flexGrow: count }} hidden={count === 0} />
        ))}
      </div>
      <ul className={styles.parts}>
        {parts.map(({ verdict, count }) => (
          <li key={verdict}>
            <VerdictMark verdict={verdict} />{' '}
            <Link className="figures" to={unitsLink(query, query, { verdict })}>
              {count}
            </Link>{' '}
            <span className={`figures ${styles.note}`}>
              {firstPass.total > 0 && percentText(count / firstPass.total)}
            </span>
          </li>
        ))}
      </ul>
    </div>
  );
}
