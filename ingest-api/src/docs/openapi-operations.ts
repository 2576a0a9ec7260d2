import type { OpenAPIObject } from '@nestjs/swagger';
import { type Access, rights } from '../auth/rights.js';
import { problemResponse } from '../common/api-problems.decorator.js';

type PathItem = OpenAPIObject['paths'][string];
type Operation = NonNullable<PathItem['get']>;
type SecurityRequirement = NonNullable<Operation['security']>[number];

const methods = ['get', 'post', 'put', 'patch', 'delete'] as const;

/**
 * Adds to every operation what follows from its nature: who may use it, by the table of rights, and the problems
 * that any request of its kind may meet before or behind its handler.
 * @throws Error for an operation that the table of rights lacks.
 */
export function completeOperations(document: OpenAPIObject): OpenAPIObject {
  const paths = Object.entries(document.paths).map(
    ([path, item]) => [path, completeItem(path, item)] as const,
  );
  return { ...document, paths: Object.fromEntries(paths) };
}

function completeItem(path: string, item: PathItem): PathItem {
  const completed = { ...item };
  for (const method of methods) {
    const operation = item[method];
    if (operation !== undefined) completed[method] = completeOperation(method, path, operation);
  }
  return completed;
}

function completeOperation(method: string, path: string, operation: Operation): Operation {
  const problems = problemsOf(method, operation).map((status) => [status, problemResponse(status)] as const);
  return {
    ...operation,
    security: securityOf(accessOf(method, path)),
    responses: { ...Object.fromEntries(problems), ...operation.responses },
  };
}

function accessOf(method: string, path: string): Access {
  const route = `${method.toUpperCase()} ${path.replace(/\{(\w+)\}/g, ':$1')}`;
  const access = (rights as Record<string, Access | undefined>)[route];
  if (access === undefined) throw new Error(`The table of rights lacks ${route}`);
  return access;
}

/** Each entry is enough by itself; none at all: anyone. */
function securityOf({ station, roles }: Access): SecurityRequirement[] {
  return [...(station ? [{ stationKey: [] }] : []), ...(roles ? [{ session: [] }] : [])];
}

function problemsOf(method: string, { parameters = [], requestBody }: Operation): number[] {
  const places = parameters.flatMap((parameter) => ('in' in parameter ? parameter.in : []));
  return [
    ...(places.includes('path') ? [400] : []),
    ...(places.includes('query') ? [422] : []),
    ...(requestBody === undefined ? [] : [400, 413, 415, 422]),
    ...(method === 'get' ? [] : [503]),
  ];
}
