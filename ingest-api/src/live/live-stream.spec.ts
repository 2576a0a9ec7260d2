import type { MessageEvent } from '@nestjs/common';
import { Subject } from 'rxjs';
import { liveStream, PING_MS } from './live-stream.js';
import type { LiveEvent } from './live.service.js';

describe('liveStream', () => {
  beforeEach(() => jest.useFakeTimers());
  afterEach(() => jest.useRealTimers());

  function follow(isSessionAlive: () => Promise<boolean> = () => Promise.resolve(true)) {
    const source = new Subject<LiveEvent>();
    const received: MessageEvent[] = [];
    const state = { ended: false };
    const subscription = liveStream(source, isSessionAlive).subscribe({
      next: (event) => received.push(event),
      complete: () => (state.ended = true),
    });
    return { source, received, state, subscription };
  }

  const ping = { type: 'ping', data: '{}' };

  it('pings at once and every 15 s', async () => {
    const { received } = follow();
    await jest.advanceTimersByTimeAsync(0);
    expect(received).toEqual([ping]);
    await jest.advanceTimersByTimeAsync(2 * PING_MS);
    expect(received).toEqual([ping, ping, ping]);
  });

  it('passes events on between pings', async () => {
    const { source, received } = follow();
    await jest.advanceTimersByTimeAsync(0);
    source.next({ topic: 'breaches', id: '7' });
    expect(received).toEqual([ping, { data: { topic: 'breaches', id: '7' } }]);
  });

  it('ends with the session', async () => {
    let alive = true;
    const { source, received, state } = follow(() => Promise.resolve(alive));
    await jest.advanceTimersByTimeAsync(0);
    alive = false;
    await jest.advanceTimersByTimeAsync(PING_MS);
    source.next({ topic: 'results', id: null });
    expect(state.ended).toBe(true);
    expect(received).toEqual([ping]);
    expect(jest.getTimerCount()).toBe(0);
  });

  it('ends when the server stops', async () => {
    const { source, state } = follow();
    await jest.advanceTimersByTimeAsync(0);
    source.complete();
    expect(state.ended).toBe(true);
    expect(jest.getTimerCount()).toBe(0);
  });

  it('leaves nothing behind when the dashboard goes', async () => {
    const { source, subscription } = follow();
    await jest.advanceTimersByTimeAsync(0);
    subscription.unsubscribe();
    expect(source.observed).toBe(false);
    expect(jest.getTimerCount()).toBe(0);
  });
});
