import type { Bound } from '../analysis.types.js';

const PREFIXES: ReadonlyMap<number, string> = new Map([
  [-15, 'f'],
  [-12, 'p'],
  [-9, 'n'],
  [-6, 'µ'],
  [-3, 'm'],
  [0, ''],
  [3, 'k'],
  [6, 'M'],
  [9, 'G'],
  [12, 'T'],
]);
const PREFIXED_UNITS: ReadonlySet<string> = new Set(['A', 'V', 'Ω', 'S', 's', 'W', 'F']);

/** Smaller figures mean nothing in any unit used here, and their powers of ten leave the range of numbers. */
const SMALLEST = 1e-30;

const UNCERTAINTY_DIGITS = 2;
const DIGITS_WITHOUT_UNCERTAINTY = 6;
const BOUND_DIGITS = 3;

/** How a group of figures is written: one SI prefix and one last digit for all of them. */
interface Notation {
  prefixExponent: number;
  /** Power of ten of the last digit shown, in the unprefixed unit. */
  lastDigitExponent: number;
}

/**
 * Writes a figure as an engineer would: SI prefix, and as many digits as its uncertainty bears (the uncertainty
 * rounded to two significant digits; JCGM 100:2008, 7.2.6). Without an uncertainty up to six significant digits
 * are written, without trailing zeros, as suits limits and settings.
 *
 * Prefixes are used with A, V, Ω, S, s, W and F, never with %, ppm or ppm/V.
 *
 * @param figure - in the unprefixed unit; below 10⁻³⁰ it is written as 0
 * @param unit - e.g. `Ω`, `ppm/V`
 * @param uncertainty - expanded uncertainty, same unit; null, 0 or left out when unknown
 * @throws RangeError when the value is not finite
 * @example formatFigure(12.1386e6, 'Ω', 0.29e6) // '12.14 MΩ'
 */
export function formatFigure(figure: number, unit: string, uncertainty?: number | null): string {
  const value = readable(figure);
  if (isUsable(uncertainty)) {
    const notation = notationFor(value, unit, uncertainty);
    return withUnit(formatIn(notation, value), unit, notation);
  }
  const notation = notationOfDigits(value, unit, DIGITS_WITHOUT_UNCERTAINTY);
  return withUnit(withoutTrailingZeros(formatIn(notation, value)), unit, notation);
}

/**
 * Writes a value with its expanded uncertainty, e.g. `0.376 ± 0.021 %`.
 *
 * @throws RangeError when the value is not finite
 */
export function formatWithUncertainty(figure: number, unit: string, uncertainty: number | null): string {
  if (!isUsable(uncertainty)) return formatFigure(figure, unit);
  const value = readable(figure);
  const notation = notationFor(value, unit, uncertainty);
  const text = `${formatIn(notation, value)} ± ${formatIn(notation, uncertainty)}`;
  return withUnit(text, unit, notation);
}

/**
 * Writes an interval with one prefix, e.g. `11.85 to 12.44 MΩ`; the digits follow half its width.
 *
 * @throws RangeError when an end is not finite
 */
export function formatInterval(lowEnd: number, highEnd: number, unit: string): string {
  const [low, high] = [readable(lowEnd), readable(highEnd)];
  const halfWidth = Math.abs(high - low) / 2;
  if (!isUsable(halfWidth)) return formatFigure(low, unit);
  const notation = notationFor(Math.max(Math.abs(low), Math.abs(high)), unit, halfWidth);
  return withUnit(`${formatIn(notation, low)} to ${formatIn(notation, high)}`, unit, notation);
}

/**
 * Writes a bound to three significant digits, rounded to the safe side, so that the claim stays true:
 * `at least` is rounded down, `at most` up. An `exact` bound is written like any figure.
 *
 * @example formatBound(894_427, 'Ω', 'atLeast') // 'at least 894 kΩ'
 */
export function formatBound(figure: number, unit: string, bound: Bound): string {
  if (bound === 'exact') return formatFigure(figure, unit);
  const value = readable(figure);
  const step = 10 ** (exponentOf(value) - (BOUND_DIGITS - 1));
  // A value that already ends on the step must not lose one to binary rounding.
  const steps = value / step;
  const nearest = Math.round(steps);
  const onStep = Math.abs(steps - nearest) < 1e-9;
  const rounded = onStep ? nearest : bound === 'atLeast' ? Math.floor(steps) : Math.ceil(steps);
  return `${bound === 'atLeast' ? 'at least' : 'at most'} ${formatFigure(rounded * step, unit)}`;
}

function notationFor(value: number, unit: string, uncertainty: number): Notation {
  const rounded = Number(uncertainty.toPrecision(UNCERTAINTY_DIGITS));
  const lastDigitExponent = exponentOf(rounded) - (UNCERTAINTY_DIGITS - 1);
  return { lastDigitExponent, prefixExponent: prefixExponentOf(value, unit, lastDigitExponent, uncertainty) };
}

function notationOfDigits(value: number, unit: string, digits: number): Notation {
  const lastDigitExponent = exponentOf(value) - (digits - 1);
  return { lastDigitExponent, prefixExponent: prefixExponentOf(value, unit, lastDigitExponent, 0) };
}

/** The prefix follows the figure as rounded (999.96 kΩ is written 1.000 MΩ), or U when the figure vanishes in it. */
function prefixExponentOf(
  value: number,
  unit: string,
  lastDigitExponent: number,
  uncertainty: number,
): number {
  if (!PREFIXED_UNITS.has(unit)) return 0;
  const size = Math.abs(Number(formatIn({ prefixExponent: 0, lastDigitExponent }, Math.abs(value))));
  const exponent = exponentOf(Math.max(size, uncertainty));
  return Math.min(12, Math.max(-15, 3 * Math.floor(exponent / 3)));
}

function formatIn({ prefixExponent, lastDigitExponent }: Notation, value: number): string {
  const scaled = value / 10 ** prefixExponent;
  const decimals = prefixExponent - lastDigitExponent;
  const step = 10 ** -decimals;
  const text =
    decimals >= 0
      ? Math.abs(scaled).toFixed(Math.min(20, decimals))
      : String(Math.round(Math.abs(scaled) / step) * step);
  return value < 0 && Number(text) !== 0 ? `−${text}` : text;
}

function withUnit(text: string, unit: string, { prefixExponent }: Notation): string {
  return `${text} ${PREFIXES.get(prefixExponent) ?? ''}${unit}`;
}

function withoutTrailingZeros(text: string): string {
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}

function exponentOf(value: number): number {
  return value === 0 ? 0 : Number(Math.abs(value).toExponential().split('e')[1]);
}

function isUsable(uncertainty: number | null | undefined): uncertainty is number {
  return typeof uncertainty === 'number' && Number.isFinite(uncertainty) && uncertainty >= SMALLEST;
}

function readable(figure: number): number {
  if (!Number.isFinite(figure)) throw new RangeError(`formatFigure requires a finite value, got ${figure}`);
  return Math.abs(figure) < SMALLEST ? 0 : figure;
}
