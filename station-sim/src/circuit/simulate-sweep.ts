import type { PostedPoint, ResultPost } from '../types/result-post.js';
import { readAmmeter, readVoltmeter } from './meter.js';
import { assembleSource, type CurrentSource } from './output-current.js';
import type { ProductFacts, StageFacts } from './product-facts.js';
import type { RandomSource } from './random.js';
import { seededUuid } from './seeded-uuid.js';
import { stationVerdict } from './station-verdict.js';
import type { Bench } from './stations.js';
import type { Unit } from './unit.js';

/** One test to be run: what, at which stage, when, and under which conditions. */
export interface TestRun {
  product: ProductFacts;
  stage: StageFacts;
  runKind: ResultPost['runKind'];
  startedAt: Date;
  operator: string;
  channel?: string;
  programVersion: string;
  ambientCelsius: number;
  /** Why the run was broken off; left out, it runs to its end. */
  abortReason?: string;
  routedOn?: ResultPost['routedOn'];
}

/** Milliseconds between the end of a dwell and the next step: range settling and two readings. */
const READING_MS = 100;

/** Seconds in which a module on its fixture comes close to its final temperature. */
const WARM_UP_SECONDS = 6;

/** Milliseconds from the first step to the end of the last dwell. */
export function sweepMs(stage: StageFacts): number {
  const { dwellMs } = stage.testPlan;
  return (plannedSteps(stage).length - 1) * (dwellMs + READING_MS) + dwellMs;
}

/**
 * Steps a load through the plan and writes the post a station would send. Give it a source of its own:
 * the same source and start give the same post, and another start changes nothing but times and id.
 */
export function simulateSweep(unit: Unit, bench: Bench, run: TestRun, random: RandomSource): ResultPost {
  const points = measurePoints(unit, bench, run, random);
  const outcome = run.abortReason ? 'aborted' : stopsEarly(points, run) ? 'stoppedOnFail' : 'completed';
  const lastMs = points.at(-1)?.elapsedMs ?? 0;
  const finishedAt = new Date(run.startedAt.getTime() + lastMs + run.stage.testPlan.dwellMs);
  return {
    resultId: seededUuid(run.startedAt, random),
    runKind: run.runKind,
    outcome,
    ...(run.abortReason ? { abortReason: run.abortReason } : {}),
    partNumber: unit.partNumber,
    serialNumber: unit.serialNumber,
    lot: unit.lot,
    stage: run.stage.stage,
    channel: run.channel ?? '1',
    startedAt: run.startedAt.toISOString(),
    finishedAt: finishedAt.toISOString(),
    sentAt: new Date(finishedAt.getTime() + random.integer(60, 240)).toISOString(),
    testPlanVersion: run.stage.testPlan.version,
    program: { name: `fh-${run.stage.stage}`, version: run.programVersion },
    operator: run.operator,
    fixture: bench.fixture,
    ambientCelsius: round(run.ambientCelsius, 1),
    supplyVolts: round(run.product.supplyVolts + random.normal(0, 0.002), 3),
    dwellMs: run.stage.testPlan.dwellMs,
    ...postedInstruments(bench),
    points,
    ...(outcome === 'aborted' ? {} : { stationVerdict: stationVerdict(points, outcome, run) }),
    routedOn: run.routedOn ?? 'hub',
  };
}

function measurePoints(unit: Unit, bench: Bench, run: TestRun, random: RandomSource): PostedPoint[] {
  const source = assembleSource(run.product, unit);
  const riseCelsius = Math.abs(random.normal(0, 0.02));
  const { dwellMs } = run.stage.testPlan;
  const steps = plannedSteps(run.stage);
  const lastStep = run.abortReason ? random.integer(1, steps.length - 2) : steps.length;
  const points: PostedPoint[] = [];
  for (const [index, step] of steps.slice(0, lastStep).entries()) {
    const elapsedMs = index * (dwellMs + READING_MS);
    const warmth = riseCelsius * (1 - Math.exp(-elapsedMs / 1000 / WARM_UP_SECONDS));
    const surroundings = {
      supplyVolts: run.product.supplyVolts,
      celsius: run.ambientCelsius + warmth,
    };
    points.push({
      ...measurePoint(source, step.loadVolts, bench, surroundings, random),
      elapsedMs,
      ...step.mark,
    });
    if (stopsEarly(points, run)) break;
  }
  return points;
}

interface PlannedStep {
  loadVolts: number;
  mark: Pick<PostedPoint, 'direction'>;
}

