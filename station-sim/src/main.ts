import { helpText, parseOptions, UsageError } from './commands/parse-options.js';
import { simulate, type Output } from './commands/simulate.js';

const EXIT_SEND_FAILED = 1;
const EXIT_USAGE = 2;

async function main(): Promise<number> {
  const options = parseOptions(process.argv.slice(2), String(Date.now()));
  if (!options) {
    process.stdout.write(helpText);
    return 0;
  }
  const stop = new AbortController();
  for (const signal of ['SIGINT', 'SIGTERM'] as const) process.once(signal, () => stop.abort());
  return (await simulate(options, stop.signal, terminalOutput())) ? 0 : EXIT_SEND_FAILED;
}

/** On a terminal the progress line overwrites itself; in a log there is one line every ten seconds. */
function terminalOutput(): Output {
  const { stdout } = process;
  let nextLogAt = 0;
  let openLine = false;
  return {
    progress(line) {
      if (stdout.isTTY) {
        stdout.write(`\r\x1b[K${line}`);
        openLine = true;
      } else if (Date.now() >= nextLogAt) {
        nextLogAt = Date.now() + 10_000;
        stdout.write(`${line}\n`);
      }
    },
    line(text) {
      stdout.write(`${openLine ? '\n' : ''}${text}\n`);
      openLine = false;
    },
  };
}

main().then(
  (code) => {
    process.exitCode = code;
  },
  (error: unknown) => {
    const usage = error instanceof UsageError;
    const message = error instanceof Error ? error.message : String(error);
    process.stderr.write(`${message}\n${usage ? 'Use --help for the options.\n' : ''}`);
    process.exitCode = usage ? EXIT_USAGE : EXIT_SEND_FAILED;
  },
);
