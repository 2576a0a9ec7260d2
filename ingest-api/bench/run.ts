import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';

/** Runs the benches named on the command line (`npm run bench -- analysis`), or all of them. */
async function main(names: string[]): Promise<void> {
  const suffix = '.bench.js';
  const known = readdirSync(__dirname)
    .filter((file) => file.endsWith(suffix))
    .map((file) => file.slice(0, -suffix.length));
  const unknown = names.filter((name) => !existsSync(join(__dirname, name + suffix)));
  if (unknown.length > 0) {
    process.stderr.write(`No bench named ${unknown.join(', ')}; there are: ${known.join(', ')}\n`);
    process.exitCode = 2;
    return;
  }
  for (const name of names.length > 0 ? names : known) {
    await import(pathToFileURL(join(__dirname, name + suffix)).href);
  }
}

void main(process.argv.slice(2).filter((argument) => !argument.startsWith('-')));
