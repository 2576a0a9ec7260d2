import type { Yield } from '@/types/api';
import { percentText } from '@/utils/format-figure';
import { scalePlace, type YieldScale } from '@/utils/yield-scale';
import styles from './group-trend.module.css';

const WIDTH = 220;
const HEIGHT = 48;
const PADDING = 4;

export interface GroupTrendProps {
  name: string;
  trend: Yield[];
  whole: Yield[];
  scale: YieldScale;
}

/** A small multiple: the group's first-pass yield step by step, the whole's faint and dashed behind it. */
export function GroupTrend({ name, trend, whole, scale }: GroupTrendProps) {
  const points = trend.flatMap((figures, step) =>
    figures.share === null ? [] : [{ step, x: place(step, trend.length), y: height(figures.share, scale) }],
  );
  return (
    <svg
      className={styles.trend}
      width={WIDTH}
      height={HEIGHT}
      viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
      role="img"
      aria-label={`${name}: ${trendWords(trend)}`}
    >
      {scale.ticks.map((tick) => (
        <path key={tick} className={styles.grid} d={`M0 ${height(tick, scale)}H${WIDTH}`} />
      ))}
      <path className={styles.whole} d={linePath(whole, scale)} />
      <path className={styles.group} d={linePath(trend, scale)} />
      {points.map(({ step, x, y }) => (
        <circle key={step} className={styles.point} cx={x} cy={y} r={trend.length > 60 ? 1 : 2} />
      ))}
    </svg>
  );
}

const place = (step: number, steps: number): number =>
  PADDING + ((step + 0.5) / steps) * (WIDTH - 2 * PADDING);
const height = (share: number, scale: YieldScale): number =>
  HEIGHT - PADDING - (scalePlace(share, scale) / 100) * (HEIGHT - 2 * PADDING);

/** A line through neighbouring steps; a step without units breaks it. */
function linePath(trend: Yield[], scale: YieldScale): string {
  return trend
    .map(({ share }, step) => {
      if (share === null) return '';
      const isJoined = step > 0 && trend[step - 1]?.share != null;
      return `${isJoined ? 'L' : 'M'}${place(step, trend.length).toFixed(1)} ${height(share, scale).toFixed(1)}`;
    })
    .join('');
}

function trendWords(trend: Yield[]): string {
  const shares = trend.flatMap(({ share }) => (share === null ? [] : [share]));
  const [first, last] = [shares[0], shares.at(-1)];
  if (first === undefined || last === undefined) return 'no units';
  return `first-pass yield from ${percentText(first)} to ${percentText(last)}, lowest ${percentText(Math.min(...shares))}`;
}
