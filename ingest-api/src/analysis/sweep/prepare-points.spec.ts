import { preparePoints, usableByVoltage } from './prepare-points.js';
import { aSweep } from './sweep.builder.js';

const onePoint = { loadVolts: 5, outputAmps: 500e-6 };
const prepared = (overrides: Parameters<typeof aSweep>[0]) =>
  preparePoints(aSweep({ points: [onePoint], ...overrides }))[0]!;

describe('preparePoints', () => {
  it('adds the burden where the voltmeter does not span the ammeter', () => {
    const ammeter = { burdenOhms: 100 };
    expect(prepared({ ammeter, voltmeter: {} }).loadVolts).toBeCloseTo(5.05, 12);
    expect(prepared({ ammeter, voltmeter: { spansAmmeter: true } }).loadVolts).toBe(5);
  });

  it('adds back what the voltmeter drew past the ammeter, and only then', () => {
    const spanning = prepared({ ammeter: {}, voltmeter: { inputOhms: 10e6, spansAmmeter: true } });
    expect(spanning.outputAmps).toBeCloseTo(500e-6 + 0.5e-6, 15);
    const beside = prepared({ ammeter: {}, voltmeter: { inputOhms: 10e6, spansAmmeter: false } });
    expect(beside.outputAmps).toBe(500e-6);
  });

  it('adds back what leaked through the fixture', () => {
    const leaking = prepared({ ammeter: {}, voltmeter: {}, fixtureLeakageOhms: 1e9 });
    expect(leaking.outputAmps).toBeCloseTo(500e-6 + 5e-9, 15);
  });

  it('takes an implausibly large reading for an overload', () => {
    const over = prepared({ points: [{ loadVolts: 5, outputAmps: 9.9e37 }], voltmeter: {} });
    expect(over).toMatchObject({ overload: true, outputAmps: 0 });
  });

  it('counts points a little beyond the promised range as its ends', () => {
    const volts = [-0.2, -0.1, 0, 8, 8.15, 8.2];
    const points = preparePoints(
      aSweep({
        points: volts.map((loadVolts) => ({ loadVolts, outputAmps: 0 })),
        ammeter: {},
        voltmeter: {},
      }),
    );
    expect(points.map((point) => point.inRange)).toEqual([false, true, true, true, true, false]);
  });

  it('keeps repeats and the order of the post; usable points are sorted', () => {
    const points = [4, 0, 4].map((loadVolts, i) => ({ loadVolts, outputAmps: i * 1e-6, overload: i === 2 }));
    const all = preparePoints(aSweep({ points, ammeter: {}, voltmeter: {} }));
    expect(all.map((point) => point.loadVolts)).toEqual([4, 0, 4]);
    expect(usableByVoltage(all).map((point) => point.index)).toEqual([1, 0]);
  });
});
