import { parseArgs } from 'node:util';
import { formatProof } from '../proof/format-proof.js';
import { runProof } from '../proof/run-proof.js';

const usage = `Usage: npm run verify [-- --help]

Recomputes every published case with this installation's own functions and prints case, quantity, status, published
and computed value and the digits that agree. Exit code 1 when a figure falls short.
`;

/** Prints the proof of the computations; exit code 0 when nothing falls short, 1 when something does, 2 on bad usage. */
function main(args: string[]): number {
  const { values } = parseArgs({ args, options: { help: { type: 'boolean', short: 'h' } } });
  if (values.help) {
    process.stdout.write(usage);
    return 0;
  }
  const rows = runProof();
  process.stdout.write(`${formatProof(rows)}\n`);
  return rows.every(({ ok }) => ok) ? 0 : 1;
}

try {
  process.exitCode = main(process.argv.slice(2));
} catch (error) {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n\n${usage}`);
  process.exitCode = 2;
}
