import { impedanceCeiling, limitProvability } from './impedance-ceiling.js';
import { outputImpedance } from './output-impedance.js';
import { resolutionUncertainty, slopeBounds } from './resolution-bounds.js';

describe('outputImpedance', () => {
  it('has both ends when the conductance is told from zero', () => {
    expect(outputImpedance(-1e-7, 2e-8)).toEqual({
      estimateOhms: 1e7,
      lowOhms: 1 / 1.2e-7,
      highOhms: 1 / (1e-7 - 2e-8),
      bound: 'exact',
      conductanceSiemens: 1e-7,
      expandedUncertaintySiemens: 2e-8,
    });
  });

  it.each([
    ['a small fall', -1e-8],
    ['a small rise', 1e-8],
  ])('is at least 1/(|g| + U) for %s within the uncertainty', (_, slope) => {
    const impedance = outputImpedance(slope, 2e-8);
    expect(impedance).toMatchObject({ bound: 'atLeast', highOhms: null });
    expect(impedance.lowOhms! * 3e-8).toBeCloseTo(1, 12);
    expect(impedance.estimateOhms! * -slope).toBeCloseTo(1, 12);
  });

  it('of a level line is at least 1/U and has no estimate', () => {
    const impedance = outputImpedance(0, 1e-6);
    expect(impedance).toMatchObject({ estimateOhms: null, highOhms: null, bound: 'atLeast' });
    expect(impedance.lowOhms! / 1e6).toBeCloseTo(1, 12);
  });

  it('does not exist for a current that rises significantly', () => {
    expect(outputImpedance(3e-8, 2e-8)).toMatchObject({ lowOhms: null, highOhms: null });
  });
});

describe('slopeBounds', () => {
  it('identical readings leave 1.2·δ over the span, whatever their number', () => {
    for (const count of [3, 12, 40]) {
      const volts = Array.from({ length: count }, (_, i) => (8 * i) / (count - 1));
      const bounds = slopeBounds(
        volts,
        volts.map(() => 1),
        0.01,
        1e-3,
      );
      expect(resolutionUncertainty(0, bounds)).toBeCloseTo(0.012 / 8, 12);
    }
  });

  it('scatter beyond the rounding leaves no bounds and no resolution uncertainty', () => {
    const bounds = slopeBounds([0, 1, 2], [0, 5, 0], 1, 0)!;
    expect(bounds.lowest).toBeGreaterThan(bounds.highest);
    expect(resolutionUncertainty(0, bounds)).toBe(0);
  });

  it('pairs at one voltage say nothing', () => {
    expect(slopeBounds([1, 1, 1], [1, 2, 3], 0.1, 0)).toBeNull();
  });
});

describe('impedanceCeiling', () => {
  const loadVolts = [0, 1.2, 2.4, 3.6, 4.8, 6, 7.2, 8];

  it('of a quiet bench is set by the steps of the meter over the span', () => {
    const ceiling = impedanceCeiling({ loadVolts, resolutionAmps: 1e-8, scatterAmps: 0 });
    expect(ceiling.governedBy).toBe('resolution');
    expect(ceiling.ceilingOhms).toBeCloseTo(8 / 1.2e-8, -3);
  });

  it('of a noisy bench is set by its scatter', () => {
    const ceiling = impedanceCeiling({ loadVolts, resolutionAmps: 1e-8, scatterAmps: 1e-7 });
    expect(ceiling.governedBy).toBe('scatter');
    expect(ceiling.ceilingOhms).toBeLessThan(1e8);
  });

  it('rises with the span and with a finer meter', () => {
    const at = (span: number, resolutionAmps: number) =>
      impedanceCeiling({ loadVolts: loadVolts.map((v) => (v * span) / 8), resolutionAmps, scatterAmps: 0 })
        .ceilingOhms;
    expect(at(16, 1e-8)).toBeCloseTo(2 * at(8, 1e-8), -2);
    expect(at(8, 1e-9)).toBeCloseTo(10 * at(8, 1e-8), -2);
  });

  it('tells which limits can be proven', () => {
    const ceiling = impedanceCeiling({ loadVolts, resolutionAmps: 1e-8, scatterAmps: 0 });
    expect(limitProvability(10e6, ceiling)).toBe('provable');
    expect(limitProvability(0.6 * ceiling.ceilingOhms, ceiling)).toBe('aboveHalfCeiling');
    expect(limitProvability(1.1 * ceiling.ceilingOhms, ceiling)).toBe('aboveCeiling');
  });

  it('refuses a plan that has no slope', () => {
    expect(() => impedanceCeiling({ loadVolts: [0, 1], resolutionAmps: 1, scatterAmps: 0 })).toThrow(
      'three load steps',
    );
    expect(() => impedanceCeiling({ loadVolts: [1, 1, 1], resolutionAmps: 1, scatterAmps: 0 })).toThrow(
      'different',
    );
    expect(() => impedanceCeiling({ loadVolts, resolutionAmps: 0, scatterAmps: 0 })).toThrow(
      'positive resolution',
    );
  });
});
