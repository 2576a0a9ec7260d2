import { afterEach, describe, expect, it } from 'vitest';
import { anAnswer, aPost } from '../testing/builders.js';
import { startLocalHub, type CannedAnswer, type LocalHub } from '../testing/local-hub.js';
import { httpPoster } from './post-result.js';

let hub: LocalHub | undefined;

afterEach(() => hub?.close());

const never = new AbortController().signal;
const now = () => new Date('2026-11-30T08:00:00Z');

async function postTo(answer: CannedAnswer) {
  hub = await startLocalHub(answer);
  return httpPoster(hub.url, now)('amk_key', aPost(), never);
}

describe('posting a result', () => {
  it('sends the post with its key and reads the answer', async () => {
    const attempt = await postTo({ status: 201, body: anAnswer({ disposition: 'retest' }) });
    expect(attempt).toEqual({ kind: 'accepted', answer: anAnswer({ disposition: 'retest' }) });
    expect(hub?.received[0]?.path).toBe('/api/v1/results');
    expect(hub?.received[0]?.headers['x-api-key']).toBe('amk_key');
    expect(hub?.received[0]?.body).toEqual(aPost());
  });

  it('takes 200 for a result the hub has already', async () => {
    expect(await postTo({ status: 200, body: anAnswer() })).toMatchObject({ kind: 'accepted' });
  });

  it.each([400, 409, 413, 415, 422])('is refused for good by %i, with the reason', async (status) => {
    expect(await postTo({ status, body: { detail: 'Unknown stage' } })).toEqual({
      kind: 'refused',
      status,
      reason: `${status} Unknown stage`,
    });
  });

  it.each([401, 403, 404])('is blocked by %i, which says nothing of the post', async (status) => {
    expect(await postTo({ status, body: 'no such page' })).toMatchObject({ kind: 'blocked', status });
  });

  it.each([429, 500, 502, 503])('is tried again after %i, not before the hub asks', async (status) => {
    const attempt = await postTo({ status, headers: { 'retry-after': '2' } });
    expect(attempt).toMatchObject({ kind: 'tryAgain', retryAfterMs: 2000 });
  });

  it('is tried again when something else answers in the place of the hub', async () => {
    expect(await postTo({ status: 200, body: '<html>Sign in to the guest network</html>' })).toMatchObject({
      kind: 'tryAgain',
    });
  });

  it('is tried again when nobody answers', async () => {
    hub = await startLocalHub({ status: 201 });
    const { url } = hub;
    await hub.close();
    expect(await httpPoster(url, now)('amk_key', aPost(), never)).toMatchObject({ kind: 'tryAgain' });
  });
});
