import 'reflect-metadata';
import { join } from 'node:path';
import { parseArgs } from 'node:util';
import type { Env } from '@ampkeep/ingest-api/dist/config/env.js';
import { stations } from '@ampkeep/station-sim/dist/circuit/stations.js';
import { stationKeyFile } from './database/station-keys.js';
import { demoEnv, demoVariables, repositoryRoot } from './demo-settings.js';
import { type Child, startChild } from './launch/child.js';
import { isPortFree } from './launch/free-port.js';
import { prepareDemoDatabase } from './launch/prepare-demo-database.js';
import { readyLines } from './launch/ready-lines.js';

const TESTS_PER_SECOND = 0.4;
const PATIENCE_MS = 10_000;
const PARENT_LOOK_MS = 1000;

const help = `Shows Ampkeep at work: loads the demonstration once, serves it, lets simulated stations post to it.

  npm start                     on http://localhost:4780 (AMPKEEP_PORT for another port)
  npm start -- --no-stations    without simulated stations
`;

/** Serves the demonstration until somebody stops it or the server ends. */
async function demonstrate(env: Env, withStations: boolean): Promise<void> {
  if (!(await isPortFree(env.port))) {
    throw new Error(`Port ${env.port} is in use. Stop what uses it, or set AMPKEEP_PORT to another port.`);
  }
  await prepareDemoDatabase(env, (line) => console.log(line));
  const stopped = stopSignal();
  const server = startServer();
  const children = [server];
  try {
    const first = await Promise.race([server.saying(/^Ampkeep listens on /), stopped]);
    if (first === 'signal') return;
    if (withStations) children.unshift(startStations(env));
    for (const line of readyLines(env, withStations ? 60 * TESTS_PER_SECOND : 0)) console.log(line);
    const ended = await Promise.race([server.ended.then(() => 'server' as const), stopped]);
    if (ended === 'server') throw new Error('The server has ended.');
    console.log('Stopping …');
  } finally {
    for (const child of children) await child.stop(PATIENCE_MS);
  }
}

function startServer(): Child {
  return startChild({
    script: join(repositoryRoot, 'ingest-api', 'dist', 'main.js'),
    variables: demoVariables(process.env),
    cwd: repositoryRoot,
  });
}

function startStations(env: Env): Child {
  const options = {
    'key-file': stationKeyFile(env.dataDir),
    spool: join(env.dataDir, 'station-sim.spool.ndjson'),
    url: `http://127.0.0.1:${env.port}`,
    stations: String(stations.length),
    rate: String(TESTS_PER_SECOND),
    count: '0',
  };
  return startChild({
    script: join(repositoryRoot, 'station-sim', 'dist', 'main.js'),
    arguments: ['--quiet', ...Object.entries(options).map(([name, value]) => `--${name}=${value}`)],
    cwd: repositoryRoot,
  });
}

/**
 * Resolves at the first Ctrl-C or SIGTERM; a second one ends the process as usual. npm's shell keeps a
 * SIGTERM to itself, so under npm the end of the parent counts as one too.
 */
function stopSignal(): Promise<'signal'> {
  return new Promise((resolve) => {
    const parent = process.ppid;
    const watch = setInterval(() => {
      if (process.env.npm_lifecycle_event && process.ppid !== parent) stop();
    }, PARENT_LOOK_MS);
    const stop = () => {
      clearInterval(watch);
      process.off('SIGINT', stop).off('SIGTERM', stop);
      resolve('signal');
    };
    process.on('SIGINT', stop).on('SIGTERM', stop);
  });
}

async function main(): Promise<void> {
  const { values } = parseArgs({
    options: { 'no-stations': { type: 'boolean', default: false }, help: { type: 'boolean', short: 'h' } },
  });
  if (values.help) process.stdout.write(help);
  else await demonstrate(demoEnv(process.env), !values['no-stations']);
}

main().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
});
