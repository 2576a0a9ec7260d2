import type { ChartOption, ChartSeries } from '@/lib/chart-option';
import type { ChartPalette } from '@/theme/chart-palette';
import type { ResultDetail, Sweep } from '@/types/api';
import { figureText } from '@/utils/format-figure';
import { labelSeries } from './sweep-labels';
import { earlierSeries, fitSeries, limitSeries, pointSeries } from './sweep-series';
import { plotRange, type PlotRange } from './sweep-range';

/** The sweep as deviation from the reference current against load voltage, earlier attempts laid faintly behind it. */
export function sweepOption(
  result: ResultDetail,
  earlier: ResultDetail[],
  show: 'fitted' | 'whole',
  palette: ChartPalette,
): ChartOption {
  const { sweep } = result;
  const range = plotRange([sweep, ...earlier.map((before) => before.sweep)], show);
  const lowPpm = niceFloor(range.lowPpm);
  const highPpm = niceCeil(range.highPpm);
  return {
    animation: false,
    grid: { left: 12, right: 76, top: 48, bottom: 34, containLabel: true },
    xAxis: {
      type: 'value',
      name: 'load voltage (V)',
      nameLocation: 'middle',
      nameGap: 28,
      min: range.lowVolts,
      max: range.highVolts,
      axisLabel: { hideOverlap: true },
    },
    yAxis: {
      type: 'value',
      name: 'deviation from the reference current (ppm)',
      nameLocation: 'end',
      nameGap: 26,
      nameTextStyle: { align: 'left' },
      min: lowPpm,
      max: highPpm,
      axisLabel: { formatter: (ppm: number) => String(ppm).replace('-', '−') },
    },
    // Text from stations never becomes markup: the tip is drawn, not written into the page.
    tooltip: { trigger: 'item', renderMode: 'richText', confine: true },
    series: [
      frame(sweep, range, palette),
      ...earlier.map((before, index) => earlierSeries(before, index, palette)),
      ...limitSeries(sweep, palette),
      ...fitSeries(sweep, palette),
      ...pointSeries(sweep, palette),
      labelSeries(result, earlier, { ...range, lowPpm, highPpm }, palette),
    ],
  };
}

/** Shades what lies outside the promised range and marks the compliance voltage. */
function frame(sweep: Sweep, range: PlotRange, palette: ChartPalette): ChartSeries {
  const outside: [number, number][] = [
    [range.lowVolts, sweep.complianceLowVolts],
    [sweep.complianceHighVolts, range.highVolts],
  ];
  return {
    type: 'line',
    data: [],
    silent: true,
    markArea: {
      silent: true,
      itemStyle: { color: palette.ink, opacity: 0.06 },
      data: outside.filter(([from, to]) => to > from).map(([from, to]) => [{ xAxis: from }, { xAxis: to }]),
    },
    markLine: {
      silent: true,
      symbol: 'none',
      data: [
        {
          xAxis: sweep.complianceHighVolts,
          lineStyle: { color: palette.faded, type: 'solid', width: 1.75 },
          label: {
            formatter: `promised to ${figureText(sweep.complianceHighVolts, 'V')}`,
            position: 'insideEndTop',
            rotate: 0,
            align: 'right',
            padding: [0, 4, 0, 0],
          },
        },
        ...complianceMark(sweep, palette),
      ],
    },
  };
}

function complianceMark(sweep: Sweep, palette: ChartPalette) {
  if (sweep.complianceVolts === null || !sweep.kneeFound) return [];
  return [
    {
      xAxis: sweep.complianceVolts,
      lineStyle: { color: palette.fail, type: 'dashed' as const, width: 1.75 },
      label: {
        formatter: `leaves its tolerance at ${figureText(sweep.complianceVolts, 'V')}`,
        position: 'insideStartTop' as const,
        rotate: 0,
        align: 'right' as const,
        color: palette.fail,
        padding: [0, 4, 0, 0],
      },
    },
  ];
}

const stepOf = (value: number) => 10 ** Math.floor(Math.log10(Math.max(Math.abs(value), 1))) / 2;
const niceFloor = (value: number) => Math.floor(value / stepOf(value)) * stepOf(value);
const niceCeil = (value: number) => Math.ceil(value / stepOf(value)) * stepOf(value);
