import createClient from 'openapi-fetch';
import type { paths } from '../types/api.generated.js';
import type { ResultAnswer } from '../types/result-answer.js';
import type { ResultPost } from '../types/result-post.js';
import { readRetryAfterMs } from './retry-delay.js';

/** How one try ended. */
export type Attempt =
  | { kind: 'accepted'; answer: ResultAnswer }
  /** The hub will never take this post; it keeps the post with its reasons. */
  | { kind: 'refused'; status: number; reason: string }
  /** Nothing is wrong with the post, but this key or address can't deliver it. */
  | { kind: 'blocked'; status: number; reason: string }
  | { kind: 'tryAgain'; reason: string; retryAfterMs: number | null };

/** Posts a result once. Never rejects for what network or hub do; that is in the answer. */
export type PostResult = (apiKey: string, post: ResultPost, signal: AbortSignal) => Promise<Attempt>;

const TIMEOUT_MS = 10_000;

/** Statuses that speak about the post itself, not about the key, the address or the moment. */
const finalStatuses = new Set([400, 409, 413, 415, 422]);

/** Statuses that speak about the key or the address. */
const blockingStatuses = new Set([401, 403, 404, 405]);

export function httpPoster(url: string, now: () => Date): PostResult {
  const client = createClient<paths>({ baseUrl: url });
  return async (apiKey, post, signal) => {
    // AbortSignal.any would hold on to every post for as long as the run's own signal lives.
    const abort = new AbortController();
    const cancel = () => abort.abort();
    const timer = setTimeout(cancel, TIMEOUT_MS);
    signal.addEventListener('abort', cancel, { once: true });
    try {
      const { data, error, response } = await client.POST('/api/v1/results', {
        body: post,
        headers: { 'x-api-key': apiKey },
        signal: abort.signal,
      });
      if (data) return { kind: 'accepted', answer: data };
      return classify(response, error, now());
    } catch (error) {
      return { kind: 'tryAgain', reason: networkReason(error), retryAfterMs: null };
    } finally {
      clearTimeout(timer);
      signal.removeEventListener('abort', cancel);
    }
  };
}

function classify(response: Response, problem: unknown, now: Date): Attempt {
  const { status } = response;
  const reason = `${status} ${detailOf(problem) ?? response.statusText}`;
  if (finalStatuses.has(status)) return { kind: 'refused', status, reason };
  if (blockingStatuses.has(status)) return { kind: 'blocked', status, reason };
  return {
    kind: 'tryAgain',
    reason,
    retryAfterMs: readRetryAfterMs(response.headers.get('retry-after'), now),
  };
}

/** What another server than the hub answers is no problem document. */
function detailOf(problem: unknown): string | null {
  const hasDetail = typeof problem === 'object' && problem !== null && 'detail' in problem;
  return hasDetail && typeof problem.detail === 'string' ? problem.detail : null;
}

function networkReason(error: unknown): string {
  if (!(error instanceof Error)) return String(error);
  const cause = error.cause instanceof Error ? error.cause.message : '';
  return cause || error.message;
}
