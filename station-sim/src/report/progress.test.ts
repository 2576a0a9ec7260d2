import { describe, expect, it } from 'vitest';
import { progressLine, summaryLines } from './progress.js';
import { countDelivery, emptyTally } from './tally.js';
import { anAnswer } from '../testing/builders.js';

describe('what the simulator tells', () => {
  it('counts verdicts, refusals and what waits', () => {
    const tally = { ...emptyTally(), tested: 4, waiting: 4 };
    countDelivery(tally, { kind: 'accepted', answer: anAnswer({ verdict: 'pass' }) });
    countDelivery(tally, { kind: 'accepted', answer: anAnswer({ verdict: 'notProven' }) });
    countDelivery(tally, { kind: 'refused', status: 422, reason: '422 Unknown stage' });
    expect(progressLine(tally, 10)).toBe(
      'tested 4/10 · pass 1 · fail 0 · not proven 1 · refused 1 · waiting 1',
    );
  });

  it('says at the end what is left and where', () => {
    const tally = { ...emptyTally(), tested: 2, waiting: 2, retries: 5, lastTrouble: 'connect refused' };
    expect(summaryLines(tally, 1.25, 'spool.ndjson')).toEqual([
      '2 tests in 1.3 s; 0 results taken by the hub: pass 0, fail 0, not proven 0, waiting 2',
      '5 tries were repeated; the last trouble: connect refused',
      '2 results wait in spool.ndjson and go out with the next run',
    ]);
  });
});
