import type { ChartSeries } from '@/lib/chart-option';
import type { ChartPalette } from '@/theme/chart-palette';
import type { ResultDetail } from '@/types/api';
import type { PlotRange } from './sweep-range';
import { attemptLabel, byVolts } from './sweep-series';

interface LineEnd {
  name: string;
  volts: number;
  ppm: number;
  color: string;
}

/** Room for one line of text, and labels nearer than this along the axis get in each other's way, as shares of the frame. */
const LINE_SHARE = 0.05;
const NEAR_SHARE = 0.15;

/** Names at the ends of the lines, moved apart where they would cover each other. */
export function labelSeries(
  result: ResultDetail,
  earlier: ResultDetail[],
  range: PlotRange,
  palette: ChartPalette,
): ChartSeries {
  const limit = result.sweep.limitLine.map((point): [number, number] => [
    point.loadVolts,
    point.deviationPpm,
  ]);
  const ends = [
    lastInside(limit, range, 'limit', palette.fail),
    ...earlier.map((before) => {
      const points = byVolts(before.sweep.points).map((point): [number, number] => [
        point.loadVolts,
        point.deviationPpm ?? 0,
      ]);
      return lastInside(points, range, attemptLabel(before), palette.faded);
    }),
  ].filter((end) => end !== null);
  return {
    type: 'scatter',
    name: 'labels',
    silent: true,
    symbolSize: 0,
    itemStyle: { opacity: 1 },
    clip: false,
    data: spread(ends, range).map(({ name, volts, ppm, color }) => ({
      value: [volts, ppm],
      label: {
        show: true,
        formatter: name,
        position: 'right',
        distance: 8,
        color,
        fontFamily: palette.proseFont,
        fontSize: 12,
      },
    })),
  };
}

/** Where a line is last seen in the frame. */
function lastInside(line: [number, number][], range: PlotRange, name: string, color: string): LineEnd | null {
  const inside = line.filter(([, ppm]) => ppm >= range.lowPpm && ppm <= range.highPpm);
  const end = inside.at(-1);
  return end ? { name, volts: end[0], ppm: end[1], color } : null;
}

/** Moves labels of neighbouring ends down until each has a line of its own. */
export function spread(ends: LineEnd[], range: PlotRange): LineEnd[] {
  const line = (range.highPpm - range.lowPpm) * LINE_SHARE;
  const near = (range.highVolts - range.lowVolts) * NEAR_SHARE;
  const placed: LineEnd[] = [];
  for (const end of [...ends].sort((a, b) => b.ppm - a.ppm)) {
    const lowestNear = Math.min(
      Infinity,
      ...placed.filter(({ volts }) => Math.abs(volts - end.volts) < near).map(({ ppm }) => ppm),
    );
    placed.push({ ...end, ppm: Math.min(end.ppm, lowestNear - line) });
  }
  return placed;
}
