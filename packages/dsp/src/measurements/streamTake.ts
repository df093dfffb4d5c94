import type { LateStartFacts } from '../facts';
import type { TrackSource } from '../trackSource';
import { hopSamples } from './hits/hopMeter';
import { createKickCandidates, type KickCandidate } from './hits/kickCandidates';
import { createOverheadHits, type OverheadHit } from './hits/overheadHits';
import { selectKicks } from './hits/selectKicks';
import { createLateStart } from './lateStart/lateStart';
import { hopLockstep } from './pass/hopLockstep';
import type { PassedTrack, TrackHops } from './pass/trackPass';
import { sameSamples } from './sameSamples';
import type { TakeSteps } from './takeSteps';

export interface StreamedTake {
  readonly tracks: readonly PassedTrack[];
  readonly kicks: readonly KickCandidate[];
  readonly overheadHits: readonly OverheadHit[];
  /** True where two tracks hold exactly the same samples, and not silence. */
  readonly sameTwice: boolean;
  /** Of the overhead against the kick microphone. */
  readonly lateStart: LateStartFacts | null;
}

export interface StreamTakeOptions {
  readonly sources: readonly TrackSource[];
  /** The kick's pass is made here, the others', which hear more, beside it. */
  readonly steps: { readonly here: TakeSteps; readonly beside: TakeSteps };
  /** Places of the kick microphone and of the overhead that hits are looked for in. */
  readonly kick: number;
  readonly overhead: number;
  readonly onProgress: (progress01: number) => void;
}

/** The one pass over all tracks: levels, and where hits may be. */
export async function streamTake(options: StreamTakeOptions): Promise<StreamedTake> {
  const { sources, steps, kick, overhead, onProgress } = options;
  const { sampleRateHz } = sources[kick];
  const candidates = createKickCandidates(sampleRateHz);
  const starts = createLateStart(sampleRateHz);
  const struck = createOverheadHits(sampleRateHz);
  const frames = Math.min(...sources.map((source) => source.frames));
  const readings = sources.map((_unused, track) =>
    (track === kick ? steps.here : steps.beside).pass(track, { frames, listens: track === overhead }),
  );
  const hopCount = frames / hopSamples(sampleRateHz);
  let alike = kick !== overhead;
  let read = 0;
  for await (const hops of hopLockstep(readings)) {
    const low = { kick: hops[kick].low, overhead: hops[overhead].low };
    candidates.push(low);
    starts.push(low);
    const { body, bright } = hops[overhead];
    struck.push({ body, bright, peaks: hops.map(({ peaks }) => peaks) });
    alike &&= sameHops(hops[kick], hops[overhead]);
    read += low.kick.length;
    onProgress(read / hopCount);
  }
  onProgress(1);
  const results = readings.map((reading) => reading.result());
  const kicks = selectKicks(candidates.result(), sampleRateHz);
  const lateStart = starts.result(kicks.length);
  const tracks = await Promise.all(results);
  const sounds = tracks[kick].level.samplePeakDbfs !== null;
  return {
    tracks,
    kicks,
    overheadHits: struck.result(),
    lateStart,
    // Hops are seldom the same where samples differ, so that hardly any take is read again for this.
    sameTwice: alike && sounds && (await sameSamples(sources[kick], sources[overhead])),
  };
}

function sameHops(a: TrackHops, b: TrackHops): boolean {
  return a.peaks.every((peak, hop) => peak === b.peaks[hop]);
}
