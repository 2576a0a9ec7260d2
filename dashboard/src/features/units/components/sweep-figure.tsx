import { useCallback, useMemo, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Chart } from '@/components/ui/chart';
import { Disclosure } from '@/components/ui/disclosure';
import { Section } from '@/components/ui/section';
import { EmptyState } from '@/components/ui/empty-state';
import { slopeWords } from '@/components/ui/slope-words';
import type { ChartPalette } from '@/theme/chart-palette';
import type { ResultDetail } from '@/types/api';
import { figureText } from '@/utils/format-figure';
import { sweepOption } from './sweep-option';
import { plotRange } from './sweep-range';
import { SweepTable } from './sweep-table';

const HEIGHT = 420;

export interface SweepFigureProps {
  result: ResultDetail;
  /** Earlier results at the same stage, oldest first. */
  earlier: ResultDetail[];
}

export function SweepFigure({ result, earlier }: SweepFigureProps) {
  const [show, setShow] = useState<'fitted' | 'whole'>('fitted');
  const option = useCallback(
    (palette: ChartPalette) => sweepOption(result, earlier, show, palette),
    [result, earlier, show],
  );
  const hidden = useMemo(
    () =>
      plotRange(
        [result, ...earlier].map(({ sweep }) => sweep),
        'fitted',
      ).hiddenCount,
    [result, earlier],
  );
  const { points } = result.sweep;
  if (points.length === 0) {
    return (
      <Section title="Sweep">
        <EmptyState title="This result has no points.">
          The station posted none{result.abortReason ? `: ${result.abortReason}` : ''}.
        </EmptyState>
      </Section>
    );
  }
  return (
    <Section
      title="Sweep"
      note="filled: in the fit, hollow: outside it; band: 95 % uncertainty of the fit"
      actions={
        hidden > 0 && (
          <Button size="small" onClick={() => setShow(show === 'fitted' ? 'whole' : 'fitted')}>
            {show === 'fitted' ? `Show ${hidden} points below the frame` : 'Show the fitted part'}
          </Button>
        )
      }
    >
      <Chart label={sweepWords(result)} height={HEIGHT} option={option} />
      <Disclosure summary="The points as a table" isPrinted>
        <SweepTable sweep={result.sweep} />
      </Disclosure>
    </Section>
  );
}

function sweepWords(result: ResultDetail): string {
  const { points, kneeFound, complianceVolts } = result.sweep;
  const knee =
    kneeFound && complianceVolts !== null
      ? ` The current leaves its tolerance at ${figureText(complianceVolts, 'V')}.`
      : '';
  return `Deviation from the reference current against load voltage, ${points.length} points. ${slopeWords(result.slope)}.${knee}`;
}
