import type { Bound } from '@/types/api';

const PREFIXES: [exponent: number, sign: string][] = [
  [12, 'T'],
  [9, 'G'],
  [6, 'M'],
  [3, 'k'],
  [0, ''],
  [-3, 'm'],
  [-6, 'µ'],
  [-9, 'n'],
  [-12, 'p'],
];
const PREFIXED_UNITS = new Set(['A', 'V', 'Ω', 'S', 's', 'W', 'Hz']);
const PLAIN_DIGITS = 4;
const BOUND_DIGITS = 2;
const UNCERTAINTY_DIGITS = 2;
const NARROW_SPACE = '\u202f';

export interface FigureOptions {
  /** Expanded uncertainty in the same unit: the value is shown to the place of its second significant digit. */
  uncertainty?: number | null;
  bound?: Bound;
}

export interface FigureText {
  /** '≥' or '≤' for a bound, else empty. */
  sign: '' | '≥' | '≤';
  digits: string;
  /** The uncertainty in the same prefix, or null where there is none to show. */
  uncertaintyDigits: string | null;
  /** Unit with its SI prefix. */
  unit: string;
}

/** Splits a figure into sign, digits and prefixed unit; digits follow the uncertainty, a bound is rounded to its safe side. */
export function formatFigure(value: number, unit: string, options: FigureOptions = {}): FigureText {
  const bound = options.bound ?? 'exact';
  const uncertainty = bound === 'exact' && options.uncertainty ? Math.abs(options.uncertainty) : null;
  const exponent = PREFIXED_UNITS.has(unit) ? prefixExponent(Math.max(Math.abs(value), uncertainty ?? 0)) : 0;
  const scaled = value / 10 ** exponent;
  const prefixedUnit = `${PREFIXES.find(([power]) => power === exponent)?.[1] ?? ''}${unit}`;

  if (bound !== 'exact') {
    const sign = bound === 'atLeast' ? '≥' : '≤';
    return { sign, digits: boundDigits(scaled, bound), uncertaintyDigits: null, unit: prefixedUnit };
  }
  if (uncertainty === null) {
    return { sign: '', digits: plainDigits(scaled), uncertaintyDigits: null, unit: prefixedUnit };
  }
  const scaledUncertainty = uncertainty / 10 ** exponent;
  const decimals =
    UNCERTAINTY_DIGITS -
    1 -
    Math.floor(Math.log10(Number(scaledUncertainty.toPrecision(UNCERTAINTY_DIGITS))));
  return {
    sign: '',
    digits: toPlace(scaled, decimals),
    uncertaintyDigits: toPlace(scaledUncertainty, decimals),
    unit: prefixedUnit,
  };
}

/** The figure as one string, for accessible names, titles and chart labels. */
export function figureText(value: number, unit: string, options: FigureOptions = {}): string {
  const { sign, digits, unit: prefixed } = formatFigure(value, unit, options);
  return `${sign}${sign && NARROW_SPACE}${digits}${prefixed && NARROW_SPACE}${prefixed}`;
}

/** A share of 0 to 1 in per cent; all nines are never rounded up to 100 %. */
export function percentText(share: number, decimals = 1): string {
  const percent = share * 100;
  const rounded = percent.toFixed(decimals);
  const shown = share < 1 && Number(rounded) === 100 ? (100 - 10 ** -decimals).toFixed(decimals) : rounded;
  return `${Number(shown) === 100 ? '100' : shown}${NARROW_SPACE}%`;
}

/** A probability in per cent; what is practically certain either way is said as a bound. */
export function probabilityText(probability: number): string {
  if (probability > 0.999) return `> 99.9${NARROW_SPACE}%`;
  if (probability < 0.001) return `< 0.1${NARROW_SPACE}%`;
  return percentText(probability);
}

function prefixExponent(magnitude: number): number {
  if (magnitude === 0 || !Number.isFinite(magnitude)) return 0;
  const exponent = Math.floor(Math.log10(Number(magnitude.toPrecision(PLAIN_DIGITS))) / 3) * 3;
  return Math.min(12, Math.max(-12, exponent));
}

function plainDigits(value: number): string {
  const digits = Number(value.toPrecision(PLAIN_DIGITS));
  return minus(
    Math.abs(digits) >= 1e9 || (digits !== 0 && Math.abs(digits) < 1e-4)
      ? digits.toExponential()
      : String(digits),
  );
}

function boundDigits(value: number, bound: Bound): string {
  if (value === 0) return '0';
  const place = BOUND_DIGITS - 1 - Math.floor(Math.log10(Math.abs(value)));
  const shifted = Number((value * 10 ** place).toPrecision(12));
  const rounded = bound === 'atLeast' ? Math.floor(shifted) : Math.ceil(shifted);
  return toPlace(rounded / 10 ** place, place);
}

function toPlace(value: number, decimals: number): string {
  if (decimals >= 0) return minus(value.toFixed(Math.min(decimals, 12)));
  const step = 10 ** -decimals;
  return minus(String(Math.round(value / step) * step));
}

const minus = (digits: string): string =>
  Number(digits) === 0 ? digits.replace('-', '') : digits.replace('-', '−');
