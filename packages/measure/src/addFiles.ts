import { createHash } from 'node:crypto';
import { open } from 'node:fs/promises';
import {
  addedTrack,
  broadcastChunk,
  createLoudness,
  createTruePeak,
  dbAmplitude,
  encodeFrames,
  infoChunk,
  wavHeader,
  type Choice,
  type TrackSource,
} from '@thudline/dsp';
import { addedHistory, addedWords } from './addedWords';
import { withOpenFiles } from './openFiles';
import { chosenTracks, type TrackChoice } from './trackChoice';

export interface AddFilesOptions {
  readonly paths: readonly string[];
  /** One kick and one overhead; both may be channels of one file. */
  readonly tracks: readonly TrackChoice[];
  readonly choice: Choice;
  /** Where the added file is written. */
  readonly outPath: string;
  /** Written into the file: its name, and when the take was recorded (`2026-11-30`, `18:05:09`). */
  readonly about: { readonly name: string; readonly date: string; readonly time: string };
  /** 0–1 */
  readonly onProgress?: (progress: number) => void;
}

export interface AddedFacts {
  readonly sampleRateHz: number;
  readonly frames: number;
  readonly bytes: number;
  readonly sha256: string;
  /** How much the two together were turned down, 0 or less. */
  readonly levelDb: number;
  /** Of the file; null for silence. */
  readonly truePeakDbtp: number | null;
  /** How much the file is turned down when it is heard beside the two as recorded, 0 or less. */
  readonly listenGainDb: number;
}

/** Room for what a later conversion may add between samples (EBU R 128: −1 dBTP at most). */
const mostDbtp = -1;
const bitDepth = 24;
const asRecorded: Choice = { flipped: false, shiftMs: 0, gainDb: 0 };

/**
 * Adds the two microphones with a choice and writes them as one 24-bit WAV that says how it was made, turned down only as
 * far as its true peak asks. Memory doesn't grow with length; the same files and choice give the same bytes.
 *
 * @throws {MeasureRefusal} files that can't be read, or not together
 */
export async function addFiles(options: AddFilesOptions): Promise<AddedFacts> {
  return withOpenFiles(options.paths, async (files) => {
    const chosen = chosenTracks(files, options.tracks);
    const source = (role: 'kick' | 'overhead'): TrackSource => {
      const track = chosen.find((each) => each.role === role);
      if (!track) throw new Error(`There is no ${role} to add.`);
      return track.source;
    };
    const [kick, overhead] = [source('kick'), source('overhead')];
    const added = addedTrack(kick, overhead, options.choice);
    const told = (part: number) => (frames: number) =>
      options.onProgress?.((part + frames / added.frames) / 2);
    const levels = await levelsOf(added, addedTrack(kick, overhead, asRecorded), told(0));
    const levelDb = Math.min(0, mostDbtp - (levels.truePeakDbtp ?? mostDbtp));
    const written = await writeAdded(added, options, { levelDb, onFrames: told(1) });
    const { sampleRateHz, frames } = added;
    return {
      ...{ sampleRateHz, frames, levelDb, ...written },
      truePeakDbtp: levels.truePeakDbtp === null ? null : levels.truePeakDbtp + levelDb,
      listenGainDb: Math.min(0, levels.louderDb === null ? 0 : 0 - (levels.louderDb + levelDb)),
    };
  });
}

/** True peak of the sum, and how much louder it is than the two as recorded; null where that can't be told. */
async function levelsOf(
  added: TrackSource,
  recorded: TrackSource,
  onFrames: (frames: number) => void,
): Promise<{ truePeakDbtp: number | null; louderDb: number | null }> {
  const { sampleRateHz } = added;
  const peak = createTruePeak({ sampleRateHz });
  const [loudness, before] = [createLoudness({ sampleRateHz }), createLoudness({ sampleRateHz })];
  let frames = 0;
  for await (const block of added.blocks()) {
    peak.push(block);
    loudness.push(block);
    before.push(await recorded.read(frames, frames + block.length));
    frames += block.length;
    onFrames(frames);
  }
  const [now, then] = [loudness.result().integratedLufs, before.result().integratedLufs];
  return {
    truePeakDbtp: peak.result().truePeakDbtp,
    louderDb: now === null || then === null ? null : now - then,
  };
}

async function writeAdded(
  added: TrackSource,
  { choice, about, outPath }: AddFilesOptions,
  { levelDb, onFrames }: { levelDb: number; onFrames: (frames: number) => void },
): Promise<{ bytes: number; sha256: string }> {
  const { sampleRateHz, frames } = added;
  const words = addedWords(choice, levelDb);
  const chunks = [
    broadcastChunk({
      ...{ description: words, originator: 'Thudline', date: about.date, time: about.time },
      codingHistory: addedHistory(choice, { sampleRateHz, levelDb }),
    }),
    infoChunk({ name: about.name, comment: words, software: 'Thudline' }),
  ];
  const gain = dbAmplitude(levelDb);
  const hash = createHash('sha256');
  const handle = await open(outPath, 'w');
  let bytes = 0;
  const write = async (part: Uint8Array): Promise<void> => {
    hash.update(part);
    bytes += part.length;
    await handle.writeFile(part);
  };
  try {
    await write(wavHeader({ channels: 1, sampleRateHz, bitDepth, frames, chunks }));
    let done = 0;
    for await (const block of added.blocks()) {
      await write(encodeFrames([block.map((sample) => sample * gain)], bitDepth));
      done += block.length;
      onFrames(done);
    }
    if (((frames * bitDepth) / 8) % 2 === 1) await write(new Uint8Array(1));
  } finally {
    await handle.close();
  }
  return { bytes, sha256: hash.digest('hex') };
}
