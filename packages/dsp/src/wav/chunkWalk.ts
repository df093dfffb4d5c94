import { broadcastBytes } from './broadcastFacts';
import { ascii, type ByteWindow } from './byteWindow';
import { WavError, cutOffHeader } from './wavError';

export interface WavChunks {
  /** Body of the `fmt ` chunk, at most its first 40 bytes. */
  readonly format: DataView;
  readonly dataOffset: number;
  /** Bytes of sound that are there. */
  readonly dataBytes: number;
  readonly cutShort: boolean;
  /** The start of the body of the `bext` chunk, before or after the sound; null where there is none. */
  readonly broadcast: DataView | null;
}

type DataExtent = Pick<WavChunks, 'dataOffset' | 'dataBytes' | 'cutShort'>;

interface FoundChunk {
  readonly id: string;
  readonly bodyStart: number;
  readonly declaredBytes: number;
}

/** No recorder writes near this many; a file of nothing but empty chunks must end, too. */
const mostChunks = 4096;
/** Looked through behind the sound for what the recorder wrote there. */
const mostTrailingChunks = 64;
/** A 32-bit size that says "see ds64", or that a recorder never came back to fill in. */
const unknownSize = 0xffffffff;
const knownIds = new Set(
  'fmt ,data,fact,LIST,JUNK,junk,PAD ,FLLR,bext,iXML,cue ,smpl,inst,PEAK,ds64,id3 ,ID3 ,axml,chna,acid,afsp'.split(
    ',',
  ),
);

/**
 * Finds the format and the sound of a RIFF, RF64 or BW64 file, whatever the order of its chunks.
 *
 * Sizes are never trusted: sound that the header claims beyond the end of the file, or a size of 0 or 0xFFFFFFFF that was
 * never filled in, is cut at what is there.
 *
 * @throws {WavError} `cut-off`, `no-frames` or `damaged`
 * @see ITU-R BS.2088-2 (11/2025) Annex 1, 2.4 and 4 (RF64/BW64, ds64)
 */
export async function walkChunks(bytes: ByteWindow): Promise<WavChunks> {
  let format: DataView | null = null;
  let data: DataExtent | null = null;
  let broadcast: DataView | null = null;
  let longDataBytes: number | null = null;
  let position = 12;

  for (let count = 0; count < mostChunks; count++) {
    const chunk = await chunkAt(bytes, position);
    if (!chunk) throw missing(format !== null, data !== null);
    if (chunk.id === 'ds64') longDataBytes = await dataBytesOf64(bytes, chunk);
    if (chunk.id === 'fmt ' && !format) {
      const body = await bytes.at(chunk.bodyStart, Math.min(chunk.declaredBytes, 40));
      if (body.byteLength < Math.max(16, Math.min(chunk.declaredBytes, 40))) throw cutOffHeader();
      format = kept(body);
    }
    if (chunk.id === 'bext' && !broadcast) broadcast = await broadcastBody(bytes, chunk);
    if (chunk.id === 'data' && !data) data = await dataExtent(bytes, chunk, longDataBytes);
    const bodyBytes = chunk.id === 'data' && data ? data.dataBytes : chunk.declaredBytes;
    position = await nextChunk(bytes, chunk, bodyBytes);
    if (format && data) {
      broadcast ??= await trailingBroadcast(bytes, position);
      return { format, ...data, broadcast };
    }
  }
  throw new WavError('damaged', "This WAV's chunks never lead to any sound; export it again.");
}

async function chunkAt(bytes: ByteWindow, position: number): Promise<FoundChunk | null> {
  const header = await bytes.at(position, 8);
  if (header.byteLength < 8) return null;
  return { id: ascii(header, 0, 4), declaredBytes: header.getUint32(4, true), bodyStart: position + 8 };
}

/** A copy: the window moves on. */
function kept(body: DataView): DataView {
  return new DataView(body.buffer.slice(body.byteOffset, body.byteOffset + body.byteLength));
}

async function broadcastBody(bytes: ByteWindow, chunk: FoundChunk): Promise<DataView> {
  return kept(await bytes.at(chunk.bodyStart, Math.min(chunk.declaredBytes, broadcastBytes)));
}

async function trailingBroadcast(bytes: ByteWindow, start: number): Promise<DataView | null> {
  let position = start;
  for (let count = 0; count < mostTrailingChunks; count++) {
    const chunk = await chunkAt(bytes, position);
    if (!chunk) return null;
    if (chunk.id === 'bext') return broadcastBody(bytes, chunk);
    position = await nextChunk(bytes, chunk, chunk.declaredBytes);
  }
  return null;
}

async function dataBytesOf64(bytes: ByteWindow, chunk: FoundChunk): Promise<number | null> {
  const body = await bytes.at(chunk.bodyStart, 16);
  if (body.byteLength < 16 || chunk.declaredBytes < 16) return null;
  return body.getUint32(8, true) + body.getUint32(12, true) * 2 ** 32;
}

async function dataExtent(
  bytes: ByteWindow,
  chunk: FoundChunk,
  longDataBytes: number | null,
): Promise<DataExtent> {
  const available = Math.max(0, bytes.sizeBytes - chunk.bodyStart);
  let declared = chunk.declaredBytes;
  if (declared === unknownSize && longDataBytes !== null) declared = longDataBytes;
  const notFilledIn = declared === 0 && !(await chunkFollows(bytes, chunk.bodyStart));
  const cutShort = notFilledIn ? available > 0 : declared > available;
  return {
    dataOffset: chunk.bodyStart,
    dataBytes: notFilledIn ? available : Math.min(declared, available),
    cutShort,
  };
}

/** A data size of 0 is meant where another chunk follows at once; else the recorder never filled it in. */
async function chunkFollows(bytes: ByteWindow, position: number): Promise<boolean> {
  const next = await chunkAt(bytes, position);
  return next !== null && knownIds.has(next.id) && next.bodyStart + next.declaredBytes <= bytes.sizeBytes;
}

/** Odd chunks are padded to an even length; some programs forget, and some write a fmt size that is wrong. */
async function nextChunk(bytes: ByteWindow, chunk: FoundChunk, bodyBytes: number): Promise<number> {
  const end = chunk.bodyStart + bodyBytes;
  const candidates = bodyBytes % 2 === 0 ? [end] : [end + 1, end];
  if (chunk.id === 'fmt ') candidates.push(chunk.bodyStart + 16);
  let best = candidates[0];
  let bestLikelihood = -1;
  for (const candidate of candidates) {
    const likelihood = chunkLikelihood(ascii(await bytes.at(candidate, 4), 0, 4));
    if (likelihood > bestLikelihood) [best, bestLikelihood] = [candidate, likelihood];
  }
  return best;
}

function chunkLikelihood(id: string): number {
  if (knownIds.has(id)) return 2;
  return /^[\x20-\x7e]{4}$/.test(id) ? 1 : 0;
}

function missing(hasFormat: boolean, hasData: boolean): WavError {
  if (hasFormat && !hasData) {
    return new WavError('no-frames', 'This WAV holds a header but no sound; export the take again.');
  }
  return cutOffHeader();
}
