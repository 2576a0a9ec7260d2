import { analyseSweep } from './analyse-sweep.js';
import { aProduct, aSweep, hasFlag, measureOf, pointsOf, steps } from './sweep.builder.js';

/** A unit that holds its current up to the knee and loses all of it within one volt. */
const kneeAt = (knee: number) => (volts: number) =>
  500e-6 * (1 - 1e-4 * volts) * Math.max(0, 1 - Math.max(0, volts - knee));
const bench = { ammeter: { resolutionAmps: 1e-8 }, voltmeter: {} };
const sweepOf = (knee: number, volts = steps(0, 10, 21)) =>
  aSweep({ points: pointsOf(volts, kneeAt(knee)), ...bench });

describe('compliance', () => {
  it('short of the promise: flagged, and the fit ends a step below the last inside point', () => {
    const analysis = analyseSweep(sweepOf(6.1));
    expect(hasFlag(analysis, 'complianceShort')).toBe(true);
    expect(analysis.compliance).toMatchObject({ kneeFound: true, bound: 'exact', fitHighVolts: 5.5 });
    expect(analysis.compliance.complianceVolts).toBeGreaterThan(6);
    expect(analysis.compliance.complianceVolts).toBeLessThan(6.5);
    expect(Math.max(...analysis.points.filter((point) => point.inFit).map((point) => point.loadVolts))).toBe(
      5.5,
    );
    expect(measureOf(analysis, 'complianceVoltage')).toMatchObject({ bound: 'exact', reason: null });
  });

  it('beyond the promise: not short, every point up to V_hi is fitted, the slope is untouched', () => {
    const analysis = analyseSweep(sweepOf(8.7));
    expect(hasFlag(analysis, 'complianceShort')).toBe(false);
    expect(analysis.compliance.complianceVolts).toBeCloseTo(8.7, 0);
    expect(analysis.fit!.pointCount).toBe(17);
    expect(measureOf(analysis, 'relativeSlope').value).toBeCloseTo(100, 0);
  });

  it('crosses τ by linear interpolation between the last inside and the first outside point', () => {
    const flat = (volts: number) => (volts <= 6 ? 1 : volts <= 7 ? 0.96 : 0.9) * 500e-6;
    const analysis = analyseSweep(aSweep({ points: pointsOf(steps(0, 8, 9), flat), ...bench }));
    expect(analysis.compliance.complianceVolts).toBeCloseTo(6.25, 9);
  });

  it('one low point alone is no knee, the last one alone is', () => {
    const dip = (at: number) => (volts: number) => (volts === at ? 0.9 : 1) * 500e-6;
    const inside = analyseSweep(aSweep({ points: pointsOf(steps(0, 8, 9), dip(5)), ...bench }));
    expect(inside.compliance).toMatchObject({ kneeFound: false, bound: 'atLeast', complianceVolts: 8 });
    const last = analyseSweep(aSweep({ points: pointsOf(steps(0, 8, 9), dip(8)), ...bench }));
    expect(last.compliance.kneeFound).toBe(true);
    expect(last.compliance.complianceVolts).toBeCloseTo(7.1, 9);
  });

  it('a gain of current is no knee', () => {
    const rising = (volts: number) => (volts > 6 ? 1.2 : 1) * 500e-6;
    expect(
      analyseSweep(aSweep({ points: pointsOf(steps(0, 8, 9), rising), ...bench })).compliance.kneeFound,
    ).toBe(false);
  });

  it('a steep straight unit has no knee, however much it loses', () => {
    const steep = (volts: number) => 500e-6 * (1 - 0.08 * volts);
    const analysis = analyseSweep(aSweep({ points: pointsOf(steps(0, 8, 17), steep), ...bench }));
    expect(analysis.compliance).toMatchObject({ kneeFound: false, bound: 'atLeast' });
  });

  it('a knee in the lower half bends its own seed line and is found all the same', () => {
    const analysis = analyseSweep(sweepOf(2.6));
    expect(analysis.compliance.complianceVolts).toBeGreaterThan(2.5);
    expect(analysis.compliance.complianceVolts).toBeLessThan(3.1);
  });

  it('a unit that collapses to nothing is short even where the seed line follows it down', () => {
    expect(hasFlag(analyseSweep(sweepOf(1.2, steps(0, 8, 9))), 'complianceShort')).toBe(true);
  });

  it('with fewer than 4 points in the lower half no knee is claimed', () => {
    const analysis = analyseSweep(sweepOf(6.1, [0, 2, 4, 6, 8]));
    expect(analysis.compliance).toMatchObject({
      kneeFound: false,
      complianceVolts: null,
      reason: 'fewPoints',
    });
    expect(measureOf(analysis, 'complianceVoltage').reason).toBe('notMeasured: fewPoints');
  });

  it('but its absence is proven when no current lies more than τ below the largest', () => {
    const analysis = analyseSweep(sweepOf(20, [0, 2, 4, 6, 8]));
    expect(analysis.compliance).toMatchObject({ bound: 'atLeast', complianceVolts: 8 });
  });

  it('is uncertain by the whole step where nothing can be interpolated', () => {
    const measure = measureOf(
      analyseSweep(
        aSweep({ points: pointsOf(steps(0, 8, 9), (volts) => (volts > 0 ? 0 : 500e-6)), ...bench }),
      ),
      'complianceVoltage',
    );
    expect(measure).toMatchObject({ value: 1, expandedUncertainty: 1 });
  });

  it('is uncertain by what the currents are, never by more than a step', () => {
    const fine = measureOf(analyseSweep(sweepOf(6.1)), 'complianceVoltage').expandedUncertainty!;
    expect(fine).toBeGreaterThan(0);
    expect(fine).toBeLessThan(0.01);
    const coarse = { ammeter: { resolutionAmps: 1e-4 }, voltmeter: {} };
    const analysis = analyseSweep({ ...sweepOf(6.1), ...coarse, product: aProduct() });
    expect(measureOf(analysis, 'complianceVoltage').expandedUncertainty).toBeLessThanOrEqual(0.5);
  });
});
