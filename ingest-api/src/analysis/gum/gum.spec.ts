import fc from 'fast-check';
import { fitLine } from '../statistics/fit-line.js';
import { combineUncertainties, withProductTerms } from './combine-uncertainties.js';
import { expandedUncertainty, wholeDegreesOfFreedom } from './expanded-uncertainty.js';
import { meanInterval } from './mean-interval.js';
import { predictOnLine } from './predict-on-line.js';
import { repeatedDays } from './repeated-days.js';

const positive = fc.double({ min: 1e-6, max: 1e6, noNaN: true });
const component = fc.record({
  standardUncertainty: positive,
  sensitivity: fc.double({ min: -100, max: 100, noNaN: true }).filter((c) => Math.abs(c) > 1e-3),
  degreesOfFreedom: fc.double({ min: 1, max: 1000, noNaN: true }),
});

describe('combined uncertainty', () => {
  it('lies between its largest contribution and the sum, with degrees of freedom between the smallest and their sum', () => {
    fc.assert(
      fc.property(fc.array(component, { minLength: 1, maxLength: 8 }), (components) => {
        const { standardUncertainty, effectiveDegreesOfFreedom, contributions } =
          combineUncertainties(components);
        expect(standardUncertainty).toBeGreaterThanOrEqual(Math.max(...contributions) * (1 - 1e-12));
        expect(standardUncertainty).toBeLessThanOrEqual(contributions.reduce((a, b) => a + b) * (1 + 1e-12));
        const degrees = components.map((c) => c.degreesOfFreedom);
        expect(effectiveDegreesOfFreedom).toBeGreaterThanOrEqual(Math.min(...degrees) * (1 - 1e-12));
        expect(effectiveDegreesOfFreedom).toBeLessThanOrEqual(degrees.reduce((a, b) => a + b) * (1 + 1e-12));
      }),
    );
  });

  it('keeps its degrees of freedom when every uncertainty is written in another unit', () => {
    fc.assert(
      fc.property(
        fc.array(component, { minLength: 1, maxLength: 5 }),
        fc.constantFrom(1e-90, 1e-9, 1e9, 1e90),
        (components, unit) => {
          const scaled = components.map((c) => ({ ...c, standardUncertainty: c.standardUncertainty * unit }));
          const ratio =
            combineUncertainties(scaled).effectiveDegreesOfFreedom /
            combineUncertainties(components).effectiveDegreesOfFreedom;
          expect(ratio).toBeCloseTo(1, 9);
        },
      ),
    );
  });

  it('has infinite degrees of freedom when every component is known exactly', () => {
    expect(combineUncertainties([{ standardUncertainty: 3 }, { standardUncertainty: 4 }])).toEqual({
      standardUncertainty: 5,
      effectiveDegreesOfFreedom: Infinity,
      contributions: [3, 4],
    });
  });

  it('is zero without any uncertainty', () => {
    const nothing = combineUncertainties([{ standardUncertainty: 0, degreesOfFreedom: 5 }]);
    expect(nothing).toMatchObject({ standardUncertainty: 0, effectiveDegreesOfFreedom: Infinity });
  });

  it('adds the effect of two inputs that multiply each other', () => {
    // f = x·y at x = y = 0: no first-order effect, u = u(x)·u(y).
    const first = combineUncertainties([{ standardUncertainty: 3, sensitivity: 0 }]).standardUncertainty;
    expect(withProductTerms(first, [{ mixedDerivative: 1, firstUncertainty: 3, secondUncertainty: 2 }])).toBe(
      6,
    );
  });

  it.each([
    [[], 'at least one component'],
    [[{ standardUncertainty: -1 }], '0 or more'],
    [[{ standardUncertainty: NaN }], '0 or more'],
    [[{ standardUncertainty: 1, degreesOfFreedom: 0 }], 'above 0'],
  ])('refuses %j', (components, message) => {
    expect(() => combineUncertainties(components)).toThrow(message);
  });
});

describe('expanded uncertainty', () => {
  it('uses the normal factor for infinite degrees of freedom', () => {
    expect(expandedUncertainty(1, Infinity)).toBeCloseTo(1.959963984540054, 14);
  });

  it.each([
    [16.7518, 16],
    [18.9987, 19],
    [18.94, 18],
    [1, 1],
    [Infinity, Infinity],
  ])('cuts %p degrees of freedom to %p', (effective, whole) => {
    expect(wholeDegreesOfFreedom(effective)).toBe(whole);
  });

  it('refuses less than one degree of freedom', () => {
    expect(() => wholeDegreesOfFreedom(0.6)).toThrow(RangeError);
    expect(() => wholeDegreesOfFreedom(NaN)).toThrow(RangeError);
  });
});

describe('prediction on a line', () => {
  it('is most certain at the mean of x, where its variance is s²/n', () => {
    const fit = fitLine([1, 2, 4, 7, 9], [3, 2.1, 2.2, 0.4, 0.3]);
    const atMean = predictOnLine(fit, fit.meanX).standardUncertainty;
    expect(atMean).toBeCloseTo(fit.residualStdDev / Math.sqrt(5), 12);
    for (const x of [-20, 1, 5, 9, 30]) {
      const distance = (x - fit.meanX) ** 2 / fit.sxx;
      const expected = fit.residualStdDev * Math.sqrt(1 / 5 + distance);
      expect(predictOnLine(fit, x).standardUncertainty).toBeCloseTo(expected, 12);
      expect(expected).toBeGreaterThanOrEqual(atMean);
    }
  });
});

describe('interval of a mean', () => {
  it('is symmetric about the mean and wider for more confidence', () => {
    const narrow = meanInterval([4, 7, 6, 5], 0.9);
    const wide = meanInterval([4, 7, 6, 5], 0.99);
    expect((narrow.low + narrow.high) / 2).toBeCloseTo(5.5, 12);
    expect(wide.high).toBeGreaterThan(narrow.high);
  });

  it('requires at least two values', () => {
    expect(() => meanInterval([4])).toThrow(RangeError);
  });
});

describe('repeated days', () => {
  it('finds no component of the days when their means scatter less than the readings explain', () => {
    const days = repeatedDays({ means: [5, 5.01, 4.99], standardDeviations: [1, 1, 1], readingsPerDay: 4 });
    expect(days.betweenDays).toBe(0);
    expect(days).toMatchObject({ betweenDf: 2, withinDf: 9, within: 1 });
  });

  it('refuses days without their deviations and single readings', () => {
    expect(() => repeatedDays({ means: [1, 2], standardDeviations: [1], readingsPerDay: 4 })).toThrow(
      RangeError,
    );
    expect(() => repeatedDays({ means: [1, 2], standardDeviations: [1, 1], readingsPerDay: 1 })).toThrow(
      RangeError,
    );
  });
});
