import fc from 'fast-check';
import { fitWeightedLine } from './fit-weighted-line.js';
import { fitYorkLine, type UncertainPoint } from './fit-york-line.js';

const deviation = fc.double({ min: 0.01, max: 1, noNaN: true });
/** Points near y = 5 − 0.4·x with uncertain coordinates. */
const points = fc
  .array(fc.tuple(fc.double({ min: -0.2, max: 0.2, noNaN: true }), deviation, deviation), {
    minLength: 4,
    maxLength: 15,
  })
  .map((list) =>
    list.map(([error, xStdDev, yStdDev], i): UncertainPoint => ({
      x: i,
      y: 5 - 0.4 * i + error,
      xStdDev,
      yStdDev,
    })),
  );

describe('line through points uncertain in both coordinates', () => {
  it('is the weighted line when x is all but certain', () => {
    fc.assert(
      fc.property(points, (uncertain) => {
        const york = fitYorkLine(uncertain.map((point) => ({ ...point, xStdDev: 1e-9 })));
        const weighted = fitWeightedLine(
          uncertain.map(({ x }) => x),
          uncertain.map(({ y }) => y),
          uncertain.map(({ yStdDev }) => yStdDev),
        );
        expect(york.slope).toBeCloseTo(weighted.slope, 9);
        expect(york.intercept).toBeCloseTo(weighted.intercept, 9);
        expect(york.slopeStdError).toBeCloseTo(weighted.slopeStdErrorUnscaled, 9);
        expect(york.interceptStdError).toBeCloseTo(weighted.interceptStdErrorUnscaled, 9);
        expect(Math.abs(york.chiSquared - weighted.chiSquared)).toBeLessThan(
          1e-9 + 1e-6 * weighted.chiSquared,
        );
      }),
    );
  });

  it('is the same line when x and y change places', () => {
    fc.assert(
      fc.property(points, (uncertain) => {
        const york = fitYorkLine(uncertain);
        const turned = fitYorkLine(
          uncertain.map((p) => ({ x: p.y, y: p.x, xStdDev: p.yStdDev, yStdDev: p.xStdDev })),
        );
        expect(turned.slope * york.slope).toBeCloseTo(1, 9);
        expect(turned.chiSquared).toBeCloseTo(york.chiSquared, 7);
      }),
    );
  });

  it('follows correlated errors: points off the line along the correlation cost nothing', () => {
    const along = [0, 1, 2, 3, 4].map((i): UncertainPoint => ({
      x: i,
      y: 2 * i,
      xStdDev: 0.1,
      yStdDev: 0.1,
      errorCorrelation: 0.9,
    }));
    expect(fitYorkLine(along).slope).toBeCloseTo(2, 12);
    expect(fitYorkLine(along).chiSquared).toBeCloseTo(0, 12);
  });

  it('refuses too few points, certain points and a vertical line', () => {
    const point = { x: 1, y: 1, xStdDev: 1, yStdDev: 1 };
    expect(() => fitYorkLine([point, point])).toThrow('at least three points');
    expect(() => fitYorkLine([point, point, { ...point, yStdDev: 0 }])).toThrow(
      'positive standard deviations',
    );
    expect(() => fitYorkLine([point, point, point])).toThrow('two different x');
  });
});
