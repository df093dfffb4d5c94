import { SignalError } from '../assert';
import type { ByteSource, TrackSource } from '../trackSource';
import { broadcastFacts } from './broadcastFacts';
import { ascii, byteWindow } from './byteWindow';
import { walkChunks, type WavChunks } from './chunkWalk';
import { decodeSamples } from './decodeSamples';
import { foreignFormat } from './foreignFormat';
import { sampleFormat } from './formatChunk';
import { WavError, cutOffHeader } from './wavError';
import type { SampleFormat, WavFacts } from './wavFacts';

export interface WavFile {
  readonly facts: WavFacts;
  /**
   * @param channel - from 0
   * @throws {SignalError} a channel that isn't in the file
   */
  track(channel: number): TrackSource;
  /** All channels in blocks of bounded size; the arrays are used again for the next block. */
  blocks(): AsyncIterable<Float32Array[]>;
}

/** Rooms that are kept for excerpts, none larger than what is read around a hit. */
const roomsKept = 4;
const largestRoom = 1024 * 1024;

/** Read from the source at once: large enough for a disk, small enough for many measurements side by side. */
const blockBytes = 256 * 1024;

/**
 * Opens a WAV file: PCM 8–32 bits, float 32 and 64, extensible, RF64 and BW64, with any order of chunks.
 *
 * Only the header is read here; the sound is read in blocks, never as a whole.
 *
 * @throws {WavError} a file that can't be measured, with one sentence for people
 * @see Microsoft's mmreg.h and ksmedia.h, ITU-R BS.2088 (RF64, BW64), EBU Tech 3285 (`bext`)
 * @example
 * const wav = encodeWav({ channels: [Float32Array.of(0, 0.5, -1)], sampleRateHz: 48000, bitDepth: 24 });
 * const opened = await openWav(bytesSource(wav));
 * opened.facts.encodingName // '24-bit PCM'
 * Array.from(await opened.track(0).read(0, 3)) // [0, 0.5, -1]
 */
export async function openWav(source: ByteSource): Promise<WavFile> {
  if (source.sizeBytes === 0) throw new WavError('empty', 'This file is empty; export the take again.');
  const bytes = byteWindow(source);
  const head = await bytes.at(0, 12);
  const container = ascii(head, 0, 4);
  if (!['RIFF', 'RF64', 'BW64'].includes(container)) throw foreignFormat(head);
  if (head.byteLength < 12) {
    throw cutOffHeader();
  }
  if (ascii(head, 8, 4) !== 'WAVE') {
    throw new WavError(
      'not-wav',
      `This ${container} file holds no WAV sound; export the take as WAV, 24-bit if you can.`,
    );
  }
  const chunks = await walkChunks(bytes);
  const facts = wavFacts(sampleFormat(chunks.format), chunks);
  return {
    facts,
    track: (channel) => track(source, facts, channel),
    blocks: () => frameBlocks(source, facts),
  };
}

function wavFacts(format: SampleFormat, chunks: WavChunks): WavFacts {
  const frames = Math.floor(chunks.dataBytes / format.blockAlign);
  if (frames === 0) {
    throw new WavError('no-frames', 'This WAV holds not one whole frame of sound; export the take again.');
  }
  const { dataOffset, cutShort } = chunks;
  const encodingName = `${format.validBits}-bit ${format.encoding === 'pcm' ? 'PCM' : 'float'}`;
  const broadcast = chunks.broadcast && broadcastFacts(chunks.broadcast);
  const durationS = frames / format.sampleRateHz;
  return { ...format, frames, dataOffset, cutShort, durationS, encodingName, broadcast };
}

function track(source: ByteSource, facts: WavFacts, channel: number): TrackSource {
  if (!Number.isInteger(channel) || channel < 0 || channel >= facts.channels) {
    throw new SignalError('option', `There is no channel ${channel} in a file of ${facts.channels}.`);
  }
  const rooms: Uint8Array[] = [];
  return {
    sampleRateHz: facts.sampleRateHz,
    frames: facts.frames,
    quantisationStep: facts.encoding === 'pcm' ? 2 ** (1 - facts.validBits) : null,
    async *blocks() {
      const out = new Float32Array(blockFrames(facts));
      for await (const block of byteBlocks(source, facts)) {
        decodeSamples({ ...block, format: facts, channel, out, outStart: 0 });
        yield out.subarray(0, block.frames);
      }
    },
    read: (start, end, into) => excerpt({ source, facts, channel, start, end, into, rooms }),
  };
}

async function excerpt(from: {
  source: ByteSource;
  facts: WavFacts;
  channel: number;
  start: number;
  end: number;
  into: Float32Array | undefined;
  /** For bytes, used again; one for each excerpt that is read at the same time. */
  rooms: Uint8Array[];
}): Promise<Float32Array> {
  const { source, facts, channel, start, end, into, rooms } = from;
  const length = Math.max(0, end - start);
  const out = into && into.length >= length ? into.subarray(0, length).fill(0) : new Float32Array(length);
  const first = Math.max(start, 0);
  const frames = Math.min(end, facts.frames) - first;
  if (frames <= 0) return out;
  const at = facts.dataOffset + first * facts.blockAlign;
  const wanted = frames * facts.blockAlign;
  const free = rooms.pop();
  const room = free && free.length >= wanted ? free : new Uint8Array(wanted);
  const bytes = await source.read(at, at + wanted, room);
  const whole = Math.min(frames, Math.floor(bytes.length / facts.blockAlign));
  decodeSamples({ bytes, format: facts, channel, frames: whole, out, outStart: first - start });
  if (rooms.length < roomsKept && wanted <= largestRoom) rooms.push(room);
  return out;
}

async function* frameBlocks(source: ByteSource, facts: WavFacts): AsyncGenerator<Float32Array[]> {
  const outs = Array.from({ length: facts.channels }, () => new Float32Array(blockFrames(facts)));
  for await (const block of byteBlocks(source, facts)) {
    outs.forEach((out, channel) => decodeSamples({ ...block, format: facts, channel, out, outStart: 0 }));
    yield outs.map((out) => out.subarray(0, block.frames));
  }
}

function blockFrames(facts: WavFacts): number {
  return Math.min(facts.frames, Math.max(1, Math.floor(blockBytes / facts.blockAlign)));
}

/** Whole frames in order. A source that has become shorter since it was opened is an error, not silence. */
async function* byteBlocks(
  source: ByteSource,
  facts: WavFacts,
): AsyncGenerator<{ bytes: Uint8Array; frames: number }> {
  const step = blockFrames(facts);
  // The next block is read while this one is measured, each into one of two rooms.
  const rooms = [0, 1].map(() => new Uint8Array(step * facts.blockAlign));
  const reading = (first: number): Promise<Uint8Array> => {
    const at = facts.dataOffset + first * facts.blockAlign;
    const frames = Math.min(step, facts.frames - first);
    const bytes = source.read(at, at + frames * facts.blockAlign, rooms[(first / step) % 2]);
    // Whoever stops early doesn't wait for it, so its failure is nobody's.
    bytes.catch(() => undefined);
    return bytes;
  };
  let ahead = reading(0);
  for (let first = 0; first < facts.frames; first += step) {
    const frames = Math.min(step, facts.frames - first);
    const bytes = await ahead;
    if (first + step < facts.frames) ahead = reading(first + step);
    if (bytes.length < frames * facts.blockAlign) {
      throw new WavError('cut-off', 'This file became shorter while it was read; copy it again.');
    }
    yield { bytes, frames };
  }
}
