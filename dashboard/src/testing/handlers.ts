import { vi } from 'vitest';
import type { Problem } from '@/types/api';

export interface Handler {
  method: string;
  path: string;
  respond: (request: Request, url: URL) => Response | Promise<Response>;
}

/** Answers a request by method and path below /api/v1: `answer('GET', '/today', aToday())`. A function sees the request. */
export function answer(
  method: string,
  path: string,
  body: object | null | ((request: Request, url: URL) => unknown),
  status = 200,
): Handler {
  return {
    method,
    path: `/api/v1${path}`,
    respond: async (request, url) => {
      const content: unknown =
        typeof body === 'function'
          ? await (body as (request: Request, url: URL) => unknown)(request, url)
          : body;
      if (content instanceof Response) return content;
      return status === 204 ? new Response(null, { status }) : Response.json(content, { status });
    },
  };
}

/** Answers with a problem document. */
export function refuse(
  method: string,
  path: string,
  problem: Partial<Problem> & { status: number },
): Handler {
  const body: Problem = {
    type: 'about:blank',
    title: 'Refused',
    code: 'refused',
    detail: 'Refused.',
    ...problem,
  };
  return answer(method, path, body, problem.status);
}

/** Puts these handlers in the network's place. The first that fits answers; a request without one fails the test. */
export function serve(handlers: Handler[]): void {
  vi.stubGlobal('fetch', async (input: Request | string) => {
    const request = typeof input === 'string' ? new Request(new URL(input, window.location.origin)) : input;
    const url = new URL(request.url);
    const handler = handlers.find(({ method, path }) => method === request.method && path === url.pathname);
    if (!handler) throw new Error(`no handler for ${request.method} ${url.pathname}`);
    return handler.respond(request, url);
  });
}
