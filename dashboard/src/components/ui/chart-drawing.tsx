import EChartsReactCore from 'echarts-for-react/esm/core';
import { useMemo } from 'react';
import { echarts } from '@/lib/echarts';
import { readChartPalette } from '@/theme/chart-palette';
import { echartsTheme } from '@/theme/echarts-theme';
import { useTheme } from '@/theme/use-theme';
import type { ChartProps } from './chart';

/** Draws with the library; a change of theme draws anew. */
export function ChartDrawing({ height, option, onPick }: Omit<ChartProps, 'label'>) {
  const theme = useTheme();
  const drawn = useMemo(() => {
    // The palette is read from the document, which already wears this theme.
    const palette = readChartPalette();
    echarts.registerTheme(theme, echartsTheme(palette));
    return option(palette);
  }, [theme, option]);
  const events = useMemo(
    (): Record<string, (event: { dataIndex: number }) => void> =>
      onPick ? { click: ({ dataIndex }) => onPick(dataIndex) } : {},
    [onPick],
  );
  return (
    <EChartsReactCore
      key={theme}
      echarts={echarts}
      theme={theme}
      option={drawn}
      notMerge
      onEvents={events}
      opts={{ renderer: 'svg' }}
      style={{ height, width: '100%' }}
    />
  );
}
