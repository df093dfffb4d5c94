import { SignalError, assertFiniteSamples } from '../assert';
import { sampleBytes, wavHeader, type WavBitDepth } from './wavHeader';

export interface EncodeWavOptions {
  /** One array a channel, all of one length, full scale ±1. */
  readonly channels: readonly Float32Array[];
  readonly sampleRateHz: number;
  readonly bitDepth: WavBitDepth;
  /** Whole chunks that stand before the sound. */
  readonly chunks?: readonly Uint8Array[];
}

/**
 * A whole WAV file. Integers are rounded to the nearest step and clamped at full scale, without dither; float32 is kept
 * as it is, overs too.
 *
 * @returns the bytes of the file
 * @throws {SignalError} no channel, unequal lengths or non-finite samples
 * @example
 * const wav = encodeWav({ channels: [Float32Array.of(0, 0.5, -1)], sampleRateHz: 48000, bitDepth: 24 });
 * wav.length // 54
 */
export function encodeWav(options: EncodeWavOptions): Uint8Array {
  const { channels, sampleRateHz, bitDepth, chunks } = options;
  if (channels.length === 0) throw new SignalError('empty', 'A WAV file needs a channel.');
  const frames = channels[0].length;
  if (channels.some((samples) => samples.length !== frames)) {
    throw new SignalError('length', 'The channels of a WAV file must be equally long.');
  }
  channels.forEach((samples) => assertFiniteSamples(samples));
  const header = wavHeader({ channels: channels.length, sampleRateHz, bitDepth, frames, chunks });
  const data = encodeFrames(channels, bitDepth);
  const file = new Uint8Array(header.length + data.length + (data.length % 2));
  file.set(header);
  file.set(data, header.length);
  return file;
}

/**
 * Interleaved frames without a header, for files that are written in pieces.
 *
 * @param channels - one array a channel, all of one length
 * @returns little-endian samples, channel after channel within each frame
 * @example
 * Array.from(encodeFrames([Float32Array.of(0.5, -1)], 16)) // [0, 64, 0, 128]
 */
export function encodeFrames(channels: readonly Float32Array[], bitDepth: WavBitDepth): Uint8Array {
  const width = sampleBytes(bitDepth);
  const step = width * channels.length;
  const frames = channels[0]?.length ?? 0;
  const view = new DataView(new ArrayBuffer(frames * step));
  channels.forEach((samples, channel) => {
    for (let i = 0, at = channel * width; i < frames; i++, at += step) {
      if (bitDepth === 'float32') view.setFloat32(at, samples[i], true);
      else if (bitDepth === 16) view.setInt16(at, steps(samples[i], 32768), true);
      else setInt24(view, at, steps(samples[i], 8388608));
    }
  });
  return new Uint8Array(view.buffer);
}

/** Nearest whole step, halves away from zero so that both polarities round alike. */
function steps(sample: number, fullScale: number): number {
  const rounded = Math.sign(sample) * Math.floor(Math.abs(sample) * fullScale + 0.5);
  return Math.max(-fullScale, Math.min(fullScale - 1, rounded));
}

function setInt24(view: DataView, at: number, value: number): void {
  view.setUint16(at, value & 0xffff, true);
  view.setInt8(at + 2, value >> 16);
}
