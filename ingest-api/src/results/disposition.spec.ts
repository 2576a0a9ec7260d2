import { chooseDisposition, type DispositionFacts } from './disposition.js';

const chosen = (facts: Partial<DispositionFacts>) =>
  chooseDisposition({
    verdict: 'pass',
    runKind: 'production',
    attemptsLeft: 2,
    priorStagePassed: true,
    lotHeld: false,
    ...facts,
  });

describe('where a unit goes', () => {
  it.each<[string, Partial<DispositionFacts>, string]>([
    ['a pass goes on', {}, 'next'],
    ['a pass at the first stage goes on', { priorStagePassed: null }, 'next'],
    ['a pass of a held lot is held', { lotHeld: true }, 'hold'],
    ['a pass with its last attempt goes on', { attemptsLeft: 0 }, 'next'],
    ['a fail is tried again', { verdict: 'fail' }, 'retest'],
    ['a fail without attempts is repaired', { verdict: 'fail', attemptsLeft: 0 }, 'repair'],
    ['a fail of a held lot is tried again', { verdict: 'fail', lotHeld: true }, 'retest'],
    ['what was not proven goes elsewhere', { verdict: 'notProven' }, 'retestElsewhere'],
    ['what can be proven nowhere is held', { verdict: 'notProven', attemptsLeft: 0 }, 'hold'],
    ['an abort is tried again', { verdict: 'aborted', attemptsLeft: 0 }, 'retest'],
    ['what nobody judges is held', { verdict: 'unjudged' }, 'hold'],
    ['a unit that skipped a stage stops', { priorStagePassed: false }, 'stop'],
    [
      'a practice unit may skip a stage',
      { priorStagePassed: false, runKind: 'practice', attemptsLeft: null },
      'next',
    ],
    ['a golden unit that passes lets the line go on', { runKind: 'golden', priorStagePassed: false }, 'next'],
    ['a golden unit that fails stops it', { runKind: 'golden', verdict: 'fail' }, 'stop'],
    ['a golden unit that proves nothing stops it', { runKind: 'golden', verdict: 'notProven' }, 'stop'],
    [
      'a study is tried as often as it takes',
      { runKind: 'study', verdict: 'fail', attemptsLeft: null },
      'retest',
    ],
  ])('%s', (_, facts, disposition) => {
    expect(chosen(facts)).toBe(disposition);
  });
});
