/*
 * Makes a clone ready to run: installs the packages and builds what is not built yet. Plain JavaScript without
 * dependencies, since it runs before there are any. What is up to date is left alone, so a second run takes a
 * moment.
 */
import { spawn } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = join(dirname(fileURLToPath(import.meta.url)), '..');
const stampFile = join(root, 'node_modules', '.cache', 'ampkeep', 'prepared.json');

/** What a workspace is built from and what proves that it was; `after` names what it is built against. */
const workspaces = [
  { name: 'station-sim', output: 'dist/main.js', after: [] },
  { name: 'ingest-api', output: 'dist/main.js', after: [] },
  { name: 'seeds', output: 'dist/demo.js', after: ['station-sim', 'ingest-api'] },
  { name: 'dashboard', output: 'dist/index.html', after: [] },
];

const sharedSources = ['package-lock.json', 'tsconfig.base.json'];
const notSources = new Set(['node_modules', 'dist', 'coverage', 'test', 'bench', 'e2e', 'screenshots']);

function requireNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major > 20 || (major === 20 && minor >= 19)) return;
  throw new Error(`Ampkeep needs Node 20.19 or newer; this is ${process.versions.node}.`);
}

async function install(stamp) {
  const lockHash = hashFiles([join(root, 'package-lock.json')]);
  const installed = join(root, 'node_modules', '.package-lock.json');
  // Packages installed by hand leave no stamp: then the times of both lock files tell.
  const upToDate =
    existsSync(installed) &&
    (stamp.lockHash === lockHash ||
      (stamp.lockHash === undefined &&
        statSync(installed).mtimeMs >= statSync(join(root, 'package-lock.json')).mtimeMs));
  if (!upToDate) {
    await step('Installing packages (the first time takes a few minutes: SQLite is compiled)', [
      'install',
      '--no-audit',
      '--no-fund',
      '--loglevel=error',
    ]);
  }
  return { ...stamp, lockHash };
}

async function build(stamp) {
  const builds = { ...stamp.builds };
  const running = new Map();
  for (const workspace of workspaces) running.set(workspace.name, buildOne(workspace, builds, running));
  await Promise.all(running.values());
  return { ...stamp, builds };
}

/** Builds a workspace once those it is built against are ready; tells their hash on, so that changes spread. */
async function buildOne({ name, output, after }, builds, running) {
  const below = await Promise.all(after.map((other) => running.get(other)));
  const own = hashFiles([...sharedSources.map((file) => join(root, file)), ...sourceFiles(join(root, name))]);
  const hash = createHash('sha256')
    .update([own, ...below].join(' '))
    .digest('hex');
  if (builds[name] !== hash || !existsSync(join(root, name, output))) {
    await step(`Building ${name}`, ['run', 'build', '--workspace', name]);
    builds[name] = hash;
  }
  return hash;
}

function sourceFiles(directory) {
  return readdirSync(directory, { withFileTypes: true })
    .filter((entry) => !notSources.has(entry.name) && !/\.(test|spec)\.tsx?$/.test(entry.name))
    .sort((a, b) => (a.name < b.name ? -1 : 1))
    .flatMap((entry) => {
      const path = join(directory, entry.name);
      return entry.isDirectory() ? sourceFiles(path) : [path];
    });
}

function hashFiles(files) {
  const hash = createHash('sha256');
  for (const file of files)
    hash.update(file.slice(root.length)).update('\0').update(readFileSync(file)).update('\0');
  return hash.digest('hex');
}

/** Runs npm quietly: one line when it begins, one when it ends, a sign of life between, its words if it fails. */
function step(title, npmArguments) {
  const started = Date.now();
  const seconds = () => Math.round((Date.now() - started) / 1000);
  console.log(`${title} …`);
  const alive = setInterval(() => console.log(`  … ${title.split(' (')[0]}: ${seconds()} s`), 20_000);
  return new Promise((resolve, reject) => {
    const npm = spawn('npm', npmArguments, { cwd: root, shell: process.platform === 'win32' });
    const words = [];
    npm.stdout.on('data', (chunk) => words.push(chunk));
    npm.stderr.on('data', (chunk) => words.push(chunk));
    npm.on('error', reject);
    npm.on('close', (code) => {
      clearInterval(alive);
      if (code === 0) {
        console.log(`${title.split(' (')[0]}: done in ${seconds()} s`);
        resolve();
      } else {
        reject(new Error(`${Buffer.concat(words).toString()}\n${title.split(' (')[0]} failed.`));
      }
    });
  });
}

function readStamp() {
  try {
    return JSON.parse(readFileSync(stampFile, 'utf8'));
  } catch {
    return {};
  }
}

function writeStamp(stamp) {
  mkdirSync(dirname(stampFile), { recursive: true });
  writeFileSync(stampFile, JSON.stringify(stamp));
}

try {
  requireNode();
  const installed = await install(readStamp());
  writeStamp(installed);
  writeStamp(await build(installed));
} catch (error) {
  console.error(error.message);
  process.exitCode = 1;
}
