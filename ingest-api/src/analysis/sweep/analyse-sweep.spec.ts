import { analyseSweep } from './analyse-sweep.js';
import { aProduct, aSweep, hasFlag, measureOf, pointsOf, steps } from './sweep.builder.js';

describe('the example of the station contract', () => {
  const analysis = analyseSweep(aSweep());

  it('has an output impedance of 12.14 MΩ, 11.85 to 12.44 MΩ', () => {
    const impedance = measureOf(analysis, 'outputImpedance');
    expect(impedance).toMatchObject({ unit: 'Ω', bound: 'exact', reason: null });
    expect(impedance.value! / 1e6).toBeCloseTo(12.14, 2);
    expect(impedance.low! / 1e6).toBeCloseTo(11.85, 2);
    expect(impedance.high! / 1e6).toBeCloseTo(12.44, 2);
  });

  it('has a relative slope of 164 ppm/V', () => {
    const slope = measureOf(analysis, 'relativeSlope');
    expect(slope.value).toBeCloseTo(164.3, 0);
    expect(slope.expandedUncertainty).toBeGreaterThan(3);
    expect(slope.expandedUncertainty).toBeLessThan(5);
  });

  it('states the current, its deviation and the compliance it proved', () => {
    expect(measureOf(analysis, 'referenceCurrent').value).toBeCloseTo(501.545e-6, 8);
    expect(measureOf(analysis, 'setpointError').value).toBeCloseTo(0.309, 2);
    expect(measureOf(analysis, 'loadRegulation').value).toBeCloseTo(0.1316, 3);
    expect(measureOf(analysis, 'complianceVoltage')).toMatchObject({ bound: 'atLeast' });
    expect(measureOf(analysis, 'complianceVoltage').value).toBeCloseTo(8.005, 3);
  });

  it('uses every point and knows no drift', () => {
    expect(analysis.points.every((point) => point.inFit && point.inRange)).toBe(true);
    expect(analysis.flags).toEqual(['driftUnknown']);
    expect(measureOf(analysis, 'settlingDrift')).toMatchObject({ value: null, reason: 'notMeasured' });
    expect(measureOf(analysis, 'effectiveEarlyVoltage').reason).toBe('notApplicable');
  });
});

describe('bench figures (common practice, no source)', () => {
  it('a two-transistor mirror of three curved points is near 27 kΩ but proves only at least about 9 kΩ', () => {
    const analysis = analyseSweep(
      aSweep({
        points: [
          { loadVolts: 0, outputAmps: 1.54e-3 },
          { loadVolts: 5, outputAmps: 1.3e-3 },
          { loadVolts: 11.3, outputAmps: 1.12e-3 },
        ],
        ammeter: {},
        voltmeter: {},
        product: aProduct({
          nominalAmps: 1.13e-3,
          supplyVolts: 12,
          complianceHighVolts: 11.3,
          circuitKind: 'twoTransistorMirror',
        }),
        plan: { referenceVolts: 5 },
      }),
    );
    expect(analysis.impedance!.estimateOhms! / 1e3).toBeCloseTo(27.2, 1);
    const impedance = measureOf(analysis, 'outputImpedance');
    expect(impedance.bound).toBe('atLeast');
    expect(impedance.value! / 1e3).toBeCloseTo(9.36, 1);
    expect(impedance).toMatchObject({ high: null, expandedUncertainty: null });
    expect(analysis.flags).toEqual(expect.arrayContaining(['curved', 'fewPoints', 'resolutionAssumed']));
  });

  it.each([{ resolutionAmps: 10e-6 }, {}])(
    'a Wilson mirror that reads 1.04 mA from 0 to 10.6 V proves at least about 0.9 MΩ and no more (%o)',
    (ammeter) => {
      const volts = steps(0, 10.6, 6);
      const analysis = analyseSweep(
        aSweep({
          points: pointsOf(volts, () => 1.04e-3),
          ammeter,
          voltmeter: {},
          product: aProduct({ nominalAmps: 1.04e-3, supplyVolts: 12, complianceHighVolts: 10.6 }),
          plan: { referenceVolts: 5 },
        }),
      );
      const impedance = measureOf(analysis, 'outputImpedance');
      expect(impedance).toMatchObject({ bound: 'atLeast', high: null, expandedUncertainty: null });
      expect(impedance.value! / 1e6).toBeCloseTo(0.883, 3);
      expect(analysis.impedance!.estimateOhms).toBeNull();
      expect(analysis.slopeUncertainty!.expanded).toBeCloseTo((1.2 * 10e-6) / 10.6, 12);
    },
  );

  it.each([
    [0.7, 1.13e-3],
    [1.4, 1.06e-3],
  ])('10 kΩ on 12 V less %d V sets about %d A, found as the reference current', (drop, amps) => {
    const set = (12 - drop) / 10e3;
    const sweep = aSweep({
      points: pointsOf(steps(0, 8, 9), () => set),
      voltmeter: {},
      ammeter: { resolutionAmps: 1e-6 },
      product: aProduct({ nominalAmps: set, supplyVolts: 12 }),
    });
    expect(measureOf(analyseSweep(sweep), 'referenceCurrent').value).toBeCloseTo(amps, 5);
  });
});

