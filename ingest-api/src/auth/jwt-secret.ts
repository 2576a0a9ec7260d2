import { randomBytes } from 'node:crypto';
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

const LEAST_CHARACTERS = 43;

function readIfThere(file: string): string | null {
  try {
    return readFileSync(file, 'utf8').trim();
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ENOENT') return null;
    throw error;
  }
}

/**
 * The secret that signs session tokens: 384 random bits, made at the first start and kept beside the
 * database in a file only its owner may read. Deleting the file signs everybody out.
 * @throws Error when the file holds too little to be a secret.
 */
export function jwtSecret(dataDir: string): string {
  const file = join(dataDir, 'jwt-secret');
  let secret = readIfThere(file);
  if (secret === null) {
    mkdirSync(dataDir, { recursive: true, mode: 0o700 });
    secret = randomBytes(48).toString('base64url');
    // `wx`: two processes that start together must not sign with different secrets.
    writeFileSync(file, `${secret}\n`, { flag: 'wx', mode: 0o600 });
  }
  if (secret.length < LEAST_CHARACTERS) {
    throw new Error(`${file} is damaged: delete it and start again. Everybody then signs in anew.`);
  }
  return secret;
}
