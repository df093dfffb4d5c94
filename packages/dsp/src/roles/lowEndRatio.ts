import { butterworthHighPass, butterworthLowPass } from '../measurements/filters/butterworth';
import { createFilterChain } from '../measurements/filters/filterChain';
import type { TrackSource } from '../trackSource';

/** A kick microphone holds most of its energy below this, an overhead little (the measurements use 30–150 Hz). */
const lowEndHz = 150;
/** Keeps a constant offset from looking like low end; below any drum. */
const lowestHz = 20;
/** Enough to hear several hits after a quiet start, and quick in a browser; common practice, no source. */
const heardS = 60;

/**
 * Share of a track's energy below 150 Hz, over its first minute.
 *
 * @returns 0–1; null for silence
 * @example
 * await lowEndRatio(file.track(0)) // 0.97
 */
export async function lowEndRatio(track: TrackSource): Promise<number | null> {
  const { sampleRateHz } = track;
  const withoutOffset = createFilterChain([butterworthHighPass({ sampleRateHz, cutoffHz: lowestHz })]);
  const lowEnd = createFilterChain([butterworthLowPass({ sampleRateHz, cutoffHz: lowEndHz })]);
  let wholeEnergy = 0;
  let lowEnergy = 0;
  let heard = 0;

  for await (const block of track.blocks()) {
    const samples = new Float64Array(block.length);
    withoutOffset.process(block, samples);
    wholeEnergy += energy(samples);
    lowEnd.process(samples, samples);
    lowEnergy += energy(samples);
    heard += block.length;
    if (heard >= heardS * sampleRateHz) break;
  }
  return wholeEnergy > 0 ? Math.min(1, lowEnergy / wholeEnergy) : null;
}

function energy(samples: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < samples.length; i++) sum += samples[i] * samples[i];
  return sum;
}
