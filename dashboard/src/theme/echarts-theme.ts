import type { ChartPalette } from './chart-palette';

/** Our look for every chart: graph paper with a fine and a strong grid, figures in the figure face, no colour of its own. */
export function echartsTheme(palette: ChartPalette) {
  const axis = {
    axisLine: { show: true, onZero: false, lineStyle: { color: palette.ink, width: 1 } },
    axisTick: { show: true, lineStyle: { color: palette.ink } },
    axisLabel: { color: palette.faded, fontFamily: palette.figureFont, fontSize: 12 },
    nameTextStyle: { color: palette.faded, fontFamily: palette.proseFont, fontSize: 13 },
    splitLine: { show: true, lineStyle: { color: palette.rule, width: 1 } },
    minorTick: { show: false, splitNumber: 5 },
    minorSplitLine: { show: true, lineStyle: { color: palette.grid, width: 0.75 } },
  };
  const label = { color: palette.ink, fontFamily: palette.proseFont, fontSize: 12 };
  return {
    backgroundColor: 'transparent',
    color: [palette.ink, palette.faded],
    textStyle: { color: palette.ink, fontFamily: palette.proseFont },
    valueAxis: axis,
    timeAxis: axis,
    logAxis: axis,
    categoryAxis: { ...axis, minorSplitLine: { show: false } },
    line: { lineStyle: { width: 2 }, symbolSize: 6, label },
    tooltip: {
      backgroundColor: palette.ink,
      borderWidth: 0,
      borderRadius: 0,
      padding: [6, 10],
      shadowBlur: 0,
      textStyle: { color: palette.sheet, fontFamily: palette.figureFont, fontSize: 12 },
      axisPointer: { lineStyle: { color: palette.ink }, crossStyle: { color: palette.ink } },
    },
    legend: { textStyle: label, itemStyle: { borderRadius: 0 } },
    markLine: { lineStyle: { color: palette.ink, width: 1.75 }, label },
    markArea: { label },
    dataZoom: {
      borderColor: palette.rule,
      fillerColor: 'transparent',
      handleStyle: { color: palette.sheet, borderColor: palette.ink },
      textStyle: { color: palette.faded, fontFamily: palette.figureFont },
    },
  };
}
