import { SignalError } from './assert';
import type { FileNotice, HitFacts, PairFacts, TakeMeasurement, TrackRole } from './facts';
import { fileNotices } from './measurements/fileNotices';
import { listHits, loudestHitDbfs, type KickHit } from './measurements/hits/listHits';
import { notLinedUp } from './measurements/lateStart/notLinedUp';
import { pairReading, type PairReading } from './measurements/pairReading';
import type { PairPart } from './measurements/readPairPart';
import { streamTake } from './measurements/streamTake';
import { createTakeSteps, type PairPartRequest, type TakeSteps } from './measurements/takeSteps';
import type { TrackSource } from './trackSource';

export type MeasureStage = 'levels' | 'hits' | 'arrival' | 'adding-up';

type OnStage = (stage: MeasureStage, progress01: number) => void;

export interface MeasureTakeOptions {
  /** Exactly one of them the kick; all of one sample rate. Measured over the shortest. */
  readonly tracks: readonly { readonly role: TrackRole; readonly source: TrackSource }[];
  /** What reading the files already showed. */
  readonly notices?: readonly FileNotice[];
  /** Told often: at every block and at every hit. */
  readonly onStage?: OnStage;
  /** Takes half of the work, in another thread: `createTakeSteps` of the same tracks. The outcome is the same. */
  readonly beside?: TakeSteps;
}

/**
 * Measures one take: levels, hits, arrival and how the microphones add.
 *
 * One pass over the samples of each track, side by side, then one read around each kick hit; memory doesn't grow with the
 * length but for the list of hits.
 *
 * @returns facts only; judgements are made on reading, see `report/`
 * @throws {SignalError} `option` without exactly one kick or with different rates; `not-finite` for broken samples
 * @example
 * const tracks = [{ role: 'kick', source: file.track(0) }, { role: 'overhead', source: file.track(1) }];
 * const measured = await measureTake({ tracks });
 * measured.facts.pairs[0].agreement.verdict // 'flip'
 * measured.facts.hits.length // 8
 */
export async function measureTake({
  tracks,
  notices = [],
  onStage = () => undefined,
  beside,
}: MeasureTakeOptions): Promise<TakeMeasurement> {
  const { kick, others, sampleRateHz } = checked(tracks);
  const sources = tracks.map((track) => track.source);
  const here = createTakeSteps(sources);
  const streamed = await streamTake({
    sources,
    steps: { here, beside: beside ?? here },
    kick,
    overhead: others[0] ?? kick,
    onProgress: (progress) => onStage('levels', progress),
  });
  const { lateStart } = streamed;
  const lateSamples = Math.round(((lateStart?.overheadLateMs ?? 0) / 1000) * sampleRateHz);
  const readings: PairReading[] = [];
  for (const [index, other] of others.entries()) {
    const late = index === 0 ? lateSamples : 0;
    const request = { kick, overhead: other, lateSamples: late, candidates: streamed.kicks };
    const onProgress = (progress: number): void => onStage('hits', (index + progress) / others.length);
    readings.push(pairReading(await readHalves({ here, beside }, request, onProgress), sampleRateHz));
  }
  const kickHits = kickHitsOfTake(readings, { kick, others, tracks: tracks.length });
  const hits = listHits(kickHits, streamed.overheadHits, { sampleRateHz, lateSamples });
  const overheadFacts =
    others.length > 0
      ? awaited((beside ?? here).overhead({ hits: hits.map(withoutFigures), place: others[0] }))
      : null;
  const pairs = readings.map((reading, index) => {
    const facts = pairFacts(reading, hits, { places: { a: kick, b: others[index] }, onStage });
    return index === 0 && lateStart ? notLinedUp(facts, lateStart) : facts;
  });
  const trackFacts = streamed.tracks.map(({ level }, index) => ({
    ...level,
    role: tracks[index].role,
    loudestHitDbfs: loudestHitDbfs(hits, index),
  }));
  const seen = fileNotices({ sources, tracks: trackFacts, pairs, sameTwice: streamed.sameTwice });
  const fromOverhead = await overheadFacts;
  onStage('adding-up', 1);
  return {
    facts: {
      version: 2,
      sampleRateHz,
      durationS: Math.min(...sources.map((source) => source.frames)) / sampleRateHz,
      tracks: trackFacts,
      pairs,
      hits,
      notices: [...notices, ...seen],
      ...fromOverhead,
    },
    peaks: streamed.tracks.map(({ outline }) => outline),
    pairSpectra: readings.map((reading, index) => (pairs[index].spectrum ? reading.spectrum : null)),
  };
}

