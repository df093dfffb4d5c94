import type { ByteSource } from '../trackSource';

/**
 * Bytes in memory, as a source to read a small file from.
 *
 * @param bytes - not copied
 */
export function bytesSource(bytes: Uint8Array): ByteSource {
  return {
    sizeBytes: bytes.length,
    read: (start, end) => Promise.resolve(bytes.subarray(start, Math.min(end, bytes.length))),
  };
}
