import { chooseDisposition } from './disposition.js';
import type { PreparedResult } from './prepared-result.js';
import type { ResultAnswer } from './result.types.js';

/** What only the database knows about a new result. */
export interface StoredFacts {
  attempt: number | null;
  /** Counted results of this unit at this stage, this one included. */
  attempts: number;
  priorStagePassed: boolean | null;
  lotHeld: boolean;
}

/** Builds the answer of `201`; a retry gets the very same. */
export function buildAnswer(result: PreparedResult, facts: StoredFacts): ResultAnswer {
  const { attempt, attempts, priorStagePassed, lotHeld } = facts;
  const attemptsLeft = result.runKind === 'production' ? Math.max(0, result.maxAttempts - attempts) : null;
  const disposition = chooseDisposition({
    verdict: result.verdict,
    runKind: result.runKind,
    attemptsLeft,
    priorStagePassed,
    lotHeld,
  });
  return {
    resultId: result.resultUuid,
    receivedAt: new Date(result.receivedAt).toISOString(),
    verdict: result.verdict,
    attempt,
    disposition,
    nextStage: disposition === 'next' ? result.nextStage : null,
    attemptsLeft,
    priorStagePassed,
    lotHeld,
    testPlanVersion: result.testPlanVersion,
    limitSetVersion: result.limitSetVersion,
    measures: result.measures,
    failedMeasures: result.failedMeasures,
    warnings: result.warnings,
    flags: result.flags,
    links: {
      self: `/api/v1/results/${result.resultUuid}`,
      unit: `/units/${encodeURIComponent(result.partNumber)}/${encodeURIComponent(result.serialNumber)}`,
    },
  };
}
