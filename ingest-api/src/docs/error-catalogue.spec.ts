import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { errorCatalogue } from './error-catalogue.js';
import { errorsPage } from './errors-page.js';

const sources = readdirSync(join(__dirname, '..'), { recursive: true, encoding: 'utf8' })
  .filter((file) => file.endsWith('.ts') && !file.endsWith('.spec.ts'))
  .map((file) => readFileSync(join(__dirname, '..', file), 'utf8'));

const inAll = (pattern: RegExp): string[] =>
  sources.flatMap((source) => [...source.matchAll(pattern)].map((match) => match[1]!));

/** Codes as the code names them: in errors of their own, in those of a kind, and by bare status. */
const usedCodes = new Set([
  ...inAll(/super\(\s*\d{3},\s*'(\w+)'/g),
  ...inAll(/new AmpkeepError\(\s*\d{3},\s*'(\w+)'/g),
  ...inAll(/new (?:Forbidden|Conflict)Error\(\s*'(\w+)'/g),
  ...inAll(/^\s+\d{3}: \['(\w+)', '[^']+'\],$/gm),
  'internal',
]);

describe('the error catalogue', () => {
  const listed = errorCatalogue.map(({ code }) => code);

  it('explains every code that a caller may meet, and none besides', () => {
    expect([...listed].sort()).toEqual([...usedCodes].sort());
  });

  it('explains each once, with the status it comes with', () => {
    expect(new Set(listed).size).toBe(listed.length);
    for (const { status, meaning, remedy } of errorCatalogue) {
      expect(status).toBeGreaterThanOrEqual(400);
      expect(meaning).not.toBe('');
      expect(remedy).not.toBe('');
    }
  });

  it('is a page on which each code can be linked to', () => {
    const page = errorsPage();
    for (const code of listed) expect(page).toContain(`id="${code}"`);
    expect(page).not.toMatch(/<script|https?:\/\//);
  });
});
