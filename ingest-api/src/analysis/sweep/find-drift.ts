import type { PreparedPoint } from '../analysis.types.js';

/** Two readings at one load voltage, early and late in the sweep. */
export interface RepeatedPoint {
  first: PreparedPoint;
  repeated: PreparedPoint;
}

/**
 * Finds the first load step's repetition at the end of a sweep, which shows how much the unit drifted meanwhile.
 *
 * A point the station marked `repeat` is compared with the earliest unmarked point at its voltage; of several such
 * pairs the one with the largest difference counts. Without marks, the latest point at the first point's voltage
 * serves, if it lies in the second half of the sweep (a reading repeated at once shows no drift).
 * Time is `elapsedMs` when every point has it, else the order of the post.
 *
 * @param points - usable points, in any order
 * @param sameVolts - voltages within this tolerance are the same
 * @returns null when nothing was repeated: the drift is unknown
 */
export function findRepeatedPoint(points: readonly PreparedPoint[], sameVolts: number): RepeatedPoint | null {
  const inTime = byTime(points);
  const marked = inTime.filter((point) => point.direction === 'repeat');
  if (marked.length > 0) return widestMarkedPair(inTime, marked, sameVolts);
  const first = inTime[0];
  if (first === undefined) return null;
  for (let i = inTime.length - 1; i >= Math.max(1, Math.ceil(inTime.length / 2)); i--) {
    const repeated = inTime[i]!;
    if (Math.abs(repeated.loadVolts - first.loadVolts) <= sameVolts) return { first, repeated };
  }
  return null;
}

function byTime(points: readonly PreparedPoint[]): PreparedPoint[] {
  const timed = points.every((point) => point.elapsedMs !== null);
  return [...points].sort((a, b) => (timed ? a.elapsedMs! - b.elapsedMs! : 0) || a.index - b.index);
}

function widestMarkedPair(
  inTime: readonly PreparedPoint[],
  marked: readonly PreparedPoint[],
  sameVolts: number,
): RepeatedPoint | null {
  let widest: RepeatedPoint | null = null;
  for (const repeated of marked) {
    const first = inTime.find(
      (point) => point.direction !== 'repeat' && Math.abs(point.loadVolts - repeated.loadVolts) <= sameVolts,
    );
    if (first === undefined) continue;
    if (widest === null || difference({ first, repeated }) > difference(widest)) widest = { first, repeated };
  }
  return widest;
}

function difference({ first, repeated }: RepeatedPoint): number {
  return Math.abs(repeated.outputAmps - first.outputAmps);
}

/**
 * Change of the current (A, signed) from the first to the repeated reading, less what the line's slope explains of
 * the small difference in voltage.
 */
export function driftAmps({ first, repeated }: RepeatedPoint, slopeSiemens: number): number {
  return repeated.outputAmps - first.outputAmps - slopeSiemens * (repeated.loadVolts - first.loadVolts);
}
