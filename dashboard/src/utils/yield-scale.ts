import type { Yield } from '@/types/api';

export interface YieldScale {
  from: number;
  to: number;
  ticks: number[];
}

const STARTS = [0.99, 0.98, 0.95, 0.9, 0.8, 0.6, 0.5, 0];

/** One scale for all yields that are shown together: it ends at 100 % and starts at a round figure below the lowest. */
export function yieldScale(yields: Yield[], targets: (number | null)[]): YieldScale {
  const lowest = Math.min(1, ...yields.map(({ low }) => low ?? 1), ...targets.map((target) => target ?? 1));
  const from = STARTS.find((start) => start < lowest) ?? 0;
  const span = 1 - from;
  const step = span > 0.5 ? 0.2 : span > 0.2 ? 0.1 : span / 5 > 0.015 ? 0.02 : span / 5;
  const count = Math.round(span / step);
  return {
    from,
    to: 1,
    ticks: Array.from({ length: count + 1 }, (_, index) => from + (span * index) / count),
  };
}

/** Place of a share on the scale in per cent of its length, kept inside it. */
export function scalePlace(share: number, { from, to }: YieldScale): number {
  return Math.min(100, Math.max(0, ((share - from) / (to - from)) * 100));
}

export type TargetStanding = 'below' | 'met' | 'open';

/** Where a yield stands to its target: only an interval that lies wholly on one side says so. */
export function standingToTarget({ low, high }: Yield, target: number | null): TargetStanding | null {
  if (target === null || low === null || high === null) return null;
  if (high < target) return 'below';
  return low >= target ? 'met' : 'open';
}
