import type { ResultPost } from '@ampkeep/station-sim/dist/types/result-post.js';

/** What a newly programmed station got wrong on its first day: bodies that the hub refuses and keeps. */
export function refusedPosts(example: ResultPost): { station: string; hoursAgo: number; body: unknown }[] {
  const { outputAmps, ...voltsOnly } = example.points[0] ?? { loadVolts: 0, outputAmps: 0 };
  return [
    {
      station: 'south-1',
      hoursAgo: 26,
      body: { ...example, points: [{ ...voltsOnly, outputAmp: outputAmps }, ...example.points.slice(1)] },
    },
    { station: 'south-1', hoursAgo: 25.5, body: { ...example, stage: 'burn-in' } },
    { station: 'north-2', hoursAgo: 9, body: { ...example, partNumber: 'FH-R500W' } },
  ];
}
