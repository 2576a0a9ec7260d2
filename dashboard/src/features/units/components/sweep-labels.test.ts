import { describe, expect, it } from 'vitest';
import { spread } from './sweep-labels';

const range = { lowVolts: 0, highVolts: 10, lowPpm: -1000, highPpm: 1000, hiddenCount: 0 };
const end = (name: string, volts: number, ppm: number) => ({ name, volts, ppm, color: '#000' });

describe('spread', () => {
  it('gives labels at the same place a line each, in the order of their ends', () => {
    const placed = spread([end('low', 10, -20), end('high', 10, 0), end('mid', 10, -10)], range);
    expect(placed.map(({ name, ppm }) => [name, ppm])).toEqual([
      ['high', 0],
      ['mid', -100],
      ['low', -200],
    ]);
  });

  it('leaves labels alone that are apart', () => {
    const apart = [end('a', 10, 500), end('b', 10, -500), end('c', 2, 490)];
    expect(spread(apart, range)).toEqual(expect.arrayContaining(apart));
  });
});
