import type { Yield } from '@/types/api';
import { percentText } from '@/utils/format-figure';
import { scalePlace, type YieldScale } from '@/utils/yield-scale';
import styles from './yield-bar.module.css';

export interface YieldBarProps {
  figures: Yield;
  target: number | null;
  scale: YieldScale;
}

/** A yield on a ruled scale: its 95 % interval as a bar, the share as a stroke, the target as a flag. */
export function YieldBar({ figures, target, scale }: YieldBarProps) {
  const { share, low, high } = figures;
  const place = (value: number) => `${scalePlace(value, scale)}%`;
  return (
    <div className={styles.bar} role="img" aria-label={yieldWords(figures, target)}>
      {scale.ticks.map((tick) => (
        <span key={tick} className={styles.tick} style={{ left: place(tick) }} />
      ))}
      {low !== null && high !== null && (
        <span
          className={styles.interval}
          style={{ left: place(low), width: `${scalePlace(high, scale) - scalePlace(low, scale)}%` }}
        />
      )}
      {target !== null && <span className={styles.target} style={{ left: place(target) }} />}
      {share !== null && <span className={styles.share} style={{ left: place(share) }} />}
    </div>
  );
}

/** The scale's figures, to stand once above the bars that share it. */
export function YieldBarScale({ scale }: { scale: YieldScale }) {
  return (
    <div className={styles.scale} aria-hidden>
      {scale.ticks.map((tick) => (
        <span key={tick} className="figures" style={{ left: `${scalePlace(tick, scale)}%` }}>
          {Math.round(tick * 1000) / 10}
        </span>
      ))}
    </div>
  );
}

function yieldWords({ passed, total, share, low, high }: Yield, target: number | null): string {
  const goal = target === null ? 'no target' : `target ${percentText(target)}`;
  if (share === null || low === null || high === null) return `no units yet, ${goal}`;
  return `${percentText(share)}, ${passed} of ${total}, 95 % interval ${percentText(low)} to ${percentText(high)}, ${goal}`;
}
