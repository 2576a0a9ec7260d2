import { describe, expect, it } from 'vitest';
import { figureText, formatFigure, percentText, probabilityText } from './format-figure';

const plain = (text: string) => text.replace(/\u202f/g, ' ');

describe('formatFigure', () => {
  it('shows digits to the second significant place of the uncertainty', () => {
    expect(formatFigure(12.1385e6, 'Ω', { uncertainty: 0.296e6 })).toEqual({
      sign: '',
      digits: '12.14',
      uncertaintyDigits: '0.30',
      unit: 'MΩ',
    });
  });

  it('shows two digits of an uncertainty that rounds up to the next place', () => {
    expect(formatFigure(5.1234, 'V', { uncertainty: 0.0996 })).toMatchObject({
      digits: '5.12',
      uncertaintyDigits: '0.10',
    });
  });

  it('rounds to tens when the uncertainty is that large', () => {
    expect(formatFigure(1234, 'ppm', { uncertainty: 126 })).toMatchObject({
      digits: '1230',
      uncertaintyDigits: '130',
    });
  });

  it('keeps the prefix of the uncertainty when the value is nearly nothing', () => {
    expect(formatFigure(1e-12, 'S', { uncertainty: 2.4e-9 })).toMatchObject({ digits: '0.0', unit: 'nS' });
  });

  it('rounds a lower bound down and an upper bound up', () => {
    expect(plain(figureText(0.916e6, 'Ω', { bound: 'atLeast' }))).toBe('≥ 910 kΩ');
    expect(plain(figureText(38.2, 'ppm', { bound: 'atMost' }))).toBe('≤ 39 ppm');
  });

  it('does not lower a bound that is already round', () => {
    expect(plain(figureText(0.29, 'V', { bound: 'atLeast' }))).toBe('≥ 290 mV');
  });

  it('takes the next prefix when rounding reaches it', () => {
    expect(plain(figureText(999_960, 'Ω'))).toBe('1 MΩ');
  });

  it('writes a true minus sign and none before zero', () => {
    expect(figureText(-3.5, '%')).toContain('−3.5');
    expect(formatFigure(-0.001, 'ppm', { uncertainty: 34 }).digits).toBe('0');
  });

  it('leaves units without prefixes alone', () => {
    expect(plain(figureText(16430, 'ppm/V', { uncertainty: 41 }))).toBe('16430 ppm/V');
  });
});

describe('percentText', () => {
  it('never rounds all nines up to a hundred', () => {
    expect(plain(percentText(0.99996))).toBe('99.9 %');
    expect(plain(percentText(1))).toBe('100 %');
  });
});

describe('probabilityText', () => {
  it('says what is practically certain as a bound', () => {
    expect(plain(probabilityText(0.99999))).toBe('> 99.9 %');
    expect(plain(probabilityText(0))).toBe('< 0.1 %');
    expect(plain(probabilityText(0.5))).toBe('50.0 %');
  });
});
