import type { ProductFacts } from '@ampkeep/station-sim/dist/circuit/product-facts.js';
import { productByPartNumber } from '@ampkeep/station-sim/dist/circuit/products.js';
import type { RandomSource } from '@ampkeep/station-sim/dist/circuit/random.js';
import { drawUnit, type Unit } from '@ampkeep/station-sim/dist/circuit/unit.js';
import { lotName, serialNumber } from '@ampkeep/station-sim/dist/plan/serial-numbers.js';
import { LOT_SIZE, productMix, type LineName } from '../scenario/line.js';
import { stories } from '../scenario/stories.js';
import { hoursBefore } from './bench-at.js';
import type { ShiftCalendar } from './shift-calendar.js';

/** A unit and when it first comes to the line. */
export interface PlannedUnit {
  product: ProductFacts;
  line: LineName;
  unit: Unit;
  startAt: Date;
}

export interface PlanUnitsOptions {
  now: Date;
  days: number;
  /** How many come to the line in an hour at full speed. */
  unitsPerHour: number;
}

const HOUR_MS = 3_600_000;
const DAY_MS = 24 * HOUR_MS;

/** Units were made some days before they come to the line. */
const MADE_DAYS_BEFORE = 4;

/** Every unit of the period, in order of arrival, with its lot and what it really is. */
export function* planUnits(
  options: PlanUnitsOptions,
  calendar: ShiftCalendar,
  random: RandomSource,
): Generator<PlannedUnit, void> {
  const draw = random.fork('units');
  const made = new Map<string, number>();
  const lots = createLots(options.now);
  for (const startAt of arrivals(options, calendar, draw)) {
    const { partNumber, line } = draw.pick(productMix);
    const product = productByPartNumber(partNumber);
    const madeAt = new Date(startAt.getTime() - MADE_DAYS_BEFORE * DAY_MS);
    const running = (made.get(partNumber) ?? 0) + 1;
    made.set(partNumber, running);
    const lot = lots.lotFor(partNumber, running, startAt, madeAt);
    const identity = { serialNumber: serialNumber(product, madeAt, running), lot: lot.name };
    const unitOptions = lot.lowEarly ? { earlyVolts: stories.lowEarlyLot.earlyVolts } : {};
    const unit = drawUnit(product, identity, random.fork(`unit ${partNumber} ${running}`), unitOptions);
    yield { product, line, unit, startAt };
  }
}

/** Units come as at full speed, and where the line runs slower, only that share of them. */
function* arrivals(
  { now, days, unitsPerHour }: PlanUnitsOptions,
  calendar: ShiftCalendar,
  draw: RandomSource,
): Generator<Date, void> {
  let at = now.getTime() - days * DAY_MS;
  while (at < now.getTime()) {
    const startAt = new Date(at);
    if (draw.chance(calendar.speedAt(startAt))) yield startAt;
    at += Math.round((HOUR_MS / unitsPerHour) * draw.between(0.3, 1.7));
  }
}

interface Lot {
  name: string;
  lowEarly: boolean;
}

/** Lots of one product each, numbered through the week they were made in. */
function createLots(now: Date) {
  const lotsInWeek = new Map<string, number>();
  const current = new Map<string, Lot>();
  let lowEarlyGiven = false;
  return {
    lotFor(partNumber: string, running: number, startAt: Date, madeAt: Date): Lot {
      const open = current.get(partNumber);
      if (open && (running - 1) % LOT_SIZE !== 0) return open;
      const week = lotName(madeAt, 0);
      const number = (lotsInWeek.get(week) ?? 0) + 1;
      lotsInWeek.set(week, number);
      const { lowEarlyLot } = stories;
      const lowEarly =
        !lowEarlyGiven &&
        partNumber === lowEarlyLot.partNumber &&
        hoursBefore(now, startAt) <= lowEarlyLot.hoursAgo;
      lowEarlyGiven ||= lowEarly;
      const lot = { name: lotName(madeAt, number), lowEarly };
      current.set(partNumber, lot);
      return lot;
    },
  };
}
