import { resolveResolution } from './resolve-resolution.js';

const assumed = (readings: number[]) => resolveResolution(readings, {}, 1e-3);

describe('resolveResolution', () => {
  it('takes what is stated', () => {
    expect(resolveResolution([1e-3, 2e-3], { resolutionAmps: 1e-8 }, 1e-3)).toEqual({
      resolutionAmps: 1e-8,
      writtenStepAmps: 1e-8,
      assumed: false,
    });
  });

  it.each([
    ['the common step of the readings', [1.05e-3, 1.03e-3, 1.02e-3], 1e-5],
    ['five counts when the meter steps by five', [1.04e-3, 1.035e-3, 1.025e-3, 1.01e-3], 5e-6],
    ['the last decimal place of identical readings', [1.04e-3, 1.04e-3, 1.04e-3], 1e-5],
    [
      'the steps of a shunt whatever their decimals',
      [7, 5, 4, 2].map((count) => count * (1e-4 / 3)),
      1e-4 / 3,
    ],
  ])('else sees %s', (_, readings, step) => {
    const { resolutionAmps, assumed: isAssumed } = assumed(readings);
    expect(resolutionAmps / step).toBeCloseTo(1, 6);
    expect(isAssumed).toBe(true);
  });

  it('never assumes a meter finer than a millionth of its reading', () => {
    expect(assumed([0.00051234567890123, 0.00051234567890123]).resolutionAmps).toBeCloseTo(5.12e-10, 12);
    expect(assumed([1e-3, 1e-3 + 1e-15]).resolutionAmps).toBeGreaterThanOrEqual(1e-9);
  });

  it('is never zero', () => {
    expect(assumed([]).resolutionAmps).toBe(1e-6);
    expect(assumed([0, 0]).resolutionAmps).toBe(1e-6);
  });
});
