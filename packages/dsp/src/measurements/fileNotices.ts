import type { FileNotice, PairFacts, TrackFacts } from '../facts';
import type { TrackSource } from '../trackSource';

/** With fewer kick hits than this nothing is said about whether two files belong together. */
const UNRELATED_FROM_HITS = 4;
/** Two microphones on one kit are above this almost always; files of different takes are near 0. Our choice. */
const UNRELATED_CORRELATION = 0.15;
const AGREEING_SHARE = 0.75;

export interface FileNoticesInput {
  readonly sources: readonly TrackSource[];
  readonly tracks: readonly TrackFacts[];
  readonly pairs: readonly PairFacts[];
  readonly sameTwice: boolean;
}

/** What a reader should know about the files, as far as the samples show it. */
export function fileNotices({ sources, tracks, pairs, sameTwice }: FileNoticesInput): FileNotice[] {
  const lengths = sources.map((source) => source.frames / source.sampleRateHz);
  const byS = Math.max(...lengths) - Math.min(...lengths);
  const silent = tracks.filter((track) => track.samplePeakDbfs === null);
  return [
    ...(byS > 0 ? [{ kind: 'lengths-differ', byS } as const] : []),
    ...(sameTwice ? [{ kind: 'same-file-twice' } as const] : []),
    ...silent.map(({ role }) => ({ kind: 'silent', role }) as const),
    ...(pairs.some(isUnrelated) ? [{ kind: 'unrelated-files' } as const] : []),
  ];
}

/** Nothing about the pair holds from hit to hit: neither when the kick arrives nor which way the low end adds. */
function isUnrelated({ arrival, agreement }: PairFacts): boolean {
  return (
    agreement.hitsUsed >= UNRELATED_FROM_HITS &&
    arrival.arrivalMs === null &&
    agreement.agreeingHits < AGREEING_SHARE * agreement.hitsUsed &&
    Math.abs(agreement.lowCorrelation ?? 1) < UNRELATED_CORRELATION
  );
}
