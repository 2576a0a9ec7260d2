import { ApiKeysService } from '@ampkeep/ingest-api/dist/api-keys/api-keys.service.js';
import type { StationPrincipal } from '@ampkeep/ingest-api/dist/auth/principals.js';
import { ResultsService } from '@ampkeep/ingest-api/dist/results/results.service.js';
import type { INestApplicationContext } from '@nestjs/common';
import type { StationKeys } from './database/station-keys.js';
import type { HistoryPost } from './history/build-history.js';

export interface HistorySteps {
  before(at: Date): void;
  after(at: Date, loaded: number): Promise<void>;
}

/** Posts that are under way together: the writer commits them as one group. */
const TOGETHER = 50;

/**
 * Hands a history to the same intake that takes the stations' posts, in the order of arrival. Rejects at the
 * first post that is not taken.
 *
 * @param steps called before and after each group with the time that its last post was received
 */
export async function loadHistory(
  app: INestApplicationContext,
  keys: StationKeys,
  history: readonly HistoryPost[],
  steps: HistorySteps,
): Promise<void> {
  const results = app.get(ResultsService, { strict: false });
  const principals = stationPrincipals(app, keys);
  for (let first = 0; first < history.length; first += TOGETHER) {
    const group = history.slice(first, first + TOGETHER);
    const at = group.at(-1)?.receivedAt ?? new Date(0);
    steps.before(at);
    await Promise.all(
      group.map(({ station, receivedAt, post }) =>
        results.record(Buffer.from(JSON.stringify(post)), principals(station), {
          seeded: true,
          receivedAt: receivedAt.getTime(),
        }),
      ),
    );
    await steps.after(at, first + group.length);
  }
}

/** What the access guard would find for each station's key. */
export function stationPrincipals(
  app: INestApplicationContext,
  keys: StationKeys,
): (station: string) => StationPrincipal {
  const apiKeys = app.get(ApiKeysService, { strict: false });
  return (station) => apiKeys.authenticate(keys[station] ?? '');
}
