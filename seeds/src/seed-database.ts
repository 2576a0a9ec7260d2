import { AmpkeepError } from '@ampkeep/ingest-api/dist/common/errors.js';
import type { Env } from '@ampkeep/ingest-api/dist/config/env.js';
import { createApp } from '@ampkeep/ingest-api/dist/create-app.js';
import { runStatement } from '@ampkeep/ingest-api/dist/database/sql.js';
import { Writer } from '@ampkeep/ingest-api/dist/database/writer.js';
import { ResultsService } from '@ampkeep/ingest-api/dist/results/results.service.js';
import { SiteSetupService } from '@ampkeep/ingest-api/dist/site-setup/site-setup.service.js';
import type { INestApplicationContext } from '@nestjs/common';
import { createDemoAccounts } from './database/create-demo-accounts.js';
import { SEEDED_AT } from './database/demo-database.js';
import { acknowledgeOne, closeQuietBreaches, findQualityLead } from './database/handle-breaches.js';
import { stationKeys, type StationKeys } from './database/station-keys.js';
import { buildHistory, demoHistory, type HistoryPost } from './history/build-history.js';
import { judgePost } from './history/judge-post.js';
import { loadHistory, stationPrincipals } from './load-history.js';
import { refusedPosts } from './scenario/refused-posts.js';
import { describeSite } from './scenario/site-description.js';

export interface SeedOptions {
  env: Env;
  /** Where the history ends. */
  now: Date;
  days?: number;
  report: (line: string) => void;
}

const HOUR_MS = 3_600_000;

/** The site was set up so many days before now, its limits released then. */
const SET_UP_DAYS_AGO = 60;

/** Fills an empty database with the demonstration. Stops at the first error. */
export async function seedDatabase({
  env,
  now,
  days = demoHistory.days,
  report,
}: SeedOptions): Promise<void> {
  const setUpAt = new Date(now.getTime() - SET_UP_DAYS_AGO * 24 * HOUR_MS);
  let time = setUpAt.getTime();
  const app = await createApp(env, () => time);
  try {
    await app.init();
    report('Accounts, products, test plans, limits and stations');
    await createDemoAccounts(app, setUpAt);
    const qualityLead = await findQualityLead();
    await app.get(SiteSetupService, { strict: false }).apply(describeSite(now, setUpAt), qualityLead.email);
    const keys = await stationKeys(app, env.dataDir);

    report(`A history of ${days} days`);
    const history = buildHistory({ ...demoHistory, days, now }, judgePost);
    await loadHistory(app, keys, history, {
      before: (at) => {
        time = at.getTime();
      },
      after: async (at, loaded) => {
        await closeQuietBreaches(app, at, qualityLead);
        if (loaded % 300 === 0 || loaded === history.length)
          report(`  ${loaded} of ${history.length} results`);
      },
    });
    time = now.getTime();
    await acknowledgeOne(app, qualityLead);
    for (const refused of refusedPosts(exampleOf(history))) {
      time = now.getTime() - refused.hoursAgo * HOUR_MS;
      await refuse(app, keys, refused.station, refused.body);
    }
    time = now.getTime();
    await markSeeded(app, now);
  } finally {
    await app.close();
  }
}

function exampleOf(history: readonly HistoryPost[]) {
  const found = history.find(({ post }) => post.partNumber === 'FH-R500-W' && post.outcome === 'completed');
  if (!found) throw new Error('The history holds no Wilson mirror');
  return found.post;
}

/** Hands in a body that the intake has to refuse. */
async function refuse(
  app: INestApplicationContext,
  keys: StationKeys,
  station: string,
  body: unknown,
): Promise<void> {
  try {
    const bytes = Buffer.from(JSON.stringify(body));
    await app.get(ResultsService, { strict: false }).record(bytes, stationPrincipals(app, keys)(station));
  } catch (error) {
    if (error instanceof AmpkeepError && error.status === 422) return;
    throw error;
  }
  throw new Error('A post that should have been refused was taken');
}

async function markSeeded(app: INestApplicationContext, now: Date): Promise<void> {
  await app
    .get(Writer, { strict: false })
    .run((transaction) =>
      runStatement(
        transaction,
        'INSERT INTO settings (name, value) VALUES (?, ?)',
        SEEDED_AT,
        now.toISOString(),
      ),
    );
}
