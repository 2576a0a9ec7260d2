import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { Ajv2020, type ValidateFunction } from 'ajv/dist/2020.js';
import addFormatsModule from 'ajv-formats';
import type { Response } from 'supertest';
import { parse } from 'yaml';

interface Documented {
  paths: Record<
    string,
    Record<string, { responses: Record<string, { content?: Record<string, { schema?: object }> }> }>
  >;
}

const document = parse(readFileSync(join(__dirname, '../../openapi.yaml'), 'utf8')) as Documented;
const ajv = new Ajv2020({ strict: false, allErrors: true, validateFormats: true });
addFormatsModule.default(ajv);
ajv.addSchema(document, 'openapi');
const routes = Object.keys(document.paths).map((template) => ({
  template,
  pattern: new RegExp(`^${template.replace(/\{[^}]+\}/g, '[^/]+')}$`),
}));
const checks = new Map<string, ValidateFunction>();
const escapePart = (part: string): string =>
  encodeURIComponent(part.replaceAll('~', '~0').replaceAll('/', '~1'));

/** Fails unless the answer is one that openapi.yaml names: status, content type and body. */
export function expectDocumented(response: Response): void {
  const { method, path } = response.request as unknown as { method: string; url: string; path?: string };
  const url = new URL((response.request as unknown as { url: string }).url);
  void path;
  if (!url.pathname.startsWith('/api/')) return;
  const route = routes
    .filter(({ pattern }) => pattern.test(url.pathname))
    .sort((a, b) => a.template.split('{').length - b.template.split('{').length)[0];
  const operation = route && document.paths[route.template]?.[method.toLowerCase()];
  if (route === undefined || operation === undefined) {
    if (response.status === 404) return; // No such route: nothing to document.
    throw new Error(`${method} ${url.pathname} is not in openapi.yaml`);
  }
  const documented = operation.responses[String(response.status)];
  if (documented === undefined)
    throw new Error(
      `${method} ${route.template} answered ${response.status}, which openapi.yaml doesn't name`,
    );
  const contentType = response.headers['content-type']?.split(';')[0];
  if (documented.content === undefined) return;
  if (contentType === undefined || documented.content[contentType]?.schema === undefined) {
    throw new Error(
      `${method} ${route.template} ${response.status} answered ${contentType}, documented: ${Object.keys(documented.content).join(', ')}`,
    );
  }
  const pointer = [
    'paths',
    route.template,
    method.toLowerCase(),
    'responses',
    String(response.status),
    'content',
    contentType,
    'schema',
  ];
  const reference = `openapi#/${pointer.map(escapePart).join('/')}`;
  const check = checks.get(reference) ?? ajv.compile({ $ref: reference });
  checks.set(reference, check);
  const body: unknown = response.text === '' ? undefined : JSON.parse(response.text);
  if (!check(body))
    throw new Error(`${method} ${route.template} ${response.status}: ${ajv.errorsText(check.errors)}`);
}
