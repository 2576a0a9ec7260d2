import { earlyOutputResistance } from './early-effect.js';
import { impedanceFromSlope } from './impedance-from-slope.js';
import {
  twoTransistorMirrorError,
  twoTransistorMirrorRatio,
  wilsonMirrorError,
  wilsonMirrorRatio,
  wilsonMirrorResistance,
} from './mirror.js';

describe('mirrors', () => {
  it.each([20, 100, 350])('lack what their ratio lacks of 1 at a gain of %p', (beta) => {
    expect(twoTransistorMirrorError(beta)).toBeCloseTo(1 - twoTransistorMirrorRatio(beta), 14);
    expect(wilsonMirrorError(beta)).toBeCloseTo(1 - wilsonMirrorRatio(beta), 14);
  });

  it('multiply the output resistance by half the gain in the Wilson circuit', () => {
    expect(wilsonMirrorResistance(200, 50e3)).toBe(5e6);
  });
});

describe('Early effect', () => {
  it('gives the resistance of the line through −V_A, wherever on it the current is taken', () => {
    const saturation = 1e-3;
    for (const volts of [0, 5, 20]) {
      const current = saturation * (1 + volts / 80);
      expect(earlyOutputResistance(80, current, volts)).toBeCloseTo(80e3, 6);
    }
  });

  it('requires a current', () => {
    expect(() => earlyOutputResistance(80, 0)).toThrow(RangeError);
  });
});

describe('impedance from a slope, to first order', () => {
  it('keeps the relative uncertainty of the slope', () => {
    const { ohms, relativeUncertainty } = impedanceFromSlope(-1e-7, 2e-9, 10);
    expect(ohms).toBeCloseTo(1e7, 3);
    expect(relativeUncertainty).toBeCloseTo(0.02, 14);
  });

  it('has a negative impedance where the current rises', () => {
    expect(impedanceFromSlope(1e-7, 2e-9, 10).ohms).toBeCloseTo(-1e7, 3);
  });

  it('has none without a slope', () => {
    expect(() => impedanceFromSlope(0, 1e-9, 10)).toThrow(RangeError);
  });
});
