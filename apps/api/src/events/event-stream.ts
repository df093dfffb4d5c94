import { Response } from 'express';

/** One tab that listens: an answer that stays open. */
export class EventStream {
  private isOpen = true;

  constructor(
    private readonly response: Response,
    readonly viewer: { userId: string; sessionId: string },
    readonly takeIds: ReadonlySet<string>,
  ) {
    response.on('close', () => (this.isOpen = false));
    response.set({
      'Content-Type': 'text/event-stream; charset=utf-8',
      'Cache-Control': 'no-cache, no-transform',
      // For nginx, which would hold events back to send them together.
      'X-Accel-Buffering': 'no',
    });
    response.flushHeaders();
    this.write(`retry: ${retryMs}\n\n`);
  }

  send(name: string, data: object): void {
    this.write(`event: ${name}\ndata: ${JSON.stringify(data)}\n\n`);
  }

  /** A comment: keeps proxies from closing a silent line, and shows whether anybody is still there. */
  beat(): void {
    this.write(':\n\n');
  }

  end(): void {
    if (this.isOpen) this.response.end();
    this.isOpen = false;
  }

  private write(text: string): void {
    if (this.isOpen) this.response.write(text);
  }
}

/** How long a browser waits before it connects again. */
const retryMs = 2_000;
