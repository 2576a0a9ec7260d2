import { lazy, Suspense } from 'react';
import type { ChartOption } from '@/lib/chart-option';
import type { ChartPalette } from '@/theme/chart-palette';
import styles from './chart.module.css';

const ChartDrawing = lazy(async () => ({ default: (await import('./chart-drawing')).ChartDrawing }));

export interface ChartProps {
  /** What the chart shows, in a sentence; its figures belong into a table below it. */
  label: string;
  height: number;
  /** Draws with the colours of the theme on screen. Keep it stable between renders (useCallback). */
  option: (palette: ChartPalette) => ChartOption;
  /** A datum was clicked; whoever has no pointer finds the same way in the table. Keep it stable between renders. */
  onPick?: ((dataIndex: number) => void) | undefined;
}

/** A chart on graph paper. The chart library is fetched when the first one is shown; its room is kept free. */
export function Chart({ label, height, option, onPick }: ChartProps) {
  return (
    <div className={styles.chart} style={{ height }} role="img" aria-label={label}>
      <Suspense fallback={<p className={styles.waiting}>Drawing the chart…</p>}>
        <ChartDrawing height={height} option={option} onPick={onPick} />
      </Suspense>
    </div>
  );
}
