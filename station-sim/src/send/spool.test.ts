import { appendFile, readFile } from 'node:fs/promises';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { aPost, withTemporaryFile } from '../testing/builders.js';
import { openSpool } from './spool.js';

const spooled = (resultId: string) => ({ station: 'north-1', post: aPost({ resultId }) });

describe('the spool', () => {
  it('gives back what was added and not removed, in order', () =>
    withTemporaryFile('spool.ndjson', async (file) => {
      const spool = await openSpool(file);
      for (const id of ['a', 'b', 'c']) await spool.add(spooled(id));
      await spool.remove('b');
      await spool.close();

      const again = await openSpool(file);
      expect(again.leftOver).toEqual([spooled('a'), spooled('c')]);
      await again.close();
    }));

  it('has a post on disk as soon as adding it resolves', () =>
    withTemporaryFile('spool.ndjson', async (file) => {
      const spool = await openSpool(file);
      await spool.add(spooled('a'));
      expect(await readFile(file, 'utf8')).toContain('"resultId":"a"');
      await spool.close();
    }));

  it('passes over a last line that a crash tore', () =>
    withTemporaryFile('spool.ndjson', async (file) => {
      const spool = await openSpool(file);
      await spool.add(spooled('a'));
      await spool.close();
      await appendFile(file, '{"op":"add","station":"north-1","post":{"resul');

      const again = await openSpool(file);
      expect(again.leftOver).toEqual([spooled('a')]);
      await again.add(spooled('b'));
      await again.close();
      const third = await openSpool(file);
      expect(third.leftOver).toEqual([spooled('a'), spooled('b')]);
      await third.close();
    }));

  it('holds exactly what was added and not removed, whatever the order', () =>
    fc.assert(
      fc.asyncProperty(fc.array(fc.tuple(fc.boolean(), fc.integer({ min: 0, max: 5 }))), (steps) =>
        withTemporaryFile('spool.ndjson', async (file) => {
          const expected = new Set<string>();
          const spool = await openSpool(file);
          await Promise.all(
            steps.map(([add, number]) => {
              if (add) expected.add(String(number));
              else expected.delete(String(number));
              return add ? spool.add(spooled(String(number))) : spool.remove(String(number));
            }),
          );
          await spool.close();
          const again = await openSpool(file);
          expect(new Set(again.leftOver.map((left) => left.post.resultId))).toEqual(expected);
          await again.close();
        }),
      ),
      { numRuns: 20 },
    ));
});
