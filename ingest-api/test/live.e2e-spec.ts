import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { signIn } from './accounts.builder.js';
import { storeFails } from './breaches.builder.js';
import { createTestApp, emailOf, type TestApp, testPassword } from './create-test-app.js';

describe('the live stream', () => {
  let test: TestApp;

  beforeEach(async () => {
    test = await createTestApp();
    stopped = null;
  });
  afterEach(() => stop());

  let stopped: Promise<void> | null = null;
  const stop = () => (stopped ??= test.close());
  const server = (): Server => test.app.getHttpServer();
  const signedIn = () => signIn(server(), emailOf('viewer'), testPassword);

  async function follow(headers: Record<string, string>): Promise<Response> {
    const { port } = server().address() as AddressInfo;
    return fetch(`http://127.0.0.1:${port}/api/v1/live`, { headers });
  }

  /** Reads on until the stream has brought what is waited for. */
  function reading(response: Response): (wanted: string) => Promise<string> {
    const reader = response.body!.pipeThrough(new TextDecoderStream()).getReader();
    let received = '';
    return async (wanted) => {
      while (!received.includes(wanted)) {
        const { done, value } = await reader.read();
        if (done) throw new Error(`The stream ended before "${wanted}" came`);
        received += value;
      }
      return received;
    };
  }

  it('pings at once and brings a breach as it opens', async () => {
    const response = await follow(await signedIn());
    expect(response.headers.get('content-type')).toMatch(/^text\/event-stream/);
    const readUntil = reading(response);
    expect(await readUntil('event: ping')).not.toContain('breaches');
    await storeFails(test.app, test.clock.now, [{}]);
    expect(await readUntil('data: {"topic":"breaches","id":"1"}')).toMatch(/event: ping/);
  });

  it('is for signed-in people', async () => {
    const response = await follow({});
    expect(response.status).toBe(401);
    await response.body?.cancel();
  });

  it('ends when the server stops', async () => {
    const readUntil = reading(await follow(await signedIn()));
    await readUntil('event: ping');
    await Promise.all([stop(), expect(readUntil('event: never')).rejects.toThrow('The stream ended')]);
  });
});
