import { ApiKeysService } from '@ampkeep/ingest-api/dist/api-keys/api-keys.service.js';
import type { StationPrincipal } from '@ampkeep/ingest-api/dist/auth/principals.js';
import { ResultsService } from '@ampkeep/ingest-api/dist/results/results.service.js';
import type { INestApplicationContext } from '@nestjs/common';
import type { StationKeys } from './database/station-keys.js';
import type { HistoryPost } from './history/build-history.js';

export interface HistorySteps {
  before(at: Date): void;
  after(at: Date, group: readonly HistoryPost[]): Promise<void>;
}

/** Posts that are under way together: as many as the writer commits as one group. */
const TOGETHER = 200;

/**
 * Hands a history to the same intake that takes the stations' posts, in the order of arrival. Rejects at the
 * first post that is not taken.
 *
 * @param steps called before and after each group with the time that its last post was received
 */
export async function loadHistory(
  app: INestApplicationContext,
  keys: StationKeys,
  history: Iterable<HistoryPost>,
  steps: HistorySteps,
): Promise<void> {
  const results = app.get(ResultsService, { strict: false });
  const principals = stationPrincipals(app, keys);
  for (const group of inGroups(history, TOGETHER)) {
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
    await steps.after(at, group);
  }
}

function* inGroups<Item>(items: Iterable<Item>, size: number): Generator<Item[], void> {
  let group: Item[] = [];
  for (const item of items) {
    if (group.push(item) < size) continue;
    yield group;
    group = [];
  }
  if (group.length > 0) yield group;
}

/** What the access guard would find for each station's key; looked up once a station. */
export function stationPrincipals(
  app: INestApplicationContext,
  keys: StationKeys,
): (station: string) => StationPrincipal {
  const apiKeys = app.get(ApiKeysService, { strict: false });
  const known = new Map<string, StationPrincipal>();
  return (station) => {
    const principal = known.get(station) ?? apiKeys.authenticate(keys[station] ?? '');
    known.set(station, principal);
    return principal;
  };
}
