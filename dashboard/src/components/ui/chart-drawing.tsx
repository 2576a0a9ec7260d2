import EChartsReactCore from 'echarts-for-react/esm/core';
import { useMemo } from 'react';
import { echarts } from '@/lib/echarts';
import { readChartPalette } from '@/theme/chart-palette';
import { echartsTheme } from '@/theme/echarts-theme';
import { useTheme } from '@/theme/use-theme';
import type { ChartProps } from './chart';

/** Draws with the library; a change of theme draws anew. */
export function ChartDrawing({ height, option }: Pick<ChartProps, 'height' | 'option'>) {
  const theme = useTheme();
  const drawn = useMemo(() => {
    // The palette is read from the document, which already wears this theme.
    const palette = readChartPalette();
    echarts.registerTheme(theme, echartsTheme(palette));
    return option(palette);
  }, [theme, option]);
  return (
    <EChartsReactCore
      key={theme}
      echarts={echarts}
      theme={theme}
      option={drawn}
      notMerge
      opts={{ renderer: 'svg' }}
      style={{ height, width: '100%' }}
    />
  );
}
