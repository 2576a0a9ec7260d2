import fc from 'fast-check';
import type { PreparedPoint } from '../analysis.types.js';
import { fitRanges } from './fit-ranges.js';
import { lineThrough } from './line-through.js';

const onRange = (
  rangeAmps: number,
  readings: readonly (readonly [loadVolts: number, outputAmps: number, stdDev?: number])[],
) => ({
  rangeAmps,
  points: readings.map(([loadVolts, outputAmps, outputAmpsStdDev = null], index): PreparedPoint => ({
    index,
    loadVolts,
    outputAmps,
    direction: null,
    elapsedMs: null,
    outputAmpsStdDev,
    rangeAmps,
    overload: false,
    inFit: true,
    inRange: true,
  })),
});

describe('fitRanges', () => {
  it('agrees with the regression on voltage and one indicator a range', () => {
    // Reference: normal equations of I = a + b·V + c·[second range], solved in exact fractions by hand:
    // first range means 1, 2 with Sxx 2, Sxy −3; second range means 4.5, 10 with Sxx 0.5, Sxy −0.5.
    const first = onRange(1, [
      [0, 3.5],
      [1, 2],
      [2, 0.5],
    ]);
    const second = onRange(2, [
      [4, 10.5],
      [5, 9.5],
    ]);
    const { fit, offsetAmps, farthestVolts } = fitRanges([first, second], false);
    const slope = -3.5 / 2.5;
    const residualSquares = 2 * 0.1 ** 2 + 2 * 0.2 ** 2;
    expect(fit.slopeSiemens).toBeCloseTo(slope, 13);
    expect(fit.interceptAmps).toBeCloseTo(2 - slope, 13);
    expect(offsetAmps.get(2)).toBeCloseTo(10 - 4.5 * slope - (2 - slope), 13);
    expect(farthestVolts).toBe(3.5);
    expect(fit.degreesOfFreedom).toBe(2);
    expect(fit.residualStdDev).toBeCloseTo(Math.sqrt(residualSquares / 2), 13);
    expect(fit.slopeStdError).toBeCloseTo(Math.sqrt(residualSquares / 2 / 2.5), 13);
    expect(fit.interceptStdError).toBeCloseTo(Math.sqrt((residualSquares / 2) * (1 / 3 + 1 / 2.5)), 13);
  });

  const readings = fc.array(
    fc.tuple(
      fc.integer({ min: 0, max: 80 }),
      fc.integer({ min: -50, max: 50 }),
      fc.integer({ min: 1, max: 9 }),
    ),
    { minLength: 4, maxLength: 12 },
  );
  const spread = (rows: readonly (readonly number[])[]) => new Set(rows.map(([volts]) => volts)).size >= 3;
  const rows = readings.filter(spread);

  it.each([true, false])('with one range is the plain fit, weighted: %s', (weighted) => {
    fc.assert(
      fc.property(rows, (drawn) => {
        const range = onRange(1, drawn);
        const { fit } = fitRanges([range], weighted);
        const plain = lineThrough(range.points, weighted);
        const names = Object.keys(plain) as (keyof typeof plain)[];
        for (const name of names) expect(Number(fit[name])).toBeCloseTo(Number(plain[name]), 8);
      }),
    );
  });

  it.each([true, false])(
    'a step between ranges changes nothing but their offset, weighted: %s',
    (weighted) => {
      fc.assert(
        fc.property(rows, rows, fc.integer({ min: -1000, max: 1000 }), (main, other, step) => {
          const moved = other.map(([volts, amps, sigma]) => [volts, amps + step, sigma] as const);
          const plain = fitRanges([onRange(1, main), onRange(2, other)], weighted);
          const stepped = fitRanges([onRange(1, main), onRange(2, moved)], weighted);
          expect(stepped.fit.slopeSiemens).toBeCloseTo(plain.fit.slopeSiemens, 8);
          expect(stepped.fit.slopeStdError).toBeCloseTo(plain.fit.slopeStdError, 8);
          expect(stepped.fit.interceptAmps).toBeCloseTo(plain.fit.interceptAmps, 8);
          expect(stepped.offsetAmps.get(2)! - plain.offsetAmps.get(2)!).toBeCloseTo(step, 7);
        }),
      );
    },
  );
});
