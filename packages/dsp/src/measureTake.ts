import { SignalError } from './assert';
import type { FileNotice, HitFacts, PairFacts, TakeMeasurement, TrackRole } from './facts';
import { fileNotices } from './measurements/fileNotices';
import { listHits, loudestHitDbfs, type KickHit } from './measurements/hits/listHits';
import { notLinedUp } from './measurements/lateStart/notLinedUp';
import { playedEarlier } from './measurements/lateStart/playedEarlier';
import { overheadFacts } from './measurements/overheadFacts';
import { readPair, type PairReading } from './measurements/measurePair';
import { streamTake } from './measurements/streamTake';
import type { TrackSource } from './trackSource';

export type MeasureStage = 'levels' | 'hits' | 'arrival' | 'adding-up';

export interface MeasureTakeOptions {
  /** Exactly one of them the kick; all of one sample rate. Measured over the shortest. */
  readonly tracks: readonly { readonly role: TrackRole; readonly source: TrackSource }[];
  /** What reading the files already showed. */
  readonly notices?: readonly FileNotice[];
  /** Told often: at every block and at every hit. */
  readonly onStage?: (stage: MeasureStage, progress01: number) => void;
}

/**
 * Measures one take: levels, hits, arrival and how the microphones add.
 *
 * One pass over all samples side by side, then one read around each kick hit; memory doesn't grow with the length but for
 * the list of hits.
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
}: MeasureTakeOptions): Promise<TakeMeasurement> {
  const { kick, others, sampleRateHz } = checked(tracks);
  const sources = tracks.map((track) => track.source);
  const streamed = await streamTake({
    sources,
    kick,
    overhead: others[0] ?? kick,
    onProgress: (progress) => onStage('levels', progress),
  });
  const { lateStart } = streamed;
  const lateSamples = Math.round(((lateStart?.overheadLateMs ?? 0) / 1000) * sampleRateHz);
  const linedUp = sources.map((source, track) =>
    lateSamples !== 0 && track === others[0] ? playedEarlier(source, lateSamples) : source,
  );
  const readings = await readPairs({ sources: linedUp, kick, others, candidates: streamed.kicks, onStage });
  const kickHits = kickHitsOfTake(readings, { kick, others, tracks: tracks.length });
  const hits = listHits(kickHits, streamed.overheadHits, { sampleRateHz, lateSamples });
  const fromOverhead =
    others.length > 0 ? await overheadFacts(sources[others[0]], { hits, place: others[0] }) : {};
  onStage('arrival', 1);
  const pairs = readings.map((reading, index) => {
    const facts = pairFacts(reading, hits, { a: kick, b: others[index] });
    return index === 0 && lateStart ? notLinedUp(facts, lateStart) : facts;
  });
  onStage('adding-up', 1);
  const trackFacts = streamed.levels.map((level, index) => ({
    ...level,
    role: tracks[index].role,
    loudestHitDbfs: loudestHitDbfs(hits, index),
  }));
  const seen = fileNotices({ sources, tracks: trackFacts, pairs, sameTwice: streamed.sameTwice });
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
    peaks: streamed.peaks,
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

async function readPairs({
  sources,
  kick,
  others,
  candidates,
  onStage,
}: {
  sources: readonly TrackSource[];
  kick: number;
  others: readonly number[];
  candidates: Parameters<typeof readPair>[0]['candidates'];
  onStage: NonNullable<MeasureTakeOptions['onStage']>;
}): Promise<PairReading[]> {
  const readings: PairReading[] = [];
  for (const [index, other] of others.entries()) {
    const onProgress = (progress: number): void => onStage('hits', (index + progress) / others.length);
    readings.push(await readPair({ kick: sources[kick], overhead: sources[other], candidates, onProgress }));
  }
  return readings;
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
  places: { readonly a: number; readonly b: number },
): PairFacts {
  const { arrival, spectrum } = reading;
  return {
    ...places,
    lateStart: null,
    arrival,
    agreement: reading.agreement(hits, places),
    spectrum: spectrum && {
      binHz: spectrum.binHz,
      binCount: spectrum.skk.length,
      hitCount: spectrum.hitCount,
    },
  };
}
