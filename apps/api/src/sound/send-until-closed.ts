import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { Response } from 'express';

/** Streams an answer; for HEAD only its headers. A listener who goes away in the middle is no error: players do it at every jump. */
export async function sendUntilClosed(bytes: AsyncIterable<Uint8Array>, response: Response): Promise<void> {
  if (response.req.method === 'HEAD') {
    response.end();
    return;
  }
  try {
    await pipeline(Readable.from(bytes), response);
  } catch (error) {
    if (!response.closed && !response.destroyed) throw error;
    if ((error as NodeJS.ErrnoException).code !== 'ERR_STREAM_PREMATURE_CLOSE') throw error;
  }
}
