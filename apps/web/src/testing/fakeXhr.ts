import { act } from '@testing-library/react';

const settled = (event: () => void) =>
  act(async () => {
    event();
    await Promise.resolve();
  });

/** One upload as the test sees it: what was sent, and what becomes of it. */
export class FakeUpload {
  readonly headers: Record<string, string> = {};
  readonly upload: { onprogress: ((event: { loaded: number; total: number }) => void) | null } = {
    onprogress: null,
  };
  onload: (() => void) | null = null;
  onerror: (() => void) | null = null;
  onabort: (() => void) | null = null;
  status = 0;
  responseText = '';
  aborted = false;
  opened = '';
  form: FormData | null = null;

  open(method: string, path: string) {
    this.opened = `${method} ${path}`;
  }
  setRequestHeader(name: string, value: string) {
    this.headers[name] = value;
  }
  send(form: FormData) {
    this.form = form;
  }
  abort() {
    this.aborted = true;
    this.onabort?.();
  }

  async progress(loaded: number, total: number) {
    await settled(() => this.upload.onprogress?.({ loaded, total }));
  }
  async answer(status: number, json: unknown) {
    this.status = status;
    this.responseText = JSON.stringify(json);
    await settled(() => this.onload?.());
  }
  async loseConnection() {
    await settled(() => this.onerror?.());
  }
}

/** Puts uploads that the test drives in place of XMLHttpRequest. */
export function fakeUploads(): FakeUpload[] {
  const sent: FakeUpload[] = [];
  globalThis.XMLHttpRequest = class extends FakeUpload {
    constructor() {
      super();
      sent.push(this);
    }
  } as unknown as typeof XMLHttpRequest;
  return sent;
}
