import { DateTime } from 'luxon';

/** Where Fernhollow Controls is. */
export const SITE_ZONE = 'Europe/London';

/** What went wrong at Fernhollow Controls; times are hours before the end of the history. */
export const stories = {
  /** An ammeter whose gain drifts over weeks: setpoint errors creep up until Wilson mirrors fail. */
  gainDrift: { station: 'north-3', fromHoursAgo: 24 * 24, gainPerDay: 0.0004 },
  /** Transistors of one delivery have a low Early voltage: the lot's output impedance is low. */
  lowEarlyLot: { partNumber: 'FH-R500-M', hoursAgo: 120, earlyVolts: 62 },
  /** After a bridge job the ammeter stayed on its 100 mA range for days: impedance can't be proven. */
  coarseRange: { station: 'north-2', fromHoursAgo: 17 * 24, untilHoursAgo: 13 * 24, rangeAmps: 0.1 },
  /** One fixture's contacts are worn: some insertions lose voltage and with it compliance. */
  poorContact: {
    station: 'south-2',
    fixture: '2',
    fromHoursAgo: 6 * 24,
    insertionShare: 0.45,
    lostVolts: [1.2, 3.5],
  },
} as const;

export interface Outage {
  from: Date;
  until: Date;
}

const OUTAGE_DAYS_AGO = 4;

/**
 * The network was away from one evening to the next morning: posts waited at the stations and came late, out of
 * order. The evening is that of a working day.
 */
export function outageBefore(now: Date): Outage {
  let evening = DateTime.fromJSDate(now, { zone: SITE_ZONE })
    .minus({ days: OUTAGE_DAYS_AGO })
    .set({ hour: 17, minute: 40, second: 0, millisecond: 0 });
  while (evening.weekday > 5) evening = evening.minus({ days: 1 });
  const morning = evening.plus({ days: 1 }).set({ hour: 6, minute: 25 });
  return { from: evening.toJSDate(), until: morning.toJSDate() };
}
