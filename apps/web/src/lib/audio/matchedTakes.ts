import { createLoudness } from '@thudline/dsp';
import { matchGainsDb } from './mixPlan';

export interface TakeSound {
  sampleRateHz: number;
  kick: Float32Array;
  overhead: Float32Array;
}

export interface HeardTake {
  sampleRateHz: number;
  /** Both microphones added, at its own level. */
  samples: Float32Array<ArrayBuffer>;
  /** Brings the takes to one loudness and keeps them below full scale; 0 or below. */
  gainDb: number;
  /** What of it is there for the loudness: 0 for the quieter take. */
  matchDb: number;
}

const amplitude = (db: number) => 10 ** (db / 20);

/**
 * Takes ready to be switched between: each with its two microphones added, all equally loud (BS.1770-5, integrated over
 * what is heard), the louder ones turned down, and none over full scale.
 *
 * @param takes.overheadGainDb - how much louder the overhead is played against the kick
 */
export function matchedTakes(takes: readonly { sound: TakeSound; overheadGainDb: number }[]): HeardTake[] {
  const added = takes.map(({ sound, overheadGainDb }) => ({
    sampleRateHz: sound.sampleRateHz,
    samples: addedTracks(sound, amplitude(overheadGainDb)),
  }));
  const loudness = added.map(loudnessOf);
  const known = loudness.filter((lufs) => lufs !== null);
  // A take too quiet to have a loudness is left as it is: there is nothing to match.
  const matches = matchGainsDb(loudness.map((lufs) => lufs ?? Math.min(0, ...known)));
  const peakDb = Math.max(...added.map(({ samples }, i) => peakDbfs(samples) + matches[i]));
  const safeDb = Math.min(0, -peakDb);
  return added.map((take, i) => ({ ...take, gainDb: matches[i] + safeDb, matchDb: matches[i] }));
}

function addedTracks({ kick, overhead }: TakeSound, gain: number): Float32Array<ArrayBuffer> {
  const samples = new Float32Array(Math.min(kick.length, overhead.length));
  for (let i = 0; i < samples.length; i++) samples[i] = kick[i] + gain * overhead[i];
  return samples;
}

function loudnessOf({ sampleRateHz, samples }: Pick<HeardTake, 'sampleRateHz' | 'samples'>): number | null {
  const meter = createLoudness({ sampleRateHz });
  meter.push(samples);
  return meter.result().integratedLufs;
}

function peakDbfs(samples: Float32Array): number {
  let peak = 0;
  for (const sample of samples) peak = Math.max(peak, Math.abs(sample));
  return 20 * Math.log10(Math.max(peak, 1e-6));
}
