import type { Today } from '@/types/api';
import { standingToTarget } from '@/utils/yield-scale';

const counted = (count: number, one: string, many: string) => `${count} ${count === 1 ? one : many}`;

/** The state of the line in one sentence. */
export function todaySummary({ products, openBreaches, worse }: Today): string {
  const stages = products.flatMap((product) => product.stages);
  const tested = stages.filter(({ firstPass }) => firstPass.total > 0);
  const below = tested.filter(
    ({ firstPass, target }) => standingToTarget(firstPass, target) === 'below',
  ).length;
  const silent = worse.filter(({ kind }) => kind === 'silent').length;
  const yieldWords =
    tested.length === 0
      ? 'Nothing tested yet today'
      : below === 0
        ? 'No stage is below its yield target'
        : `${counted(below, 'stage is', 'stages are')} below the yield target`;
  const words = [
    yieldWords,
    openBreaches.length === 0
      ? 'no breach is open'
      : `${counted(openBreaches.length, 'breach is', 'breaches are')} open`,
    silent === 0 ? null : `${counted(silent, 'station is', 'stations are')} silent`,
  ];
  return `${words.filter(Boolean).join(', ')}.`;
}
