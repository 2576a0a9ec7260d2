import { processYields } from './process-yields.js';

describe('yields of a process', () => {
  it('tells scrap, rework and the product of the steps apart', () => {
    expect(
      processYields(100, [
        { defects: 5, rework: 5 },
        { defects: 0, rework: 10 },
      ]),
    ).toEqual({
      yield: 0.95,
      firstTimeYield: 0.8,
      rolledThroughput: 0.9 * 0.9,
      defects: 5,
      defectsPerMillion: 50_000,
    });
  });

  it('refuses more losses than units, and no units', () => {
    expect(() => processYields(10, [{ defects: 6, rework: 6 }])).toThrow(RangeError);
    expect(() => processYields(0, [])).toThrow(RangeError);
  });
});
