import type { SweepPoint } from '../analysis.types.js';
import { analyseSweep } from './analyse-sweep.js';
import { sweepLine } from './sweep-line.js';
import { aProduct, aSweep, hasFlag, measureOf, pointsOf, steps } from './sweep.builder.js';

const bench = { ammeter: { resolutionAmps: 1e-9 }, voltmeter: {} };
const line = (volts: number) => 500e-6 - 5e-8 * volts;
const straight = pointsOf(steps(0, 8, 9), line);
const analysisOf = (points: SweepPoint[], overrides: Parameters<typeof aSweep>[0] = {}) =>
  analyseSweep(aSweep({ points, ...bench, ...overrides }));

describe('ranges, weights and coverage', () => {
  const changingAfter = (last: number) =>
    straight.map((point, i) => ({
      ...point,
      outputAmps: point.outputAmps + (i > last ? 1e-6 : 0),
      ammeterRangeAmps: i > last ? 1e-2 : 1e-3,
    }));

  it('another ammeter range has its own intercept and changes neither slope nor load regulation', () => {
    const analysis = analysisOf(changingAfter(5));
    expect(analysis.points.every((point) => point.inFit)).toBe(true);
    expect(analysis.fit).toMatchObject({ degreesOfFreedom: 6, pointCount: 6 });
    expect(analysis.fit!.slopeSiemens).toBeCloseTo(-5e-8, 14);
    expect(measureOf(analysis, 'referenceCurrent').value).toBeCloseTo(line(4), 12);
    expect(measureOf(analysis, 'loadRegulation').value).toBeCloseTo(0.08, 2);
    expect(analysis.flags).toEqual(['driftUnknown']);
  });

  it('another ammeter range at one step only stays out of everything and is flagged', () => {
    const analysis = analysisOf(changingAfter(7));
    expect(analysis.fit!.pointCount).toBe(8);
    expect(analysis.fit!.slopeSiemens).toBeCloseTo(-5e-8, 14);
    expect(measureOf(analysis, 'loadRegulation').reason).toBe('notMeasured');
    expect(analysis.flags).toEqual(expect.arrayContaining(['rangeChanged', 'rangeNotCovered']));
  });

  it('pairs across ranges bound no slope: identical readings prove 1.2·δ over the span of one range', () => {
    const level = changingAfter(4).map((point) => ({ ...point, outputAmps: 500e-6 }));
    const { slopeUncertainty, impedance } = analysisOf(level);
    expect(slopeUncertainty!.fromResolution / (1.2e-9 / 4)).toBeCloseTo(1, 9);
    expect(impedance!.bound).toBe('atLeast');
  });

  it('load regulation across ranges knows the level of one to the other no better than the slope', () => {
    const uncertaintyOf = (points: SweepPoint[]) =>
      measureOf(analysisOf(points), 'loadRegulation').expandedUncertainty!;
    expect(uncertaintyOf(changingAfter(4))).toBeGreaterThan(1.5 * uncertaintyOf(straight));
  });

  it('weights the fit only when every point carries a standard deviation', () => {
    const noisy = straight.map((point, i) => ({ ...point, outputAmpsStdDev: i === 0 ? 1e-7 : 1e-9 }));
    noisy[0]!.outputAmps += 1e-7;
    const weighted = analysisOf(noisy);
    expect(weighted.fit!.weighted).toBe(true);
    expect(weighted.fit!.slopeSiemens).toBeCloseTo(-5e-8, 11);
    const someOnly = analysisOf(
      noisy.map((point, i) => (i === 3 ? { ...point, outputAmpsStdDev: undefined } : point)),
    );
    expect(someOnly.fit!.weighted).toBe(false);
    expect(hasFlag(someOnly, 'weightsUnused')).toBe(true);
    expect(hasFlag(weighted, 'weightsUnused')).toBe(false);
  });

  it.each([
    [7.7, false],
    [7.5, true],
  ])('points up to %d V of 8: range not covered %s', (highest, flagged) => {
    expect(hasFlag(analysisOf(pointsOf(steps(0, highest, 9), line)), 'rangeNotCovered')).toBe(flagged);
  });
});

