import { Request, Response } from 'express';
import { byteRange } from './byte-range';
import { ListenWav } from './listen-wav';
import { sendUntilClosed } from './send-until-closed';

/** Answers are asked for again each time, so that a take that was deleted or hidden can't be heard from a cache. */
export const soundCacheControl = 'private, no-cache';

/** Sends a WAV that is made while it is sent, or the one range of it that was asked for. */
export async function sendWav(
  { wav, etag }: { wav: ListenWav; etag: string },
  request: Request,
  response: Response,
): Promise<void> {
  response
    .set({ 'Cache-Control': soundCacheControl, ETag: etag, 'Accept-Ranges': 'bytes' })
    .type('audio/wav');
  if (request.fresh) {
    response.status(304).end();
    return;
  }
  const isSameSound = [undefined, etag].includes(request.get('If-Range'));
  const range = isSameSound ? byteRange(request.get('Range'), wav.sizeBytes) : null;
  const { start, end } = range ?? { start: 0, end: wav.sizeBytes };
  if (range) response.status(206).set('Content-Range', `bytes ${start}-${end - 1}/${wav.sizeBytes}`);
  response.set('Content-Length', String(end - start));
  await sendUntilClosed(wav.bytes({ start, end }), response);
}

interface StoredSound {
  name: string;
  bytes: number;
  sha256: string;
  /** Asked for only where the bytes are: a stream that nobody reads would hold a connection to the store. */
  open: () => Promise<AsyncIterable<Uint8Array>>;
}

/** Sends a stored file to keep, under a name; HEAD is answered from what is known of it. */
export async function sendAttachment(
  sound: StoredSound,
  request: Request,
  response: Response,
): Promise<void> {
  const bytes = request.method === 'HEAD' ? null : await sound.open();
  response.attachment(sound.name).type('audio/wav');
  response.set({
    'Cache-Control': soundCacheControl,
    'Content-Length': String(sound.bytes),
    ETag: `"${sound.sha256}"`,
  });
  if (bytes) await sendUntilClosed(bytes, response);
  else response.end();
}
