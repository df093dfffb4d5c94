import type { HumFacts, LateStartFacts } from '../facts';
import type { TrackSource } from '../trackSource';
import { createKickCandidates } from './hits/kickCandidates';
import { createOverheadHits, type OverheadHit } from './hits/overheadHits';
import { selectKicks } from './hits/selectKicks';
import type { KickCandidate } from './hits/kickCandidates';
import { hum } from './level/hum';
import { createLateStart } from './lateStart/lateStart';
import { createTrackLevel, levelBorder, type TrackLevel, type TrackLevelFacts } from './level/trackLevel';
import { lockstep } from './lockstep';
import { createPeaks, peakBorder, type TrackPeaks } from './peaks/peaks';
import { createSpanCutter } from './spans';

export interface StreamedTake {
  readonly levels: readonly (TrackLevelFacts & { readonly hum: HumFacts | null })[];
  readonly peaks: readonly TrackPeaks[];
  readonly kicks: readonly KickCandidate[];
  readonly overheadHits: readonly OverheadHit[];
  /** True where two tracks hold exactly the same samples, and not silence. */
  readonly sameTwice: boolean;
  /** Of the overhead against the kick microphone. */
  readonly lateStart: LateStartFacts | null;
}

export interface StreamTakeOptions {
  readonly sources: readonly TrackSource[];
  /** Places of the kick microphone and of the overhead that hits are looked for in. */
  readonly kick: number;
  readonly overhead: number;
  readonly onProgress: (progress01: number) => void;
}

/** The one pass over all tracks: levels, and where hits may be; then the quiet second of each, for hum. */
export async function streamTake(options: StreamTakeOptions): Promise<StreamedTake> {
  const { sources, kick, overhead, onProgress } = options;
  const { sampleRateHz } = sources[kick];
  const levels = sources.map(({ quantisationStep }) => createTrackLevel({ sampleRateHz, quantisationStep }));
  const candidates = createKickCandidates(sampleRateHz);
  const starts = createLateStart(sampleRateHz);
  const struck = createOverheadHits({ sampleRateHz, trackCount: sources.length, overhead });
  const frames = Math.min(...sources.map((source) => source.frames));
  const cutters = sources.map(() => createSpanCutter([levelBorder(sampleRateHz), peakBorder({ frames })]));
  const outlines = sources.map(() => createPeaks({ frames }));
  let same = kick !== overhead;
  let read = 0;
  for await (const pieces of lockstep(sources)) {
    pieces.forEach((piece, track) => {
      const spans = cutters[track].cut(piece);
      levels[track].push(piece, spans);
      outlines[track].push(piece, spans);
    });
    starts.push(candidates.push(pieces[kick], pieces[overhead]));
    struck.push(pieces);
    same &&= alike(pieces[kick], pieces[overhead]);
    read += pieces[kick].length;
    onProgress(read / frames);
  }
  const results = levels.map((level) => level.result());
  const kicks = selectKicks(candidates.result(), sampleRateHz);
  const hums: (HumFacts | null)[] = [];
  for (const [track, source] of sources.entries()) hums.push(await humOf(source, levels[track]));
  return {
    levels: results.map((result, track) => ({ ...result, hum: hums[track] })),
    peaks: outlines.map((outline) => outline.result()),
    kicks,
    overheadHits: struck.result(),
    lateStart: starts.result(kicks.length),
    sameTwice: same && results[kick].samplePeakDbfs !== null,
  };
}

async function humOf(source: TrackSource, level: TrackLevel): Promise<HumFacts | null> {
  const stretch = level.quietStretch();
  return stretch && hum(await source.read(stretch.startFrame, stretch.endFrame), source.sampleRateHz);
}

function alike(a: Float32Array, b: Float32Array): boolean {
  for (let i = 0; i < a.length; i += 1) if (a[i] !== b[i]) return false;
  return true;
}
