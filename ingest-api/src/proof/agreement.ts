import type { StatedDigits, Tolerance } from './proof.types.js';

/** Double precision holds no more. */
const MOST_DIGITS = 15;

export interface Agreement {
  agreeingDigits: number;
  requiredDigits: number;
}

/**
 * To how many digits a computed value agrees with a printed figure, and how many it must.
 *
 * A figure printed with n significant digits must be met within `withinUnits` units of its n-th digit; the agreeing
 * digits are the most for which that holds. Where a program in double precision cannot reach the printed digits,
 * and for exact numbers, the case's tolerance takes their place (see `agreementWithin`).
 *
 * @param printed - decimal text of the source
 * @param withinUnits - ½ for correctly rounded figures
 */
export function agreementWithPrinted(
  printed: string,
  computed: number,
  digits: StatedDigits,
  withinUnits: number,
  tolerance: Tolerance,
): Agreement {
  const stated = statedDigits(printed, digits);
  if (stated === null || stated.count > digitsOf(tolerance))
    return agreementWithin(printed, computed, tolerance);
  const deviation = Math.abs(computed - Number(printed));
  const agrees = (count: number): boolean =>
    deviation <= withinUnits * 10 ** (stated.leadingExponent - count + 1) * (1 + 1e-9);
  let agreeingDigits = 0;
  while (agreeingDigits < MOST_DIGITS && agrees(agreeingDigits + 1)) agreeingDigits += 1;
  return { agreeingDigits, requiredDigits: stated.count };
}

/**
 * Agreement measured by the deviation itself: −log₁₀ of the relative (or absolute, as the tolerance is) deviation,
 * rounded down; the tolerance's own −log₁₀ is required.
 */
export function agreementWithin(expected: string, computed: number, tolerance: Tolerance): Agreement {
  const reference = Number(expected);
  const deviation = Math.abs(computed - reference);
  const relative =
    tolerance.rel !== undefined && reference !== 0 ? deviation / Math.abs(reference) : deviation;
  const agreeing = relative === 0 ? MOST_DIGITS : Math.floor(-Math.log10(relative) + 1e-9);
  return {
    agreeingDigits: Number.isNaN(agreeing) ? 0 : Math.min(MOST_DIGITS, Math.max(0, agreeing)),
    requiredDigits: digitsOf(tolerance),
  };
}

/** −log₁₀ of a tolerance, in whole digits. */
export function digitsOf({ rel, abs }: Tolerance): number {
  return Math.min(MOST_DIGITS, Math.round(-Math.log10(rel ?? abs ?? 1e-15)));
}

/**
 * How many significant digits the source states, counted from which power of ten. Decimals of a figure below their
 * own last place (0.00 to two decimals) count from the units place. Null for exact numbers.
 */
function statedDigits(
  printed: string,
  { sig, dp }: StatedDigits,
): { count: number; leadingExponent: number } | null {
  const value = Math.abs(Number(printed));
  const exponent = value === 0 ? 0 : Number(value.toExponential().split('e')[1]);
  if (sig !== undefined) return { count: sig, leadingExponent: exponent };
  if (dp === undefined) return null;
  const count = dp + exponent + 1;
  return value === 0 || count < 1 ? { count: dp, leadingExponent: -1 } : { count, leadingExponent: exponent };
}
