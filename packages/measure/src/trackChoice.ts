import type { FileNotice, TrackRole, TrackSource, WavFile } from '@thudline/dsp';
import { MeasureRefusal } from './measureRefusal';
import type { OpenFile } from './openFiles';

/** Which channel of which file was which microphone. */
export interface TrackChoice {
  readonly role: TrackRole;
  readonly fileIndex: number;
  /** From 0. */
  readonly channel: number;
}

/** A microphone's samples, ready to be measured. */
export interface ChosenTrack {
  readonly role: TrackRole;
  readonly source: TrackSource;
}

/** A difference in length below this is how recorders stop, and no news; common practice, no source. */
const lengthWorthMentioningS = 0.01;

/**
 * The tracks to measure, all as long as the shortest of them.
 *
 * @throws {MeasureRefusal} `no-such-channel`, `same-channel` or `rates-differ`
 */
export function chosenTracks(files: readonly OpenFile[], choices: readonly TrackChoice[]): ChosenTrack[] {
  const whole = choices.map((choice) => ({
    role: choice.role,
    source: wavOf(files, choice).track(choice.channel),
  }));
  if (new Set(choices.map(({ fileIndex, channel }) => `${fileIndex}:${channel}`)).size < choices.length) {
    throw new MeasureRefusal({
      code: 'same-channel',
      message:
        'The kick and the overhead are the same channel of the same file; choose one channel for each.',
    });
  }
  const rates = [...new Set(whole.map(({ source }) => source.sampleRateHz))];
  if (rates.length > 1) {
    throw new MeasureRefusal({
      code: 'rates-differ',
      message: `The files have different sample rates (${rates.join(' and ')} Hz); export both from one session at one rate.`,
    });
  }
  const frames = Math.min(...whole.map(({ source }) => source.frames));
  return whole.map(({ role, source }) => ({ role, source: shortened(source, frames) }));
}

/**
 * What the files alone have to say: different lengths, headers that claimed too much.
 *
 * @param choices - already found good by `chosenTracks`
 */
export function headerNotices(files: readonly OpenFile[], choices: readonly TrackChoice[]): FileNotice[] {
  const facts = choices.map((choice) => ({ role: choice.role, ...wavOf(files, choice).facts }));
  const lengthsS = facts.map(({ durationS }) => durationS);
  const byS = Math.max(...lengthsS) - Math.min(...lengthsS);
  return [
    ...(byS > lengthWorthMentioningS ? [{ kind: 'lengths-differ' as const, byS }] : []),
    ...facts.filter(({ cutShort }) => cutShort).map(({ role }) => ({ kind: 'cut-short' as const, role })),
  ];
}

function wavOf(files: readonly OpenFile[], { fileIndex, channel }: TrackChoice): WavFile {
  const wav = files.at(fileIndex)?.wav;
  if (!wav || !Number.isInteger(channel) || channel < 0 || channel >= wav.facts.channels) {
    const count = wav?.facts.channels ?? 0;
    throw new MeasureRefusal({
      code: 'no-such-channel',
      message: `There is no channel ${channel} in a file of ${count}; channels count from 0.`,
      fileIndex,
    });
  }
  return wav;
}

function shortened(source: TrackSource, frames: number): TrackSource {
  if (source.frames === frames) return source;
  return {
    ...source,
    frames,
    async *blocks() {
      let given = 0;
      for await (const block of source.blocks()) {
        yield block.subarray(0, frames - given);
        given += block.length;
        if (given >= frames) return;
      }
    },
    async read(startFrame, endFrame) {
      const samples = await source.read(startFrame, endFrame);
      return samples.fill(0, Math.max(0, Math.min(samples.length, frames - startFrame)));
    },
  };
}
