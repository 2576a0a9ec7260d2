import type { QueryClient } from '@tanstack/react-query';
import { isLiveTopic, touchesTopics, type LiveTopic } from './live-topics';

const COLLECT_MS = 250;
/** The server pings every 15 s; two lost pings and some grace mean a dead line that the browser hasn't noticed. */
const SILENCE_MS = 40_000;
const REOPEN_MS = 3_000;

export type LiveState = 'connecting' | 'live' | 'lost';

/**
 * Follows the server's event stream: collects the topics of 250 ms into one invalidation, and after a break
 * invalidates everything, because events may have been missed.
 */
export function followLiveUpdates(
  client: QueryClient,
  onState: (state: LiveState, lastHeardAt: number) => void,
): () => void {
  const topics = new Set<LiveTopic>();
  let source: EventSource | undefined;
  let flushTimer: ReturnType<typeof setTimeout> | undefined;
  let silenceTimer: ReturnType<typeof setTimeout> | undefined;
  let reopenTimer: ReturnType<typeof setTimeout> | undefined;
  let missedEvents = false;
  let lastHeardAt = Date.now();

  const flush = () => {
    flushTimer = undefined;
    const predicate = touchesTopics(new Set(topics));
    topics.clear();
    void client.invalidateQueries({ predicate });
  };

  const heard = () => {
    lastHeardAt = Date.now();
    clearTimeout(silenceTimer);
    silenceTimer = setTimeout(lost, SILENCE_MS);
  };

  const lost = () => {
    missedEvents = true;
    onState('lost', lastHeardAt);
    clearTimeout(silenceTimer);
    source?.close();
    clearTimeout(reopenTimer);
    reopenTimer = setTimeout(open, REOPEN_MS);
  };

  const collect = (event: MessageEvent<string>) => {
    heard();
    const topic = readTopic(event.data);
    if (!topic) return;
    topics.add(topic);
    flushTimer ??= setTimeout(flush, COLLECT_MS);
  };

  function open() {
    source = new EventSource('/api/v1/live');
    source.onopen = () => {
      heard();
      onState('live', lastHeardAt);
      if (missedEvents) void client.invalidateQueries();
      missedEvents = false;
    };
    source.onmessage = collect;
    source.addEventListener('ping', heard);
    source.onerror = lost;
  }

  open();
  return () => {
    [flushTimer, silenceTimer, reopenTimer].forEach(clearTimeout);
    source?.close();
  };
}

function readTopic(data: string): LiveTopic | null {
  try {
    const { topic } = JSON.parse(data) as { topic?: unknown };
    return isLiveTopic(topic) ? topic : null;
  } catch {
    return null;
  }
}
