import type { Yield } from '@/types/api';

export interface YieldScale {
  from: number;
  to: number;
  ticks: number[];
}

/** Where the scale may start, and into how many parts it is then divided. */
const STARTS: [start: number, parts: number][] = [
  [0.99, 5],
  [0.98, 4],
  [0.95, 5],
  [0.9, 5],
  [0.8, 4],
  [0.7, 3],
  [0.6, 4],
  [0.5, 5],
  [0.4, 6],
  [0.3, 7],
  [0.2, 8],
];
const WHOLE: [start: number, parts: number] = [0, 5];

/** One scale for all yields that are shown together: it ends at 100 % and starts at a round figure below the lowest. */
export function yieldScale(yields: Yield[], targets: (number | null)[]): YieldScale {
  const lowest = Math.min(1, ...yields.map(({ low }) => low ?? 1), ...targets.map((target) => target ?? 1));
  const [from, parts] = STARTS.find(([start]) => start < lowest) ?? WHOLE;
  return {
    from,
    to: 1,
    ticks: Array.from({ length: parts + 1 }, (_, index) => from + ((1 - from) * index) / parts),
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
