import { describe, expect, it } from 'vitest';
import { aProduct } from '@/testing/product-builders';
import { examplePost } from './example-post';

const identity = {
  resultId: '4052d593-8bbf-4e71-aae4-536fb9f01ce4',
  startedAt: '2026-11-30T08:15:30.120Z',
};

describe('examplePost', () => {
  it('posts the readings of the API docs for a product like theirs', () => {
    const post = examplePost(aProduct(), 'final', identity);
    expect(post.points[0]).toEqual({ loadVolts: 0, outputAmps: 0.00050188 });
    expect(post.points.at(-1)).toEqual({ loadVolts: 8, outputAmps: 0.00050122 });
    expect(post).toMatchObject({ ...identity, partNumber: 'FH-R500-W', stage: 'final' });
  });

  it('covers the promised range and the nominal current of any other product', () => {
    const product = aProduct({ nominalAmps: 0.015, complianceLowVolts: 2, complianceHighVolts: 10 });
    const { points, ammeter } = examplePost(product, 'final', identity);
    expect(points.map(({ loadVolts }) => loadVolts)).toEqual([2, 3.2, 4.4, 5.6, 6.8, 8, 9.2, 10]);
    expect(points[4]?.outputAmps).toBe(0.0150444);
    expect(ammeter).toEqual({ rangeAmps: 0.03, resolutionAmps: 3e-7 });
  });

  it('counts nowhere, whatever key it comes with', () => {
    expect(examplePost(aProduct(), 'final', identity).runKind).toBe('practice');
  });
});
