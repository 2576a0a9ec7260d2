import { afterEach, describe, expect, it } from 'vitest';
import { createRandom } from '../circuit/random.js';
import { anAnswer, aPost, withTemporaryFile } from '../testing/builders.js';
import { startLocalHub, type LocalHub } from '../testing/local-hub.js';
import { createVirtualClock } from '../testing/virtual-clock.js';
import { httpPoster } from './post-result.js';
import { openSpool, type Spool } from './spool.js';
import { createStationLane } from './station-lane.js';

let hub: LocalHub | undefined;

afterEach(() => hub?.close());

const laneTo = (url: string, spool: Spool, giveUp = new AbortController()) => {
  const clock = createVirtualClock();
  const lane = createStationLane({
    apiKey: 'amk_key',
    send: httpPoster(url, () => clock.now()),
    spool,
    clock,
    random: createRandom(1),
    giveUp: giveUp.signal,
  });
  return { lane, clock };
};

describe('the way of a station’s posts', () => {
  it('goes on through an outage and empties the spool', () =>
    withTemporaryFile('spool.ndjson', async (file) => {
      hub = await startLocalHub(
        { status: 503, headers: { 'retry-after': '5' } },
        { status: 429 },
        { status: 201, body: anAnswer() },
      );
      const spool = await openSpool(file);
      const { lane, clock } = laneTo(hub.url, spool);
      const troubles: string[] = [];
      const before = clock.now().getTime();
      await spool.add({ station: 'north-1', post: aPost() });
      const delivery = await lane.deliver(aPost(), (reason) => troubles.push(reason));
      await spool.close();

      expect(delivery).toEqual({ kind: 'accepted', answer: anAnswer() });
      expect(troubles).toEqual([expect.stringContaining('503'), expect.stringContaining('429')]);
      expect(clock.now().getTime() - before).toBeGreaterThanOrEqual(5000);
      expect((await openAndClose(file)).leftOver).toEqual([]);
    }));

  it('sends one after the other, each the very same at every try', () =>
    withTemporaryFile('spool.ndjson', async (file) => {
      hub = await startLocalHub({ status: 503 }, { status: 201, body: anAnswer() });
      const spool = await openSpool(file);
      const { lane } = laneTo(hub.url, spool);
      await Promise.all(
        ['a', 'b', 'c'].map((resultId) => lane.deliver(aPost({ resultId }), () => undefined)),
      );
      await spool.close();
      expect(hub.received.map((post) => post.body.resultId)).toEqual(['a', 'a', 'b', 'c']);
      expect(hub.received[0]?.body).toEqual(hub.received[1]?.body);
    }));

  it('lets a post go that is refused for good', () =>
    withTemporaryFile('spool.ndjson', async (file) => {
      hub = await startLocalHub({ status: 422, body: { detail: 'Unknown part number' } });
      const spool = await openSpool(file);
      await spool.add({ station: 'north-1', post: aPost() });
      const delivery = await laneTo(hub.url, spool).lane.deliver(aPost(), () => undefined);
      await spool.close();
      expect(delivery.kind).toBe('refused');
      expect((await openAndClose(file)).leftOver).toEqual([]);
    }));

  it('keeps a post when the run ends in an outage, and the next run sends it', () =>
    withTemporaryFile('spool.ndjson', async (file) => {
      hub = await startLocalHub({ status: 503 }, { status: 503 }, { status: 201, body: anAnswer() });
      const spool = await openSpool(file);
      const giveUp = new AbortController();
      let tries = 0;
      await spool.add({ station: 'north-1', post: aPost() });
      const kept = await laneTo(hub.url, spool, giveUp).lane.deliver(aPost(), () => {
        if (++tries === 2) giveUp.abort();
      });
      await spool.close();
      expect(kept.kind).toBe('kept');

      const again = await openSpool(file);
      expect(again.leftOver).toEqual([{ station: 'north-1', post: aPost() }]);
      const sent = await laneTo(hub.url, again).lane.deliver(aPost(), () => undefined);
      await again.close();
      expect(sent.kind).toBe('accepted');
      expect((await openAndClose(file)).leftOver).toEqual([]);
    }));

  it('keeps a post whose key is not let in', () =>
    withTemporaryFile('spool.ndjson', async (file) => {
      hub = await startLocalHub({ status: 401, body: { detail: 'Unknown API key' } });
      const spool = await openSpool(file);
      await spool.add({ station: 'north-1', post: aPost() });
      const delivery = await laneTo(hub.url, spool).lane.deliver(aPost(), () => undefined);
      await spool.close();
      expect(delivery).toMatchObject({ kind: 'blocked', status: 401 });
      expect((await openAndClose(file)).leftOver).toHaveLength(1);
    }));
});

async function openAndClose(file: string): Promise<Spool> {
  const spool = await openSpool(file);
  await spool.close();
  return spool;
}
