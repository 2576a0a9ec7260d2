import { createRandom } from '../circuit/random.js';
import { buildPlan } from '../plan/build-plan.js';
import { progressLine, summaryLines } from '../report/progress.js';
import type { Tally } from '../report/tally.js';
import { outageOf } from '../run/outage.js';
import { runSimulation } from '../run/run-simulation.js';
import { systemClock } from '../send/clock.js';
import { httpPoster } from '../send/post-result.js';
import { openSpool } from '../send/spool.js';
import type { SimOptions } from './parse-options.js';
import { readKeyFile } from './read-key-file.js';

/** Where words go: progress may overwrite itself, lines stay. */
export interface Output {
  progress(line: string): void;
  line(text: string): void;
}

/** Runs the simulation. True when everything was taken by the hub. */
export async function simulate(options: SimOptions, stop: AbortSignal, output: Output): Promise<boolean> {
  const keys = await readKeyFile(options.keyFile, options.stations);
  const spool = await openSpool(options.spoolFile);
  const now = () => systemClock.now();
  const random = createRandom(options.seed);
  const started = now();
  output.line(
    `${options.scenario}, ${options.stations} stations, ${options.testsPerSecond} tests/s, seed ${options.seed}, to ${options.url}`,
  );
  try {
    const tally = await runSimulation(
      {
        plan: buildPlan({ scenario: options.scenario, stations: options.stations, madeAt: started }, random),
        stations: options.stations,
        testsPerSecond: options.testsPerSecond,
        count: options.count,
        outage: outageOf(options.scenario, options.count),
      },
      {
        clock: systemClock,
        send: httpPoster(options.url, now),
        spool,
        keys,
        random,
        stop,
        onProgress: (current) => {
          if (!options.quiet) output.progress(progressLine(current, plannedCount(options)));
        },
      },
    );
    const seconds = (now().getTime() - started.getTime()) / 1000;
    for (const line of summaryLines(tally, seconds, options.spoolFile)) output.line(line);
    return succeeded(tally);
  } finally {
    await spool.close();
  }
}

function plannedCount({ scenario, count }: SimOptions): number {
  return scenario === 'one-fail' ? 1 : count;
}

function succeeded(tally: Tally): boolean {
  return tally.refused === 0 && tally.waiting === 0 && tally.blocked === null;
}
