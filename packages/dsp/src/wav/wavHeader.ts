import { assertBetween, assertPositive } from '../assert';

export type WavBitDepth = 16 | 24 | 'float32';

export interface WavHeaderOptions {
  readonly channels: number;
  readonly sampleRateHz: number;
  readonly bitDepth: WavBitDepth;
  readonly frames: number;
  /** Whole chunks, each of an even length, that stand before the sound: `broadcastChunk`, `infoChunk`. */
  readonly chunks?: readonly Uint8Array[];
}

/** The largest size that fits a RIFF header (32 bits). */
const largestRiffBytes = 0xffffffff;

/**
 * @returns bytes of one sample in a file of this depth
 * @example
 * sampleBytes(24) // 3
 */
export function sampleBytes(bitDepth: WavBitDepth): number {
  return bitDepth === 'float32' ? 4 : bitDepth / 8;
}

/**
 * The header that stands before the frames of a WAV file: 44 bytes for 16 and 24 bits, 58 for float (with `fact`), and the
 * chunks given.
 *
 * @returns bytes to be followed by `frames` frames, and one 0 byte where their size is odd
 * @throws {SignalError} no channel, a rate of 0, or more than 4 GiB
 * @see learn.microsoft.com mmreg.h, WAVEFORMATEX
 * @example
 * wavHeader({ channels: 1, sampleRateHz: 48000, bitDepth: 16, frames: 10 }).length // 44
 */
export function wavHeader(options: WavHeaderOptions): Uint8Array {
  const { channels, sampleRateHz, bitDepth, frames, chunks = [] } = options;
  assertBetween(channels, 1, 0xffff, 'channels');
  assertPositive(sampleRateHz, 'sampleRateHz');
  const isFloat = bitDepth === 'float32';
  const chunksStart = isFloat ? 50 : 36;
  const chunkBytes = chunks.reduce((sum, chunk) => sum + chunk.length, 0);
  const headerBytes = chunksStart + chunkBytes + 8;
  const blockAlign = channels * sampleBytes(bitDepth);
  const dataBytes = frames * blockAlign;
  const riffBytes = headerBytes - 8 + dataBytes + (dataBytes % 2);
  assertBetween(riffBytes, 0, largestRiffBytes, 'size of the file in bytes');

  const view = new DataView(new ArrayBuffer(headerBytes));
  text(view, 0, 'RIFF');
  view.setUint32(4, riffBytes, true);
  text(view, 8, 'WAVEfmt ');
  view.setUint32(16, isFloat ? 18 : 16, true);
  view.setUint16(20, isFloat ? 3 : 1, true);
  view.setUint16(22, channels, true);
  view.setUint32(24, sampleRateHz, true);
  view.setUint32(28, sampleRateHz * blockAlign, true);
  view.setUint16(32, blockAlign, true);
  view.setUint16(34, sampleBytes(bitDepth) * 8, true);
  if (isFloat) {
    text(view, 38, 'fact');
    view.setUint32(42, 4, true);
    view.setUint32(46, frames, true);
  }
  const header = new Uint8Array(view.buffer);
  chunks.reduce((at, chunk) => {
    header.set(chunk, at);
    return at + chunk.length;
  }, chunksStart);
  text(view, headerBytes - 8, 'data');
  view.setUint32(headerBytes - 4, dataBytes, true);
  return header;
}

function text(view: DataView, offset: number, ascii: string): void {
  for (let i = 0; i < ascii.length; i++) view.setUint8(offset + i, ascii.charCodeAt(i));
}
