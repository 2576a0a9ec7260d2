import { formatBound, formatFigure } from '../analysis/judging/format-figure.js';

export interface Slope {
  /** g = −dI/dV in S; positive when the current falls. */
  conductanceSiemens: number | null;
  /** Expanded, k ≈ 2. */
  conductanceUncertainty: number | null;
  /** The largest g that the limit allows. */
  limitSiemens: number | null;
}

/**
 * Says what the slope mark draws.
 * @example 'The current falls by 412 nA per volt of load, 4.1 times what the limit allows.'
 */
export function slopeInWords({ conductanceSiemens, conductanceUncertainty, limitSiemens }: Slope): string {
  if (conductanceSiemens === null) return 'The slope could not be computed.';
  const size = Math.abs(conductanceSiemens);
  const uncertainty = conductanceUncertainty ?? 0;
  const limit = limitSiemens !== null && limitSiemens > 0 ? limitSiemens : null;
  if (size <= uncertainty) {
    const most = size + uncertainty;
    return `No slope can be told from level: ${formatBound(most, 'A', 'atMost')} per volt of load${share(most, limit)}.`;
  }
  const direction = conductanceSiemens > 0 ? 'falls' : 'rises';
  const figure = formatFigure(size, 'A', conductanceUncertainty);
  return `The current ${direction} by ${figure} per volt of load${share(size, limit)}.`;
}

function share(size: number, limit: number | null): string {
  if (limit === null) return '';
  const ratio = size / limit;
  if (ratio < 1) return `, ${Number((100 * ratio).toPrecision(2))} % of what the limit allows`;
  return `, ${Number(ratio.toPrecision(ratio < 100 ? 2 : 3))} times what the limit allows`;
}
