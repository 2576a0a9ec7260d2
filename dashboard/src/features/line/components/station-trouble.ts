import type { Station } from '@/types/api';
import { LARGEST_CLOCK_SKEW_SECONDS } from '@/utils/clock-skew';

/** What is wrong with a station, worst first; empty for a healthy one. */
export function stationTroubles(station: Station, now: number): string[] {
  const troubles: string[] = [];
  if (station.state === 'quiet') troubles.push('quiet');
  if (station.instruments.some(({ calibrationOverdue }) => calibrationOverdue))
    troubles.push('calibration overdue');
  if (station.goldenDueAt !== null && Date.parse(station.goldenDueAt) <= now)
    troubles.push('golden check due');
  if (Math.abs(station.clockSkewSeconds ?? 0) > LARGEST_CLOCK_SKEW_SECONDS) troubles.push('clock off');
  return troubles;
}
