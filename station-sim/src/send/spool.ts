import { mkdir, open, readFile, rename, writeFile, type FileHandle } from 'node:fs/promises';
import { dirname } from 'node:path';
import type { ResultPost } from '../types/result-post.js';

export interface SpooledPost {
  station: string;
  post: ResultPost;
}

/** Keeps every post on disk until the hub has taken it or refused it for good. */
export interface Spool {
  /** What an earlier run left behind, oldest first. */
  readonly leftOver: readonly SpooledPost[];
  /** Resolves once the post is on disk. */
  add(spooled: SpooledPost): Promise<void>;
  remove(resultId: string): Promise<void>;
  close(): Promise<void>;
}

type Line = ({ op: 'add' } & SpooledPost) | { op: 'done'; resultId: string };

/** When nothing waits any more, a file longer than this is emptied. */
const EMPTY_ABOVE_BYTES = 1_000_000;

/** Opens the spool: one JSON line a step, rewritten at the start to hold only what still waits. */
export async function openSpool(file: string): Promise<Spool> {
  await mkdir(dirname(file), { recursive: true });
  const waiting = await readWaiting(file);
  const leftOver = [...waiting.values()];
  await rewrite(file, leftOver);
  const handle = await open(file, 'a', 0o600);
  const write = inOrder(handle);
  return {
    leftOver,
    async add(spooled) {
      waiting.set(spooled.post.resultId, spooled);
      await write({ op: 'add', ...spooled });
    },
    async remove(resultId) {
      waiting.delete(resultId);
      await write({ op: 'done', resultId }, () => waiting.size === 0);
    },
    close: () => handle.close(),
  };
}

/** Appends one line after the other; `mayEmpty` is asked after the line is on disk. */
function inOrder(handle: FileHandle): (line: Line, mayEmpty?: () => boolean) => Promise<void> {
  let last: Promise<void> = Promise.resolve();
  const append = async (line: Line, mayEmpty?: () => boolean) => {
    await handle.appendFile(`${JSON.stringify(line)}\n`);
    await handle.datasync();
    if (mayEmpty?.() && (await handle.stat()).size > EMPTY_ABOVE_BYTES) await handle.truncate(0);
  };
  return (line, mayEmpty) => {
    const written = last.then(() => append(line, mayEmpty));
    last = written.catch(() => undefined);
    return written;
  };
}

async function readWaiting(file: string): Promise<Map<string, SpooledPost>> {
  const waiting = new Map<string, SpooledPost>();
  for (const text of (await readOrEmpty(file)).split('\n')) {
    const line = parseLine(text);
    if (line?.op === 'add') waiting.set(line.post.resultId, { station: line.station, post: line.post });
    if (line?.op === 'done') waiting.delete(line.resultId);
  }
  return waiting;
}

/** A crash can tear the last line: what was not wholly written was not yet sent. */
function parseLine(text: string): Line | null {
  try {
    return text === '' ? null : (JSON.parse(text) as Line);
  } catch {
    return null;
  }
}

async function readOrEmpty(file: string): Promise<string> {
  try {
    return await readFile(file, 'utf8');
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ENOENT') return '';
    throw error;
  }
}

async function rewrite(file: string, waiting: readonly SpooledPost[]): Promise<void> {
  const lines = waiting.map((spooled) => `${JSON.stringify({ op: 'add', ...spooled })}\n`);
  await writeFile(`${file}.new`, lines.join(''), { mode: 0o600, flush: true });
  await rename(`${file}.new`, file);
}
