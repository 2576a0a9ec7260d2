import type { ChartSeries } from '@/lib/chart-option';
import type { ChartPalette } from '@/theme/chart-palette';
import type { ResultDetail, Sweep, SweepPoint } from '@/types/api';
import { figureText } from '@/utils/format-figure';

const DATA_WIDTH = 2;
const LIMIT_WIDTH = 1.75;
/** Earlier attempts are told apart by dash and marker, not by colour. */
const EARLIER_DASHES = [
  [2, 3],
  [8, 4],
  [8, 3, 2, 3],
];
const EARLIER_MARKERS = ['triangle', 'diamond', 'rect'];

export const byVolts = (points: SweepPoint[]) =>
  points
    .filter(({ overload, deviationPpm }) => !overload && deviationPpm !== null)
    .sort((a, b) => a.loadVolts - b.loadVolts || a.index - b.index);

/** The fitted line with its uncertainty band. */
export function fitSeries(sweep: Sweep, palette: ChartPalette): ChartSeries[] {
  if (sweep.line.length === 0) return [];
  const line = sweep.line;
  return [
    {
      type: 'line',
      stack: 'band',
      stackStrategy: 'all',
      symbol: 'none',
      silent: true,
      lineStyle: { opacity: 0 },
      data: line.map(({ loadVolts, lowPpm }) => [loadVolts, lowPpm]),
    },
    {
      type: 'line',
      stack: 'band',
      stackStrategy: 'all',
      symbol: 'none',
      silent: true,
      lineStyle: { opacity: 0 },
      areaStyle: { color: palette.ink, opacity: 0.16 },
      data: line.map(({ loadVolts, lowPpm, highPpm }) => [loadVolts, highPpm - lowPpm]),
    },
    {
      type: 'line',
      name: 'fit',
      symbol: 'none',
      silent: true,
      lineStyle: { color: palette.ink, width: DATA_WIDTH },
      data: line.map(({ loadVolts, deviationPpm }) => [loadVolts, deviationPpm]),
    },
  ];
}

/** The slope that the limit allows, through the reference point. */
export function limitSeries(sweep: Sweep, palette: ChartPalette): ChartSeries[] {
  if (sweep.limitLine.length === 0) return [];
  return [
    {
      type: 'line',
      name: 'limit',
      symbol: 'none',
      silent: true,
      lineStyle: { color: palette.fail, width: LIMIT_WIDTH, type: [10, 4] },
      data: sweep.limitLine.map(({ loadVolts, deviationPpm }) => [loadVolts, deviationPpm]),
    },
  ];
}

const markers: Record<string, string> = { down: 'triangle', repeat: 'diamond' };

/** Measured points: filled in the fit, hollow outside it; the marker tells the direction of the sweep. */
export function pointSeries(sweep: Sweep, palette: ChartPalette): ChartSeries[] {
  return [
    {
      type: 'scatter',
      name: 'points',
      symbolSize: 8,
      z: 5,
      data: byVolts(sweep.points).map((point) => ({
        value: [point.loadVolts, point.deviationPpm ?? 0],
        symbol: markers[point.direction ?? ''] ?? 'circle',
        itemStyle: {
          color: point.inFit ? palette.ink : palette.sheet,
          borderColor: palette.ink,
          borderWidth: 1.75,
          opacity: 1,
        },
        tooltip: { formatter: () => pointText(point) },
      })),
    },
  ];
}

export const attemptLabel = ({ attempt, verdict }: Pick<ResultDetail, 'attempt' | 'verdict'>): string =>
  attempt === null ? verdict : `attempt ${attempt}`;

/** An earlier attempt at the same stage, each about its own reference current. */
export function earlierSeries(
  { sweep, attempt, verdict }: ResultDetail,
  index: number,
  palette: ChartPalette,
): ChartSeries {
  const name = attemptLabel({ attempt, verdict });
  return {
    type: 'line',
    name,
    symbol: EARLIER_MARKERS[index % EARLIER_MARKERS.length] ?? 'triangle',
    symbolSize: 6,
    showAllSymbol: true,
    lineStyle: {
      color: palette.faded,
      width: LIMIT_WIDTH,
      type: EARLIER_DASHES[index % EARLIER_DASHES.length] ?? 'dashed',
    },
    itemStyle: { color: palette.faded },
    data: byVolts(sweep.points).map((point) => ({
      value: [point.loadVolts, point.deviationPpm ?? 0],
      tooltip: { formatter: () => `${name}\n${pointText(point)}` },
    })),
  };
}

function pointText({ loadVolts, outputAmps, deviationPpm, inFit, direction }: SweepPoint): string {
  const lines = [
    `${figureText(loadVolts, 'V')}  ${(outputAmps * 1e6).toPrecision(6)} µA`,
    deviationPpm === null ? '' : figureText(deviationPpm, 'ppm'),
    [direction, inFit ? null : 'not in the fit'].filter(Boolean).join(', '),
  ];
  return lines.filter(Boolean).join('\n');
}
