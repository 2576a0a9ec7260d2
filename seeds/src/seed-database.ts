import type { Env } from '@ampkeep/ingest-api/dist/config/env.js';
import { createApp } from '@ampkeep/ingest-api/dist/create-app.js';
import { runStatement } from '@ampkeep/ingest-api/dist/database/sql.js';
import { Writer } from '@ampkeep/ingest-api/dist/database/writer.js';
import { SiteSetupService } from '@ampkeep/ingest-api/dist/site-setup/site-setup.service.js';
import type { ResultPost } from '@ampkeep/station-sim/dist/types/result-post.js';
import type { INestApplicationContext } from '@nestjs/common';
import { createDemoAccounts } from './database/create-demo-accounts.js';
import { SEEDED_AT } from './database/demo-database.js';
import { acknowledgeOne, closeQuietBreaches, findQualityLead } from './database/handle-breaches.js';
import { stationKeys } from './database/station-keys.js';
import { demoHistory, type HistoryOptions } from './history/build-history.js';
import type { DeliveryGroup } from './history/history-groups.js';
import { historyFromThread } from './history/history-thread.js';
import { type HistorySource, loadHistory, stationPrincipals } from './load-history.js';
import { loadRefusedPosts } from './load-refused-posts.js';
import { refusedPosts } from './scenario/refused-posts.js';
import { describeSite } from './scenario/site-description.js';

export interface SeedOptions {
  env: Env;
  /** Where the history ends. */
  now: Date;
  days?: number;
  /** Same seed and end, same history. */
  seed?: string;
  /** Makes the history; in a thread of its own if nothing else is said. */
  makeHistory?: (options: HistoryOptions) => HistorySource;
  report: (line: string) => void;
}

const HOUR_MS = 3_600_000;

/** The site was set up so many days before its history begins, its limits released then. */
const SET_UP_DAYS_BEFORE = 2;

/** A line of progress for about so many results. */
const REPORT_EVERY = 2000;

/** Fills an empty database with the demonstration. Stops at the first error. */
export async function seedDatabase({
  env,
  now,
  days = demoHistory.days,
  seed = demoHistory.seed,
  makeHistory = historyFromThread,
  report,
}: SeedOptions): Promise<void> {
  const setUpAt = new Date(now.getTime() - (days + SET_UP_DAYS_BEFORE) * 24 * HOUR_MS);
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
    const progress = createProgress(now, days, report);
    const principals = stationPrincipals(app, keys);
    await loadHistory(app, principals, makeHistory({ ...demoHistory, days, seed, now }), {
      before: (at) => {
        time = at.getTime();
      },
      after: async (at, group) => {
        await closeQuietBreaches(app, at, now, qualityLead);
        progress.add(group, at);
      },
    });
    time = now.getTime();
    await acknowledgeOne(app, qualityLead);
    const example = progress.example();
    // A day or two without a Wilson mirror, such as a Sunday's, has none to show.
    const refused = example ? refusedPosts(example).filter(({ hoursAgo }) => hoursAgo < days * 24) : [];
    await loadRefusedPosts(app, principals, refused, (hoursAgo) => {
      time = now.getTime() - hoursAgo * HOUR_MS;
    });
    time = now.getTime();
    await markSeeded(app, now);
    report(`  ${progress.loaded()} results`);
  } finally {
    await app.close();
  }
}

/** Tells how far the history is, and keeps one ordinary post of it. */
function createProgress(now: Date, days: number, report: (line: string) => void) {
  let loaded = 0;
  let reported = 0;
  let example: ResultPost | undefined;
  return {
    add(group: DeliveryGroup, at: Date) {
      loaded += group.length;
      example ??= group.map(({ body }) => JSON.parse(body) as ResultPost).find(isOrdinary);
      if (loaded - reported < REPORT_EVERY) return;
      reported = loaded;
      const day = days - Math.floor((now.getTime() - at.getTime()) / (24 * HOUR_MS));
      report(`  day ${day} of ${days}: ${loaded} results`);
    },
    loaded: () => loaded,
    example: () => example,
  };
}

const isOrdinary = ({ partNumber, runKind, outcome }: ResultPost): boolean =>
  partNumber === 'FH-R500-W' && runKind === 'production' && outcome === 'completed';

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
