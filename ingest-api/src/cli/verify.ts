import { parseArgs } from 'node:util';
import { formatProof } from '../proof/format-proof.js';
import { runProof } from '../proof/run-proof.js';
import { coverageLines } from '../proof/simulation/coverage-lines.js';
import { runCoverage } from '../proof/simulation/run-coverage.js';

const usage = `Usage: npm run verify [-- --coverage] [--draws <number>] [--seed <number>]

Recomputes every published case with this installation's own functions and prints case, quantity, status, published
and computed value and the digits that agree.

  --coverage  also simulates whole sweeps: does the 95 % interval cover, is "at least" true? Takes minutes.
  --draws     simulated sweeps in each cell of the simulation, default 20000
  --seed      the same seed gives the same simulation, default 1

Exit code 1 when a figure falls short, 2 on arguments that can't be read.
`;

class UsageError extends Error {}

/** Prints the proof of the computations, and the simulation when asked; says whether nothing falls short. */
function verify({ coverage, draws, seed }: { coverage: boolean; draws: number; seed: number }): boolean {
  const rows = runProof();
  process.stdout.write(`${formatProof(rows)}\n`);
  const agrees = rows.every(({ ok }) => ok);
  if (!coverage) return agrees;
  const report = runCoverage({ draws, seed });
  process.stdout.write(`\n${coverageLines(report).join('\n')}\n`);
  return agrees && report.shortfalls.length === 0;
}

function readArguments(args: string[]): { help: boolean; coverage: boolean; draws: number; seed: number } {
  try {
    const { values } = parseArgs({
      args,
      options: {
        help: { type: 'boolean', short: 'h', default: false },
        coverage: { type: 'boolean', default: false },
        draws: { type: 'string', default: '20000' },
        seed: { type: 'string', default: '1' },
      },
    });
    return {
      ...values,
      draws: wholeNumber('--draws', values.draws),
      seed: wholeNumber('--seed', values.seed),
    };
  } catch (error) {
    throw error instanceof UsageError ? error : new UsageError((error as Error).message);
  }
}

function wholeNumber(name: string, text: string): number {
  const value = Number(text);
  if (!Number.isSafeInteger(value) || value < 1) throw new UsageError(`${name} wants a whole number above 0`);
  return value;
}

try {
  const options = readArguments(process.argv.slice(2));
  if (options.help) process.stdout.write(usage);
  else process.exitCode = verify(options) ? 0 : 1;
} catch (error) {
  if (!(error instanceof UsageError)) throw error;
  process.stderr.write(`${error.message}\n\n${usage}`);
  process.exitCode = 2;
}
