import type { Person } from '@ampkeep/ingest-api/dist/auth/principals.js';
import { BreachesService } from '@ampkeep/ingest-api/dist/breaches/breaches.service.js';
import { User } from '@ampkeep/ingest-api/dist/users/models/user.model.js';
import type { INestApplicationContext } from '@nestjs/common';
import { acknowledgement, breachEndings, QUIET_HOURS } from '../scenario/breach-endings.js';

const MOST_AT_ONCE = 500;

/** The quality lead of the demonstration, as a handler would see them. */
export async function findQualityLead(): Promise<Person> {
  const { userId, email, displayName, role } = await User.findOne({
    where: { role: 'qualityLead' },
    rejectOnEmpty: true,
  });
  return { userId, email, displayName, role, sessionId: '' };
}

/** Closes what has been quiet for long at a time of the history, with cause and action. */
export async function closeQuietBreaches(app: INestApplicationContext, at: Date, by: Person): Promise<void> {
  const breaches = app.get(BreachesService, { strict: false });
  const quietSince = at.getTime() - QUIET_HOURS * 3_600_000;
  for (const { breachId, measure, lastEventAt } of await breaches.findUnclosed(MOST_AT_ONCE)) {
    const ending = breachEndings[measure];
    if (ending && Date.parse(lastEventAt) < quietSince) await breaches.close(breachId, ending, by);
  }
}

/** Leaves one of the open breaches acknowledged, if the history left it open. */
export async function acknowledgeOne(app: INestApplicationContext, by: Person): Promise<void> {
  const breaches = app.get(BreachesService, { strict: false });
  const { note, ...wanted } = acknowledgement;
  const found = (await breaches.findUnclosed(MOST_AT_ONCE)).find(
    ({ partNumber, stage, measure }) =>
      partNumber === wanted.partNumber && stage === wanted.stage && measure === wanted.measure,
  );
  if (found) await breaches.acknowledge(found.breachId, note, by);
}
