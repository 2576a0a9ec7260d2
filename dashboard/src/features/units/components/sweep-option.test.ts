import { describe, expect, it } from 'vitest';
import { aResult } from '@/testing/builders';
import { aPoint, aSweep } from '@/testing/sweep-builders';
import type { ChartPalette } from '@/theme/chart-palette';
import { sweepOption } from './sweep-option';
import { plotRange } from './sweep-range';

const palette: ChartPalette = {
  sheet: '#fff',
  ink: '#000',
  faded: '#555',
  rule: '#ccc',
  grid: '#eee',
  pass: '#0b6b66',
  fail: '#800',
  notProven: '#6e6600',
  proseFont: 'sans',
  figureFont: 'mono',
};

const withKnee = () => {
  const sweep = aSweep();
  const fallen = { ...aPoint(8, 8.4, 0.0004), inFit: false };
  return aSweep({
    points: [...sweep.points, fallen],
    complianceVolts: 8.1,
    complianceBound: 'exact',
    kneeFound: true,
  });
};

const seriesOf = (option: ReturnType<typeof sweepOption>) =>
  Array.isArray(option.series) ? option.series : [];

describe('plotRange', () => {
  it('lets a knee fall out of the frame, and counts what it hides', () => {
    const range = plotRange([withKnee()], 'fitted');
    expect(range.lowPpm).toBeGreaterThan(-1500);
    expect(range.hiddenCount).toBe(1);
  });

  it('frames every point when the whole curve is asked for', () => {
    const range = plotRange([withKnee()], 'whole');
    expect(range.lowPpm).toBeLessThan(-200_000);
    expect(range.hiddenCount).toBe(0);
  });
});

describe('sweepOption', () => {
  it('draws fit, band, limit and points', () => {
    const names = seriesOf(sweepOption(aResult(), [], 'fitted', palette)).map(({ name }) => name);
    expect(names).toEqual(expect.arrayContaining(['limit', 'fit', 'points']));
  });

  it('draws neither fit nor limit where there is none', () => {
    const result = aResult({ sweep: aSweep({ line: [], limitLine: [], fit: null }) });
    const names = seriesOf(sweepOption(result, [], 'fitted', palette)).map(({ name }) => name);
    expect(names).not.toContain('fit');
    expect(names).not.toContain('limit');
  });

  it('tells earlier attempts apart by dash and marker', () => {
    const earlier = [aResult({ resultId: 'a', attempt: 1 }), aResult({ resultId: 'b', attempt: 2 })];
    const drawn = seriesOf(sweepOption(aResult({ attempt: 3 }), earlier, 'fitted', palette)).filter(
      ({ name }) => String(name).startsWith('attempt'),
    );
    const looks = drawn.map((series) =>
      JSON.stringify('lineStyle' in series ? [series.lineStyle, 'symbol' in series && series.symbol] : null),
    );
    expect(new Set(looks).size).toBe(2);
  });

  it('never writes the text of a station into the page as markup', () => {
    const { tooltip } = sweepOption(aResult(), [], 'fitted', palette);
    expect(tooltip).toMatchObject({ renderMode: 'richText' });
  });
});
