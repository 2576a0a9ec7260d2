import type { CustomSeriesOption } from 'echarts/charts';
import type { ChartSeries } from '@/lib/chart-option';
import type { ChartPalette } from '@/theme/chart-palette';
import type { Yield, YieldBucket } from '@/types/api';
import type { YieldScale } from '@/utils/yield-scale';

const LIMIT_WIDTH = 1.75;
const BAND_OPACITY = 0.16;

type Render = NonNullable<CustomSeriesOption['renderItem']>;
type Api = Parameters<Render>[1];

const percent = (share: number): number => share * 100;

/** Left and right edge of a step, in pixels. */
export function stepEdges(api: Api, index: number, y: number): { left: number; width: number } {
  const centre = api.coord([index, y])[0] ?? 0;
  const size = api.size?.([1, 0]);
  const width = (Array.isArray(size) ? size[0] : size) ?? 0;
  return { left: centre - width / 2, width };
}

/**
 * The interval of each step as a box over its width: each step is an estimate of its own, nothing is claimed between
 * two of them. Cut at the frame.
 */
export function intervalSeries(
  figures: (Yield | null)[],
  { from }: YieldScale,
  palette: ChartPalette,
): ChartSeries {
  return {
    type: 'custom',
    name: 'interval',
    silent: true,
    z: 1,
    clip: true,
    data: figures.map((figure, index) => [
      index,
      percent(Math.max(from, figure?.low ?? 0)),
      figure?.low == null ? NaN : percent(Math.max(from, figure.high ?? 0)),
    ]),
    renderItem: (_, api) => {
      const [index, low, high] = [Number(api.value(0)), Number(api.value(1)), Number(api.value(2))];
      if (Number.isNaN(high)) return null;
      const { left, width } = stepEdges(api, index, low);
      const top = api.coord([index, high])[1] ?? 0;
      const bottom = api.coord([index, low])[1] ?? 0;
      return {
        type: 'rect',
        shape: { x: left, y: top, width, height: Math.max(1, bottom - top) },
        style: { fill: palette.ink, opacity: BAND_OPACITY },
      };
    },
  };
}

export interface TrendLine {
  name: string;
  figures: (Yield | null)[];
  symbol: 'circle' | 'rect' | 'triangle';
  isHollow: boolean;
  dash: 'solid' | number[];
  tone: 'ink' | 'faded';
}

/** A line of yields; steps without units are gaps. */
export function lineSeries(line: TrendLine, palette: ChartPalette): ChartSeries {
  const color = palette[line.tone];
  return {
    type: 'line',
    name: line.name,
    silent: true,
    z: 3,
    symbol: line.symbol,
    symbolSize: line.figures.length > 60 ? 4 : 7,
    showAllSymbol: true,
    connectNulls: false,
    lineStyle: { color, width: 2, type: line.dash },
    itemStyle: { color: line.isHollow ? palette.sheet : color, borderColor: color, borderWidth: LIMIT_WIDTH },
    data: line.figures.map((figure) => (figure?.share == null ? null : percent(figure.share))),
  };
}

/** The target as a level line over the whole width. */
export function targetSeries(target: number | null, palette: ChartPalette): ChartSeries[] {
  if (target === null) return [];
  return [
    {
      type: 'line',
      name: 'target',
      silent: true,
      data: [],
      markLine: {
        silent: true,
        symbol: 'none',
        lineStyle: { color: palette.ink, width: LIMIT_WIDTH, type: [12, 4] },
        label: { show: false },
        data: [{ yAxis: percent(target) }],
      },
    },
  ];
}

/** Units of each step, stacked by the verdict of their first attempt: fails at the bottom, where they line up. */
export function volumeSeries(buckets: YieldBucket[], palette: ChartPalette): ChartSeries {
  return {
    type: 'custom',
    name: 'units',
    silent: true,
    xAxisIndex: 1,
    yAxisIndex: 1,
    data: buckets.map(({ failed, notProven, firstPass }, index) => [
      index,
      failed,
      notProven,
      firstPass.passed,
    ]),
    renderItem: (_, api) => {
      const index = Number(api.value(0));
      const { left, width } = stepEdges(api, index, 0);
      const gap = Math.min(4, width * 0.15);
      let below = 0;
      const slab = (count: number, style: object) => {
        const bottom = api.coord([index, below])[1] ?? 0;
        below += count;
        const top = api.coord([index, below])[1] ?? 0;
        return {
          type: 'rect' as const,
          shape: { x: left + gap / 2, y: top, width: Math.max(1, width - gap), height: bottom - top },
          style: { lineWidth: 1, ...style },
        };
      };
      return {
        type: 'group',
        children: [
          slab(Number(api.value(1)), { fill: palette.fail }),
          slab(Number(api.value(2)), {
            fill: palette.sheet,
            stroke: palette.notProven,
            lineWidth: LIMIT_WIDTH,
          }),
          slab(Number(api.value(3)), { fill: palette.pass, opacity: 0.45 }),
        ].filter(({ shape }) => shape.height > 0),
      };
    },
  };
}
