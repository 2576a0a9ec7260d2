import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { OpenAPIObject } from '@nestjs/swagger';
import { parse } from 'yaml';

const document = parse(readFileSync(join(__dirname, '../../../openapi.yaml'), 'utf8')) as OpenAPIObject;
const described = (document.tags ?? []).map(({ name }) => name);
const operations = Object.entries(document.paths).flatMap(([path, item]) =>
  Object.entries(item as Record<string, { tags?: string[] }>).map(([method, { tags }]) => ({
    operation: `${method.toUpperCase()} ${path}`,
    tags: tags ?? [],
  })),
);

describe('the groups of the API docs', () => {
  it.each(operations)('$operation stands in one of them', ({ tags }) => {
    expect(tags).toHaveLength(1);
    expect(described).toContain(tags[0]);
  });

  it('none is empty', () => {
    expect([...new Set(operations.flatMap(({ tags }) => tags))].sort()).toEqual([...described].sort());
  });
});
