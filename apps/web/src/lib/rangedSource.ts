import type { ByteSource } from '@thudline/dsp';
import { requestBytes } from './apiClient';

/** A header and what follows it at once. */
const firstBytes = 4096;

/**
 * A file of the server that is read in stretches, so that an hour-long one need not be fetched whole. The stretch read
 * last is kept: two channels of one file lie in the same bytes.
 *
 * @throws {Error} the server says nothing of the file's size
 */
export async function rangedSource(path: string, signal: AbortSignal): Promise<ByteSource> {
  const { bytes: head, headers } = await requestBytes(path, { signal, range: { start: 0, end: firstBytes } });
  const sizeBytes = sizeOf(headers, head.length);
  let last = { start: 0, end: head.length, bytes: Promise.resolve(head) };
  return {
    sizeBytes,
    async read(start, end) {
      const stop = Math.min(end, sizeBytes);
      if (stop <= start) return new Uint8Array();
      if (stop <= head.length) return head.subarray(start, stop);
      if (start < last.start || stop > last.end) {
        const asked = requestBytes(path, { signal, range: { start, end: stop } });
        last = { start, end: stop, bytes: asked.then(({ bytes }) => bytes) };
      }
      const { bytes, start: from } = last;
      return (await bytes).subarray(start - from, stop - from);
    },
  };
}

/** "bytes 0-4095/9600044", or the whole file where the server answers with all of it. */
function sizeOf(headers: Headers, length: number): number {
  const range = headers.get('Content-Range');
  if (!range) return length;
  const size = Number(/\/(\d+)$/.exec(range)?.[1]);
  if (!Number.isSafeInteger(size)) throw new Error(`The server does not say how long its file is: ${range}`);
  return size;
}
