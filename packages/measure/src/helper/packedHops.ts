import type { TrackHops } from '@thudline/dsp/measuring';

/** The hops of one block in one buffer, which is handed back and forth between the threads instead of made anew. */
export interface PackedHops {
  readonly buffer: ArrayBuffer;
  /** How many numbers each of the lists has, in the order of `names`. */
  readonly lengths: readonly number[];
}

const names = ['low', 'peaks', 'body', 'bright'] as const;
const bytesOfNumber = Float64Array.BYTES_PER_ELEMENT;

/** @param room - is filled where it is large enough */
export function packedHops(hops: TrackHops, room: ArrayBuffer | undefined): PackedHops {
  const lengths = names.map((name) => hops[name].length);
  const bytes = bytesOfNumber * lengths.reduce((sum, length) => sum + length, 0);
  const buffer = room && room.byteLength >= bytes ? room : new ArrayBuffer(bytes);
  const lists = unpackedHops({ buffer, lengths });
  for (const name of names) lists[name].set(hops[name]);
  return { buffer, lengths };
}

/** @returns views of the buffer */
export function unpackedHops({ buffer, lengths }: PackedHops): TrackHops {
  let at = 0;
  const [low, peaks, body, bright] = lengths.map((length) => {
    const list = new Float64Array(buffer, at, length);
    at += bytesOfNumber * length;
    return list;
  });
  if (!low || !peaks || !body || !bright) throw new Error('A block of hops has four lists.');
  return { low, peaks, body, bright };
}
