type Listener = (event: MessageEvent<string>) => void;

/** An event stream driven by the test: `FakeEventSource.latest().send({ topic: 'results', id: null })`. */
export class FakeEventSource {
  static opened: FakeEventSource[] = [];

  static latest(): FakeEventSource {
    const source = FakeEventSource.opened.at(-1);
    if (!source) throw new Error('no event stream was opened');
    return source;
  }

  static reset(): void {
    FakeEventSource.opened = [];
  }

  readonly url: string;
  isClosed = false;
  onopen: (() => void) | null = null;
  onmessage: Listener | null = null;
  onerror: (() => void) | null = null;
  private readonly listeners = new Map<string, Listener>();

  constructor(url: string) {
    this.url = url;
    FakeEventSource.opened.push(this);
  }

  addEventListener(type: string, listener: Listener): void {
    this.listeners.set(type, listener);
  }

  close(): void {
    this.isClosed = true;
  }

  open(): void {
    this.onopen?.();
  }

  send(event: { topic: string; id: string | null }): void {
    this.onmessage?.(new MessageEvent('message', { data: JSON.stringify(event) }));
  }

  break(): void {
    this.onerror?.();
  }
}
