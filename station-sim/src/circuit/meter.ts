import type { Ammeter, Voltmeter } from './instruments.js';
import type { RandomSource } from './random.js';

export interface Reading {
  value: number;
  overload: boolean;
}

/** A range reads up to 20 % beyond its name, then shows overload (common practice). */
const OVER_RANGE = 1.2;

/** What the ammeter shows for a true current in A: gain, offset, noise, range, then rounding to its resolution. */
export function readAmmeter(trueAmps: number, meter: Ammeter, random: RandomSource): Reading {
  const analog = trueAmps * (1 + meter.gainError) + meter.offsetAmps + random.normal(0, meter.noiseAmps);
  const fullScale = OVER_RANGE * meter.rangeAmps;
  if (Math.abs(analog) > fullScale) return { value: Math.sign(analog) * fullScale, overload: true };
  return { value: roundToResolution(analog, meter.resolutionAmps), overload: false };
}

/** What the voltmeter shows for a true voltage in V. */
export function readVoltmeter(trueVolts: number, meter: Voltmeter, random: RandomSource): number {
  const analog = trueVolts * (1 + meter.gainError) + random.normal(0, meter.noiseVolts);
  return roundToResolution(analog, meter.resolutionVolts);
}

/** Nearest multiple of a decimal resolution, without the binary dust that would lengthen the posted JSON. */
function roundToResolution(value: number, resolution: number): number {
  const rounded = Number((Math.round(value / resolution) * resolution).toPrecision(12));
  return rounded === 0 ? 0 : rounded;
}
