/** What is written about a file into its `bext` chunk. */
export interface BroadcastWords {
  readonly description?: string;
  readonly originator?: string;
  /** `2026-11-30` */
  readonly date?: string;
  /** `18:05:09` */
  readonly time?: string;
  readonly timeReferenceSamples?: number;
  /** How the sound came about, lines of `A=PCM,F=48000,W=24,M=mono,T=…`. */
  readonly codingHistory?: string;
}

/** Bytes of a `bext` body before its coding history. */
const broadcastBodyBytes = 602;
const version = 2;
/** Version 2 has places for loudness; this value says that they hold nothing. */
const noLoudness = 0x7fff;
const loudnessFields = [412, 414, 416, 418, 420];

/**
 * A `bext` chunk to be put before the sound. Letters lose what isn't ASCII; what is too long is cut.
 *
 * @returns a whole chunk of even length
 * @see EBU Tech 3285 v2 (2011), 2.3 and 2.4
 * @example
 * const bext = broadcastChunk({ description: 'Kick and overhead', originator: 'Thudline', date: '2026-12-01', time: '10:00:00' });
 * bext.length // 610
 */
export function broadcastChunk(words: BroadcastWords): Uint8Array {
  const history = words.codingHistory ? `${words.codingHistory}\r\n` : '';
  const { bytes, view, body } = emptyChunk('bext', broadcastBodyBytes + history.length);
  putAscii(bytes, { at: body, most: 256, text: words.description });
  putAscii(bytes, { at: body + 256, most: 32, text: words.originator });
  putAscii(bytes, { at: body + 320, most: 10, text: words.date });
  putAscii(bytes, { at: body + 330, most: 8, text: words.time });
  view.setBigUint64(body + 338, BigInt(words.timeReferenceSamples ?? 0), true);
  view.setUint16(body + 346, version, true);
  for (const field of loudnessFields) view.setUint16(body + field, noLoudness, true);
  putAscii(bytes, { at: body + broadcastBodyBytes, most: history.length, text: history });
  return bytes;
}

/**
 * A `LIST` chunk of kind `INFO`: the name of the file's sound, a comment, and the program that made it.
 *
 * @returns a whole chunk of even length
 * @see Multimedia Programming Interface and Data Specifications 1.0 (1991), "INFO List Chunk" (from memory)
 * @example
 * infoChunk({ name: 'Take 12', comment: 'overhead flipped' }).length // 54
 */
export function infoChunk(words: { name?: string; comment?: string; software?: string }): Uint8Array {
  const parts = (
    [
      ['INAM', words.name],
      ['ICMT', words.comment],
      ['ISFT', words.software],
    ] as const
  ).flatMap(([id, text]) => (text ? [textPart(id, text)] : []));
  const partBytes = parts.reduce((sum, part) => sum + part.length, 0);
  const { bytes, body } = emptyChunk('LIST', 4 + partBytes);
  putAscii(bytes, { at: body, most: 4, text: 'INFO' });
  parts.reduce((at, part) => {
    bytes.set(part, at);
    return at + part.length;
  }, body + 4);
  return bytes;
}

/** Text of an INFO list ends with a zero, which counts. */
function textPart(id: string, text: string): Uint8Array {
  const plain = plainLetters(text);
  const { bytes, body } = emptyChunk(id, plain.length + 1);
  putAscii(bytes, { at: body, most: plain.length, text: plain });
  return bytes;
}

function emptyChunk(id: string, bodyBytes: number) {
  const body = 8;
  const bytes = new Uint8Array(body + bodyBytes + (bodyBytes % 2));
  const view = new DataView(bytes.buffer);
  putAscii(bytes, { at: 0, most: 4, text: id });
  view.setUint32(4, bodyBytes, true);
  return { bytes, view, body };
}

/** Accents go, marks become those of ASCII; what else isn't ASCII becomes a question mark. */
function plainLetters(text: string): string {
  return text
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .replace(/[‘’]/g, "'")
    .replace(/[“”„]/g, '"')
    .replace(/[‐-―−]/g, '-')
    .replace(/[^\0-\x7f]/gu, '?');
}

function putAscii(bytes: Uint8Array, put: { at: number; most: number; text?: string }): void {
  const text = plainLetters(put.text ?? '').slice(0, put.most);
  for (let i = 0; i < text.length; i++) bytes[put.at + i] = text.charCodeAt(i);
}