function plannedSteps(stage: StageFacts): PlannedStep[] {
  const { loadVolts, repeatFirst, upAndDown } = stage.testPlan;
  const up: PlannedStep[] = loadVolts.map((volts) => ({
    loadVolts: volts,
    mark: upAndDown ? { direction: 'up' } : {},
  }));
  const down: PlannedStep[] = upAndDown
    ? [...loadVolts].reverse().map((volts) => ({ loadVolts: volts, mark: { direction: 'down' } }))
    : [];
  const first = loadVolts[0];
  const repeat: PlannedStep[] =
    repeatFirst && first !== undefined ? [{ loadVolts: first, mark: { direction: 'repeat' } }] : [];
  return [...up, ...down, ...repeat];
}

function measurePoint(
  source: CurrentSource,
  loadVolts: number,
  bench: Bench,
  surroundings: { supplyVolts: number; celsius: number },
  random: RandomSource,
): Pick<PostedPoint, 'loadVolts' | 'outputAmps' | 'overload'> {
  const { ammeter, voltmeter, contactOhms } = bench;
  // An electronic load regulates to a millivolt or so above zero; at zero it is a short.
  const trueLoadVolts = loadVolts === 0 ? 0 : loadVolts + Math.abs(random.normal(0, 0.0005));
  const trueAmps = settledAmps(
    (amps) => trueLoadVolts + amps * (ammeter.burdenOhms + contactOhms),
    (volts) => source(volts, surroundings),
  );
  const burdenVolts = voltmeter.spansAmmeter ? trueAmps * ammeter.burdenOhms : 0;
  const bypassAmps = voltmeter.spansAmmeter ? trueLoadVolts / voltmeter.inputOhms : 0;
  const current = readAmmeter(trueAmps - bypassAmps, ammeter, random);
  return {
    loadVolts: readVoltmeter(trueLoadVolts + burdenVolts, voltmeter, random),
    outputAmps: current.value,
    ...(current.overload ? { overload: true } : {}),
  };
}

/** Steps of repeated substitution before it is given up, and the relative change that ends it. */
const SUBSTITUTIONS = 8;
const SETTLED = 1e-12;

/**
 * Where source and load agree. The slight slope of a current source lets repeated substitution settle in a few
 * steps; near saturation it doesn't, and bisection does: the source's current only falls as its terminal voltage
 * rises.
 */
function settledAmps(terminalVolts: (amps: number) => number, sourceAmps: (volts: number) => number): number {
  const highest = sourceAmps(terminalVolts(0));
  let amps = highest;
  for (let step = 0; step < SUBSTITUTIONS; step++) {
    const next = sourceAmps(terminalVolts(amps));
    if (Math.abs(next - amps) <= SETTLED * highest) return next;
    amps = next;
  }
  return bisect(terminalVolts, sourceAmps, highest);
}

function bisect(
  terminalVolts: (amps: number) => number,
  sourceAmps: (volts: number) => number,
  highest: number,
): number {
  let low = 0;
  let high = highest;
  for (let step = 0; step < 50; step++) {
    const middle = (low + high) / 2;
    if (sourceAmps(terminalVolts(middle)) > middle) low = middle;
    else high = middle;
  }
  return high;
}

/** The station's program gives up when the first two steps bring less than half the nominal current. */
function stopsEarly(points: readonly PostedPoint[], run: TestRun): boolean {
  return points.length === 2 && points.every((point) => point.outputAmps < run.product.nominalAmps / 2);
}

function postedInstruments(bench: Bench): Pick<ResultPost, 'ammeter' | 'voltmeter'> {
  const { ammeter, voltmeter } = bench;
  return {
    ammeter: {
      serialNumber: ammeter.serialNumber,
      rangeAmps: ammeter.rangeAmps,
      resolutionAmps: ammeter.resolutionAmps,
      readingAccuracyPercent: ammeter.readingAccuracyPercent,
      rangeAccuracyPercent: ammeter.rangeAccuracyPercent,
      burdenOhms: ammeter.burdenOhms,
    },
    voltmeter: {
      serialNumber: voltmeter.serialNumber,
      rangeVolts: voltmeter.rangeVolts,
      resolutionVolts: voltmeter.resolutionVolts,
      readingAccuracyPercent: voltmeter.readingAccuracyPercent,
      rangeAccuracyPercent: voltmeter.rangeAccuracyPercent,
      inputOhms: voltmeter.inputOhms,
      spansAmmeter: voltmeter.spansAmmeter,
    },
  };
}

function round(value: number, digits: number): number {
  return Number(value.toFixed(digits));
}
