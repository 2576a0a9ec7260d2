import type { SlopeFigures } from '@/types/api';
import { boxExit, slopeAngles, type Point } from './slope-geometry';
import styles from './slope-mark.module.css';
import { slopeWords } from './slope-words';

const ASPECT = 1.6;

export interface SlopeMarkProps {
  slope: SlopeFigures;
  /** Width in CSS pixels, 24 to 120. */
  size?: number;
  /** True beside text that already says the same. */
  isDecorative?: boolean;
}

/**
 * The fitted line of a unit against the level line of an ideal source. The limit's slope is always drawn at 20°, the
 * unit's in proportion; what the measurement leaves open is a fan.
 */
export function SlopeMark({ slope, size = 40, isDecorative = false }: SlopeMarkProps) {
  const width = size;
  const height = Math.round(size / ASPECT);
  const weight = size >= 80 ? 3 : size >= 36 ? 2.25 : 2;
  const pivot: Point = { x: weight, y: height * 0.24 };
  const angles = slopeAngles(slope);
  const exit = (degrees: number) => boxExit(pivot, degrees, width - 1, height - 1);
  const limitEnd = angles.limitDegrees === null ? null : exit(angles.limitDegrees);
  const name = isDecorative ? { 'aria-hidden': true } : { role: 'img', 'aria-label': slopeWords(slope) };

  return (
    <svg className={styles.mark} width={width} height={height} viewBox={`0 0 ${width} ${height}`} {...name}>
      <line className={styles.level} x1={pivot.x} y1={pivot.y} x2={width - 1} y2={pivot.y} />
      {limitEnd && size >= 40 && (
        <path className={styles.beyond} d={beyondLimit(pivot, limitEnd, width - 1, height - 1)} />
      )}
      {limitEnd && (
        <line className={styles.limit} x1={pivot.x} y1={pivot.y} x2={limitEnd.x} y2={limitEnd.y} />
      )}
      {angles.fanDegrees && (
        <path
          className={styles.fan}
          d={wedge(pivot, exit(angles.fanDegrees[0]), exit(angles.fanDegrees[1]), width, height)}
        />
      )}
      {angles.unitDegrees !== null && (
        <UnitLine
          from={pivot}
          to={exit(angles.unitDegrees)}
          weight={weight}
          isOpen={angles.fanDegrees !== null}
        />
      )}
      {angles.unitDegrees === null && (
        <circle className={styles.nothing} cx={width / 2} cy={height * 0.6} r={weight} />
      )}
      <circle className={styles.pivot} cx={pivot.x} cy={pivot.y} r={weight} />
    </svg>
  );
}

function UnitLine({ from, to, weight, isOpen }: { from: Point; to: Point; weight: number; isOpen: boolean }) {
  return (
    <line
      className={isOpen ? styles.openUnit : styles.unit}
      strokeWidth={isOpen ? weight * 0.6 : weight}
      x1={from.x}
      y1={from.y}
      x2={to.x}
      y2={to.y}
    />
  );
}

const at = ({ x, y }: Point) => `${x.toFixed(2)} ${y.toFixed(2)}`;

/** Triangle between two rays, with the box's corner where they leave it by different sides. */
function wedge(pivot: Point, low: Point, high: Point, width: number, height: number): string {
  const corner = low.x >= width - 1.01 && high.x < width - 1.01 ? ` L ${width - 1} ${height - 1}` : '';
  return `M ${at(pivot)} L ${at(low)}${corner} L ${at(high)} Z`;
}

function beyondLimit(pivot: Point, limitEnd: Point, right: number, bottom: number): string {
  return `M ${at(pivot)} L ${at(limitEnd)} L ${right} ${bottom} L ${pivot.x} ${bottom} Z`;
}
