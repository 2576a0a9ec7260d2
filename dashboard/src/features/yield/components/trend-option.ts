import type { ChartOption } from '@/lib/chart-option';
import type { ChartPalette } from '@/theme/chart-palette';
import type { YieldReport } from '@/types/api';
import type { YieldScale } from '@/utils/yield-scale';
import { bucketTick } from '../bucket-names';
import type { ChangeMark } from '../mark-changes';
import { changeSeries, labelSeries, pickSeries } from './trend-annotations';
import { intervalSeries, lineSeries, targetSeries, volumeSeries, type TrendLine } from './trend-series';
import { bucketTip } from './trend-words';

const LEFT = 52;
const RIGHT = 92;
const TREND = { top: 44, height: 240 };
const VOLUME = { top: 312, height: 86 };
export const TREND_HEIGHT = 432;

/** First-pass yield with its interval, final yield, rolled throughput and target; the units of each step beneath. */
export function trendOption(
  report: YieldReport,
  marks: ChangeMark[],
  scale: YieldScale,
  target: number | null,
  palette: ChartPalette,
): ChartOption {
  const { buckets, by, timeZone } = report;
  const lines = trendLines(report);
  const ticks = buckets.map((bucket) => bucketTick(bucket, by, timeZone));
  return {
    animation: false,
    grid: [
      { left: LEFT, right: RIGHT, ...TREND },
      { left: LEFT, right: RIGHT, ...VOLUME },
    ],
    xAxis: [
      { type: 'category', gridIndex: 0, data: ticks, axisLabel: { show: false }, axisTick: { show: false } },
      { type: 'category', gridIndex: 1, data: ticks, axisLabel: { hideOverlap: true } },
    ],
    yAxis: [
      {
        type: 'value',
        gridIndex: 0,
        name: 'yield (%)',
        nameLocation: 'end',
        nameGap: 22,
        nameTextStyle: { align: 'left' },
        min: scale.from * 100,
        max: scale.to * 100,
        interval: ((scale.to - scale.from) * 100) / (scale.ticks.length - 1),
        axisLabel: { formatter: (value: number) => String(Math.round(value * 10) / 10) },
      },
      {
        type: 'value',
        gridIndex: 1,
        name: 'units',
        nameTextStyle: { align: 'left' },
        nameGap: 8,
        splitNumber: 2,
        minInterval: 1,
        // The slabs are drawn by us, so their sum has to be told.
        max: roundUp(Math.max(1, ...buckets.map(({ firstPass }) => firstPass.total))),
      },
    ],
    // Text from stations never becomes markup: the tip is drawn, not written into the page.
    tooltip: { trigger: 'item', renderMode: 'richText', confine: true },
    series: [
      intervalSeries(
        buckets.map(({ firstPass }) => firstPass),
        scale,
        palette,
      ),
      changeSeries(marks, scale, palette),
      ...targetSeries(target, palette),
      ...lines.map((line) => lineSeries(line, palette)),
      labelSeries(lines, target, scale, buckets.length - 1, palette),
      volumeSeries(buckets, palette),
      ...([0, 1] as const).map((grid) =>
        pickSeries(buckets, (bucket) => bucketTip(bucket, by, timeZone), grid, palette),
      ),
    ],
  };
}

/** The next 1, 2, 4, 6 or 8 times a power of ten: an axis that ends on a round figure. */
function roundUp(count: number): number {
  const power = 10 ** Math.floor(Math.log10(count));
  return power * ([1, 2, 4, 6, 8].find((step) => step * power >= count) ?? 10);
}

function trendLines({ buckets }: YieldReport): TrendLine[] {
  const lines: TrendLine[] = [
    {
      name: 'final',
      figures: buckets.map(({ final }) => final),
      symbol: 'rect',
      isHollow: true,
      dash: [8, 4],
      tone: 'faded',
    },
    {
      name: 'first pass',
      figures: buckets.map(({ firstPass }) => firstPass),
      symbol: 'circle',
      isHollow: false,
      dash: 'solid',
      tone: 'ink',
    },
  ];
  if (buckets.some(({ rolledThroughput }) => rolledThroughput !== null))
    lines.push({
      name: 'all stages',
      figures: buckets.map(({ rolledThroughput }) => rolledThroughput),
      symbol: 'triangle',
      isHollow: true,
      dash: [2, 3],
      tone: 'ink',
    });
  return lines;
}
