import fc from 'fast-check';
import { formatBound, formatFigure, formatInterval, formatWithUncertainty } from './format-figure.js';

describe('figures', () => {
  it.each([
    [12.1386e6, 'Ω', 0.29e6, '12.14 MΩ'],
    [501.23456e-6, 'A', 0.12e-6, '501.23 µA'],
    [999.96e3, 'Ω', 96, '999.960 kΩ'],
    [999.996e3, 'Ω', 960, '1.00000 MΩ'],
    [1234, 'Ω', 560, '1.23 kΩ'],
    [234, 'Ω', 560, '230 Ω'],
    [0, 'A', 1.2e-9, '0.0 nA'],
    [-0.376, '%', 0.021, '−0.376 %'],
    [163.9, 'ppm/V', 4, '163.9 ppm/V'],
    [-0.0001, '%', 0.2, '0.00 %'],
    [12.1386e6, 'Ω', null, '12.1386 MΩ'],
    [10e6, 'Ω', undefined, '10 MΩ'],
    [8, 'V', 0, '8 V'],
    [2e6, 'ppm', null, '2000000 ppm'],
    [0, 'V', null, '0 V'],
    [3.2e-18, 'S', null, '0.0032 fS'],
  ])('%p %s ± %p is written %s', (value, unit, uncertainty, text) => {
    expect(formatFigure(value, unit, uncertainty)).toBe(text);
  });

  it('never fails on a finite figure', () => {
    const anyFigure = fc.double({ min: -1e300, max: 1e300, noNaN: true });
    fc.assert(
      fc.property(anyFigure, anyFigure, fc.constantFrom('A', '%'), (value, other, unit) => {
        const texts = [
          formatFigure(value, unit),
          formatFigure(value, unit, other),
          formatWithUncertainty(value, unit, other),
          formatInterval(Math.min(value, other), Math.max(value, other), unit),
          formatBound(value, unit, 'atLeast'),
          formatBound(value, unit, 'atMost'),
        ];
        expect(texts.join()).not.toMatch(/NaN|Infinity|undefined/);
      }),
      { numRuns: 1000 },
    );
  });

  it('writes a value with its uncertainty under one prefix', () => {
    expect(formatWithUncertainty(501.23456e-6, 'A', 0.12e-6)).toBe('501.23 ± 0.12 µA');
    expect(formatWithUncertainty(0.5, '%', null)).toBe('0.5 %');
  });

  it('writes an interval under one prefix', () => {
    expect(formatInterval(11.849e6, 12.442e6, 'Ω')).toBe('11.85 to 12.44 MΩ');
    expect(formatInterval(0.9e6, 3.1e6, 'Ω')).toBe('0.9 to 3.1 MΩ');
  });

  it('rounds a bound to the side on which it stays true', () => {
    expect(formatBound(894_987, 'Ω', 'atLeast')).toBe('at least 894 kΩ');
    expect(formatBound(41.231, 'ppm', 'atMost')).toBe('at most 41.3 ppm');
    expect(formatBound(8, 'V', 'atLeast')).toBe('at least 8 V');
    expect(formatBound(0.29, 'V', 'atLeast')).toBe('at least 290 mV');
  });

  it('refuses what is no figure', () => {
    expect(() => formatFigure(Infinity, 'Ω')).toThrow(RangeError);
    expect(() => formatFigure(NaN, 'Ω', 1)).toThrow(RangeError);
  });
});
