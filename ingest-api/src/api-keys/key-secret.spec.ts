import { createHash } from 'node:crypto';
import { createKey, hashSecret, matchesSecret, splitKey } from './key-secret.js';

describe('an API key', () => {
  it('is a public prefix of eight characters and a secret of 256 bits', () => {
    const { key, prefix, secretHash } = createKey();
    expect(key).toMatch(/^amk_[a-z2-9]{8}_[A-Za-z0-9_-]{43}$/);
    const parts = splitKey(key)!;
    expect(parts.prefix).toBe(prefix);
    expect(Buffer.from(parts.secret, 'base64url')).toHaveLength(32);
    expect(secretHash).toBe(createHash('sha256').update(parts.secret).digest('hex'));
    expect(key).not.toContain(secretHash);
  });

  it('is never the same twice', () => {
    const keys = Array.from({ length: 200 }, () => createKey());
    expect(new Set(keys.map(({ prefix }) => prefix)).size).toBe(200);
    expect(new Set(keys.map(({ secretHash }) => secretHash)).size).toBe(200);
  });

  it('is known again by its secret alone', () => {
    const { secretHash, key } = createKey();
    const { secret } = splitKey(key)!;
    expect(matchesSecret(secret, secretHash)).toBe(true);
    const near = secret.slice(0, -1) + (secret.endsWith('A') ? 'E' : 'A');
    expect(matchesSecret(near, secretHash)).toBe(false);
    expect(matchesSecret('', secretHash)).toBe(false);
    expect(matchesSecret(hashSecret(secret), secretHash)).toBe(false);
  });

  it.each([
    '',
    'amk_',
    'amk_k7m2p9qx',
    `amk_k7m2p9qx_${'x'.repeat(42)}`,
    `amk_k7m2p9qx_${'x'.repeat(44)}`,
    ` amk_k7m2p9qx_${'x'.repeat(43)}`,
    `amk_k7m2p9qx_${'x'.repeat(43)}\n`,
    `AMK_k7m2p9qx_${'x'.repeat(43)}`,
    `amk_k7m2p9qx_${'é'.repeat(43)}`,
  ])('has one form: %j is none', (text) => {
    expect(splitKey(text)).toBeNull();
  });
});
