import type { AgreementFacts, ArrivalFacts, HitFacts, PairSpectrum } from '../facts';
import type { TrackSource } from '../trackSource';
import { agreement } from './agreement/agreement';
import { hitBalance, type HitBalance } from './agreement/hitBalance';
import { matchGainDb } from './agreement/matchGain';
import { createPairGatherer, kickWindow } from './agreement/pairSpectrum';
import { arrivalStretch, createArrivalMeter } from './arrival/arrival';
import { attackDb } from './comparing/attack';
import type { KickCandidate } from './hits/kickCandidates';
import { readKickHits, type KickHitRead } from './hits/readKickHits';
import type { KickHit } from './hits/listHits';

/** What was gathered from the kick hits of one pair; told by {@link PairReading.facts} once all hits are listed. */
export interface PairReading {
  /** Peaks in the order [kick microphone, overhead]. */
  readonly kickHits: readonly KickHit[];
  readonly arrival: ArrivalFacts;
  readonly spectrum: PairSpectrum | null;
  /** @param places - of the two in the hits' peaks */
  agreement(hits: readonly HitFacts[], places: { readonly a: number; readonly b: number }): AgreementFacts;
}

export interface ReadPairOptions {
  readonly kick: TrackSource;
  readonly overhead: TrackSource;
  readonly candidates: readonly KickCandidate[];
  readonly onProgress: (progress01: number) => void;
}

/** A hit's peak lies this near its onset, or before the next hit. */
const PEAK_BEFORE_MS = 10;
const PEAK_AFTER_MS = 100;

/** Reads the kick hits of a pair, each once, and gathers arrival, pair spectrum and peaks from them. */
export async function readPair(options: ReadPairOptions): Promise<PairReading> {
  const { kick, overhead, candidates, onProgress } = options;
  const { sampleRateHz } = kick;
  const arrivalMeter = createArrivalMeter(sampleRateHz);
  const gatherer = createPairGatherer({ sampleRateHz, perHit: hitBalance });
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
    onProgress(kickHits.length / candidates.length);
  };
  // One hit is held back, since where it ends depends on the next one's onset.
  let waiting: KickHitRead | null = null;
  const stretch = { beforeMs: arrivalStretch.beforeMs, afterMs: kickWindow.afterMs };
  for await (const hit of readKickHits({ kick, overhead, candidates, ...stretch })) {
    if (waiting) take(waiting, Math.max(1, hit.onsetSample - waiting.onsetSample));
    waiting = hit;
  }
  if (waiting) take(waiting, Infinity);
  const arrival = arrivalMeter.result();
  const spectrum = gatherer.result();
  return {
    kickHits,
    arrival,
    spectrum,
    agreement: (hits, places) =>
      agreement({ spectrum, balances, arrival, matchGainDb: matchGainDb(hits, places) }),
  };
}

function peaksOf(
  { kick, overhead, onsetAt }: KickHitRead,
  { toNext, sampleRateHz }: { toNext: number; sampleRateHz: number },
): number[] {
  const count = (ms: number): number => Math.round((ms / 1000) * sampleRateHz);
  const start = Math.max(0, onsetAt - count(PEAK_BEFORE_MS));
  const end = onsetAt + Math.min(count(PEAK_AFTER_MS), toNext);
  return [kick, overhead].map((samples) =>
    samples.subarray(start, end).reduce((peak, sample) => Math.max(peak, Math.abs(sample)), 0),
  );
}

/** Null where the hit is cut off, by the next one or by the end of the file. */
function attackOf(
  { kick, onsetAt, onsetSample, startSample }: KickHitRead,
  { toEnd, sampleRateHz }: { toEnd: number; sampleRateHz: number },
): number | null {
  const startAt = onsetAt - (onsetSample - startSample);
  return attackDb(kick.subarray(0, onsetAt + toEnd), { sampleRateHz, startAt });
}
