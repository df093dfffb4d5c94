import type { TrackSource } from '../../trackSource';
import type { KickCandidate } from './kickCandidates';
import { foot } from './foot';
import { onset, onsetStretch, type OnsetRoom } from './onset';

/** A kick hit read from both microphones around its onset. */
export interface KickHitRead {
  /** Where the onset lies in the file. */
  readonly onsetSample: number;
  /** Where it is first heard, some milliseconds before its onset. */
  readonly startSample: number;
  readonly kick: Float32Array;
  readonly overhead: Float32Array;
  /** Where the onset lies in `kick` and `overhead`. */
  readonly onsetAt: number;
}

export interface ReadKickHitsOptions {
  readonly kick: TrackSource;
  readonly overhead: TrackSource;
  readonly candidates: readonly KickCandidate[];
  /** What is needed around each onset. */
  readonly beforeMs: number;
  readonly afterMs: number;
}

/** A hit is good until the one after the next is asked for; the next one is read ahead meanwhile. */
const roomsForHits = 3;

/** Reads the hits one after the other, each once and the next one ahead: memory holds three however many there are. */
export async function* readKickHits(options: ReadKickHitsOptions): AsyncGenerator<KickHitRead> {
  const { kick, overhead, candidates } = options;
  const { sampleRateHz } = kick;
  const samples = (ms: number): number => Math.ceil((ms / 1000) * sampleRateHz);
  const before = samples(options.beforeMs);
  const after = samples(options.afterMs);
  const rooms = Array.from({ length: roomsForHits }, () => {
    const length = before + after + samples(onsetStretch.beforeMs) + samples(onsetStretch.afterMs);
    return { kick: new Float32Array(length), overhead: new Float32Array(length) };
  });
  const aroundLength = samples(onsetStretch.beforeMs) + samples(onsetStretch.afterMs);
  const onsetRoom: OnsetRoom = {
    band: new Float64Array(aroundLength),
    energyBefore: new Float64Array(aroundLength + 1),
  };
  const startOf = (atSample: number): number => atSample - before - samples(onsetStretch.beforeMs);
  const read = (index: number): Promise<[Float32Array, Float32Array]> => {
    const { atSample } = candidates[index];
    const [start, end] = [startOf(atSample), atSample + after + samples(onsetStretch.afterMs)];
    const room = rooms[index % roomsForHits];
    const both = Promise.all([kick.read(start, end, room.kick), overhead.read(start, end, room.overhead)]);
    // Whoever stops early doesn't wait for it, so its failure is nobody's.
    both.catch(() => undefined);
    return both;
  };
  let ahead = candidates.length > 0 ? read(0) : null;
  for (let index = 0; ahead; index += 1) {
    const { atSample } = candidates[index];
    const start = startOf(atSample);
    const [kickStretch, overheadStretch] = await ahead;
    ahead = index + 1 < candidates.length ? read(index + 1) : null;
    const around = kickStretch.subarray(before, kickStretch.length - after);
    const candidateAt = atSample - start - before;
    const onsetAt = before + onset(around, { sampleRateHz, candidateAt, room: onsetRoom });
    const onsetSample = Math.max(0, start + onsetAt);
    // The onset was looked for behind `before` samples, so `from` is never negative.
    const from = onsetSample - start - before;
    const cut = (stretch: Float32Array): Float32Array => stretch.subarray(from, from + before + after);
    const kickCut = cut(kickStretch);
    const startSample = Math.max(0, onsetSample - before + foot(kickCut, { sampleRateHz, onsetAt: before }));
    yield { onsetSample, startSample, kick: kickCut, overhead: cut(overheadStretch), onsetAt: before };
  }
}
