import { createServer, type IncomingHttpHeaders } from 'node:http';
import type { AddressInfo } from 'node:net';
import { text } from 'node:stream/consumers';

export interface CannedAnswer {
  status: number;
  body?: unknown;
  headers?: Record<string, string>;
}

export interface ReceivedPost {
  path: string | undefined;
  headers: IncomingHttpHeaders;
  body: { resultId: string };
}

export interface LocalHub {
  url: string;
  received: ReceivedPost[];
  close(): Promise<void>;
}

/** An HTTP server on loopback that gives the canned answers in turn, then the last one for ever. */
export async function startLocalHub(...answers: [CannedAnswer, ...CannedAnswer[]]): Promise<LocalHub> {
  const received: ReceivedPost[] = [];
  const server = createServer((request, response) => {
    void text(request).then((body) => {
      received.push({
        path: request.url,
        headers: request.headers,
        body: JSON.parse(body) as ReceivedPost['body'],
      });
      const answer = answers[Math.min(received.length, answers.length) - 1] ?? answers[0];
      response.writeHead(answer.status, { 'content-type': 'application/json', ...answer.headers });
      response.end(typeof answer.body === 'string' ? answer.body : JSON.stringify(answer.body ?? {}));
    });
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  return {
    url: `http://127.0.0.1:${(server.address() as AddressInfo).port}`,
    received,
    close: () =>
      new Promise((resolve) => {
        server.close(() => resolve());
        server.closeAllConnections();
      }),
  };
}
