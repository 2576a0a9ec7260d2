import { applyDecorators } from '@nestjs/common';
import { ApiExtraModels, ApiResponse, getSchemaPath } from '@nestjs/swagger';
import { ProblemDto } from './problem.dto.js';

const meanings: Record<number, string> = {
  400: 'Not readable as what it should be',
  401: 'Not signed in, or no known API key',
  403: 'Not allowed',
  404: "Doesn't exist",
  409: 'In conflict with what is stored',
  413: 'Too large',
  415: 'Content type not read here',
  422: 'Readable, but not valid; see `errors`',
  429: 'Too many requests; wait as `Retry-After` says',
  503: "Can't be stored now; send again as `Retry-After` says",
};

/** How OpenAPI tells of a problem document of this status. */
export const problemResponse = (status: number) => ({
  description: meanings[status] ?? 'Problem',
  content: { 'application/problem+json': { schema: { $ref: getSchemaPath(ProblemDto) } } },
});

/** Documents the problem documents an operation may answer with. 401, 403 and 429 are told everywhere. */
export function ApiProblems(...statuses: number[]): MethodDecorator & ClassDecorator {
  const all = [...new Set([...statuses, 401, 403, 429])].sort((a, b) => a - b);
  return applyDecorators(
    ApiExtraModels(ProblemDto),
    ...all.map((status) => ApiResponse({ status, ...problemResponse(status) })),
  );
}
