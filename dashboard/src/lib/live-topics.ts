import type { Query } from '@tanstack/react-query';

export type LiveTopic = 'results' | 'breaches' | 'stations' | 'intake' | 'mailbox';

/** First path segments (behind /api/v1/) that show something of a topic. */
const shownIn: Record<LiveTopic, string[]> = {
  results: ['today', 'units', 'results', 'stations', 'intake', 'breaches'],
  breaches: ['today', 'breaches'],
  stations: ['today', 'stations'],
  intake: ['intake', 'stations'],
  mailbox: ['mailbox', 'breaches'],
};

export function isLiveTopic(value: unknown): value is LiveTopic {
  return typeof value === 'string' && value in shownIn;
}

/** Tells whether a cached answer may have changed by events of these topics. */
export function touchesTopics(topics: ReadonlySet<LiveTopic>): (query: Query) => boolean {
  const segments = new Set([...topics].flatMap((topic) => shownIn[topic]));
  return (query) => {
    const path: unknown = query.queryKey[1];
    if (typeof path !== 'string') return false;
    // What was posted and how it was judged at the time never changes.
    if (path === '/api/v1/results/{resultId}/post') return false;
    return segments.has(path.replace('/api/v1/', '').split('/')[0] ?? '');
  };
}