describe('repeated and returning points', () => {
  const repeatOf = (change: number): SweepPoint => ({ loadVolts: 0.005, outputAmps: line(0.005) + change });

  it('a repeated first point shows the drift, corrected for the slope', () => {
    const analysis = analysisOf([...straight, repeatOf(1e-8)]);
    expect(measureOf(analysis, 'settlingDrift').value).toBeCloseTo(20, 1);
    expect(hasFlag(analysis, 'driftUnknown')).toBe(false);
    expect(analysis.slopeUncertainty!.fromDrift).toBeCloseTo((2 * 1e-8) / (8 * Math.sqrt(3)), 10);
  });

  it('marked as repeat it may stand anywhere in the post', () => {
    const repeat = { ...repeatOf(-1e-8), direction: 'repeat' as const };
    expect(measureOf(analysisOf([repeat, ...straight]), 'settlingDrift').value).toBeCloseTo(-20, 1);
  });

  it('a reading repeated at once shows no drift', () => {
    const analysis = analysisOf([repeatOf(0), ...straight]);
    expect(hasFlag(analysis, 'driftUnknown')).toBe(true);
    expect(measureOf(analysis, 'settlingDrift').reason).toBe('notMeasured');
  });

  it('up and down readings at common voltages show the hysteresis', () => {
    const up = straight.map((point) => ({ ...point, direction: 'up' as const }));
    const down = [6, 4, 2].map((volts) => ({
      loadVolts: volts,
      outputAmps: line(volts) - (volts === 4 ? 2e-8 : 1e-8),
      direction: 'down' as const,
    }));
    const hysteresis = measureOf(analysisOf([...up, ...down]), 'sweepHysteresis');
    expect(hysteresis.value).toBeCloseTo(40, 0);
    expect(measureOf(analysisOf(up), 'sweepHysteresis').reason).toBe('notMeasured');
  });
});

describe('load regulation', () => {
  it('is the difference of the ends over the reference current', () => {
    expect(measureOf(analysisOf(straight), 'loadRegulation').value).toBeCloseTo((100 * 4e-7) / 499.8e-6, 6);
  });

  it('interpolates an end between neighbours and takes a point within 2 % of the range', () => {
    const past = analysisOf(pointsOf([-0.5, 0.5, 1, 2, 3, 4, 5, 6, 7.9], line));
    expect(measureOf(past, 'loadRegulation').value).toBeCloseTo((100 * 3.95e-7) / 499.8e-6, 6);
  });

  it('is not measured when an end was not reached', () => {
    expect(measureOf(analysisOf(pointsOf(steps(0, 7.7, 9), line)), 'loadRegulation').reason).toBe(
      'notMeasured',
    );
  });

  it('is negative for a rising current and includes the loss beyond a knee', () => {
    expect(
      measureOf(analysisOf(pointsOf(steps(0, 8, 9), (v) => 500e-6 + 1e-8 * v)), 'loadRegulation').value,
    ).toBeLessThan(0);
    const collapsing = pointsOf(steps(0, 8, 9), (v) => (v > 7 ? 250e-6 : 500e-6));
    expect(measureOf(analysisOf(collapsing), 'loadRegulation').value).toBeCloseTo(50, 6);
  });
});

describe('reference current', () => {
  it('has the uncertainty of line, meter and resolution', () => {
    const ammeter = {
      resolutionAmps: 1e-9,
      rangeAmps: 1e-3,
      readingAccuracyPercent: 0.1,
      rangeAccuracyPercent: 0.05,
    };
    const reference = measureOf(analysisOf(straight, { ammeter }), 'referenceCurrent');
    expect(reference.value).toBeCloseTo(499.8e-6, 12);
    const expected = (2 / Math.sqrt(3)) * Math.hypot(0.001 * 499.8e-6, 0.0005 * 1e-3);
    expect(reference.expandedUncertainty! / expected).toBeCloseTo(1, 4);
  });

  it('must lie among the fitted points; the relative measures then lean on the line’s middle', () => {
    const analysis = analysisOf(straight, { plan: { referenceVolts: 8.5 } });
    expect(measureOf(analysis, 'referenceCurrent').reason).toMatch(/^notMeasured: reference voltage/);
    expect(measureOf(analysis, 'setpointError').value).toBeNull();
    expect(measureOf(analysis, 'relativeSlope').value).toBeCloseTo(100, 0);
  });
});

