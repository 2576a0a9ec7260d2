import type { Problem, ProblemError } from '@/types/api';

/** The one error the API client throws. `code` is the problem document's stable code; `unreachable` when no answer came. */
export class ApiError extends Error {
  override readonly name = 'ApiError';
  readonly code: string;
  readonly status: number;
  readonly errors: ProblemError[];

  constructor(
    problem: Pick<Problem, 'code' | 'status' | 'detail'> & { errors?: ProblemError[] | undefined },
  ) {
    super(problem.detail);
    this.code = problem.code;
    this.status = problem.status;
    this.errors = problem.errors ?? [];
  }
}

export function isApiError(error: unknown, code?: string): error is ApiError {
  return error instanceof ApiError && (code === undefined || error.code === code);
}

/** What to tell a person about any thrown value. */
export function errorText(error: unknown): string {
  if (error instanceof ApiError) return error.message;
  return 'Something in this page went wrong. Reload it; if that does not help, tell the administrator.';
}
