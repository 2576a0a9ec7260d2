import fc from 'fast-check';
import MultivariateLinearRegression from 'ml-regression-multivariate-linear';
import { fitLine } from './fit-line.js';
import { fitLineThroughOrigin } from './fit-line-through-origin.js';
import { fitWeightedLine } from './fit-weighted-line.js';
import { univariateSummary } from './univariate-summary.js';

const figure = fc.double({ min: -1000, max: 1000, noNaN: true });

/** Points whose x are spread over at least 1, so that the comparison is about the method, not about a bad design. */
const cloud = fc
  .array(fc.record({ x: figure, y: figure }), { minLength: 3, maxLength: 60 })
  .filter((points) => spread(points.map(({ x }) => x)) > 1)
  .map((points) => ({ x: points.map(({ x }) => x), y: points.map(({ y }) => y) }));

const spread = (values: readonly number[]) => Math.max(...values) - Math.min(...values);

/** Agreement relative to the size of the figures that the result is a difference of. */
function expectAgreement(value: number, other: number, size: number, digits: number) {
  expect(Math.abs(value - other)).toBeLessThanOrEqual(10 ** -digits * Math.max(Math.abs(other), size));
}

describe('the straight line beside ml-regression-multivariate-linear (normal equations with an SVD inverse)', () => {
  it('agrees in intercept, slope and their standard errors to 8 digits', () => {
    fc.assert(
      fc.property(cloud, ({ x, y }) => {
        const line = fitLine(x, y);
        const other = new MultivariateLinearRegression(
          x.map((value) => [value]),
          y.map((value) => [value]),
        );
        const size = Math.max(...y.map(Math.abs)) / spread(x);
        expectAgreement(line.slope, other.weights[0]![0]!, size, 8);
        expectAgreement(line.intercept, other.weights[1]![0]!, Math.max(...y.map(Math.abs)), 8);
        expectAgreement(line.slopeStdError, other.stdErrors[0]!, size, 8);
        expectAgreement(line.residualStdDev, other.stdError, Math.max(...y.map(Math.abs)), 8);
      }),
    );
  });
});

describe('properties of the straight line', () => {
  it('does not depend on the order of the points beyond the last digits', () => {
    const pair = cloud.chain(({ x, y }) => {
      const order = x.map((_, i) => i);
      return fc.tuple(fc.constant({ x, y }), fc.shuffledSubarray(order, { minLength: x.length }));
    });
    fc.assert(
      fc.property(pair, ([{ x, y }, order]) => {
        const line = fitLine(x, y);
        const shuffled = fitLine(
          order.map((i) => x[i]!),
          order.map((i) => y[i]!),
        );
        const size = Math.max(...y.map(Math.abs)) / spread(x);
        expectAgreement(shuffled.slope, line.slope, size, 13);
        expectAgreement(shuffled.slopeStdError, line.slopeStdError, size, 13);
      }),
    );
  });

  it('an offset of y changes no slope, only the intercept', () => {
    fc.assert(
      fc.property(cloud, fc.integer({ min: -1_000_000, max: 1_000_000 }), ({ x, y }, offset) => {
        const line = fitLine(x, y);
        const raised = fitLine(
          x,
          y.map((value) => value + offset),
        );
        const size = (Math.abs(offset) + 1000) / spread(x);
        expectAgreement(raised.slope, line.slope, size, 13);
        expectAgreement(raised.intercept, line.intercept + offset, 1e3 * size, 13);
      }),
    );
  });

  it('scales with y and inversely with x', () => {
    fc.assert(
      fc.property(cloud, fc.integer({ min: -20, max: 20 }), ({ x, y }, exponent) => {
        const k = 2 ** exponent;
        const line = fitLine(x, y);
        const scaled = fitLine(
          x.map((value) => value * k),
          y.map((value) => value * 4),
        );
        expect(scaled.slope).toBe((line.slope * 4) / k);
        expect(scaled.rSquared).toBe(line.rSquared);
      }),
    );
  });

  it('leaves residuals that sum to zero and hang on no x', () => {
    fc.assert(
      fc.property(cloud, ({ x, y }) => {
        const { intercept, slope } = fitLine(x, y);
        const residuals = y.map((value, i) => value - intercept - slope * x[i]!);
        expect(Math.abs(residuals.reduce((sum, e) => sum + e, 0))).toBeLessThan(1e-8);
        expect(Math.abs(residuals.reduce((sum, e, i) => sum + e * x[i]!, 0))).toBeLessThan(1e-5);
      }),
    );
  });

  it('weighted by equal standard deviations is the plain line', () => {
    fc.assert(
      fc.property(cloud, fc.double({ min: 1e-6, max: 1e6, noNaN: true }), ({ x, y }, sigma) => {
        const plain = fitLine(x, y);
        const weighted = fitWeightedLine(
          x,
          y,
          x.map(() => sigma),
        );
        const size = Math.max(...y.map(Math.abs)) / spread(x);
        expectAgreement(weighted.slope, plain.slope, size, 12);
        expectAgreement(weighted.slopeStdError, plain.slopeStdError, size, 12);
      }),
    );
  });

  it('through the origin equals the plain line of points mirrored in the origin', () => {
    fc.assert(
      fc.property(cloud, ({ x, y }) => {
        const mirrored = fitLine([...x, ...x.map((value) => -value)], [...y, ...y.map((value) => -value)]);
        expectAgreement(fitLineThroughOrigin(x, y).slope, mirrored.slope, 1, 10);
      }),
    );
  });
});

describe('properties of the univariate summary', () => {
  it('an offset moves the mean and nothing else', () => {
    const values = fc.array(fc.integer({ min: -1000, max: 1000 }), { minLength: 2, maxLength: 60 });
    fc.assert(
      fc.property(values, fc.integer({ min: -1_000_000, max: 1_000_000 }), (numbers, offset) => {
        const plain = univariateSummary(numbers);
        const moved = univariateSummary(numbers.map((value) => value + offset));
        expect(moved.mean).toBeCloseTo(plain.mean + offset, 8);
        expect(moved.standardDeviation).toBeCloseTo(plain.standardDeviation, 9);
        expect(moved.lag1Autocorrelation ?? 0).toBeCloseTo(plain.lag1Autocorrelation ?? 0, 8);
      }),
    );
  });
});
