import { Link } from 'react-router-dom';
import { YieldBar } from '@/components/ui/yield-bar';
import { paths } from '@/config/paths';
import type { TodayStage, Verdict } from '@/types/api';
import { percentText } from '@/utils/format-figure';
import { standingToTarget, type TargetStanding, type YieldScale } from '@/utils/yield-scale';
import styles from './yield-figure.module.css';

const standings: Record<TargetStanding, string> = {
  below: 'below',
  met: 'met',
  open: '',
};

export interface YieldRowProps {
  partNumber: string;
  stage: TodayStage;
  scale: YieldScale;
}

export function YieldRow({ partNumber, stage, scale }: YieldRowProps) {
  const { firstPass, previous, target } = stage;
  const standing = standingToTarget(firstPass, target);
  const unitsWith = (verdict: Verdict) => paths.units({ partNumber, stage: stage.stage, verdict });
  return (
    <tr className={standing === 'below' ? styles.below : undefined}>
      <th scope="row" className={styles.stage}>
        <Link to={paths.units({ partNumber, stage: stage.stage })}>{stage.stage}</Link>
      </th>
      <td className={styles.bar}>
        <YieldBar figures={firstPass} target={target} scale={scale} />
      </td>
      <td className={`${styles.end} ${styles.share}`}>
        {firstPass.share === null ? '–' : percentText(firstPass.share)}
      </td>
      <td className={styles.standing}>{standingText(stage, standing)}</td>
      <td className={`figures ${styles.counts}`}>
        {firstPass.passed}
        {' · '}
        <Count count={stage.notProven} to={unitsWith('notProven')} word="not proven" />
        {' · '}
        <Count count={stage.failed} to={unitsWith('fail')} word="failed" />
      </td>
      <td className={`${styles.end} ${styles.final}`}>
        {stage.final.share === null ? '–' : percentText(stage.final.share)}
        {stage.openUnits > 0 && <span className={styles.open}> {stage.openUnits} open</span>}
      </td>
      <td className={`${styles.end} ${styles.previous}`}>
        {previous.share === null ? '–' : percentText(previous.share)}
      </td>
    </tr>
  );
}

function standingText({ firstPass, target }: TodayStage, standing: TargetStanding | null): string {
  if (firstPass.share === null) return 'no units yet';
  if (target === null) return 'no target';
  return `${percentText(target, 0)} ${standing ? standings[standing] : ''}`.trim();
}

/** A count leads to its units; a zero leads nowhere. */
function Count({ count, to, word }: { count: number; to: string; word: string }) {
  if (count === 0) return <>0</>;
  return (
    <Link to={to} aria-label={`${count} ${word}`}>
      {count}
    </Link>
  );
}
