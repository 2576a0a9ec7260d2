import type { Instrument, Station } from '@/types/api';
import { LARGEST_CLOCK_SKEW_SECONDS } from '@/utils/clock-skew';
import { formatTime } from '@/utils/format-time';

/** A fact in words, and whether it wants somebody. */
export interface StationFact {
  text: string;
  isTrouble: boolean;
}

const stateWords: Record<Station['state'], string> = {
  posting: 'Posting',
  quiet: 'Quiet',
  neverPosted: 'Never posted',
};

export function stateFact({ active, state }: Station): StationFact {
  if (!active) return { text: 'Out of service', isTrouble: false };
  return { text: stateWords[state], isTrouble: state === 'quiet' };
}

/** `clockSkewSeconds` is server minus station: a positive one means a clock that is late. */
export function clockFact({ clockSkewSeconds }: Station): StationFact {
  if (clockSkewSeconds === null) return { text: '–', isTrouble: false };
  const seconds = Math.abs(clockSkewSeconds);
  if (seconds < 1) return { text: 'right', isTrouble: false };
  const amount = seconds < 120 ? `${Math.round(seconds)} s` : `${Math.round(seconds / 60)} min`;
  return {
    text: `${amount} ${clockSkewSeconds > 0 ? 'late' : 'early'}`,
    isTrouble: seconds > LARGEST_CLOCK_SKEW_SECONDS,
  };
}

export const dayText = (day: string): string => formatTime(`${day}T00:00:00Z`, 'UTC', 'date');

/** The instrument that needs calibration first says how the station stands. */
export function calibrationFact(instruments: readonly Instrument[]): StationFact {
  if (instruments.length === 0) return { text: 'no instruments', isTrouble: false };
  const first = instruments
    .filter(({ calibrationDueOn }) => calibrationDueOn !== null)
    .sort((a, b) => (a.calibrationDueOn ?? '').localeCompare(b.calibrationDueOn ?? ''))[0];
  if (!first?.calibrationDueOn) return { text: 'no date known', isTrouble: false };
  return first.calibrationOverdue
    ? { text: `${first.serialNumber} overdue since ${dayText(first.calibrationDueOn)}`, isTrouble: true }
    : { text: `until ${dayText(first.calibrationDueOn)}`, isTrouble: false };
}
