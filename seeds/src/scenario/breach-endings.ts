import { stories } from './stories.js';

/** How the quality lead's office closes a breach by its measure, once its cause was found. */
export const breachEndings: Readonly<Record<string, { cause: string; action: string }>> = {
  outputImpedance: {
    cause: 'Output transistor leaks or has a low Early voltage; confirmed on the curve tracer.',
    action: 'Units scrapped, the delivery of transistors reported to its supplier.',
  },
  setpointError: {
    cause: 'Set resistor of the neighbouring value was fitted.',
    action: 'Feeder of the placement machine checked and relabelled, units repaired.',
  },
  complianceVoltage: {
    cause: 'Cracked solder joint at the output pin.',
    action: 'Joint resoldered; handling tray padded.',
  },
  loadRegulation: {
    cause: 'Same units as the compliance voltage: cracked joint.',
    action: 'Closed with it.',
  },
  stoppedOnFail: { cause: 'Open output.', action: 'Unit repaired.' },
};

/** What the quality lead wrote on a breach that is being looked into. */
export const acknowledgement = {
  partNumber: 'FH-T250-C',
  stage: 'final',
  measure: 'complianceVoltage',
  note: 'Only units from fixture 2 of south-2. Contacts are to be looked at.',
} as const;

/** A breach is taken as mended once nothing joined it for so many hours. */
export const QUIET_HOURS = 20;

/** What the stories keep open to the end of the history, from so many hours before it. */
export const stillOpen: readonly {
  partNumber: string;
  stage: string;
  measure: string;
  fromHoursAgo: number;
}[] = [
  { partNumber: 'FH-R500-W', stage: 'final', measure: 'setpointError', fromHoursAgo: 8 * 24 },
  {
    partNumber: stories.lowEarlyLot.partNumber,
    stage: 'board',
    measure: 'outputImpedance',
    fromHoursAgo: stories.lowEarlyLot.hoursAgo,
  },
  { ...acknowledgement, fromHoursAgo: stories.poorContact.fromHoursAgo },
];
