import type { Verdict } from '../analysis/analysis.types.js';
import type { Disposition, RunKind } from './result.types.js';

/** What decides where the unit goes next. */
export interface DispositionFacts {
  verdict: Verdict;
  runKind: RunKind;
  /** Null where attempts aren't counted. */
  attemptsLeft: number | null;
  priorStagePassed: boolean | null;
  lotHeld: boolean;
}

/**
 * Where the station shall send the unit. A unit that skipped its prior stage stops; a held lot's good units
 * are held; a fail is tried again while attempts are left and then repaired; what the measurement could not
 * prove goes to another station, since the same meter would say the same again.
 */
export function chooseDisposition(facts: DispositionFacts): Disposition {
  const { verdict, runKind, attemptsLeft, priorStagePassed, lotHeld } = facts;
  if (runKind === 'golden') return verdict === 'pass' ? 'next' : 'stop';
  if (priorStagePassed === false && runKind === 'production') return 'stop';
  if (verdict === 'aborted') return 'retest';
  if (verdict === 'unjudged') return 'hold';
  const mayTryAgain = attemptsLeft === null || attemptsLeft > 0;
  if (verdict === 'fail') return mayTryAgain ? 'retest' : 'repair';
  if (verdict === 'notProven') return mayTryAgain ? 'retestElsewhere' : 'hold';
  return lotHeld ? 'hold' : 'next';
}
