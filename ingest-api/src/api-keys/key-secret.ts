import { createHash, randomBytes, randomInt, timingSafeEqual } from 'node:crypto';

const PREFIX_ALPHABET = 'abcdefghijkmnpqrstuvwxyz23456789';
const KEY_FORM = /^amk_([a-z0-9]{8})_([A-Za-z0-9_-]{43})$/;

export interface NewKey {
  /** What the station sends; shown once. */
  key: string;
  prefix: string;
  secretHash: string;
}

export const hashSecret = (secret: string): string => createHash('sha256').update(secret).digest('hex');

/** A key `amk_<prefix>_<secret>`: a public prefix of 8 characters and a random secret of 256 bits. */
export function createKey(): NewKey {
  const prefix = Array.from({ length: 8 }, () => PREFIX_ALPHABET[randomInt(PREFIX_ALPHABET.length)]).join('');
  const secret = randomBytes(32).toString('base64url');
  return { key: `amk_${prefix}_${secret}`, prefix, secretHash: hashSecret(secret) };
}

/** Splits a key into prefix and secret; null when it isn't one. */
export function splitKey(key: string): { prefix: string; secret: string } | null {
  const match = KEY_FORM.exec(key);
  return match === null ? null : { prefix: match[1]!, secret: match[2]! };
}

/** Compares in a time that doesn't tell how much was right. */
export function matchesSecret(secret: string, secretHash: string): boolean {
  return timingSafeEqual(Buffer.from(hashSecret(secret), 'hex'), Buffer.from(secretHash, 'hex'));
}
