import type { MessageEvent } from '@nestjs/common';
import {
  concatMap,
  endWith,
  ignoreElements,
  map,
  merge,
  type Observable,
  share,
  takeUntil,
  takeWhile,
  timer,
} from 'rxjs';
import type { LiveEvent } from './live.service.js';

export const PING_MS = 15_000;

/**
 * What one dashboard receives: the events, and a ping at once and then every 15 s by which it notices a
 * dead connection. Each ping asks whether the session still lives; when not, the stream ends.
 */
export function liveStream(
  events: Observable<LiveEvent>,
  isSessionAlive: () => Promise<boolean>,
): Observable<MessageEvent> {
  const pings = timer(0, PING_MS).pipe(
    concatMap(isSessionAlive),
    takeWhile((alive) => alive),
    map((): MessageEvent => ({ type: 'ping', data: '{}' })),
    share(),
  );
  const sessionEnd = pings.pipe(ignoreElements(), endWith(true));
  const serverEnd = events.pipe(ignoreElements(), endWith(true));
  return merge(
    pings.pipe(takeUntil(serverEnd)),
    events.pipe(
      map((data): MessageEvent => ({ data })),
      takeUntil(sessionEnd),
    ),
  );
}
