import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { measureTake, type HitFacts, type PairFacts } from '@thudline/dsp';
import { withOpenFiles } from '../openFiles';
import { memoryTrack } from './memoryTrack';

/** One recording, in memory. */
export interface RecordingTake {
  readonly sampleRateHz: number;
  readonly kick: Float32Array;
  readonly overhead: Float32Array;
}

export interface MeasuredRecording {
  readonly pair: PairFacts;
  readonly hits: readonly HitFacts[];
}

/** When what was struck, from `events.json`. */
export interface PlayedHits {
  readonly kicksS: readonly number[];
  readonly othersS: readonly number[];
}

export async function readRecording(folder: string): Promise<RecordingTake> {
  const paths = ['kick.wav', 'overhead.wav'].map((name) => join(folder, name));
  return withOpenFiles(paths, async (files) => {
    const [kick, overhead] = files.map(({ wav }) => wav.track(0));
    if (!kick || !overhead) throw new Error(`${folder} holds no pair.`);
    return {
      sampleRateHz: kick.sampleRateHz,
      kick: await kick.read(0, kick.frames),
      overhead: await overhead.read(0, overhead.frames),
    };
  });
}

export async function measured({ kick, overhead, sampleRateHz }: RecordingTake): Promise<MeasuredRecording> {
  const { facts } = await measureTake({
    tracks: [
      { role: 'kick', source: memoryTrack(kick, sampleRateHz) },
      { role: 'overhead', source: memoryTrack(overhead, sampleRateHz) },
    ],
  });
  const [pair] = facts.pairs;
  if (!pair) throw new Error('A take of two tracks has a pair.');
  return { pair, hits: facts.hits };
}

/** The overhead `samples` later; earlier where negative. */
export function movedOverhead(take: RecordingTake, samples: number): RecordingTake {
  const overhead = take.overhead.map((_, i, all) => all[i - samples] ?? 0);
  return { ...take, overhead };
}

export function invertedOverhead(take: RecordingTake): RecordingTake {
  return { ...take, overhead: take.overhead.map((x) => -x) };
}

interface EventsFile {
  readonly sample_rate: number;
  readonly events: readonly { readonly sample: number; readonly instrument: string }[];
}

/** Names the sample sets use for a bass drum (SOURCES.md of the recordings). */
const KICKS = new Set(['KdrumL', 'ks']);

export async function playedHits(folder: string): Promise<PlayedHits> {
  const text = await readFile(join(folder, 'events.json'), 'utf8');
  const { sample_rate: sampleRateHz, events } = JSON.parse(text) as EventsFile;
  const timesOf = (isWanted: (instrument: string) => boolean): number[] => [
    ...new Set(
      events.filter(({ instrument }) => isWanted(instrument)).map(({ sample }) => sample / sampleRateHz),
    ),
  ];
  const kicksS = timesOf((instrument) => KICKS.has(instrument));
  // What sounds together with a kick is told as the kick.
  const othersS = timesOf((instrument) => !KICKS.has(instrument)).filter((timeS) => !kicksS.includes(timeS));
  return { kicksS, othersS };
}

/** Takes strung together, one after the other `everyS` apart, `count` of them. */
export function strung(
  takes: readonly RecordingTake[],
  { count, everyS }: { count: number; everyS: number },
): RecordingTake {
  const sampleRateHz = takes[0]?.sampleRateHz ?? 44_100;
  const length = Math.round((1 + count * everyS) * sampleRateHz);
  const kick = new Float32Array(length);
  const overhead = new Float32Array(length);
  const add = (into: Float32Array, samples: Float32Array, at: number): void => {
    for (let i = 0; i < samples.length && at + i < length; i += 1)
      into[at + i] = (into[at + i] ?? 0) + (samples[i] ?? 0);
  };
  for (let hit = 0; hit < count; hit += 1) {
    const take = takes[hit % takes.length];
    const at = Math.round((0.25 + hit * everyS) * sampleRateHz);
    if (take) add(kick, take.kick, at);
    if (take) add(overhead, take.overhead, at);
  }
  return { sampleRateHz, kick, overhead };
}
