import type { RandomSource } from '@ampkeep/station-sim/dist/circuit/random.js';

/** Temperature on the line in °C: warmest in the afternoon, coolest before dawn (UTC). */
export function ambientCelsius(at: Date, random: RandomSource): number {
  const hour = at.getUTCHours() + at.getUTCMinutes() / 60;
  return 22.8 + 1.2 * Math.sin((2 * Math.PI * (hour - 9)) / 24) + random.normal(0, 0.2);
}
