import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { Response } from 'express';

/** Streams an answer; for HEAD only its headers. A listener who goes away in the middle is no error: players do it at every jump. */
export async function sendUntilClosed(bytes: AsyncIterable<Uint8Array>, response: Response): Promise<void> {
  // Not wrapped again: what wraps a stream that is never read leaves it open, and with it a connection to the store.
  const source = bytes instanceof Readable ? bytes : Readable.from(bytes);
  if (response.req.method === 'HEAD') {
    source.destroy();
    response.end();
    return;
  }
  try {
    await pipeline(source, response);
  } catch (error) {
    if (!response.closed && !response.destroyed) throw error;
    if ((error as NodeJS.ErrnoException).code !== 'ERR_STREAM_PREMATURE_CLOSE') throw error;
  } finally {
    source.destroy();
  }
}
