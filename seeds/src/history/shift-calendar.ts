import { DateTime } from 'luxon';
import { SITE_ZONE } from '../scenario/stories.js';

/** `off`: nobody but a few people who catch up. */
export type Shift = 'early' | 'late' | 'off';

/** The line's working hours over a period. */
export interface ShiftCalendar {
  shiftAt(at: Date): Shift;
  /** Share of its full speed at which the line runs. */
  speedAt(at: Date): number;
  /** When each shift of the period began. */
  readonly shiftStarts: readonly Date[];
}

interface Hour {
  shift: Shift;
  speed: number;
}

const HOUR_MS = 3_600_000;
const OFF: Hour = { shift: 'off', speed: 0.05 };

/** Two shifts from Monday to Friday, half a crew on Saturday morning, by the site's clock. */
export function createShiftCalendar(from: Date, until: Date): ShiftCalendar {
  const hours: Hour[] = [];
  const shiftStarts: Date[] = [];
  const first = Math.floor(from.getTime() / HOUR_MS);
  let before = hourOf(first - 1).shift;
  for (let hour = first; hour * HOUR_MS <= until.getTime(); hour++) {
    const next = hourOf(hour);
    const at = new Date(hour * HOUR_MS);
    if (next.shift !== 'off' && next.shift !== before && at >= from) shiftStarts.push(at);
    hours.push(next);
    before = next.shift;
  }
  const find = (at: Date) => hours[Math.floor(at.getTime() / HOUR_MS) - first] ?? OFF;
  return { shiftAt: (at) => find(at).shift, speedAt: (at) => find(at).speed, shiftStarts };
}

/** @param hourNumber hours since 1970 in UTC; the site's zone differs from it by whole hours */
function hourOf(hourNumber: number): Hour {
  const { weekday, hour } = DateTime.fromMillis(hourNumber * HOUR_MS, { zone: SITE_ZONE });
  if (weekday === 7 || hour < 6 || hour >= 22) return OFF;
  if (hour < 14) return { shift: 'early', speed: weekday === 6 ? 0.4 : 1 };
  return weekday === 6 ? OFF : { shift: 'late', speed: 1 };
}
