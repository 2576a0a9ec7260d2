import type { Station } from '@/types/api';

/** Clocks further apart than this are flagged by the intake as well. */
const CLOCK_SKEW_SECONDS = 30;

/** What is wrong with a station, worst first; empty for a healthy one. */
export function stationTroubles(station: Station, now: number): string[] {
  const troubles: string[] = [];
  if (station.state === 'quiet') troubles.push('quiet');
  if (station.instruments.some(({ calibrationOverdue }) => calibrationOverdue))
    troubles.push('calibration overdue');
  if (station.goldenDueAt !== null && Date.parse(station.goldenDueAt) <= now)
    troubles.push('golden check due');
  if (Math.abs(station.clockSkewSeconds ?? 0) > CLOCK_SKEW_SECONDS) troubles.push('clock off');
  return troubles;
}
