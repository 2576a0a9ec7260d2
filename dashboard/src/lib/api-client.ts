import createFetchClient, { type Middleware } from 'openapi-fetch';
import createQueryClient from 'openapi-react-query';
import type { Problem } from '@/types/api';
import type { paths } from '@/types/api.generated';
import { ApiError } from './api-error';

const throwProblems: Middleware = {
  async onResponse({ response }) {
    if (response.ok) return undefined;
    throw new ApiError(await readProblem(response));
  },
  onError() {
    return new ApiError({
      code: 'unreachable',
      status: 0,
      detail: 'The server does not answer. Check the network; this page tries again by itself.',
    });
  },
};

async function readProblem(response: Response): Promise<Problem> {
  const fallback: Problem = {
    type: 'about:blank',
    title: response.statusText,
    status: response.status,
    code: `http${response.status}`,
    detail: `The server answered ${response.status} and gave no reason.`,
  };
  try {
    return { ...fallback, ...((await response.json()) as Partial<Problem>) };
  } catch {
    return fallback;
  }
}

/** Typed requests; every answer that is not 2xx is thrown as an `ApiError`. */
export const api = createFetchClient<paths>({
  baseUrl: window.location.origin,
  fetch: (request) => globalThis.fetch(request),
});
api.use(throwProblems);

/** The same requests as query options and mutations: `$api.queryOptions('get', '/api/v1/today')`. */
export const $api = createQueryClient(api);
