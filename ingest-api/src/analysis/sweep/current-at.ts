import type { PreparedPoint } from '../analysis.types.js';

/**
 * The current (A) at a load voltage as measured, without any fit: interpolated linearly between the neighbouring
 * load steps, or that of the nearest step when the voltage lies beyond them by no more than `endVolts`. Readings
 * of one step are averaged.
 *
 * @param points - usable points by ascending voltage
 * @param sameVolts - voltages within this tolerance are one step
 * @returns null when the voltage lies outside what was measured
 */
export function currentAt(
  points: readonly PreparedPoint[],
  volts: number,
  sameVolts: number,
  endVolts: number,
): number | null {
  const steps = averageSteps(points, sameVolts);
  const above = steps.findIndex((step) => step.loadVolts >= volts);
  const lower = steps[(above === -1 ? steps.length : above) - 1];
  const upper = above === -1 ? undefined : steps[above];
  if (lower !== undefined && upper !== undefined) {
    const share = (volts - lower.loadVolts) / (upper.loadVolts - lower.loadVolts);
    return lower.outputAmps + share * (upper.outputAmps - lower.outputAmps);
  }
  const nearest = lower ?? upper;
  if (nearest === undefined || Math.abs(nearest.loadVolts - volts) > endVolts) return null;
  return nearest.outputAmps;
}

interface Step {
  loadVolts: number;
  outputAmps: number;
}

function averageSteps(points: readonly PreparedPoint[], sameVolts: number): Step[] {
  const steps: Step[] = [];
  let start = 0;
  while (start < points.length) {
    let end = start + 1;
    while (end < points.length && points[end]!.loadVolts - points[start]!.loadVolts <= sameVolts) end++;
    steps.push(average(points.slice(start, end)));
    start = end;
  }
  return steps;
}

function average(points: readonly PreparedPoint[]): Step {
  let volts = 0;
  let amps = 0;
  for (const point of points) {
    volts += point.loadVolts;
    amps += point.outputAmps;
  }
  return { loadVolts: volts / points.length, outputAmps: amps / points.length };
}