function checked(tracks: MeasureTakeOptions['tracks']): {
  kick: number;
  others: number[];
  sampleRateHz: number;
} {
  const kicks = tracks.flatMap((track, index) => (track.role === 'kick' ? [index] : []));
  const others = tracks.flatMap((track, index) => (track.role === 'kick' ? [] : [index]));
  if (kicks.length !== 1)
    throw new SignalError('option', `A take has one kick microphone, not ${kicks.length}.`);
  const rates = new Set(tracks.map((track) => track.source.sampleRateHz));
  if (rates.size !== 1) throw new SignalError('option', 'All tracks of a take have one sample rate.');
  return { kick: kicks[0], others, sampleRateHz: tracks[0].source.sampleRateHz };
}

/** Of fewer hits another thread's part takes as long to get going as it saves; for speed. */
const fewestShared = 200;

/** Always in the same two halves, so that the sums are the same to the last bit whoever adds them up. */
async function readHalves(
  { here, beside }: { readonly here: TakeSteps; readonly beside: TakeSteps | undefined },
  request: Omit<PairPartRequest, 'from' | 'to'>,
  onProgress: (progress01: number) => void,
): Promise<PairPart[]> {
  const count = request.candidates.length;
  const middle = Math.ceil(count / 2);
  const first = { ...request, from: 0, to: middle };
  const second = { ...request, from: middle, to: count };
  const elsewhere = beside && count >= fewestShared ? awaited(beside.pairPart(first, () => undefined)) : null;
  const half = (at: number) => (progress: number) => onProgress(elsewhere ? progress : (at + progress) / 2);
  if (elsewhere) {
    const own = await here.pairPart(second, half(1));
    return [await elsewhere, own];
  }
  return [await here.pairPart(first, half(0)), await here.pairPart(second, half(1))];
}

/** What isn't asked for needn't cross a thread. */
function withoutFigures({ timeS, kind, peaksDbfs }: HitFacts): HitFacts {
  return { timeS, kind, peaksDbfs };
}

/** It is awaited later; until then its failure is not unheard of. */
function awaited<Result>(promise: Promise<Result>): Promise<Result> {
  promise.catch(() => undefined);
  return promise;
}

/** Every pair was read at the same hits, so their peaks join into one list a hit. */
function kickHitsOfTake(
  readings: readonly PairReading[],
  { kick, others, tracks }: { kick: number; others: readonly number[]; tracks: number },
): KickHit[] {
  return (readings[0]?.kickHits ?? []).map(({ peaks, ...kickHit }, hit) => ({
    ...kickHit,
    peaks: Array.from({ length: tracks }, (_, track) =>
      track === kick ? peaks[0] : readings[others.indexOf(track)].kickHits[hit].peaks[1],
    ),
  }));
}

function pairFacts(
  reading: PairReading,
  hits: readonly HitFacts[],
  {
    places,
    onStage,
  }: { readonly places: { readonly a: number; readonly b: number }; readonly onStage: OnStage },
): PairFacts {
  const { spectrum } = reading;
  const arrival = reading.arrival();
  onStage('arrival', 1);
  return {
    ...places,
    lateStart: null,
    arrival,
    agreement: reading.agreement(arrival, hits, places),
    spectrum: spectrum && {
      binHz: spectrum.binHz,
      binCount: spectrum.skk.length,
      hitCount: spectrum.hitCount,
    },
  };
}
