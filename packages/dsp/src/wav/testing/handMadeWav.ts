/** Builders of WAV files by hand, for specs: whatever a header may claim. */

/** @returns one chunk: id, declared size, body, and the pad byte where the body is odd */
export function chunk(id: string, body: Uint8Array, options: { declaredBytes?: number; pad?: boolean } = {}) {
  const padded = options.pad !== false && body.length % 2 === 1 ? 1 : 0;
  const bytes = new Uint8Array(8 + body.length + padded);
  bytes.set([...id].map((letter) => letter.charCodeAt(0)));
  new DataView(bytes.buffer).setUint32(4, options.declaredBytes ?? body.length, true);
  bytes.set(body, 8);
  return bytes;
}

/** @returns a fmt chunk; everything may be set to nonsense */
export function fmt(fields: {
  tag?: number;
  channels?: number;
  sampleRateHz?: number;
  bits?: number;
  blockAlign?: number;
  extensible?: { validBits: number; guid: number[] };
}) {
  const { tag = 1, channels = 1, sampleRateHz = 48000, bits = 16 } = fields;
  const view = new DataView(new ArrayBuffer(fields.extensible ? 40 : 16));
  const blockAlign = fields.blockAlign ?? channels * Math.ceil(bits / 8);
  view.setUint16(0, fields.extensible ? 0xfffe : tag, true);
  view.setUint16(2, channels, true);
  view.setUint32(4, sampleRateHz, true);
  view.setUint32(8, sampleRateHz * blockAlign, true);
  view.setUint16(12, blockAlign, true);
  view.setUint16(14, bits, true);
  if (fields.extensible) {
    view.setUint16(16, 22, true);
    view.setUint16(18, fields.extensible.validBits, true);
    new Uint8Array(view.buffer).set(fields.extensible.guid, 24);
  }
  return chunk('fmt ', new Uint8Array(view.buffer));
}

/** GUID bytes of PCM sound: KSDATAFORMAT_SUBTYPE_PCM of Microsoft's ksmedia.h, as ffmpeg writes it. */
export const pcmGuid = [1, 0, 0, 0, 0, 0, 0x10, 0, 0x80, 0, 0, 0xaa, 0, 0x38, 0x9b, 0x71];

/** @returns a file of these chunks behind a RIFF (or other) head */
export function riff(chunks: readonly Uint8Array[], container = 'RIFF') {
  const bodyBytes = chunks.reduce((sum, bytes) => sum + bytes.length, 4);
  const file = new Uint8Array(8 + bodyBytes);
  file.set([...container].map((letter) => letter.charCodeAt(0)));
  new DataView(file.buffer).setUint32(4, bodyBytes, true);
  file.set(
    [...'WAVE'].map((letter) => letter.charCodeAt(0)),
    8,
  );
  let at = 12;
  for (const bytes of chunks) {
    file.set(bytes, at);
    at += bytes.length;
  }
  return file;
}
