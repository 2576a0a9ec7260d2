import type { ProductFacts } from '@ampkeep/station-sim/dist/circuit/product-facts.js';
import { productByPartNumber } from '@ampkeep/station-sim/dist/circuit/products.js';
import type { RandomSource } from '@ampkeep/station-sim/dist/circuit/random.js';
import { drawUnit, type Unit } from '@ampkeep/station-sim/dist/circuit/unit.js';
import { lotName, serialNumber } from '@ampkeep/station-sim/dist/plan/serial-numbers.js';
import { LOT_SIZE, productMix, type LineName } from '../scenario/line.js';
import { stories } from '../scenario/stories.js';
import { hoursBefore } from './bench-at.js';

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
  unitsPerDay: number;
}

const DAY_MS = 86_400_000;

/** Units were made some days before they come to the line. */
const MADE_DAYS_BEFORE = 4;

/** By night (22 to 6 o'clock UTC) the line runs at this share of its speed. */
const NIGHT_SPEED = 0.4;

/** Every unit of the period, in order of arrival, with its lot and what it really is. */
export function planUnits(options: PlanUnitsOptions, random: RandomSource): PlannedUnit[] {
  const draw = random.fork('units');
  const made = new Map<string, number>();
  const lots = createLots(options.now);
  return arrivals(options, draw).map((startAt) => {
    const { partNumber, line } = draw.pick(productMix);
    const product = productByPartNumber(partNumber);
    const madeAt = new Date(startAt.getTime() - MADE_DAYS_BEFORE * DAY_MS);
    const running = (made.get(partNumber) ?? 0) + 1;
    made.set(partNumber, running);
    const lot = lots.lotFor(partNumber, running, startAt, madeAt);
    const identity = { serialNumber: serialNumber(product, madeAt, running), lot: lot.name };
    const unitOptions = lot.lowEarly ? { earlyVolts: stories.lowEarlyLot.earlyVolts } : {};
    const unit = drawUnit(product, identity, random.fork(`unit ${partNumber} ${running}`), unitOptions);
    return { product, line, unit, startAt };
  });
}

function arrivals({ now, days, unitsPerDay }: PlanUnitsOptions, draw: RandomSource): Date[] {
  const times: Date[] = [];
  const nightShare = 8 / 24;
  const dayGapMs = (DAY_MS / unitsPerDay) * (1 - nightShare + nightShare * NIGHT_SPEED);
  let at = now.getTime() - days * DAY_MS;
  while (at < now.getTime()) {
    times.push(new Date(at));
    const hour = new Date(at).getUTCHours();
    const speed = hour >= 22 || hour < 6 ? NIGHT_SPEED : 1;
    at += Math.round((dayGapMs / speed) * draw.between(0.3, 1.7));
  }
  return times;
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
