import { Section } from '@/components/ui/section';
import type { YieldReport } from '@/types/api';
import { percentText } from '@/utils/format-figure';
import styles from './retests.module.css';

/** How much is tested again, what that gains, and what it says about the measuring; what was aborted. */
export function Retests({ report }: { report: YieldReport }) {
  const { retests, aborts, whole } = report;
  const gained = whole.final.passed - whole.firstPass.passed;
  return (
    <Section title="Retests and aborts">
      <dl className={styles.facts}>
        <Fact name="Tested again" count={retests.retested} total={retests.total} of="units" />
        <Fact
          name="Passed at the second try"
          count={retests.passedOnSecond}
          total={retests.retested}
          of="retested"
        />
        <Fact name="Passed in the end, not at first" count={gained} total={retests.total} of="units" />
        <Fact name="Aborted" count={aborts.aborted} total={aborts.total} of="runs" />
      </dl>
      {retests.retested > 0 && <p className={styles.words}>{secondTryWords(report)}</p>}
    </Section>
  );
}

function secondTryWords({ retests, whole }: YieldReport): string {
  const gain =
    whole.firstPass.share === null || whole.final.share === null
      ? ''
      : `Retests lift the yield by ${((whole.final.share - whole.firstPass.share) * 100).toFixed(1)} points. `;
  if (retests.passedOnSecond === 0) return `${gain}None of the retested units passed at its second try.`;
  return `${gain}A unit that passes at the second try with nothing changed between is a sign of a measuring problem (contact, settling, range), not of a better unit: split by station and by fixture to find it.`;
}

function Fact({ name, count, total, of }: { name: string; count: number; total: number; of: string }) {
  return (
    <div className={styles.fact}>
      <dt>{name}</dt>
      <dd>
        <span className={styles.share}>{total > 0 ? percentText(count / total) : '–'}</span>
        <span className={styles.count}>
          <span className="figures">{count}</span> of <span className="figures">{total}</span> {of}
        </span>
      </dd>
    </div>
  );
}
