import { fitLine } from './fit-line.js';
import { fitLineThroughOrigin } from './fit-line-through-origin.js';
import { fitWeightedLine } from './fit-weighted-line.js';

/** Relative agreement to a number of digits. */
const digits = (value: number, expected: number) =>
  value === expected ? 17 : -Math.log10(Math.abs((value - expected) / expected));

/** NIST StRD Norris (doi 10.18434/T43G6C); certified values as carried by ab9sq/Rqualification. */
const norris = {
  y: [
    0.1, 338.8, 118.1, 888.0, 9.2, 228.1, 668.5, 998.5, 449.1, 778.9, 559.2, 0.3, 0.1, 778.1, 668.8, 339.3,
    448.9, 10.8, 557.7, 228.3, 998.0, 888.8, 119.6, 0.3, 0.6, 557.6, 339.3, 888.0, 998.5, 778.9, 10.2, 117.6,
    228.9, 668.4, 449.2, 0.2,
  ],
  x: [
    0.2, 337.4, 118.2, 884.6, 10.1, 226.5, 666.3, 996.3, 448.6, 777.0, 558.2, 0.4, 0.6, 775.5, 666.9, 338.0,
    447.5, 11.6, 556.0, 228.1, 995.8, 887.6, 120.2, 0.3, 0.3, 556.8, 339.1, 887.2, 999.0, 779.0, 11.1, 118.3,
    229.2, 669.1, 448.9, 0.5,
  ],
};

describe('fitLine', () => {
  it('reaches the certified digits of the Norris set', () => {
    const line = fitLine(norris.x, norris.y);
    expect(digits(line.slope, 1.00211681802045)).toBeGreaterThan(13);
    expect(digits(line.intercept, -0.262323073774029)).toBeGreaterThan(11);
    expect(digits(line.slopeStdError, 0.429796848199937e-3)).toBeGreaterThan(13);
    expect(digits(line.interceptStdError, 0.232818234301152)).toBeGreaterThan(13);
    expect(digits(line.residualStdDev, 0.884796396144373)).toBeGreaterThan(13);
    expect(digits(line.rSquared, 0.999993745883712)).toBeGreaterThan(13);
    expect(digits(line.regressionSumOfSquares, 4255954.13232369)).toBeGreaterThan(13);
  });

  it('keeps the slope of a few parts per million on a large current', () => {
    const x = Array.from({ length: 11 }, (_, i) => i);
    const line = fitLine(
      x,
      x.map((volts) => 0.01 - 1e-6 * volts),
    );
    expect(digits(line.slope, -1e-6)).toBeGreaterThan(12);
  });

  it('gives a perfect fit of level readings no scatter', () => {
    const line = fitLine([0, 1, 2], [5, 5, 5]);
    expect(line).toMatchObject({ slope: 0, intercept: 5, slopeStdError: 0, rSquared: 1 });
  });

  it('refuses what has no line', () => {
    expect(() => fitLine([1, 2], [1, 2])).toThrow('at least three points');
    expect(() => fitLine([1, 1, 1], [1, 2, 3])).toThrow('two different x');
    expect(() => fitLine([1, 2, 3], [1, 2])).toThrow('as many y as x');
  });
});

describe('fitLineThroughOrigin', () => {
  it('reaches the certified digits of NoInt1 and NoInt2', () => {
    const x1 = [60, 61, 62, 63, 64, 65, 66, 67, 68, 69, 70];
    const line1 = fitLineThroughOrigin(x1, [130, 131, 132, 133, 134, 135, 136, 137, 138, 139, 140]);
    expect(digits(line1.slope, 2.07438016528926)).toBeGreaterThan(14);
    expect(digits(line1.slopeStdError, 0.0165289256198347)).toBeGreaterThan(13);
    expect(digits(line1.rSquared, 0.999365492298663)).toBeGreaterThan(14);
    const line2 = fitLineThroughOrigin([4, 5, 6], [3, 4, 4]);
    expect(digits(line2.slope, 0.727272727272727)).toBeGreaterThan(14);
    expect(digits(line2.residualStdDev, 0.369274472937998)).toBeGreaterThan(13);
  });

  it('refuses points that are all at the origin', () => {
    expect(() => fitLineThroughOrigin([0, 0], [1, 2])).toThrow('not zero');
    expect(() => fitLineThroughOrigin([1], [1])).toThrow('at least two points');
  });
});

describe('fitWeightedLine', () => {
  it('equals the unweighted fit when all standard deviations are equal', () => {
    const weighted = fitWeightedLine(
      norris.x,
      norris.y,
      norris.x.map(() => 0.25),
    );
    const plain = fitLine(norris.x, norris.y);
    expect(weighted.slope).toBeCloseTo(plain.slope, 13);
    expect(weighted.slopeStdError).toBeCloseTo(plain.slopeStdError, 15);
    expect(weighted.sxx / plain.sxx).toBeCloseTo(1, 13);
    expect(weighted.chiSquared).toBeCloseTo(plain.residualSumOfSquares / 0.0625, 8);
  });

  it('follows the precise points', () => {
    const line = fitWeightedLine([0, 1, 2, 3], [0, 1, 2, 30], [1e-6, 1e-6, 1e-6, 1e3]);
    expect(line.slope).toBeCloseTo(1, 6);
    expect(line.slopeStdErrorUnscaled).toBeCloseTo(1e-6 / Math.SQRT2, 12);
  });

  it('refuses a standard deviation of zero', () => {
    expect(() => fitWeightedLine([0, 1, 2], [0, 1, 2], [1, 0, 1])).toThrow('positive');
  });
});
