import { readFileSync } from 'node:fs';
import { join } from 'node:path';

const packageFile = join(__dirname, '../../package.json');

/** This Ampkeep's version, from its package. */
export const ampkeepVersion = (JSON.parse(readFileSync(packageFile, 'utf8')) as { version: string }).version;
