import type { StageName } from '@ampkeep/station-sim/dist/circuit/product-facts.js';
import type { RandomSource } from '@ampkeep/station-sim/dist/circuit/random.js';
import type { TestRun } from '@ampkeep/station-sim/dist/circuit/simulate-sweep.js';
import type { ResultPost } from '@ampkeep/station-sim/dist/types/result-post.js';
import { operators } from '../scenario/line.js';
import { programVersionAt } from '../scenario/program-versions.js';
import { ambientCelsius } from './ambient.js';
import { hoursBefore } from './bench-at.js';
import type { ShiftCalendar } from './shift-calendar.js';

/** A post as it left its station. */
export interface SentPost {
  station: string;
  sentAt: Date;
  post: ResultPost;
}

/** Who and what runs a test at a time of the history. */
export function runConditions(
  stage: StageName,
  startedAt: Date,
  now: Date,
  calendar: ShiftCalendar,
  random: RandomSource,
): Pick<TestRun, 'startedAt' | 'operator' | 'programVersion' | 'ambientCelsius'> {
  return {
    startedAt,
    operator: random.pick(operators[calendar.shiftAt(startedAt)]),
    programVersion: programVersionAt(stage, hoursBefore(now, startedAt)),
    ambientCelsius: ambientCelsius(startedAt, random),
  };
}
