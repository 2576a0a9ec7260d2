import type { Migration } from '../migrator.js';
import { createCatalogue } from './20261201T0900-create-catalogue.js';
import { createApiKeys } from './20261201T0910-create-api-keys.js';
import { createResults } from './20261201T0920-create-results.js';
import { createPeople } from './20261201T0930-create-people.js';
import { createHeartbeats } from './20261201T0950-create-heartbeats.js';
import { createBreaches } from './20261201T0940-create-breaches.js';

/** All schema changes, oldest first. Append only: what was released stays as it is. */
export const migrations: readonly Migration[] = [
  createCatalogue,
  createApiKeys,
  createResults,
  createPeople,
  createBreaches,
  createHeartbeats,
];
