import '@testing-library/jest-dom';
import { ReadableStream, TransformStream } from 'node:stream/web';
import { TextDecoder, TextEncoder } from 'node:util';

/** jsdom lacks these; Chakra and our hooks need them. */
class NoResizeObserver {
  observe() {}
  unobserve() {}
  disconnect() {}
}

/** The router makes one for every navigation and reads only these of it. */
class NavigationRequest {
  readonly url: string;
  readonly method: string;
  readonly signal: AbortSignal | null;
  constructor(url: string | URL, { method = 'GET', signal = null }: RequestInit = {}) {
    this.url = String(url);
    this.method = method;
    this.signal = signal;
  }
}

Object.assign(globalThis, {
  Request: NavigationRequest,
  TextEncoder,
  TextDecoder,
  ReadableStream,
  TransformStream,
  structuredClone:
    globalThis.structuredClone ?? ((value: unknown) => JSON.parse(JSON.stringify(value)) as unknown),
  ResizeObserver: NoResizeObserver,
});
const noMedia = (query: string) => ({
  matches: false,
  media: query,
  onchange: null,
  addEventListener() {},
  removeEventListener() {},
  dispatchEvent: () => false,
});
if (!('matchMedia' in window)) Object.assign(window, { matchMedia: noMedia });

/** jsdom knows the element, but not how to open it. */
const opening = (open: boolean) =>
  function (this: HTMLDialogElement) {
    this.open = open;
  };
if (!('showModal' in HTMLDialogElement.prototype))
  Object.assign(HTMLDialogElement.prototype, { showModal: opening(true), close: opening(false) });

function readWhole(this: Blob) {
  return new Promise<ArrayBuffer>((resolve, reject) => {
    const reader = new FileReader();
    reader.onload = () => resolve(reader.result as ArrayBuffer);
    reader.onerror = () => reject(new Error('The blob could not be read.'));
    reader.readAsArrayBuffer(this);
  });
}
if (!('arrayBuffer' in Blob.prototype)) Object.assign(Blob.prototype, { arrayBuffer: readWhole });
