import type { Bound, SlopeFigures } from '@/types/api';
import { figureText } from '@/utils/format-figure';

const boundWords: Record<Bound, string> = { exact: '', atLeast: 'at least ', atMost: 'at most ' };

/** Expanded uncertainty of r = 1/g to first order, U_g / g²: good enough to choose the digits of r. */
export function impedanceUncertainty({
  conductanceSiemens,
  expandedUncertaintySiemens,
}: SlopeFigures): number | null {
  if (!conductanceSiemens || expandedUncertaintySiemens === null) return null;
  return expandedUncertaintySiemens / conductanceSiemens ** 2;
}

/** What a slope mark shows, in words: its accessible name. */
export function slopeWords(slope: SlopeFigures): string {
  const limit = slope.limitSiemens
    ? `limit ${figureText(1 / slope.limitSiemens, 'Ω')}`
    : 'no limit to draw it against';
  return `Output impedance ${impedanceWords(slope)}, ${limit}`;
}

function impedanceWords(slope: SlopeFigures): string {
  if (slope.conductanceSiemens === null) return 'not computed';
  if (slope.impedanceOhms === null) return 'none, the current rises with the load voltage';
  const figure = figureText(slope.impedanceOhms, 'Ω', {
    bound: slope.impedanceBound,
    uncertainty: impedanceUncertainty(slope),
  });
  return boundWords[slope.impedanceBound] + figure.replace(/^[≥≤]\s?/, '');
}
