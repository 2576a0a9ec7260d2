import { aProduct, aSite } from '../../test/builders.js';
import type { DescribedStage } from './site-description.js';
import { findSiteWarnings } from './site-warnings.js';

/** One product with one stage: promised 0 to 8 V, tolerance 1 %. */
function warningsOf(changes: { loadVolts?: number[]; limits?: DescribedStage['limits'] }): string[] {
  const [stage] = aProduct().stages;
  const changed = {
    ...stage!,
    testPlan: { ...stage!.testPlan, loadVolts: changes.loadVolts ?? [0, 1, 2, 4, 6, 8] },
    limits: changes.limits ?? stage!.limits,
  };
  return findSiteWarnings({ ...aSite(), products: [aProduct({ stages: [changed] })] });
}

describe('findSiteWarnings', () => {
  it('is silent about a plan with enough steps and no load regulation limit', () => {
    expect(warningsOf({})).toEqual([]);
  });

  it('warns of too few load steps, in all or in the lower half', () => {
    expect(warningsOf({ loadVolts: [0, 1, 2, 8] })).toEqual([
      expect.stringContaining('fewer than 5 load steps'),
      expect.stringContaining('no knee can be claimed'),
    ]);
    expect(warningsOf({ loadVolts: [0, 2, 4, 6, 8] })).toEqual([
      expect.stringContaining('no knee can be claimed'),
    ]);
  });

  it('warns of a tolerance above ten times the allowed load regulation', () => {
    expect(warningsOf({ limits: [{ measure: 'loadRegulation', lower: -0.05, upper: 0.05 }] })).toEqual([
      'warning, FH-R500-W board: the compliance tolerance is more than ten times the allowed load regulation',
    ]);
    expect(warningsOf({ limits: [{ measure: 'loadRegulation', upper: 0.1 }] })).toEqual([]);
  });
});
