import fc from 'fast-check';
import type { PointDirection, SweepAnalysis, SweepInput, SweepPoint } from '../analysis.types.js';
import { analyseSweep } from './analyse-sweep.js';
import { aProduct, aSweep, measureOf, pointsOf, steps } from './sweep.builder.js';
import { sweepLine } from './sweep-line.js';

const reading = fc.oneof(
  fc.double({ min: -1, max: 20, noNaN: true }),
  fc.constantFrom(0, 500e-6, 501e-6, 1e-30, 9.9e37, -1e38),
  fc.double({ min: -1e38, max: 1e38, noNaN: true }),
);
const positive = fc.oneof(
  fc.double({ min: 1e-9, max: 1, noNaN: true }),
  fc.double({ min: 1e-30, max: 1e15, noNaN: true }),
);
const percent = fc.double({ min: 0, max: 100, noNaN: true });
const maybe = <T>(arbitrary: fc.Arbitrary<T>) => fc.option(arbitrary, { nil: undefined });

const anyPoint: fc.Arbitrary<SweepPoint> = fc.record({
  loadVolts: fc.oneof(fc.double({ min: 0, max: 8, noNaN: true }), fc.constantFrom(0, 2, 4, 8), reading),
  outputAmps: fc.oneof(fc.double({ min: 480e-6, max: 520e-6, noNaN: true }), reading),
  elapsedMs: maybe(fc.integer({ min: 0, max: 1_000_000_000 })),
  direction: maybe(fc.constantFrom<PointDirection>('up', 'down', 'repeat')),
  outputAmpsStdDev: maybe(positive),
  ammeterRangeAmps: maybe(fc.constantFrom(1e-3, 1e-2)),
  overload: maybe(fc.boolean()),
});

const anySweep: fc.Arbitrary<SweepInput> = fc.record({
  points: fc.array(anyPoint, { maxLength: 40 }),
  ammeter: fc.record({
    rangeAmps: maybe(positive),
    resolutionAmps: maybe(positive),
    readingAccuracyPercent: maybe(percent),
    rangeAccuracyPercent: maybe(percent),
    burdenOhms: maybe(fc.double({ min: 0, max: 1e12, noNaN: true })),
  }),
  voltmeter: fc.record({ inputOhms: maybe(positive), spansAmmeter: maybe(fc.boolean()) }),
  fixtureLeakageOhms: maybe(positive),
  product: fc.constantFrom(
    aProduct(),
    aProduct({ circuitKind: 'twoTransistorMirror', complianceTolerance: 0.2 }),
    aProduct({ nominalAmps: 15e-3, supplyVolts: 24, complianceLowVolts: 1, complianceHighVolts: 20 }),
  ),
  plan: fc.constantFrom({ referenceVolts: 4 }, { referenceVolts: 0 }, { referenceVolts: 100 }),
});

/** A sweep of a unit whose line, noise and steps are drawn; distinct times, so that the order of the post is free. */
const realSweep = fc
  .record({
    count: fc.integer({ min: 4, max: 30 }),
    slope: fc.double({ min: -2e-6, max: 2e-6, noNaN: true }),
    noise: fc.array(fc.double({ min: -1e-7, max: 1e-7, noNaN: true }), { minLength: 30, maxLength: 30 }),
  })
  .map(({ count, slope, noise }) =>
    steps(0, 8, count).map((loadVolts, i) => ({
      loadVolts,
      outputAmps: Math.round((500e-6 - slope * loadVolts + noise[i]!) * 1e9) / 1e9,
      elapsedMs: 1000 * i,
    })),
  );

const everyFigure = (value: unknown): number[] => {
  if (typeof value === 'number') return [value];
  return value !== null && typeof value === 'object' ? Object.values(value).flatMap(everyFigure) : [];
};

describe('any valid post', () => {
  it('is analysed without exception, NaN or infinity, with a reason wherever a value is missing', () => {
    fc.assert(
      fc.property(anySweep, (input) => {
        const analysis = analyseSweep(input);
        const figures = [...everyFigure(analysis), ...everyFigure(sweepLine(analysis))];
        expect(figures.filter((figure) => !Number.isFinite(figure))).toEqual([]);
        expect(
          analysis.measures.map((measure) => (measure.value === null) === (measure.reason !== null)),
        ).toEqual(Array(11).fill(true));
        expect(analysis.points).toHaveLength(input.points.length);
      }),
      { numRuns: 1000 },
    );
  });

  it('leaves the input as it was', () => {
    fc.assert(
      fc.property(anySweep, (input) => {
        const before = structuredClone(input);
        analyseSweep(input);
        expect(input).toEqual(before);
      }),
      { numRuns: 50 },
    );
  });

  it('may have 500 points', () => {
    const points = pointsOf(steps(0, 8, 500), (volts) => 500e-6 - 1e-7 * volts);
    expect(analyseSweep(aSweep({ points })).fit!.pointCount).toBe(500);
  });
});

