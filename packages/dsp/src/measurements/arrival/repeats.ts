import { median } from '../statistics';

/** More hits than this change the median little, and every pair is compared. */
const HITS_COMPARED = 30;

/**
 * How far one stretch of sound repeats from hit to hit: the median over all pairs of their correlation coefficient.
 *
 * A drum's own beginning is nearly the same each time; a hat's or a crash's is new noise.
 *
 * @param stretches - one a hit, lined up; compared over the shortest
 * @returns −1 … 1; null below two hits
 */
export function repeats(stretches: readonly Float64Array[]): number | null {
  const compared = stretches.slice(0, HITS_COMPARED);
  const length = Math.min(...compared.map((stretch) => stretch.length));
  const pairs = compared.flatMap((a, i) => compared.slice(i + 1).map((b) => correlation(a, b, length)));
  return median(pairs);
}

function correlation(a: Float64Array, b: Float64Array, length: number): number {
  let [aa, bb, ab] = [0, 0, 0];
  for (let i = 0; i < length; i += 1) {
    aa += a[i] * a[i];
    bb += b[i] * b[i];
    ab += a[i] * b[i];
  }
  return aa > 0 && bb > 0 ? ab / Math.sqrt(aa * bb) : 0;
}
