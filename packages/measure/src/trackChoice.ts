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

/**
 * The tracks to measure.
 *
 * @throws {MeasureRefusal} `no-such-channel`, `same-channel` or `rates-differ`
 */
export function chosenTracks(files: readonly OpenFile[], choices: readonly TrackChoice[]): ChosenTrack[] {
  const tracks = choices.map((choice) => ({
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
  const rates = [...new Set(tracks.map(({ source }) => source.sampleRateHz))];
  if (rates.length > 1) {
    throw new MeasureRefusal({
      code: 'rates-differ',
      message: `The files have different sample rates (${rates.join(' and ')} Hz); export both from one session at one rate.`,
    });
  }
  return tracks;
}

/**
 * What only the headers show: that they claimed more than the files hold. The rest is seen while measuring.
 *
 * @throws {MeasureRefusal} `no-such-channel`
 */
export function headerNotices(files: readonly OpenFile[], choices: readonly TrackChoice[]): FileNotice[] {
  return choices
    .filter((choice) => wavOf(files, choice).facts.cutShort)
    .map(({ role }) => ({ kind: 'cut-short', role }));
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
