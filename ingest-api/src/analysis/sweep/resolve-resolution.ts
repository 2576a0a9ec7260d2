import type { AmmeterSpec } from '../analysis.types.js';

/** No bench ammeter is taken to resolve finer than this share of its reading unless it says so (6½ digits). */
const FINEST_ASSUMED = 1e-6;

export interface Resolution {
  /** δ in A, always positive. */
  resolutionAmps: number;
  /** The finest step the readings are written in, no larger than δ: what a bend must exceed to be seen. */
  writtenStepAmps: number;
  /** True when nobody stated δ and it was read off the readings. */
  assumed: boolean;
}

/**
 * The ammeter's resolution δ: what post or register state, else the step seen in the readings.
 *
 * The step seen is the largest one of which all differences between readings are multiples (1.54, 1.30, 1.12 mA:
 * 0.06 mA); with identical readings the last decimal place they are written with (1.04 mA: 0.01 mA). It is taken
 * no finer than 10⁻⁶ of the largest reading, and never 0: readings of nothing but zeros get 0.1 % of the nominal
 * current. Cost: n log n.
 *
 * @param readings - currents as the meter gave them (A), overloads left out
 */
export function resolveResolution(
  readings: readonly number[],
  ammeter: AmmeterSpec,
  nominalAmps: number,
): Resolution {
  const stated = ammeter.resolutionAmps;
  if (stated !== undefined && stated > 0) return statedResolution(stated);
  const largest = readings.reduce((most, reading) => Math.max(most, Math.abs(reading)), 0);
  if (!(largest > 0)) {
    const step = 1e-3 * Math.abs(nominalAmps);
    return { resolutionAmps: step, writtenStepAmps: step, assumed: true };
  }
  const finest = FINEST_ASSUMED * largest;
  const written = Math.max(finest, Math.min(...readings.map(lastDecimalPlace)));
  const resolutionAmps = Math.max(finest, commonStep(readings, finest) ?? written);
  return { resolutionAmps, writtenStepAmps: Math.min(written, resolutionAmps), assumed: true };
}

function statedResolution(amps: number): Resolution {
  return { resolutionAmps: amps, writtenStepAmps: amps, assumed: false };
}

/** Euclid's algorithm over the gaps between sorted readings; null when all readings are equal. */
function commonStep(readings: readonly number[], finest: number): number | null {
  const sorted = Float64Array.from(readings).sort();
  let step = 0;
  for (let i = 1; i < sorted.length; i++) {
    const gap = sorted[i]! - sorted[i - 1]!;
    if (gap > finest / 2) step = commonDivisor(step, gap, finest / 2);
  }
  return step > 0 ? step : null;
}

/** Largest common divisor of two steps; a remainder within the slack of 0 or of the divisor is rounding. */
function commonDivisor(a: number, b: number, slack: number): number {
  let divisor = Math.max(a, b);
  let remainder = Math.min(a, b);
  while (remainder > slack) {
    const left = divisor % remainder;
    divisor = remainder;
    remainder = divisor - left < slack ? 0 : left;
  }
  return divisor;
}

/** 0.00104 → 0.00001: the place of the last digit of the shortest decimal that is this number; 1 for 0. */
function lastDecimalPlace(reading: number): number {
  const [mantissa = '', exponent = '0'] = reading.toExponential().split('e');
  const decimals = mantissa.split('.')[1]?.length ?? 0;
  return Number(`1e${Number(exponent) - decimals}`);
}
