import type { Sweep } from '@/types/api';

export interface PlotRange {
  lowVolts: number;
  highVolts: number;
  lowPpm: number;
  highPpm: number;
  /** Points of the sweep that lie outside and are cut off. */
  hiddenCount: number;
}

const MARGIN = 0.12;

/**
 * The part of the plane to draw. `fitted`: what the fit, its band, the limit and the fitted points need, so that a
 * knee of many thousand ppm doesn't flatten everything else. `whole`: every point.
 */
export function plotRange(sweeps: Sweep[], show: 'fitted' | 'whole'): PlotRange {
  const points = sweeps.flatMap((sweep) => sweep.points.filter(({ overload }) => !overload));
  const drawn = show === 'whole' ? points : points.filter(({ inFit }) => inFit);
  const ppm = [
    ...drawn.flatMap(({ deviationPpm }) => (deviationPpm === null ? [] : [deviationPpm])),
    ...sweeps.flatMap(({ line }) => line.flatMap(({ lowPpm, highPpm }) => [lowPpm, highPpm])),
    ...(sweeps[0]?.limitLine ?? []).map(({ deviationPpm }) => deviationPpm),
  ];
  const volts = [
    ...points.map(({ loadVolts }) => loadVolts),
    ...sweeps.flatMap(({ complianceLowVolts, complianceHighVolts }) => [
      complianceLowVolts,
      complianceHighVolts,
    ]),
  ];
  const [lowPpm, highPpm] = withMargin(Math.min(0, ...ppm), Math.max(0, ...ppm));
  const isOutside = (value: number | null) => value !== null && (value < lowPpm || value > highPpm);
  return {
    lowVolts: Math.min(0, ...volts),
    highVolts: Math.max(...volts, 1),
    lowPpm,
    highPpm,
    hiddenCount: (sweeps[0]?.points ?? []).filter(({ deviationPpm }) => isOutside(deviationPpm)).length,
  };
}

function withMargin(low: number, high: number): [number, number] {
  const margin = Math.max(high - low, 1) * MARGIN;
  return [low - margin, high + margin];
}
