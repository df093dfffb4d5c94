import type { TrackSource } from '../trackSource';
import { createHitsAlike, type AlikeSums } from './agreement/hitsAlike';
import { hitBalance, type HitBalance } from './agreement/hitBalance';
import { createPairGatherer, kickWindow, type PairSums } from './agreement/pairSpectrum';
import { arrivalStretch, createArrivalMeter, type ArrivalPart } from './arrival/arrival';
import { attackDb } from './comparing/attack';
import type { KickCandidate } from './hits/kickCandidates';
import { readKickHits, type KickHitRead } from './hits/readKickHits';
import type { KickHit } from './hits/listHits';

/** What was gathered from some of a pair's kick hits, one after the other; can cross a thread. */
export interface PairPart {
  /** Peaks in the order [kick microphone, overhead]. */
  readonly kickHits: readonly KickHit[];
  readonly balances: readonly HitBalance[];
  readonly arrival: ArrivalPart;
  readonly spectrum: PairSums;
  readonly alike: AlikeSums;
}

export interface ReadPairPartOptions {
  readonly kick: TrackSource;
  readonly overhead: TrackSource;
  /** All of the take. */
  readonly candidates: readonly KickCandidate[];
  /** Which of the candidates are read; `to` is not included. */
  readonly from: number;
  readonly to: number;
  readonly onProgress: (progress01: number) => void;
}

/** A hit's peak lies this near its onset, or before the next hit. */
const PEAK_BEFORE_MS = 10;
const PEAK_AFTER_MS = 100;

/** Reads some of a pair's kick hits, each once, and gathers arrival, pair spectrum and peaks from them. */
export async function readPairPart(options: ReadPairPartOptions): Promise<PairPart> {
  const { kick, overhead, candidates, from, to, onProgress } = options;
  const { sampleRateHz } = kick;
  const arrivalMeter = createArrivalMeter(sampleRateHz, from);
  const alike = createHitsAlike();
  const gatherer = createPairGatherer({
    sampleRateHz,
    perHit(bins) {
      alike.add(bins);
      return hitBalance(bins);
    },
  });
  const balances: HitBalance[] = [];
  const kickHits: KickHit[] = [];
  const take = (hit: KickHitRead, toNext: number): void => {
    arrivalMeter.add(hit);
    const balance = gatherer.add({ ...hit, toNext });
    balances.push(balance);
    const { onsetSample, startSample } = hit;
    const { lowEnergy, overheadThirdOctavesDbfs } = balance;
    const toEnd = Math.min(toNext, kick.frames - onsetSample);
    kickHits.push({
      onsetSample,
      startSample,
      peaks: peaksOf(hit, { toNext, sampleRateHz }),
      figures: { attackDb: attackOf(hit, { toEnd, sampleRateHz }), lowEnergy, overheadThirdOctavesDbfs },
    });
    onProgress(kickHits.length / (to - from));
  };
  // One hit is held back, since where it ends depends on the next one's onset; the one after the last is read for that.
  let waiting: KickHitRead | null = null;
  const wanted = candidates.slice(from, to + 1);
  const stretch = { beforeMs: arrivalStretch.beforeMs, afterMs: kickWindow.afterMs };
  for await (const hit of readKickHits({ kick, overhead, candidates: wanted, ...stretch })) {
    if (waiting) take(waiting, Math.max(1, hit.onsetSample - waiting.onsetSample));
    waiting = hit;
  }
  if (waiting && kickHits.length < to - from) take(waiting, Infinity);
  return { kickHits, balances, arrival: arrivalMeter.part(), spectrum: gatherer.sums(), alike: alike.sums() };
}

function peaksOf(
  { kick, overhead, onsetAt }: KickHitRead,
  { toNext, sampleRateHz }: { toNext: number; sampleRateHz: number },
): number[] {
  const count = (ms: number): number => Math.round((ms / 1000) * sampleRateHz);
  const start = Math.max(0, onsetAt - count(PEAK_BEFORE_MS));
  const end = onsetAt + Math.min(count(PEAK_AFTER_MS), toNext);
  return [largestSample(kick, start, end), largestSample(overhead, start, end)];
}

/** Null where the hit is cut off, by the next one or by the end of the file. */
function attackOf(
  { kick, onsetAt, onsetSample, startSample }: KickHitRead,
  { toEnd, sampleRateHz }: { toEnd: number; sampleRateHz: number },
): number | null {
  const startAt = onsetAt - (onsetSample - startSample);
  return attackDb(kick.subarray(0, onsetAt + toEnd), { sampleRateHz, startAt });
}

function largestSample(samples: Float32Array, start: number, end: number): number {
  let largest = 0;
  for (let i = start; i < Math.min(end, samples.length); i += 1) {
    const size = Math.abs(samples[i]);
    if (size > largest) largest = size;
  }
  return largest;
}
