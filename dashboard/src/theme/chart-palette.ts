/** The tokens a chart draws with, as colours: charts cannot read CSS variables by themselves. */
export interface ChartPalette {
  sheet: string;
  ink: string;
  faded: string;
  rule: string;
  grid: string;
  pass: string;
  fail: string;
  notProven: string;
  proseFont: string;
  figureFont: string;
}

export function readChartPalette(): ChartPalette {
  const style = getComputedStyle(document.documentElement);
  const token = (name: string) => style.getPropertyValue(`--${name}`).trim();
  return {
    sheet: token('sheet'),
    ink: token('ink'),
    faded: token('faded'),
    rule: token('rule'),
    grid: token('grid'),
    pass: token('pass'),
    fail: token('fail'),
    notProven: token('not-proven'),
    proseFont: token('font-prose'),
    figureFont: token('font-figures'),
  };
}
