import type { SlopeFigures } from '@/types/api';
import { Figure } from './figure';
import { impedanceUncertainty } from './slope-words';

/** Output impedance of a run as a figure, with "≥" where only a bound is known. */
export function Impedance({ slope }: { slope: SlopeFigures }) {
  return (
    <Figure
      value={slope.impedanceOhms}
      unit="Ω"
      bound={slope.impedanceBound}
      uncertainty={impedanceUncertainty(slope)}
    />
  );
}
