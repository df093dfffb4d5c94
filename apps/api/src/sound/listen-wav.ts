import { encodeFrames, TrackSource, wavHeader } from '@thudline/dsp';
import { ByteRange } from './byte-range';

const bitDepth = 16;
/** Frames read and sent at a time: with 32 channels of 8 bytes, 8 MB of a recording. */
export const blockFrames = 32_768;

/**
 * A 16-bit WAV with one channel a track that is never stored: its length is computed, and any stretch of it is made from
 * the frames it holds. It ends with the shortest track.
 */
export class ListenWav {
  readonly sizeBytes: number;
  private readonly header: Uint8Array;
  private readonly frameBytes: number;
  private readonly frames: number;

  constructor(private readonly tracks: readonly TrackSource[]) {
    this.frames = Math.min(...tracks.map((track) => track.frames));
    this.frameBytes = (tracks.length * bitDepth) / 8;
    const sampleRateHz = tracks[0]?.sampleRateHz ?? 0;
    this.header = wavHeader({ channels: tracks.length, sampleRateHz, bitDepth, frames: this.frames });
    this.sizeBytes = this.header.length + this.frames * this.frameBytes;
  }

  async *bytes({ start, end }: ByteRange): AsyncGenerator<Uint8Array> {
    const headerBytes = this.header.length;
    if (start < headerBytes) yield this.header.slice(start, Math.min(end, headerBytes));
    const from = Math.max(0, start - headerBytes);
    const to = end - headerBytes;
    const lastFrame = Math.ceil(to / this.frameBytes);
    for (let first = Math.floor(from / this.frameBytes); first < lastFrame; first += blockFrames) {
      const block = await this.block(first, Math.min(first + blockFrames, lastFrame));
      const blockStart = first * this.frameBytes;
      yield block.subarray(Math.max(0, from - blockStart), to - blockStart);
    }
  }

  private async block(first: number, end: number): Promise<Uint8Array> {
    const channels: Float32Array[] = [];
    // One after the other: tracks of one file share the stretch that was read last.
    for (const track of this.tracks) channels.push(await track.read(first, end));
    return encodeFrames(channels, bitDepth);
  }
}
