import type { ByteSource } from '../trackSource';

/**
 * Bytes in memory, as a source to read a small file from.
 *
 * @param bytes - not copied
 * @example
 * (await bytesSource(Uint8Array.of(1, 2, 3)).read(1, 9)).length // 2
 */
export function bytesSource(bytes: Uint8Array): ByteSource {
  return {
    sizeBytes: bytes.length,
    read: (start, end) => Promise.resolve(bytes.subarray(start, Math.min(end, bytes.length))),
  };
}
