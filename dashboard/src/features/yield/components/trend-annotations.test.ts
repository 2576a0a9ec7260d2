import { describe, expect, it } from 'vitest';
import { spreadLabels } from './trend-annotations';

describe('spreadLabels', () => {
  it('moves names at the same height apart, the highest stays', () => {
    const scale = { from: 0.8, to: 1, ticks: [] };
    const labels = spreadLabels(
      [
        { text: 'first pass', at: 0.95, tone: 'ink' },
        { text: 'final', at: 0.96, tone: 'faded' },
      ],
      scale,
    );
    expect(labels.map(({ text }) => text)).toEqual(['final', 'first pass']);
    expect(labels[0]?.at).toBe(0.96);
    expect(labels[1]?.at).toBeCloseTo(0.945, 6);
  });
});
