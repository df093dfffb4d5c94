import type { TrackSource } from '@thudline/dsp';

/**
 * Whether two tracks hold the same samples, whatever their files are called and say besides.
 *
 * Different takes differ in their first block, so this reads on only where they are alike. Two silent tracks are not
 * called the same: silence has its own notice.
 *
 * @param a - as long as `b`
 */
export async function sameSound(a: TrackSource, b: TrackSource): Promise<boolean> {
  if (a.frames !== b.frames) return false;
  let at = 0;
  let isSilent = true;
  for await (const block of a.blocks()) {
    const other = await b.read(at, at + block.length);
    for (let i = 0; i < block.length; i++) {
      if (block[i] !== other[i]) return false;
      if (block[i] !== 0) isSilent = false;
    }
    at += block.length;
  }
  return !isSilent;
}
