import type { RandomSource } from './random.js';

/**
 * A version 7 UUID (RFC 9562, section 5.7): 48 bits of Unix milliseconds, the rest from the seeded source,
 * so the same run gives the same ids and the ids sort by time.
 */
export function seededUuid(at: Date, random: RandomSource): string {
  const hex = (bits: number) =>
    random
      .integer(0, 2 ** bits - 1)
      .toString(16)
      .padStart(bits / 4, '0');
  const time = at.getTime().toString(16).padStart(12, '0');
  const variant = (8 + random.integer(0, 3)).toString(16);
  return `${time.slice(0, 8)}-${time.slice(8)}-7${hex(12)}-${variant}${hex(12)}-${hex(24)}${hex(24)}`;
}
