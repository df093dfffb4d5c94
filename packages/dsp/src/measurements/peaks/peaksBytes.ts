import { SignalError } from '../../assert';
import type { PeakLevel, TrackPeaks } from './peaks';

const BYTES_PER_COUNT = 4;

/**
 * What is stored of a track's outline: little-endian uint32 number of levels and steps of each, then their int8 pairs.
 * @example
 * encodePeaks([{ steps: 1, pairs: Int8Array.of(-1, 1) }]).length // 10
 */
export function encodePeaks(peaks: TrackPeaks): Uint8Array {
  const headBytes = BYTES_PER_COUNT * (1 + peaks.length);
  const bytes = new Uint8Array(headBytes + peaks.reduce((sum, level) => sum + level.pairs.length, 0));
  const view = new DataView(bytes.buffer);
  view.setUint32(0, peaks.length, true);
  let at = headBytes;
  peaks.forEach(({ steps, pairs }, level) => {
    view.setUint32(BYTES_PER_COUNT * (level + 1), steps, true);
    bytes.set(new Uint8Array(pairs.buffer, pairs.byteOffset, pairs.byteLength), at);
    at += pairs.length;
  });
  return bytes;
}

/**
 * The inverse of {@link encodePeaks}.
 *
 * @throws {SignalError} `length` for bytes that hold more or less than they say
 * @example
 * decodePeaks(encodePeaks([{ steps: 1, pairs: Int8Array.of(-1, 1) }]))[0].steps // 1
 */
export function decodePeaks(bytes: Uint8Array): TrackPeaks {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  const levels = bytes.length < BYTES_PER_COUNT ? 0 : view.getUint32(0, true);
  const headBytes = BYTES_PER_COUNT * (1 + levels);
  const steps =
    levels === 0 || bytes.length < headBytes
      ? []
      : Array.from({ length: levels }, (_, i) => view.getUint32(BYTES_PER_COUNT * (i + 1), true));
  if (steps.length === 0 || bytes.length !== headBytes + steps.reduce((sum, count) => sum + 2 * count, 0)) {
    throw new SignalError('length', `An outline isn't ${bytes.length} bytes long.`);
  }
  let at = headBytes;
  return steps.map((count) => {
    const pairs = Int8Array.from(bytes.subarray(at, at + 2 * count), (byte) => (byte << 24) >> 24);
    at += 2 * count;
    return { steps: count, pairs };
  });
}

export interface Outline {
  readonly steps: number;
  /** In the order they were asked for: interleaved lowest and highest of each step. */
  readonly tracks: readonly Int8Array[];
}

/**
 * Picks the coarsest level that has at least `steps` steps, else the finest.
 *
 * @param tracks - of one take, so all with the same levels
 * @example
 * const track = [{ steps: 1, pairs: Int8Array.of(-9, 9) }, { steps: 2, pairs: Int8Array.of(-9, 1, -1, 9) }];
 * outlineOf([track], 2).steps // 2
 */
export function outlineOf(tracks: readonly TrackPeaks[], steps: number): Outline {
  const pick = (levels: TrackPeaks): PeakLevel =>
    levels.find((level) => level.steps >= steps) ?? levels[levels.length - 1];
  return {
    steps: tracks.length === 0 ? 0 : pick(tracks[0]).steps,
    tracks: tracks.map((each) => pick(each).pairs),
  };
}

/**
 * What crosses the wire: one track after the other.
 * @example
 * encodeOutline({ steps: 1, tracks: [Int8Array.of(-9, 9)] }).length // 2
 */
export function encodeOutline({ steps, tracks }: Outline): Uint8Array {
  const bytes = new Uint8Array(tracks.length * 2 * steps);
  tracks.forEach((pairs, i) =>
    bytes.set(new Uint8Array(pairs.buffer, pairs.byteOffset, 2 * steps), 2 * steps * i),
  );
  return bytes;
}

/**
 * The inverse of {@link encodeOutline}; `steps` and `tracks` are what the headers `X-Steps` and `X-Tracks` say.
 *
 * @throws {SignalError} `length` where the bytes are not that many
 * @example
 * const sent = encodeOutline({ steps: 1, tracks: [Int8Array.of(-9, 9)] });
 * Array.from(decodeOutline(sent, { steps: 1, tracks: 1 }).tracks[0]) // [-9, 9]
 */
export function decodeOutline(
  bytes: Uint8Array,
  { steps, tracks }: { readonly steps: number; readonly tracks: number },
): Outline {
  if (bytes.length !== 2 * steps * tracks) {
    throw new SignalError(
      'length',
      `An outline of ${tracks} tracks by ${steps} steps isn't ${bytes.length} bytes long.`,
    );
  }
  const pairs = new Int8Array(bytes.buffer, bytes.byteOffset, bytes.length);
  return {
    steps,
    tracks: Array.from({ length: tracks }, (_, i) => pairs.slice(2 * steps * i, 2 * steps * (i + 1))),
  };
}
