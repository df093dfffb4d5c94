import { eventNames } from '@thudline/contracts';
import { act } from '@testing-library/react';

/** A stream of the server's events as the test sees it: what was asked for, and what it tells. */
export class FakeStream {
  static readonly CONNECTING = 0;
  static readonly OPEN = 1;
  static readonly CLOSED = 2;
  onopen: (() => void) | null = null;
  onerror: (() => void) | null = null;
  readyState: number = FakeStream.CONNECTING;
  private readonly listeners = new Map<string, (event: { data: string }) => void>();

  constructor(readonly url: string) {}

  addEventListener(name: string, listener: (event: { data: string }) => void) {
    this.listeners.set(name, listener);
  }
  close() {
    this.readyState = FakeStream.CLOSED;
  }

  async open() {
    this.readyState = FakeStream.OPEN;
    await settled(() => this.onopen?.());
  }
  /** What a server that has no such stream, or ended the session, makes of it. */
  async refuse() {
    this.readyState = FakeStream.CLOSED;
    await settled(() => this.onerror?.());
  }
  async tell(name: keyof typeof eventNames, value: unknown) {
    await settled(() => this.listeners.get(eventNames[name])?.({ data: JSON.stringify(value) }));
  }
}

const settled = (event: () => void) =>
  act(async () => {
    event();
    await Promise.resolve();
  });

/** Puts streams that the test drives in place of the browser's; `restore` takes them away again. */
export function fakeEvents(): { streams: FakeStream[]; restore: () => void } {
  const streams: FakeStream[] = [];
  const before = globalThis.EventSource as typeof EventSource | undefined;
  globalThis.EventSource = class extends FakeStream {
    constructor(url: string) {
      super(url);
      streams.push(this);
    }
  } as unknown as typeof EventSource;
  return {
    streams,
    restore: () => {
      if (before) globalThis.EventSource = before;
      else Reflect.deleteProperty(globalThis, 'EventSource');
    },
  };
}
