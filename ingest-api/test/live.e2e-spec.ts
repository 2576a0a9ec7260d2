import type { AddressInfo } from 'node:net';
import { addAccount, signIn } from './accounts.builder.js';
import { createTestApp } from './breaches-app.js';
import { addLine, storeFails } from './breaches.builder.js';

describe('the live stream', () => {
  let test: Awaited<ReturnType<typeof createTestApp>>;

  beforeEach(async () => {
    test = await createTestApp();
    await addLine(test.app);
    await addAccount(test.app);
  });
  afterEach(() => test.close());

  async function follow(headers: Record<string, string>): Promise<Response> {
    const { port } = test.server.address() as AddressInfo;
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
    const response = await follow(await signIn(test.server, 'viewer@fernhollow.example'));
    expect(response.headers.get('content-type')).toMatch(/^text\/event-stream/);
    const readUntil = reading(response);
    expect(await readUntil('event: ping')).not.toContain('breaches');
    await storeFails(test.app, test.time.now, [{}]);
    expect(await readUntil('data: {"topic":"breaches","id":"1"}')).toMatch(/event: ping/);
  });

  it('is for signed-in people', async () => {
    const response = await follow({});
    expect(response.status).toBe(401);
    await response.body?.cancel();
  });

  it('ends when the server stops', async () => {
    const readUntil = reading(await follow(await signIn(test.server, 'viewer@fernhollow.example')));
    await readUntil('event: ping');
    await Promise.all([test.close(), expect(readUntil('event: never')).rejects.toThrow('The stream ended')]);
  });
});
