import { AmpkeepError } from '@ampkeep/ingest-api/dist/common/errors.js';
import { ResultsService } from '@ampkeep/ingest-api/dist/results/results.service.js';
import type { StationPrincipal } from '@ampkeep/ingest-api/dist/auth/principals.js';
import type { INestApplicationContext } from '@nestjs/common';
import type { RefusedBody } from './scenario/refused-posts.js';

/** Hands in bodies that the intake has to refuse. Rejects when one is taken. */
export async function loadRefusedPosts(
  app: INestApplicationContext,
  principals: (station: string) => StationPrincipal,
  refused: readonly RefusedBody[],
  setHoursAgo: (hoursAgo: number) => void,
): Promise<void> {
  const results = app.get(ResultsService, { strict: false });
  for (const { station, hoursAgo, times, body } of refused) {
    for (let trial = 0; trial < times; trial++) {
      setHoursAgo(hoursAgo - trial / 60);
      await expectRefusal(results.record(Buffer.from(body), principals(station)));
    }
  }
}

async function expectRefusal(recorded: Promise<unknown>): Promise<void> {
  try {
    await recorded;
  } catch (error) {
    if (error instanceof AmpkeepError && error.status < 500) return;
    throw error;
  }
  throw new Error('A post that should have been refused was taken');
}
