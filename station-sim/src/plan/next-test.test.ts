import { describe, expect, it } from 'vitest';
import { createRandom } from '../circuit/random.js';
import { anAnswer, aPost } from '../testing/builders.js';
import { buildPlan, type PlannedTest } from './build-plan.js';
import { nextTest } from './next-test.js';

const aTest = (overrides: Partial<PlannedTest> = {}): PlannedTest => {
  const options = { scenario: 'steady', stations: 3, madeAt: new Date('2026-11-26') } as const;
  const [first] = buildPlan(options, createRandom(1));
  if (!first) throw new Error('An endless plan has a first test');
  return { ...first, runKind: 'production', followed: true, station: 'north-3', ...overrides };
};

describe('where a unit goes after a result', () => {
  it('goes on to the next stage, and leaves after the last', () => {
    const answer = anAnswer({ disposition: 'next' });
    expect(nextTest(aTest({ stage: 'board' }), aPost(), answer, 3)?.stage).toBe('final');
    expect(nextTest(aTest({ stage: 'final' }), aPost(), answer, 3)).toBeNull();
  });

  it('is tested again where it is, or on the next station', () => {
    expect(nextTest(aTest(), aPost(), anAnswer({ disposition: 'retest' }), 3)).toEqual(aTest());
    const elsewhere = nextTest(aTest(), aPost(), anAnswer({ disposition: 'retestElsewhere' }), 3);
    expect(elsewhere).toEqual(aTest({ station: 'north-1' }));
  });

  it.each(['repair', 'hold', 'stop'] as const)('leaves the line on %s', (disposition) => {
    expect(nextTest(aTest(), aPost(), anAnswer({ disposition }), 3)).toBeNull();
  });

  it('goes by the station’s own verdict when no answer comes', () => {
    expect(nextTest(aTest({ stage: 'board' }), aPost({ stationVerdict: 'pass' }), null, 3)?.stage).toBe(
      'final',
    );
    expect(nextTest(aTest({ stage: 'board' }), aPost({ stationVerdict: 'fail' }), null, 3)).toBeNull();
  });

  it('leaves a unit that is not followed alone', () => {
    expect(nextTest(aTest({ followed: false }), aPost(), anAnswer(), 3)).toBeNull();
  });
});
