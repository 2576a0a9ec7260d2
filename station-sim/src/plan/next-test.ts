import { productByPartNumber } from '../circuit/products.js';
import { stations } from '../circuit/stations.js';
import type { ResultPost } from '../types/result-post.js';
import type { ResultAnswer } from '../types/result-answer.js';
import type { PlannedTest } from './build-plan.js';

/**
 * Where a unit goes after a result: as the answer's disposition says, or, when no answer came in time, as
 * the station's own verdict says (pass: next stage; fail: set aside). Null: the unit leaves the line.
 *
 * @param stationCount how many stations of the line take part
 */
export function nextTest(
  test: PlannedTest,
  post: ResultPost,
  answer: ResultAnswer | null,
  stationCount: number,
): PlannedTest | null {
  if (!test.followed) return null;
  if (!answer) return post.stationVerdict === 'pass' ? onNextStage(test) : null;
  switch (answer.disposition) {
    case 'next':
      return onNextStage(test);
    case 'retest':
      return test;
    case 'retestElsewhere':
      return { ...test, station: stationAfter(test.station, stationCount) };
    case 'repair':
    case 'hold':
    case 'stop':
      return null;
  }
}

function onNextStage(test: PlannedTest): PlannedTest | null {
  const stages = productByPartNumber(test.unit.partNumber).stages.map((facts) => facts.stage);
  const stage = stages[stages.indexOf(test.stage) + 1];
  return stage ? { ...test, stage } : null;
}

function stationAfter(station: string, stationCount: number): string {
  const taking = stations.slice(0, stationCount).map((facts) => facts.station);
  return taking[(taking.indexOf(station) + 1) % taking.length] ?? station;
}
