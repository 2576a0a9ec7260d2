import { mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { jwtSecret } from './jwt-secret.js';

describe('the secret that signs session tokens', () => {
  let dataDir: string;
  beforeEach(() => (dataDir = mkdtempSync(join(tmpdir(), 'ampkeep-secret-'))));
  afterEach(() => rmSync(dataDir, { recursive: true }));

  it('is made once, kept for its owner alone, and differs from site to site', () => {
    const secret = jwtSecret(dataDir);
    expect(jwtSecret(dataDir)).toBe(secret);
    expect(readFileSync(join(dataDir, 'jwt-secret'), 'utf8').trim()).toBe(secret);
    expect(statSync(join(dataDir, 'jwt-secret')).mode & 0o777).toBe(0o600);
    expect(jwtSecret(join(dataDir, 'another-site'))).not.toBe(secret);
  });

  it('is refused when the file was cut short', () => {
    writeFileSync(join(dataDir, 'jwt-secret'), '');
    expect(() => jwtSecret(dataDir)).toThrow(/delete it and start again/);
  });
});
