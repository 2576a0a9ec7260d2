/** A counted result of one unit at one stage, as far as its place among the attempts is concerned. */
export interface AttemptOrder {
  startedAt: number;
  finishedAt: number | null;
  resultUuid: string;
}

const beforeAnyFinish = Number.MIN_SAFE_INTEGER;

/**
 * Order of attempts: by start, then finish, then resultId, so that any order of arrival numbers them alike.
 * A result without finish stands before one that has it.
 */
export function byAttemptOrder(left: AttemptOrder, right: AttemptOrder): number {
  return (
    left.startedAt - right.startedAt ||
    (left.finishedAt ?? beforeAnyFinish) - (right.finishedAt ?? beforeAnyFinish) ||
    compareText(left.resultUuid, right.resultUuid)
  );
}

const compareText = (left: string, right: string): number => (left < right ? -1 : left > right ? 1 : 0);
