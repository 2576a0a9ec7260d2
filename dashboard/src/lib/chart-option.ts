import type { CustomSeriesOption, LineSeriesOption, ScatterSeriesOption } from 'echarts/charts';
import type {
  GridComponentOption,
  MarkAreaComponentOption,
  MarkLineComponentOption,
  TooltipComponentOption,
} from 'echarts/components';
import type { ComposeOption } from 'echarts/core';

export type ChartSeries = LineSeriesOption | ScatterSeriesOption | CustomSeriesOption;

/** Options of the chart parts that are registered. */
export type ChartOption = ComposeOption<
  | ChartSeries
  | GridComponentOption
  | MarkAreaComponentOption
  | MarkLineComponentOption
  | TooltipComponentOption
>;
