import { DataTable, type DataColumn } from '@/components/ui/data-table';
import { TimeText } from '@/components/ui/time-text';
import type { MeasureLimit, ProductStage } from '@/types/api';
import { figureText, percentText } from '@/utils/format-figure';
import { measureName } from '@/utils/measure-names';
import { limitWords, planWords, riskWords } from '../limit-words';
import styles from './stage-limits.module.css';
import { StepDrawing } from './step-drawing';

const columns: DataColumn<MeasureLimit>[] = [
  {
    key: 'measure',
    head: 'Measure',
    isRowHead: true,
    isTight: true,
    cell: ({ measure }) => measureName(measure),
  },
  {
    key: 'limit',
    head: 'Limit',
    isTight: true,
    cell: (limit) => <span className="figures">{limitWords(limit)}</span>,
  },
  {
    key: 'rule',
    head: 'Rule',
    isTight: true,
    cell: ({ rule, guardFactor }) => `${rule}, guard factor ${guardFactor}`,
  },
  {
    key: 'risk',
    head: 'What that means',
    cell: (limit) => <span className={styles.risk}>{riskWords(limit)}</span>,
  },
];

/** What one product has to prove at one stage, and by which steps. */
export function StageLimits({ partNumber, stage }: { partNumber: string; stage: ProductStage }) {
  const { testPlan, limitSet, yieldTarget, maxAttempts } = stage;
  return (
    <section className={styles.stage} aria-label={`${partNumber} ${stage.stage}`}>
      <h3 className={styles.name}>
        {stage.position}. {stage.stage}
      </h3>
      <p className={styles.note}>
        {maxAttempts} {maxAttempts === 1 ? 'attempt' : 'attempts'},{' '}
        {yieldTarget === null ? 'no yield target' : `yield target ${percentText(yieldTarget)}`}
      </p>
      {testPlan ? (
        <div className={styles.plan}>
          <StepDrawing plan={testPlan} />
          <p>
            <strong>Test plan {testPlan.version}.</strong> {planWords(testPlan)}{' '}
            <span className={styles.note}>
              Steps: {testPlan.loadVolts.map((volts) => figureText(volts, 'V')).join(', ')}.
            </span>
          </p>
        </div>
      ) : (
        <p className={styles.none}>No test plan is in force.</p>
      )}
      {limitSet ? (
        <>
          <p className={styles.released}>
            <strong>Limits {limitSet.version}</strong>, in force since{' '}
            <TimeText at={limitSet.effectiveAt} show="date" />, released by {limitSet.releasedBy} on{' '}
            <TimeText at={limitSet.releasedAt} show="date" />
          </p>
          <DataTable
            caption={`Limits of ${partNumber} at ${stage.stage}`}
            columns={columns}
            rows={limitSet.limits}
            rowKey={({ measure }) => measure}
          />
        </>
      ) : (
        <p className={styles.none}>No limits are released: results are kept and shown, but not judged.</p>
      )}
    </section>
  );
}