describe('the order of the points', () => {
  it('changes nothing', () => {
    const shuffled = realSweep.chain((points) =>
      fc.tuple(fc.constant(points), fc.shuffledSubarray(points, { minLength: points.length })),
    );
    fc.assert(
      fc.property(shuffled, ([points, otherwise]) => {
        const { fit, impedance, compliance, measures, flags } = analyseSweep(aSweep({ points }));
        expect(analyseSweep(aSweep({ points: otherwise }))).toMatchObject({
          fit,
          impedance,
          compliance,
          measures,
          flags,
        });
      }),
    );
  });
});

describe('scaling laws', () => {
  const powerOfTwo = fc.integer({ min: -12, max: 12 }).map((exponent) => 2 ** exponent);
  const bench = { voltmeter: {}, ammeter: { resolutionAmps: 1e-8, readingAccuracyPercent: 0.02 } };

  it('currents k times as large have a conductance and an uncertainty k times as large', () => {
    fc.assert(
      fc.property(realSweep, powerOfTwo, (points, k) => {
        const plain = analyseSweep(aSweep({ points, ...bench }));
        const scaled = analyseSweep(
          aSweep({
            points: points.map((point) => ({ ...point, outputAmps: k * point.outputAmps })),
            voltmeter: {},
            ammeter: { ...bench.ammeter, resolutionAmps: k * 1e-8 },
            product: aProduct({ nominalAmps: k * 500e-6 }),
          }),
        );
        expectScaled(plain, scaled, k);
        expect(measureOf(scaled, 'relativeSlope').value).toBeCloseTo(
          measureOf(plain, 'relativeSlope').value!,
          9,
        );
        expect(scaled.flags).toEqual(plain.flags);
      }),
    );
  });

  it('voltages k times as large have a conductance and an uncertainty k times as small', () => {
    fc.assert(
      fc.property(realSweep, powerOfTwo, (points, k) => {
        const plain = analyseSweep(aSweep({ points, ...bench }));
        const scaled = analyseSweep(
          aSweep({
            points: points.map((point) => ({ ...point, loadVolts: k * point.loadVolts })),
            ...bench,
            product: aProduct({ complianceHighVolts: 8 * k, supplyVolts: 9 * k }),
            plan: { referenceVolts: 4 * k },
          }),
        );
        expectScaled(plain, scaled, 1 / k);
        expect(measureOf(scaled, 'loadRegulation').value).toBeCloseTo(
          measureOf(plain, 'loadRegulation').value!,
          9,
        );
        expect(scaled.flags).toEqual(plain.flags);
      }),
    );
  });

  function expectScaled(plain: SweepAnalysis, scaled: SweepAnalysis, k: number) {
    expect(scaled.fit === null).toBe(plain.fit === null);
    if (plain.impedance === null || scaled.impedance === null) return;
    const { conductanceSiemens, expandedUncertaintySiemens } = plain.impedance;
    expect(scaled.impedance.conductanceSiemens / k).toBeCloseTo(conductanceSiemens, 15);
    expect(scaled.impedance.expandedUncertaintySiemens / k / expandedUncertaintySiemens).toBeCloseTo(1, 9);
    expect(scaled.impedance.bound).toBe(plain.impedance.bound);
  }
});

describe('a noiseless line', () => {
  it('returns its slope to 12 digits', () => {
    const drop = fc.double({ min: 0.02, max: 0.6, noNaN: true });
    const amps = fc.double({ min: 1e-6, max: 1, noNaN: true });
    fc.assert(
      fc.property(drop, amps, fc.integer({ min: 3, max: 60 }), (share, nominalAmps, count) => {
        const slope = (-share * nominalAmps) / 8;
        const points = pointsOf(steps(0, 8, count), (volts) => nominalAmps + slope * volts);
        const { fit } = analyseSweep(
          aSweep({ points, ammeter: {}, voltmeter: {}, product: aProduct({ nominalAmps }) }),
        );
        expect(Math.abs(fit!.slopeSiemens / slope - 1)).toBeLessThan(1e-12);
      }),
    );
  });
});