describe('linearity error', () => {
  it('is at most residual and uncertainty while rounding could explain it', () => {
    const linearity = measureOf(
      analysisOf(straight, { ammeter: { resolutionAmps: 1e-8 } }),
      'linearityError',
    );
    expect(linearity).toMatchObject({ bound: 'atMost', low: 0 });
    expect(linearity.value).toBeCloseTo(linearity.estimate! + linearity.expandedUncertainty!, 9);
  });

  it('is the largest residual of a curved characteristic, which is flagged', () => {
    const curved = analysisOf(pointsOf(steps(0, 8, 9), (v) => 500e-6 - 1e-7 * v + 1e-8 * v * v));
    expect(measureOf(curved, 'linearityError')).toMatchObject({ bound: 'exact' });
    expect(hasFlag(curved, 'curved')).toBe(true);
    expect(hasFlag(analysisOf(straight), 'curved')).toBe(false);
  });
});

describe('impedance in volts', () => {
  it('a plain two-transistor mirror has an effective Early voltage of a·r_out less the supply', () => {
    const earlyVolts = 80;
    const mirror = pointsOf(steps(0, 8, 9), (volts) => 450e-6 * (1 + (9 - volts) / earlyVolts));
    const product = aProduct({ circuitKind: 'twoTransistorMirror', complianceTolerance: 0.2 });
    expect(measureOf(analysisOf(mirror, { product }), 'effectiveEarlyVoltage').value).toBeCloseTo(
      earlyVolts,
      6,
    );
    expect(measureOf(analysisOf(mirror, { product }), 'impedanceCurrentProduct').value).toBeCloseTo(89, 6);
    const degenerated = { ...product, hasEmitterResistors: true };
    expect(measureOf(analysisOf(mirror, { product: degenerated }), 'effectiveEarlyVoltage').reason).toBe(
      'notApplicable',
    );
  });

  it('is a bound where the impedance is one', () => {
    const flat = analysisOf(pointsOf(steps(0, 8, 9), () => 500e-6));
    expect(measureOf(flat, 'impedanceCurrentProduct')).toMatchObject({ bound: 'atLeast', high: null });
  });
});

describe('sweepLine', () => {
  const analysis = analyseSweep(aSweep());
  const drawn = sweepLine(analysis);

  it('runs over the fit range through the reference point, with a band around it', () => {
    expect(drawn).toHaveLength(25);
    expect(drawn[0]!.loadVolts).toBeCloseTo(0.005, 3);
    expect(drawn.at(-1)!.loadVolts).toBeCloseTo(8.005, 3);
    const middle = sweepLine(analysis, 3)[1]!;
    // The burden moved the middle 5 mV above the reference voltage: 0.8 ppm at 164 ppm/V.
    expect(middle.deviationPpm).toBeCloseTo(-0.82, 1);
    for (const place of drawn) {
      expect(place.lowPpm).toBeLessThan(place.deviationPpm);
      expect(place.highPpm).toBeGreaterThan(place.deviationPpm);
    }
  });

  it('falls by the relative slope and is narrowest in the middle', () => {
    const fall = drawn[0]!.deviationPpm - drawn.at(-1)!.deviationPpm;
    expect(fall / 8).toBeCloseTo(measureOf(analysis, 'relativeSlope').value!, 0);
    const width = (i: number) => drawn[i]!.highPpm - drawn[i]!.lowPpm;
    expect(width(12)).toBeLessThan(width(0));
    expect(width(12)).toBeLessThan(width(24));
  });

  it('is empty without a fit', () => {
    expect(sweepLine(analyseSweep(aSweep({ points: [] })))).toEqual([]);
  });
});
