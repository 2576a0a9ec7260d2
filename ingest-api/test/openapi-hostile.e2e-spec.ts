import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import type TestAgent from 'supertest/lib/agent.js';
import { parse } from 'yaml';
import { createTestApp, type TestApp } from './create-test-app.js';

interface Schema {
  $ref?: string;
  properties?: Record<string, Schema>;
  type?: string | string[];
}
interface Operation {
  requestBody?: { content: Record<string, { schema?: Schema }> };
}
const document = parse(readFileSync(join(__dirname, '../../openapi.yaml'), 'utf8')) as {
  paths: Record<string, Record<string, Operation>>;
  components: { schemas: Record<string, Schema> };
};
const operations = Object.entries(document.paths).flatMap(([path, item]) =>
  Object.entries(item)
    // A stream never ends, and signing out would end the test's own session.
    .filter(([method]) => path !== '/api/v1/live' && method !== 'delete')
    .map(([method, operation]) => ({ route: `${method} ${path}`, method, path, operation })),
);

const oddTexts = [
  '%00',
  '%27%3B--',
  '%F0%9F%94%A9',
  '%2e%2e%2f',
  '-1',
  '1e309',
  '99999999999999999999',
  'x'.repeat(3000),
  '%25',
  '[object%20Object]',
  '__proto__',
  'null',
];
const oddValues: unknown[] = [
  '\u0000',
  'a\u0000@b.example',
  '\ud800',
  "'; DROP TABLE users; --",
  'x'.repeat(5000),
  '',
  '   ',
  1e308,
  -1,
  true,
  null,
  [],
  {},
  { $ne: 1 },
  ['a'],
  '2027-01-01T00:00:00Z',
];

describe('every operation of the API, asked badly', () => {
  let test: TestApp;
  let administrator: TestAgent;
  beforeAll(async () => {
    test = await createTestApp();
    administrator = await test.as('administrator');
  });
  afterAll(() => test.close());

  const call = (method: string, path: string) =>
    (administrator as unknown as Record<string, TestAgent['get']>)[method]!(path);
  const propertiesOf = ({ requestBody }: Operation): string[] => {
    const schema = requestBody?.content['application/json']?.schema ?? {};
    const named =
      schema.$ref === undefined ? schema : document.components.schemas[schema.$ref.split('/').at(-1)!]!;
    return Object.keys(named.properties ?? {});
  };

  it.each(operations.filter(({ path }) => path.includes('{')))(
    '$route answers odd addresses in words',
    async ({ method, path }) => {
      for (const text of oddTexts) {
        const { status } = await call(method, path.replace(/\{\w+\}/g, text)).send(
          method === 'get' ? undefined : {},
        );
        expect([text.slice(0, 20), status < 500]).toEqual([text.slice(0, 20), true]);
      }
    },
  );

  it.each(operations.filter(({ operation }) => operation.requestBody))(
    '$route answers odd bodies in words',
    async ({ method, path, operation }) => {
      const address = path.replace(/\{\w+\}/g, '1');
      const names = propertiesOf(operation);
      for (const value of oddValues) {
        const body = JSON.stringify(Object.fromEntries(names.map((name) => [name, value])));
        const { status } = await call(method, address).type('json').send(body);
        expect([body.slice(0, 60), status < 500]).toEqual([body.slice(0, 60), true]);
      }
      for (const text of [
        '',
        '{',
        '[]',
        'null',
        '"x"',
        '{"__proto__":{"a":1}}',
        `{"a":"${'x'.repeat(200_000)}"}`,
      ]) {
        const { status } = await call(method, address).type('json').send(text);
        expect([text.slice(0, 20), status < 500]).toEqual([text.slice(0, 20), true]);
      }
      for (const type of ['text/plain', 'application/json; charset=utf-7', 'application/xml']) {
        const { status } = await call(method, address).set('Content-Type', type).send('{}');
        expect([type, status < 500]).toEqual([type, true]);
      }
    },
  );
});
