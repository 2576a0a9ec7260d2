import fc from 'fast-check';
import { rolledThroughput } from './rolled-throughput.js';
import { wilsonInterval } from './wilson-interval.js';

const stage = fc
  .integer({ min: 1, max: 5000 })
  .chain((total) => fc.record({ passed: fc.integer({ min: 0, max: total }), total: fc.constant(total) }));

describe('rolled-throughput yield', () => {
  it('multiplies the first-pass yields of the stages', () => {
    const stages = [
      { passed: 95, total: 100 },
      { passed: 90, total: 95 },
    ];
    expect(rolledThroughput(stages)?.share).toBeCloseTo(0.9, 12);
  });

  it('has the Wilson interval of the only stage', () => {
    const rolled = rolledThroughput([{ passed: 81, total: 263 }])!;
    expect(rolled.low).toBeCloseTo(wilsonInterval(81, 263)!.low, 12);
    expect(rolled.high).toBeCloseTo(wilsonInterval(81, 263)!.high, 12);
  });

  it('adds the squared distances on the logarithmic scale', () => {
    const stages = [
      { passed: 180, total: 200 },
      { passed: 150, total: 180 },
    ];
    const intervals = stages.map(({ passed, total }) => wilsonInterval(passed, total)!);
    const distances = stages.map(
      ({ passed, total }, i) => Math.log(passed / total) - Math.log(intervals[i]!.low),
    );
    const expected = Math.exp(Math.log(0.75) - Math.sqrt(distances[0]! ** 2 + distances[1]! ** 2));
    expect(rolledThroughput(stages)!.low).toBeCloseTo(expected, 12);
  });

  it('stays an interval from 0 to 1 around the share, whatever the stages and their order', () => {
    fc.assert(
      fc.property(fc.array(stage, { minLength: 1, maxLength: 6 }), (stages) => {
        const { share, low, high } = rolledThroughput(stages)!;
        expect(low).toBeGreaterThanOrEqual(0);
        expect(low).toBeLessThanOrEqual(share + 1e-12);
        expect(high).toBeGreaterThanOrEqual(share - 1e-12);
        expect(high).toBeLessThanOrEqual(1);
        expect(rolledThroughput([...stages].reverse())!.low).toBeCloseTo(low, 12);
      }),
    );
  });

  it('reaches from 0 to the upper end of the stage that nobody passed', () => {
    const rolled = rolledThroughput([
      { passed: 0, total: 10 },
      { passed: 9, total: 10 },
    ]);
    expect(rolled).toEqual({ share: 0, low: 0, high: wilsonInterval(0, 10)!.high });
  });

  it('is unknown without stages or with a stage that has no unit yet', () => {
    expect(rolledThroughput([])).toBeNull();
    expect(
      rolledThroughput([
        { passed: 9, total: 10 },
        { passed: 0, total: 0 },
      ]),
    ).toBeNull();
  });
});