describe('sweeps of units and benches that are out of order', () => {
  const volts = steps(0, 8, 9);
  const everyFigure = (value: unknown): number[] =>
    typeof value === 'number'
      ? [value]
      : value !== null && typeof value === 'object'
        ? Object.values(value).flatMap(everyFigure)
        : [];

  it.each([
    ['empty', []],
    ['open', pointsOf(volts, () => 0)],
    ['dead', pointsOf(volts, () => 3e-9)],
    ['connected backwards', pointsOf(volts, () => -500e-6)],
    ['shorted, so that only one voltage was reached', pointsOf([0, 0, 0, 0], () => 500e-6)],
    ['overloaded throughout', pointsOf(volts, () => 9.9e37)],
    ['of two voltages', pointsOf([0, 8], () => 500e-6)],
    ['of one point', pointsOf([4], () => 500e-6)],
    ['absurdly large', pointsOf(volts, (v) => 1e300 * (1 + v))],
    ['absurdly small', pointsOf(volts, () => 5e-324)],
  ])('%s: gives findings without NaN or infinity', (_, points) => {
    const analysis = analyseSweep(aSweep({ points }));
    expect(everyFigure(analysis).filter((figure) => !Number.isFinite(figure))).toEqual([]);
    for (const measure of analysis.measures) {
      expect(measure.value === null).toBe(measure.reason !== null);
    }
  });

  it('a dead unit is short of compliance from the lowest voltage on and has no slope', () => {
    const analysis = analyseSweep(aSweep({ points: pointsOf(volts, () => 1e-9) }));
    expect(measureOf(analysis, 'complianceVoltage')).toMatchObject({ bound: 'atMost' });
    expect(measureOf(analysis, 'complianceVoltage').value).toBeLessThan(0.01);
    expect(measureOf(analysis, 'setpointError').value).toBeCloseTo(-100, 3);
    expect(measureOf(analysis, 'outputImpedance').reason).toBe('notComputed: no current');
    expect(hasFlag(analysis, 'complianceShort')).toBe(true);
  });

  it('fewer than three voltages leave the slope out and keep the rest', () => {
    const analysis = analyseSweep(aSweep({ points: pointsOf([0, 0, 8, 8], () => 500e-6) }));
    expect(analysis.fit).toBeNull();
    expect(measureOf(analysis, 'relativeSlope').reason).toBe('notComputed: fewer than 3 voltages');
    expect(measureOf(analysis, 'referenceCurrent').value).toBeCloseTo(500e-6, 12);
    expect(measureOf(analysis, 'loadRegulation').value).toBeCloseTo(0, 12);
    expect(measureOf(analysis, 'complianceVoltage').bound).toBe('atLeast');
  });

  it('overloaded points stay out of everything', () => {
    const points = pointsOf(volts, (v) => 500e-6 - 1e-7 * v).map((point, i) => ({
      ...point,
      overload: i === 8,
    }));
    const analysis = analyseSweep(aSweep({ points, ammeter: { resolutionAmps: 1e-9 }, voltmeter: {} }));
    expect(hasFlag(analysis, 'overload')).toBe(true);
    expect(hasFlag(analysis, 'rangeNotCovered')).toBe(true);
    expect(analysis.fit!.pointCount).toBe(8);
  });

  it('a current that rises significantly has no impedance but a slope', () => {
    const points = pointsOf(volts, (v) => 500e-6 + 1e-7 * v);
    const analysis = analyseSweep(aSweep({ points }));
    expect(hasFlag(analysis, 'risingCurrent')).toBe(true);
    expect(measureOf(analysis, 'outputImpedance')).toMatchObject({ value: null, reason: 'risingCurrent' });
    expect(measureOf(analysis, 'relativeSlope').value).toBeCloseTo(-200, -1);
    expect(analysis.impedance!.conductanceSiemens).toBeCloseTo(-1e-7, 10);
  });
});
