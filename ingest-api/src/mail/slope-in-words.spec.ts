import { slopeInWords } from './slope-in-words.js';

const slope = (conductanceSiemens: number | null, limitSiemens: number | null = 100e-9) => ({
  conductanceSiemens,
  conductanceUncertainty: 2e-9,
  limitSiemens,
});

describe('slopeInWords', () => {
  it('tells a slope beyond the limit by its multiple', () => {
    expect(slopeInWords(slope(412.3e-9))).toBe(
      'The current falls by 412.3 nA per volt of load, 4.1 times what the limit allows.',
    );
  });

  it('tells a slope inside the limit by its share', () => {
    expect(slopeInWords(slope(45e-9))).toBe(
      'The current falls by 45.0 nA per volt of load, 45 % of what the limit allows.',
    );
  });

  it('says when the current rises', () => {
    expect(slopeInWords(slope(-250e-9, null))).toBe('The current rises by 250.0 nA per volt of load.');
  });

  it('claims no slope where the uncertainty hides it', () => {
    expect(slopeInWords(slope(-1e-9, null))).toBe(
      'No slope can be told from level: at most 3 nA per volt of load.',
    );
  });

  it('says that there is none', () => {
    expect(slopeInWords(slope(null))).toBe('The slope could not be computed.');
  });
});
