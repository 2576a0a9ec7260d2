import type { TestPlan } from '@/types/api';
import { planWords } from '../limit-words';
import styles from './step-drawing.module.css';

const WIDTH = 240;
const HEIGHT = 64;
const PADDING = 4;

/** The load steps as a staircase in the order in which they are set, the reference voltage as a dashed level. */
export function StepDrawing({ plan }: { plan: TestPlan }) {
  const steps = stepsInOrder(plan);
  const highest = Math.max(...steps, plan.referenceVolts);
  const lowest = Math.min(0, ...steps);
  const level = (volts: number) =>
    HEIGHT - PADDING - ((volts - lowest) / (highest - lowest || 1)) * (HEIGHT - 2 * PADDING);
  const width = (WIDTH - 2 * PADDING) / steps.length;
  const path = steps
    .map((volts, step) => `${step === 0 ? 'M' : 'L'}${PADDING + step * width} ${level(volts)}h${width}`)
    .join('');
  return (
    <svg
      className={styles.steps}
      width={WIDTH}
      height={HEIGHT}
      viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
      role="img"
      aria-label={planWords(plan)}
    >
      <path className={styles.frame} d={`M${PADDING} 0V${HEIGHT - PADDING}H${WIDTH}`} />
      <path className={styles.reference} d={`M${PADDING} ${level(plan.referenceVolts)}H${WIDTH}`} />
      <path className={styles.line} d={path} />
    </svg>
  );
}

/** Every step as it is set: down again where the plan says so, the first one repeated at the end. */
function stepsInOrder({ loadVolts, upAndDown, repeatFirst }: TestPlan): number[] {
  const down = upAndDown ? [...loadVolts].reverse().slice(1) : [];
  const first = loadVolts[0];
  return [...loadVolts, ...down, ...(repeatFirst && first !== undefined ? [first] : [])];
}
