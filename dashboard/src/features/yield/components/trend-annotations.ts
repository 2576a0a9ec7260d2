import type { ChartSeries } from '@/lib/chart-option';
import type { ChartPalette } from '@/theme/chart-palette';
import type { YieldBucket } from '@/types/api';
import { percentText } from '@/utils/format-figure';
import type { YieldScale } from '@/utils/yield-scale';
import type { ChangeMark } from '../mark-changes';
import { stepEdges, type TrendLine } from './trend-series';

/** Room for one line of text, as a share of the frame's height. */
const LINE_SHARE = 0.075;

export interface EndLabel {
  text: string;
  /** Where it stands, as a share of 0 to 1. */
  at: number;
  tone: 'ink' | 'faded';
}

/** Moves labels that would cover each other apart, the highest stays. */
export function spreadLabels(labels: EndLabel[], { from, to }: YieldScale): EndLabel[] {
  const line = (to - from) * LINE_SHARE;
  let lowest = Infinity;
  return [...labels]
    .sort((a, b) => b.at - a.at)
    .map((label) => {
      lowest = Math.min(label.at, lowest - line);
      return { ...label, at: lowest };
    });
}

/** Names at the right end of the lines and of the target. */
export function labelSeries(
  lines: TrendLine[],
  target: number | null,
  scale: YieldScale,
  lastStep: number,
  palette: ChartPalette,
): ChartSeries {
  const ends = lines.flatMap(({ name, figures, tone }): EndLabel[] => {
    const at = figures.findLast((figure) => figure?.share != null)?.share;
    return at == null ? [] : [{ text: name, at, tone }];
  });
  if (target !== null) ends.push({ text: `target ${percentText(target, 0)}`, at: target, tone: 'ink' });
  return {
    type: 'custom',
    name: 'labels',
    silent: true,
    clip: false,
    z: 6,
    data: spreadLabels(ends, scale).map(({ text, at, tone }) => ({
      value: [lastStep, at * 100],
      text,
      tone,
    })),
    renderItem: ({ dataIndex }, api) => {
      const label = spreadLabels(ends, scale)[dataIndex];
      if (!label) return null;
      const { left, width } = stepEdges(api, lastStep, label.at * 100);
      return {
        type: 'text',
        x: left + width + 8,
        y: api.coord([lastStep, label.at * 100])[1] ?? 0,
        style: {
          text: label.text,
          fill: palette[label.tone],
          font: `12px ${palette.proseFont}`,
          verticalAlign: 'middle',
        },
      };
    },
  };
}

/** A line where limits, a plan or a program changed, with the letter of its text below the chart. */
export function changeSeries(marks: ChangeMark[], { to }: YieldScale, palette: ChartPalette): ChartSeries {
  return {
    type: 'custom',
    name: 'changes',
    silent: true,
    clip: false,
    z: 2,
    data: marks.map(({ bucket, within }) => [bucket, within]),
    renderItem: ({ dataIndex, coordSys }, api) => {
      const mark = marks[dataIndex];
      if (!mark) return null;
      const { left, width } = stepEdges(api, mark.bucket, to * 100);
      const x = left + width * mark.within;
      const frame = coordSys as unknown as { y: number; height: number };
      return {
        type: 'group',
        children: [
          {
            type: 'line',
            shape: { x1: x, x2: x, y1: frame.y - 4, y2: frame.y + frame.height },
            style: { stroke: palette.ink, lineWidth: 1.75, lineDash: [2, 3] },
          },
          {
            type: 'text',
            x,
            y: frame.y - 6,
            style: {
              text: mark.letter,
              fill: palette.ink,
              font: `600 12px ${palette.proseFont}`,
              align: 'center',
              verticalAlign: 'bottom',
            },
          },
        ],
      };
    },
  };
}

/** What a pointer finds: the whole column of a step, with its figures; a click leads to its units. */
export function pickSeries(
  buckets: YieldBucket[],
  tip: (bucket: YieldBucket) => string,
  gridIndex: 0 | 1,
  palette: ChartPalette,
): ChartSeries {
  return {
    type: 'custom',
    name: 'steps',
    z: 10,
    xAxisIndex: gridIndex,
    yAxisIndex: gridIndex,
    data: buckets.map((bucket, index) => ({
      value: [index, 0],
      tooltip: { formatter: () => tip(bucket) },
    })),
    renderItem: ({ dataIndex, coordSys }, api) => {
      const { left, width } = stepEdges(api, dataIndex, 0);
      const frame = coordSys as unknown as { y: number; height: number };
      return {
        type: 'rect',
        shape: { x: left, y: frame.y, width, height: frame.height },
        style: { fill: 'transparent' },
        emphasis: { style: { fill: palette.ink, opacity: 0.06 } },
      };
    },
  };
}
