import { chunk } from './handMadeWav';

/** @returns a `bext` chunk of version 2 as EBU Tech 3285 lays it out; every field is written as given */
export function broadcastChunk(
  fields: {
    description?: string;
    originator?: string;
    date?: string;
    time?: string;
    timeReference?: bigint;
  },
  options: { bodyBytes?: number } = {},
) {
  const body = new Uint8Array(602);
  const put = (at: number, text = '') =>
    body.set(
      [...text].map((letter) => letter.charCodeAt(0)),
      at,
    );
  put(0, fields.description);
  put(256, fields.originator);
  put(320, fields.date);
  put(330, fields.time);
  const view = new DataView(body.buffer);
  view.setBigUint64(338, fields.timeReference ?? 0n, true);
  view.setUint16(346, 2, true);
  return chunk('bext', body.subarray(0, options.bodyBytes ?? body.length));
}
