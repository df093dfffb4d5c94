import type { TrackSource } from '../trackSource';

/**
 * Reads several tracks side by side, from the start to the end of the shortest.
 *
 * @returns pieces of the same length of every track; a piece is only good until the next is asked for
 */
export async function* lockstep(sources: readonly TrackSource[]): AsyncGenerator<Float32Array[]> {
  const iterators = sources.map((source) => source.blocks()[Symbol.asyncIterator]());
  const waiting: Float32Array[] = sources.map(() => new Float32Array(0));
  let left = Math.min(...sources.map((source) => source.frames));
  try {
    while (left > 0) {
      for (const [track, iterator] of iterators.entries()) {
        while (waiting[track].length === 0) {
          const block = await iterator.next();
          if (block.done) return;
          waiting[track] = block.value;
        }
      }
      const length = Math.min(left, ...waiting.map((block) => block.length));
      yield waiting.map((block) => block.subarray(0, length));
      waiting.forEach((block, track) => {
        waiting[track] = block.subarray(length);
      });
      left -= length;
    }
  } finally {
    for (const iterator of iterators) await iterator.return?.();
  }
}
