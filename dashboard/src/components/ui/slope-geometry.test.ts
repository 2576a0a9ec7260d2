import { describe, expect, it } from 'vitest';
import { aSlope } from '@/testing/builders';
import { boxExit, slopeAngles } from './slope-geometry';

describe('slopeAngles', () => {
  it('draws a unit exactly at its limit at the 20° of the limit', () => {
    const angles = slopeAngles(aSlope({ conductanceSiemens: 1e-7, limitSiemens: 1e-7 }));
    expect(angles.unitDegrees).toBeCloseTo(20, 10);
    expect(angles.limitDegrees).toBe(20);
  });

  it('draws half the conductance with half the fall', () => {
    const { unitDegrees } = slopeAngles(aSlope({ conductanceSiemens: 0.5e-7, limitSiemens: 1e-7 }));
    const fall = Math.tan(((unitDegrees ?? 0) * Math.PI) / 180);
    expect(fall).toBeCloseTo(Math.tan((20 * Math.PI) / 180) / 2, 10);
  });

  it('clips at 60° either way', () => {
    expect(slopeAngles(aSlope({ conductanceSiemens: 1e-3 }))).toMatchObject({
      unitDegrees: 60,
      isClipped: true,
    });
    expect(slopeAngles(aSlope({ conductanceSiemens: -1e-3 })).unitDegrees).toBe(-60);
  });

  it('opens a fan over the interval of a bound and none for a value', () => {
    const bound = aSlope({
      conductanceSiemens: 1e-8,
      expandedUncertaintySiemens: 1e-7,
      impedanceBound: 'atLeast',
    });
    const [low, high] = slopeAngles(bound).fanDegrees ?? [];
    expect(low).toBeLessThan(0);
    expect(high).toBeGreaterThan(20);
    expect(slopeAngles(aSlope()).fanDegrees).toBeNull();
  });

  it('draws no unit without a limit or without a slope', () => {
    expect(slopeAngles(aSlope({ limitSiemens: null })).unitDegrees).toBeNull();
    expect(slopeAngles(aSlope({ conductanceSiemens: null })).unitDegrees).toBeNull();
  });
});

describe('boxExit', () => {
  it('leaves by the right side when shallow and by the bottom when steep', () => {
    expect(boxExit({ x: 0, y: 10 }, 0, 40, 30)).toEqual({ x: 40, y: 10 });
    expect(boxExit({ x: 0, y: 10 }, 60, 40, 30).y).toBeCloseTo(30, 10);
  });
});
