import { parseArgs } from 'node:util';
import { stations } from '../circuit/stations.js';
import { scenarios, type Scenario } from '../plan/scenarios.js';

export interface SimOptions {
  stations: number;
  testsPerSecond: number;
  count: number;
  seed: string;
  url: string;
  keyFile: string;
  scenario: Scenario;
  spoolFile: string;
  quiet: boolean;
}

/** Thrown for a command line that can't be carried out; the message says what to change. */
export class UsageError extends Error {
  constructor(message: string) {
    super(message);
    this.name = 'UsageError';
  }
}

export const helpText = `Simulated test stations that post load-regulation results to Ampkeep.

  npm run sim -- --key-file keys.json [options]

  --key-file FILE   JSON with one API key for each station: { "north-1": "amk_…", … }  (required)
  --stations N      how many stations take part, 1 to ${stations.length}                        (3)
  --rate N          tests per second of all stations together, 0.01 to 200    (1)
  --count N         how many tests to run; 0 goes on until Ctrl-C             (100)
  --seed TEXT       same seed, same units and readings; without it every run makes other units
  --scenario NAME   what happens on the line                                  (steady)
                      steady        units go from board to final, 2 to 3 % fail, golden runs now and then
                      one-fail      one unit whose output impedance is clearly too low
                      drift         the last station's ammeter gains 0.02 % with every test, up to 2 %
                      bad-lot       every FH-R500-M comes from a lot with a low Early voltage
                      coarse-meter  the last station's ammeter stayed on its 100 mA range: not proven
                      poor-contact  fixture 2 of the last station loses voltage now and then
                      outage        the network is away for a while; what waited arrives late and out of order
  --url ADDRESS     where Ampkeep answers                                     (http://localhost:4780)
  --spool FILE      results that could not be sent yet                        (data/station-sim.spool.ndjson)
  --quiet           no progress line
  --help            this text

A result is written to the spool before it is sent and leaves it when Ampkeep has taken it or refused it for
good; what is left is sent first by the next run. Exit code: 0 all sent, 1 some not, 2 wrong command line.
`;

/**
 * @param defaultSeed taken when the command line names none
 * @returns null when help was asked for
 * @throws UsageError
 */
export function parseOptions(argv: readonly string[], defaultSeed: string): SimOptions | null {
  const values = readArguments(argv);
  if (values.help) return null;
  const scenario = oneOf(values.scenario, scenarios, '--scenario');
  return {
    stations: number(values.stations, '--stations', 1, stations.length, true),
    testsPerSecond: number(values.rate, '--rate', 0.01, 200, false),
    count: number(values.count, '--count', 0, 10_000_000, true),
    seed: values.seed ?? defaultSeed,
    url: httpUrl(values.url),
    keyFile: required(values['key-file'], '--key-file'),
    scenario,
    spoolFile: required(values.spool, '--spool'),
    quiet: values.quiet,
  };
}

function readArguments(argv: readonly string[]) {
  try {
    return parseArgs({
      args: [...argv],
      options: {
        'key-file': { type: 'string' },
        stations: { type: 'string', default: '3' },
        rate: { type: 'string', default: '1' },
        count: { type: 'string', default: '100' },
        seed: { type: 'string' },
        scenario: { type: 'string', default: 'steady' },
        url: { type: 'string', default: 'http://localhost:4780' },
        spool: { type: 'string', default: 'data/station-sim.spool.ndjson' },
        quiet: { type: 'boolean', default: false },
        help: { type: 'boolean', short: 'h', default: false },
      },
    }).values;
  } catch (error) {
    throw new UsageError(error instanceof Error ? error.message : String(error));
  }
}

function number(text: string, name: string, low: number, high: number, whole: boolean): number {
  const value = text.trim() === '' ? NaN : Number(text);
  if (value >= low && value <= high && (!whole || Number.isInteger(value))) return value;
  throw new UsageError(
    `${name} is "${text}", must be a ${whole ? 'whole ' : ''}number from ${low} to ${high}`,
  );
}

function oneOf<T extends string>(text: string, allowed: readonly T[], name: string): T {
  const found = allowed.find((candidate) => candidate === text);
  if (found) return found;
  throw new UsageError(`${name} is "${text}", must be one of ${allowed.join(', ')}`);
}

function httpUrl(text: string): string {
  if (URL.canParse(text) && /^https?:$/.test(new URL(text).protocol)) return text.replace(/\/+$/, '');
  throw new UsageError(`--url is "${text}", must be an address that begins with http:// or https://`);
}

function required(text: string | undefined, name: string): string {
  if (text) return text;
  throw new UsageError(`${name} is missing`);
}
