import fc from 'fast-check';
import { normalCdf } from '../distributions/normal.js';
import { conformityProbability } from './conformity-probability.js';
import { findRoot } from './find-root.js';
import { globalRisk, guardBandForRisk, movedInwards } from './global-risk.js';
import { guardBandInStandardUncertainties, riskOfGuardFactor } from './guard-factor.js';
import { integrate } from './integrate.js';
import { gammaPrior, normalPrior } from './prior.js';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('integrate', () => {
  it('is exact on polynomials up to degree 22', () => {
    for (let degree = 0; degree <= 22; degree++) {
      const expected = (3 ** (degree + 1) - (-1) ** (degree + 1)) / (degree + 1);
      expect(integrate((x) => x ** degree, -1, 3) / expected).toBeCloseTo(1, 13);
    }
  });

  it('finds the normal distribution function again', () => {
    const density = (x: number) => Math.exp((-x * x) / 2) / Math.sqrt(2 * Math.PI);
    fc.assert(
      fc.property(between(-6, 6), between(-6, 6), (a, b) =>
        expect(integrate(density, a, b)).toBeCloseTo(normalCdf(b) - normalCdf(a), 12),
      ),
    );
  });

  it('turns its sign with the ends', () => {
    expect(integrate((x) => x, 2, 0)).toBeCloseTo(-2, 13);
    expect(integrate((x) => x, 2, 2)).toBe(0);
  });
});

describe('findRoot', () => {
  it('finds the root in the bracket', () => {
    fc.assert(
      fc.property(between(-5, 5), (root) =>
        expect(findRoot((x) => Math.expm1(x - root), -10, 10)).toBeCloseTo(root, 11),
      ),
    );
  });

  it('refuses a bracket without a change of sign', () => {
    expect(() => findRoot((x) => x * x + 1, -1, 1)).toThrow(RangeError);
  });
});

describe('probability of conformity', () => {
  it('adds up to 1 over the three parts of the line', () => {
    fc.assert(
      fc.property(between(-50, 50), between(0.01, 20), (value, u) => {
        const inside = conformityProbability(value, u, { lower: -1, upper: 2 });
        const below = conformityProbability(value, u, { lower: null, upper: -1 });
        const above = conformityProbability(value, u, { lower: 2, upper: null });
        expect(inside + below + above).toBeCloseTo(1, 12);
      }),
    );
  });

  it('keeps the digits of a small probability on either side', () => {
    expect(conformityProbability(-10, 1, { lower: 0, upper: 1 }) / normalCdf(-10)).toBeCloseTo(1, 4);
    expect(conformityProbability(11, 1, { lower: 0, upper: 1 }) / normalCdf(-10)).toBeCloseTo(1, 4);
  });

  it('is certain without uncertainty, and a value on the limit conforms', () => {
    const tolerance = { lower: 0, upper: 1 };
    expect([-0.1, 0, 0.5, 1, 1.1].map((value) => conformityProbability(value, 0, tolerance))).toEqual([
      0, 1, 1, 1, 0,
    ]);
  });

  it('is 1 without limits and 0 when the limits exclude each other', () => {
    expect(conformityProbability(3, 1, { lower: null, upper: null })).toBe(1);
    expect(conformityProbability(3, 1, { lower: 4, upper: 2 })).toBe(0);
  });

  it('refuses a negative uncertainty', () => {
    expect(() => conformityProbability(3, -1, { lower: 0, upper: 1 })).toThrow(RangeError);
  });
});

describe('global risk', () => {
  const inspection = {
    prior: normalPrior(0, 1),
    standardUncertainty: 0.25,
    tolerance: { lower: -2, upper: 2 },
  };

  it('shares the production out completely', () => {
    fc.assert(
      fc.property(
        between(-1, 1),
        between(0.2, 2),
        between(0.05, 1),
        between(-0.3, 0.3),
        (mean, sd, u, guardBand) => {
          const tolerance = { lower: -2, upper: 2 };
          const prior = normalPrior(mean, sd);
          const risk = globalRisk({
            prior,
            standardUncertainty: u,
            tolerance,
            acceptance: movedInwards(tolerance, guardBand),
          });
          // A sum of two normals is normal: the share accepted has a closed form.
          const observed = normalPrior(mean, Math.hypot(sd, u));
          const closed = observed.cumulative(2 - guardBand) - observed.cumulative(-2 + guardBand);
          expect(risk.accepted).toBeCloseTo(closed, 10);
          expect(risk.accepted - risk.falseAccept + risk.falseReject + risk.nonconforming).toBeCloseTo(1, 10);
        },
      ),
      { numRuns: 50 },
    );
  });

  it("trades the consumer's risk for the producer's as the guard band grows", () => {
    const risks = [0, 0.2, 0.4].map((w) =>
      globalRisk({ ...inspection, acceptance: movedInwards(inspection.tolerance, w) }),
    );
    expect(risks[0]!.falseAccept).toBeGreaterThan(risks[1]!.falseAccept);
    expect(risks[1]!.falseAccept).toBeGreaterThan(risks[2]!.falseAccept);
    expect(risks[2]!.falseReject).toBeGreaterThan(risks[1]!.falseReject);
  });

  it('finds the guard band whose risk is the target', () => {
    const guardBand = guardBandForRisk(inspection, 0.001);
    expect(
      globalRisk({ ...inspection, acceptance: movedInwards(inspection.tolerance, guardBand) }).falseAccept,
    ).toBeCloseTo(0.001, 12);
  });

  it('agrees with the gamma density on its own distribution function', () => {
    const prior = gammaPrior(4, 0.25);
    expect(integrate(prior.density, 0, 1.3)).toBeCloseTo(prior.cumulative(1.3), 12);
    expect(integrate(prior.density, 0, prior.support.high)).toBeCloseTo(1, 12);
  });

  it('refuses an inspection without uncertainty', () => {
    expect(() => globalRisk({ ...inspection, standardUncertainty: 0 })).toThrow(RangeError);
  });
});

describe('guard factors', () => {
  it('are the inverse of their risk', () => {
    fc.assert(
      fc.property(between(0.0001, 0.5), (risk) =>
        expect(riskOfGuardFactor(guardBandInStandardUncertainties(risk) / 2)).toBeCloseTo(risk, 12),
      ),
    );
  });
});
