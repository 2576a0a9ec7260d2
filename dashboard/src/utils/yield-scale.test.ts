import { describe, expect, it } from 'vitest';
import { aYield } from '@/testing/builders';
import { scalePlace, standingToTarget, yieldScale } from './yield-scale';

describe('yieldScale', () => {
  it('starts at a round figure below the lowest interval and target', () => {
    const scale = yieldScale([aYield({ low: 0.72 }), aYield({ low: 0.91 })], [0.95, null]);
    expect(scale.from).toBe(0.7);
    expect(scale.ticks.map((tick) => Math.round(tick * 100))).toEqual([70, 80, 90, 100]);
  });

  it('covers everything when a yield is near nothing', () => {
    expect(yieldScale([aYield({ low: 0.02 })], []).from).toBe(0);
  });
});

describe('scalePlace', () => {
  it('keeps a share outside the scale at its end', () => {
    expect(scalePlace(0.4, yieldScale([aYield({ low: 0.72 })], []))).toBe(0);
  });
});

describe('standingToTarget', () => {
  it('says below or met only when the whole interval lies on one side', () => {
    expect(standingToTarget(aYield({ low: 0.8, high: 0.94 }), 0.95)).toBe('below');
    expect(standingToTarget(aYield({ low: 0.96, high: 0.99 }), 0.95)).toBe('met');
    expect(standingToTarget(aYield({ low: 0.9, high: 0.98 }), 0.95)).toBe('open');
    expect(standingToTarget(aYield(), null)).toBeNull();
  });
});
