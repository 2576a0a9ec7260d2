import { ApiKeysService } from '@ampkeep/ingest-api/dist/api-keys/api-keys.service.js';
import type { StationPrincipal } from '@ampkeep/ingest-api/dist/auth/principals.js';
import { ResultsService } from '@ampkeep/ingest-api/dist/results/results.service.js';
import type { INestApplicationContext } from '@nestjs/common';
import type { StationKeys } from './database/station-keys.js';
import type { DeliveryGroup } from './history/history-groups.js';

export interface HistorySteps {
  before(at: Date): void;
  after(at: Date, group: DeliveryGroup): Promise<void>;
}

/** Groups of a history, whether they are there or still being made. */
export type HistorySource = Iterable<DeliveryGroup> | AsyncIterable<DeliveryGroup>;

/**
 * Hands a history to the same intake that takes the stations' posts, in the order of arrival. Rejects at the
 * first post that is not taken.
 *
 * @param steps called before and after each group with the time that its last post was received
 */
export async function loadHistory(
  app: INestApplicationContext,
  principals: (station: string) => StationPrincipal,
  history: HistorySource,
  steps: HistorySteps,
): Promise<void> {
  const results = app.get(ResultsService, { strict: false });
  for await (const group of history) {
    const at = new Date(group.at(-1)?.receivedAt ?? 0);
    steps.before(at);
    await Promise.all(
      group.map(({ station, receivedAt, body }) =>
        results.record(Buffer.from(body), principals(station), { seeded: true, receivedAt }),
      ),
    );
    await steps.after(at, group);
  }
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
