import type { ResultPost } from '@ampkeep/station-sim/dist/types/result-post.js';

/** A body that the hub refuses and keeps. */
export interface RefusedBody {
  station: string;
  hoursAgo: number;
  /** How often the station tried, a minute apart. */
  times: number;
  body: string;
}

/**
 * What stations got wrong: newly written programs on their first day, and a station that tried one post again and
 * again.
 *
 * @param example a post that the hub took
 */
export function refusedPosts(example: ResultPost): RefusedBody[] {
  const { outputAmps, ...voltsOnly } = example.points[0] ?? { loadVolts: 0, outputAmps: 0 };
  const { startedAt, ...withoutStart } = example;
  const text = JSON.stringify(example);
  return [
    once('south-2', 33 * 24 + 2, JSON.stringify({ ...withoutStart, startTime: startedAt })),
    once('south-2', 33 * 24 + 1, text.replace('{', `{"stage":"final",`)),
    once('north-4', 19 * 24, text.slice(0, text.length / 2)),
    once('north-1', 12 * 24, JSON.stringify({ ...example, operator: 'B199' })),
    {
      station: 'north-3',
      hoursAgo: 6 * 24,
      times: 14,
      body: JSON.stringify({ ...example, supplyVolts: '9.003 V' }),
    },
    once(
      'south-1',
      26,
      JSON.stringify({
        ...example,
        points: [{ ...voltsOnly, outputAmp: outputAmps }, ...example.points.slice(1)],
      }),
    ),
    once('south-1', 25.5, JSON.stringify({ ...example, stage: 'burn-in' })),
    once('north-2', 9, JSON.stringify({ ...example, partNumber: 'FH-R500W' })),
  ];
}

const once = (station: string, hoursAgo: number, body: string): RefusedBody => ({
  station,
  hoursAgo,
  times: 1,
  body,
});
