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
  return async (apiKey, post, signal) => {
    // AbortSignal.any would hold on to every post for as long as the run's own signal lives.
    const abort = new AbortController();
    const cancel = () => abort.abort();
    const timer = setTimeout(cancel, TIMEOUT_MS);
    signal.addEventListener('abort', cancel, { once: true });
    try {
      const response = await fetch(`${url}/api/v1/results`, {
        method: 'POST',
        headers: { 'content-type': 'application/json', 'x-api-key': apiKey },
        body: JSON.stringify(post),
        signal: abort.signal,
      });
      return classify(response, await response.text(), now());
    } catch (error) {
      return { kind: 'tryAgain', reason: networkReason(error), retryAfterMs: null };
    } finally {
      clearTimeout(timer);
      signal.removeEventListener('abort', cancel);
    }
  };
}

function classify(response: Response, body: string, now: Date): Attempt {
  const { status } = response;
  if (response.ok) {
    const answer = parseObject(body);
    if (answer && 'disposition' in answer)
      return { kind: 'accepted', answer: answer as unknown as ResultAnswer };
    return { kind: 'tryAgain', reason: `${status}, but not in the words of the hub`, retryAfterMs: null };
  }
  const detail = parseObject(body)?.detail;
  const reason = `${status} ${typeof detail === 'string' ? detail : response.statusText}`;
  if (finalStatuses.has(status)) return { kind: 'refused', status, reason };
  if (blockingStatuses.has(status)) return { kind: 'blocked', status, reason };
  return {
    kind: 'tryAgain',
    reason,
    retryAfterMs: readRetryAfterMs(response.headers.get('retry-after'), now),
  };
}

function parseObject(body: string): Record<string, unknown> | null {
  try {
    const parsed: unknown = JSON.parse(body);
    return typeof parsed === 'object' && parsed !== null ? (parsed as Record<string, unknown>) : null;
  } catch {
    return null;
  }
}

function networkReason(error: unknown): string {
  if (!(error instanceof Error)) return String(error);
  const cause = error.cause instanceof Error ? error.cause.message : '';
  return cause || error.message;
}
