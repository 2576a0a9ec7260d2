import { Link } from 'react-router-dom';
import { Impedance } from '@/components/ui/impedance';
import { LabelTag } from '@/components/ui/label-tag';
import { SlopeMark } from '@/components/ui/slope-mark';
import { TimeText } from '@/components/ui/time-text';
import { VerdictMark } from '@/components/ui/verdict-mark';
import { paths } from '@/config/paths';
import type { RunItem, Unit, UnitStage } from '@/types/api';
import styles from './attempt-list.module.css';

/** Every result of the unit, stage by stage, oldest first; one of them is on show. */
export function AttemptList({ unit, shownResultId }: { unit: Unit; shownResultId: string }) {
  return (
    <>
      {unit.stages.map((stage) => (
        <div key={stage.stage} className={styles.stage}>
          <h3 className={styles.name}>
            {stage.stage} <span className={styles.count}>{attemptsText(stage)}</span>
          </h3>
          <ol>
            {stage.results.map((run) => (
              <Attempt key={run.resultId} run={run} isShown={run.resultId === shownResultId} />
            ))}
          </ol>
        </div>
      ))}
    </>
  );
}

function attemptsText({ results, maxAttempts }: UnitStage): string {
  const counted = results.filter(({ attempt }) => attempt !== null).length;
  return `${counted} of at most ${maxAttempts} attempts`;
}

const kinds: Record<RunItem['runKind'], string | null> = {
  production: null,
  golden: 'golden unit',
  study: 'study',
  practice: 'practice',
};

function attemptName({ attempt, outcome }: RunItem): string {
  if (attempt !== null) return `Attempt ${attempt}`;
  return outcome === 'aborted' ? 'Aborted, not counted' : 'Not counted';
}

function Attempt({ run, isShown }: { run: RunItem; isShown: boolean }) {
  const name = attemptName(run);
  const kind = kinds[run.runKind];
  return (
    <li className={styles.attempt} aria-current={isShown ? 'true' : undefined}>
      <SlopeMark slope={run.slope} size={48} />
      <span className={styles.what}>
        {isShown ? (
          <strong>{name}</strong>
        ) : (
          <Link to={paths.unit(run.partNumber, run.serialNumber, run.resultId)}>{name}</Link>
        )}
        {kind && (
          <>
            {' '}
            <LabelTag>{kind}</LabelTag>
          </>
        )}
        <span className={styles.when}>
          <TimeText at={run.startedAt} /> {run.station}
        </span>
      </span>
      <span className={styles.result}>
        <VerdictMark verdict={run.verdict} />
        <Impedance slope={run.slope} />
      </span>
    </li>
  );
}
