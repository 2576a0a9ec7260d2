import { describe, expect, it } from 'vitest';
import { headroomVolts, sourceOutputOhms, transferRatio } from './current-source.js';
import { baseEmitterVolts, collectorAmps, thermalVolts, transistorOutputOhms } from './transistor.js';

describe('current sources', () => {
  // A. S. Sedra, K. C. Smith, Microelectronic Circuits, exercise on the Wilson mirror; printed answers seen
  // on a homework-answer page, the book itself not opened: 2 %, 0.02 %, 100 kΩ, 5 MΩ.
  it('matches the published mirror and Wilson mirror with beta 100 and r_o 100 kΩ', () => {
    expect(100 * (1 - transferRatio('twoTransistorMirror', 100))).toBeCloseTo(2, 1);
    expect(100 * (1 - transferRatio('wilsonMirror', 100))).toBeCloseTo(0.02, 3);
    expect(sourceOutputOhms('twoTransistorMirror', 100_000, 100)).toBe(100_000);
    expect(sourceOutputOhms('wilsonMirror', 100_000, 100)).toBe(5_000_000);
  });

  it('orders the circuits by output resistance: mirror, Wilson, cascode', () => {
    const mirror = sourceOutputOhms('twoTransistorMirror', 200_000, 120);
    const wilson = sourceOutputOhms('wilsonMirror', 200_000, 120);
    const cascode = sourceOutputOhms('cascode', 200_000, 120);
    expect(mirror).toBeLessThan(wilson);
    expect(wilson).toBeLessThan(cascode);
  });

  it('leaves the load one junction less under a Wilson mirror than under a plain one', () => {
    expect(headroomVolts('twoTransistorMirror', 0.65, 0)).toBe(0);
    expect(headroomVolts('wilsonMirror', 0.65, 0)).toBe(0.65);
    expect(headroomVolts('opAmpPassTransistor', 0.65, 2)).toBe(2);
  });
});

describe('a transistor', () => {
  it('carries more current by the Early factor', () => {
    expect(collectorAmps(1e-3, 10, 100)).toBeCloseTo(1.1e-3, 12);
  });

  it('has the output resistance of that slope', () => {
    const slope = (collectorAmps(1e-3, 5.001, 100) - collectorAmps(1e-3, 5, 100)) / 0.001;
    expect(transistorOutputOhms(100, 5, collectorAmps(1e-3, 5, 100))).toBeCloseTo(1 / slope, 3);
  });

  it('loses 2 mV of V_BE for each °C', () => {
    expect(baseEmitterVolts(35) - baseEmitterVolts(25)).toBeCloseTo(-0.02, 12);
  });

  it('has a thermal voltage near 25.7 mV at 25 °C', () => {
    expect(thermalVolts(25)).toBeCloseTo(0.02569, 5);
  });
});
