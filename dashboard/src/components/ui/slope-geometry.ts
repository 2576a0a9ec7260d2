import type { SlopeFigures } from '@/types/api';

/** Where the limit's slope is always drawn. */
export const LIMIT_DEGREES = 20;
const CLIP_DEGREES = 60;

export interface SlopeAngles {
  /** Degrees below the level line; negative where the current rises. */
  unitDegrees: number | null;
  /** The two edges of what a bound leaves open. */
  fanDegrees: [low: number, high: number] | null;
  limitDegrees: number | null;
  isClipped: boolean;
}

/** Angles of the slope mark: the limit's conductance at 20°, the unit's in proportion, clipped at 60°. */
export function slopeAngles(slope: SlopeFigures): SlopeAngles {
  const {
    conductanceSiemens: conductance,
    limitSiemens: limit,
    expandedUncertaintySiemens: uncertainty,
  } = slope;
  if (!limit || limit <= 0 || conductance === null) {
    return {
      unitDegrees: null,
      fanDegrees: null,
      limitDegrees: limit ? LIMIT_DEGREES : null,
      isClipped: false,
    };
  }
  const isBound = slope.impedanceBound !== 'exact' && uncertainty !== null;
  return {
    unitDegrees: toDegrees(conductance / limit),
    fanDegrees: isBound
      ? [toDegrees((conductance - uncertainty) / limit), toDegrees((conductance + uncertainty) / limit)]
      : null,
    limitDegrees: LIMIT_DEGREES,
    isClipped: Math.abs(rawDegrees(conductance / limit)) > CLIP_DEGREES,
  };
}

const limitTangent = Math.tan((LIMIT_DEGREES * Math.PI) / 180);
const rawDegrees = (share: number): number => (Math.atan(share * limitTangent) * 180) / Math.PI;
const toDegrees = (share: number): number =>
  Math.min(CLIP_DEGREES, Math.max(-CLIP_DEGREES, rawDegrees(share)));

export interface Point {
  x: number;
  y: number;
}

/** Where a line from `pivot` at an angle below the level leaves a box of this width and height. */
export function boxExit(pivot: Point, degrees: number, width: number, height: number): Point {
  const tangent = Math.tan((degrees * Math.PI) / 180);
  const run = width - pivot.x;
  const room = tangent >= 0 ? height - pivot.y : pivot.y;
  const reach = Math.abs(tangent) * run > room ? room / Math.abs(tangent) : run;
  return { x: pivot.x + reach, y: pivot.y + reach * tangent };
}
