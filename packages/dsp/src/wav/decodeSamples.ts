import type { SampleFormat } from './wavFacts';

/** Where the samples of one channel lie in a block of frames, and where they go. */
export interface DecodeJob {
  /** Whole frames, one after the other. */
  readonly bytes: Uint8Array;
  readonly format: SampleFormat;
  readonly channel: number;
  readonly frames: number;
  /** Takes `frames` samples from index `outStart` on. */
  readonly out: Float32Array;
  readonly outStart: number;
}

/**
 * Decodes one channel of a block of frames to full scale ±1: N-bit integers are divided by 2^(N−1), 8-bit is unsigned.
 *
 * Own loops instead of wav-decoder: that one turns 24-bit −1 into +1, reads 8-bit off centre and decodes every channel
 * (docs/decisions/0003-wav-decoding.md). A test pins these loops to its values wherever it is right. What is no finite
 * number in a float file becomes 0.
 */
export function decodeSamples(job: DecodeJob): void {
  const view = new DataView(job.bytes.buffer, job.bytes.byteOffset, job.bytes.byteLength);
  const { encoding, bitsPerSample } = job.format;
  if (encoding === 'float') return bitsPerSample === 64 ? float64(job, view) : float32(job, view);
  if (bitsPerSample === 8) return pcm8(job);
  if (bitsPerSample === 16) return pcm16(job, view);
  return bitsPerSample === 24 ? pcm24(job) : pcm32(job, view);
}

function firstByte({ channel, format }: DecodeJob): number {
  return channel * (format.bitsPerSample / 8);
}

function pcm8(job: DecodeJob): void {
  const { bytes, out, outStart, frames } = job;
  const step = job.format.blockAlign;
  for (let i = 0, at = firstByte(job); i < frames; i++, at += step)
    out[outStart + i] = (bytes[at] - 128) / 128;
}

function pcm16(job: DecodeJob, view: DataView): void {
  const { out, outStart, frames } = job;
  const step = job.format.blockAlign;
  for (let i = 0, at = firstByte(job); i < frames; i++, at += step) {
    out[outStart + i] = view.getInt16(at, true) / 32768;
  }
}

const isLittleEndian = new Uint8Array(Uint16Array.of(1).buffer)[0] === 1;
const oneOver31Bits = 2 ** -31;

/** Four samples from three words, where they lie one after the other: half the time of byte by byte. */
function pcm24Words({ bytes, out, outStart, frames }: DecodeJob): number {
  const whole = frames - (frames % 4);
  const words = new Int32Array(bytes.buffer, bytes.byteOffset, (whole / 4) * 3);
  for (let i = outStart, w = 0; w < words.length; i += 4, w += 3) {
    const [a, b, c] = [words[w], words[w + 1], words[w + 2]];
    out[i] = (a << 8) * oneOver31Bits;
    out[i + 1] = (((a >>> 16) & 0xff00) | (b << 16)) * oneOver31Bits;
    out[i + 2] = (((b >>> 8) & 0xffff00) | (c << 24)) * oneOver31Bits;
    out[i + 3] = (c & 0xffffff00) * oneOver31Bits;
  }
  return whole;
}

function pcm24(job: DecodeJob): void {
  const { bytes, out, outStart, frames } = job;
  const step = job.format.blockAlign;
  const inWords = isLittleEndian && step === 3 && bytes.byteOffset % 4 === 0 ? pcm24Words(job) : 0;
  // The three bytes go to the top of a 32-bit integer, so that its sign is theirs.
  for (let i = inWords, at = firstByte(job) + inWords * step; i < frames; i++, at += step) {
    out[outStart + i] = ((bytes[at] << 8) | (bytes[at + 1] << 16) | (bytes[at + 2] << 24)) / 2147483648;
  }
}

function pcm32(job: DecodeJob, view: DataView): void {
  const { out, outStart, frames } = job;
  const step = job.format.blockAlign;
  for (let i = 0, at = firstByte(job); i < frames; i++, at += step) {
    out[outStart + i] = view.getInt32(at, true) / 2147483648;
  }
}

function float32(job: DecodeJob, view: DataView): void {
  const { out, outStart, frames } = job;
  const step = job.format.blockAlign;
  for (let i = 0, at = firstByte(job); i < frames; i++, at += step) {
    const value = view.getFloat32(at, true);
    out[outStart + i] = Number.isFinite(value) ? value : 0;
  }
}

/** The largest number a float32 can hold; a float64 beyond it would become an infinity. */
const largestFloat32 = 3.4028234663852886e38;

function float64(job: DecodeJob, view: DataView): void {
  const { out, outStart, frames } = job;
  const step = job.format.blockAlign;
  for (let i = 0, at = firstByte(job); i < frames; i++, at += step) {
    const value = view.getFloat64(at, true);
    out[outStart + i] = Math.abs(value) <= largestFloat32 ? value : 0;
  }
}
