import { readFile } from 'node:fs/promises';
import { stations } from '../circuit/stations.js';
import { UsageError } from './parse-options.js';

/**
 * Reads the API keys of the first stations of the line. Never puts a key into a message.
 * @throws UsageError when the file can't be read or a station has no key in it
 */
export async function readKeyFile(file: string, stationCount: number): Promise<Record<string, string>> {
  const keys = parseKeys(file, await readText(file));
  const missing = stations
    .slice(0, stationCount)
    .map((facts) => facts.station)
    .filter((name) => !keys[name]);
  if (missing.length > 0) throw new UsageError(`${file} holds no key for ${missing.join(', ')}`);
  return keys;
}

async function readText(file: string): Promise<string> {
  try {
    return await readFile(file, 'utf8');
  } catch (error) {
    const code = (error as NodeJS.ErrnoException).code;
    throw new UsageError(`--key-file ${file} can't be read${code ? ` (${code})` : ''}`);
  }
}

function parseKeys(file: string, text: string): Record<string, string> {
  const parsed = parseJson(text);
  if (typeof parsed === 'object' && parsed !== null && !Array.isArray(parsed)) {
    const entries = Object.entries(parsed);
    if (entries.every((entry): entry is [string, string] => typeof entry[1] === 'string')) {
      return Object.fromEntries(entries);
    }
  }
  throw new UsageError(`${file} must hold JSON such as { "north-1": "amk_…" }`);
}

function parseJson(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return null;
  }
}
