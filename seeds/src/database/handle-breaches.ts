import type { Person } from '@ampkeep/ingest-api/dist/auth/principals.js';
import { BreachesService } from '@ampkeep/ingest-api/dist/breaches/breaches.service.js';
import { User } from '@ampkeep/ingest-api/dist/users/models/user.model.js';
import type { INestApplicationContext } from '@nestjs/common';
import { acknowledgement, breachEndings, QUIET_HOURS, stillOpen } from '../scenario/breach-endings.js';

const MOST_AT_ONCE = 500;
const HOUR_MS = 3_600_000;

/** The quality lead of the demonstration, as a handler would see them. */
export async function findQualityLead(): Promise<Person> {
  const { userId, email, displayName, role } = await User.findOne({
    where: { role: 'qualityLead' },
    rejectOnEmpty: true,
  });
  return { userId, email, displayName, role, sessionId: '' };
}

/** Closes what has been quiet for long at a time of the history that ends at `now`, with cause and action. */
export async function closeQuietBreaches(
  app: INestApplicationContext,
  at: Date,
  now: Date,
  by: Person,
): Promise<void> {
  const breaches = app.get(BreachesService, { strict: false });
  const quietSince = at.getTime() - QUIET_HOURS * HOUR_MS;
  const hoursAgo = (now.getTime() - at.getTime()) / HOUR_MS;
  for (const breach of await breaches.findUnclosed(MOST_AT_ONCE)) {
    const ending = breachEndings[breach.measure];
    const goesOn = stillOpen.some((story) => isAbout(breach, story) && hoursAgo <= story.fromHoursAgo);
    if (ending && !goesOn && Date.parse(breach.lastEventAt) < quietSince) {
      await breaches.close(breach.breachId, ending, by);
    }
  }
}

/** Leaves one of the open breaches acknowledged, if the history left it open. */
export async function acknowledgeOne(app: INestApplicationContext, by: Person): Promise<void> {
  const breaches = app.get(BreachesService, { strict: false });
  const found = (await breaches.findUnclosed(MOST_AT_ONCE)).find((breach) =>
    isAbout(breach, acknowledgement),
  );
  if (found) await breaches.acknowledge(found.breachId, acknowledgement.note, by);
}

interface Cause {
  partNumber: string;
  stage: string;
  measure: string;
}

const isAbout = (breach: Cause, cause: Cause): boolean =>
  breach.partNumber === cause.partNumber && breach.stage === cause.stage && breach.measure === cause.measure;
