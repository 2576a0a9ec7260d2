import { QueryClient } from '@tanstack/react-query';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { FakeEventSource } from '@/testing/fake-event-source';
import { followLiveUpdates, type LiveState } from './live-updates';

const TODAY = ['get', '/api/v1/today'];
const PRODUCTS = ['get', '/api/v1/products', {}];

let client: QueryClient;
let states: LiveState[];
let lastHeardAt: number;
let stop: () => void;
const isStale = (queryKey: unknown[]) => client.getQueryState(queryKey)?.isInvalidated;

beforeEach(() => {
  vi.useFakeTimers();
  client = new QueryClient();
  client.setQueryData(TODAY, {});
  client.setQueryData(PRODUCTS, []);
  states = [];
  stop = followLiveUpdates(client, (state, heardAt) => {
    states.push(state);
    lastHeardAt = heardAt;
  });
});

afterEach(() => {
  stop();
  vi.useRealTimers();
});

describe('followLiveUpdates', () => {
  it('collects events and then refreshes only what they touch', () => {
    const invalidate = vi.spyOn(client, 'invalidateQueries');
    FakeEventSource.latest().open();
    FakeEventSource.latest().send({ topic: 'results', id: 'a' });
    FakeEventSource.latest().send({ topic: 'results', id: 'b' });
    expect(isStale(TODAY)).toBe(false);
    vi.advanceTimersByTime(250);
    expect(isStale(TODAY)).toBe(true);
    expect(isStale(PRODUCTS)).toBe(false);
    expect(invalidate).toHaveBeenCalledOnce();
  });

  it('passes over what it does not understand', () => {
    FakeEventSource.latest().send({ topic: 'weather', id: null });
    vi.advanceTimersByTime(250);
    expect(isStale(TODAY)).toBe(false);
  });

  it('says that the connection is lost, tries again and refreshes everything', () => {
    FakeEventSource.latest().open();
    FakeEventSource.latest().break();
    expect(states).toEqual(['live', 'lost']);
    vi.advanceTimersByTime(3_000);
    expect(FakeEventSource.opened).toHaveLength(2);
    FakeEventSource.latest().open();
    expect(states.at(-1)).toBe('live');
    expect(isStale(PRODUCTS)).toBe(true);
  });

  it('takes a silent line for a lost one, and knows when it was last heard', () => {
    FakeEventSource.latest().open();
    const openedAt = Date.now();
    vi.advanceTimersByTime(40_000);
    expect(states.at(-1)).toBe('lost');
    expect(lastHeardAt).toBe(openedAt);
  });

  it('closes the stream when nobody follows any more', () => {
    stop();
    expect(FakeEventSource.latest().isClosed).toBe(true);
  });
});
