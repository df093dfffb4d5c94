import type { Hit } from '@thudline/contracts';

/** The drum hit that is loudest in the overhead; undefined where a take has none. */
export function loudSnare(hits: readonly Hit[]): Hit | undefined {
  const level = ({ overheadPeakDbfs }: Hit) => overheadPeakDbfs ?? -Infinity;
  return hits
    .filter(({ kind }) => kind === 'drum')
    .reduce<Hit | undefined>((top, hit) => (top && level(top) >= level(hit) ? top : hit), undefined);
}
