import type { ByteSource } from '../trackSource';

/** Bytes fetched at once: a header with its usual chunks takes one read from a disk, an object or a browser's File. */
const windowBytes = 64 * 1024;

/** Small reads anywhere in a source, served from the last window fetched. */
export interface ByteWindow {
  readonly sizeBytes: number;
  /** @returns up to `length` bytes from `start`; fewer at the end of the source */
  at(start: number, length: number): Promise<DataView>;
}

/**
 * Reads ahead, so that walking over many small chunks costs few reads of the source.
 *
 * @param source - never read past its end
 */
export function byteWindow(source: ByteSource): ByteWindow {
  let windowStart = 0;
  let bytes = new Uint8Array(0);

  return {
    sizeBytes: source.sizeBytes,
    async at(start, length) {
      const end = Math.min(start + length, source.sizeBytes);
      if (end <= start) return new DataView(new ArrayBuffer(0));
      if (start < windowStart || end > windowStart + bytes.length) {
        bytes = (
          await source.read(start, Math.min(start + Math.max(length, windowBytes), source.sizeBytes))
        ).slice();
        windowStart = start;
      }
      const from = start - windowStart;
      const available = Math.max(0, Math.min(end - start, bytes.length - from));
      return new DataView(bytes.buffer, bytes.byteOffset + from, available);
    },
  };
}

/** @returns `length` bytes as one character each, fewer at the end of the view */
export function ascii(view: DataView, offset: number, length: number): string {
  let text = '';
  for (let i = offset; i < Math.min(offset + length, view.byteLength); i++) {
    text += String.fromCharCode(view.getUint8(i));
  }
  return text;
}
