/** What went wrong at Fernhollow Controls in the week before now; times are hours before now. */
export const stories = {
  /** An ammeter whose gain drifts: setpoint errors creep up until Wilson mirrors fail. */
  gainDrift: { station: 'north-3', fromHoursAgo: 110, gainPerDay: 0.0021 },
  /** Transistors of one delivery have a low Early voltage: the lot's output impedance is low. */
  lowEarlyLot: { partNumber: 'FH-R500-W', hoursAgo: 66, earlyVolts: 60 },
  /** After a bridge job the ammeter stayed on its 100 mA range: impedance can't be proven. */
  coarseRange: { station: 'north-2', fromHoursAgo: 52, untilHoursAgo: 43, rangeAmps: 0.1 },
  /** One fixture's contacts are worn: some insertions lose voltage and with it compliance. */
  poorContact: {
    station: 'south-2',
    fixture: '2',
    fromHoursAgo: 40,
    insertionShare: 0.45,
    lostVolts: [1.2, 3.5],
  },
  /** The network was away: posts waited at the stations and came late, out of order. */
  outage: { fromHoursAgo: 88, untilHoursAgo: 84 },
} as const;
