import type { TrackSource } from '../../trackSource';
import { ratioDb, type Band } from '../agreement/choiceEnergy';
import { butterworthBand } from '../filters/butterworth';
import { filtered } from '../filters/filterChain';
import { DECAY_HOP_MS, decayFigures, type DecayFigures } from './decayFigures';
import type { LoudHit } from './snareHits';

/** docs/measurements.md, 7: below 500 Hz a drum rings longer than the room. */
export const DECAY_BANDS_HZ = [500, 1000, 2000, 4000] as const;

/** Half an octave of IEC 61260-1: G^(1/2) with G = 10^(3/10). */
const HALF_OCTAVE = Math.pow(10, 3 / 20);
/** Read before a hit: what rings there, and time for the filters to settle. */
const BEFORE_S = 0.1;
const BACKGROUND_S = { from: -0.07, to: -0.02 };
/** A small room's decay is over by then. */
const LONGEST_S = 1.5;
/** A hit is told to 12 ms; this much before the next one is surely not that yet. */
const GUARD_S = 0.015;
/** A hit begins where its level first comes within 20 dB of its largest (ISO 3382-1's start of an impulse response). */
const START_BELOW_PEAK = 0.1;
const START_SEARCH_S = { from: -0.02, to: 0.03 };
/** Wires ring on after the stick, a tom's head doesn't reach so high: 1.5–6 kHz against 100 Hz–1 kHz, 20–120 ms after. */
const WIRES_BAND = { lowHz: 1500, highHz: 6000 };
const BODY_BAND = { lowHz: 100, highHz: 1000 };
const WIRES_S = { from: 0.02, to: 0.12 };
/** Of real drums recorded close, 64 of 69 toms lie below and 58 of 59 snares with wires above (decisions/0012). */
const WIRES_OVER_BODY_DB = -14;

/** What a hit's brightness is taken from, and over how long; the body's octaves are those that tell the kind of a hit. */
const BRIGHT_BAND = { lowHz: 2000, highHz: 10000 };
const BRIGHT_S = { from: 0, to: 0.1 };

/** What one snare hit says of the room. */
export interface SnareRead {
  /** In the order of {@link DECAY_BANDS_HZ}. */
  readonly bands: readonly DecayFigures[];
  /** 2–10 kHz against 100 Hz–1 kHz over its first 100 ms; null where either is silent. */
  readonly brightnessDb: number | null;
}

/** One hit's decay, band by band; null for a drum without wires. */
export async function readDecay(overhead: TrackSource, hit: LoudHit): Promise<SnareRead | null> {
  const { sampleRateHz } = overhead;
  const from = Math.round((hit.timeS - BEFORE_S) * sampleRateHz);
  const endS = Math.min(hit.nextS - GUARD_S, hit.timeS + LONGEST_S);
  const end = Math.min(overhead.frames, Math.round(endS * sampleRateHz));
  const samples = await overhead.read(from, end);
  const at = (seconds: number): number => Math.round((BEFORE_S + seconds) * sampleRateHz);
  const startS = startOf(samples, { at, sampleRateHz });
  const place = { at: (seconds: number): number => at(startS + seconds), sampleRateHz };
  if (!hasWires(samples, place)) return null;
  const bands = DECAY_BANDS_HZ.map((centreHz) => {
    const band = octave(samples, centreHz, sampleRateHz);
    const before = { from: place.at(BACKGROUND_S.from), to: place.at(BACKGROUND_S.to) };
    const backgroundDb = 10 * Math.log10(meanPower(band, before) || Number.MIN_VALUE);
    return decayFigures(hopPowers(band.subarray(place.at(0)), sampleRateHz), backgroundDb);
  });
  const over = { ...place, span: BRIGHT_S };
  return {
    bands,
    brightnessDb: ratioDb(bandPower(samples, BRIGHT_BAND, over), bandPower(samples, BODY_BAND, over)),
  };
}

interface Place {
  /** Index of a time after the told one. */
  readonly at: (seconds: number) => number;
  readonly sampleRateHz: number;
}

function startOf(samples: Float32Array, { at, sampleRateHz }: Place): number {
  const from = at(START_SEARCH_S.from);
  const around = samples.subarray(from, at(START_SEARCH_S.to));
  const peak = around.reduce((most, x) => Math.max(most, Math.abs(x)), 0);
  const first = around.findIndex((x) => Math.abs(x) >= START_BELOW_PEAK * peak);
  return START_SEARCH_S.from + Math.max(0, first) / sampleRateHz;
}

function hasWires(samples: Float32Array, place: Place): boolean {
  const over = { ...place, span: WIRES_S };
  const wires = bandPower(samples, WIRES_BAND, over);
  return wires > bandPower(samples, BODY_BAND, over) * Math.pow(10, WIRES_OVER_BODY_DB / 10);
}

function bandPower(
  samples: Float32Array,
  band: Band,
  { at, sampleRateHz, span }: Place & { readonly span: { readonly from: number; readonly to: number } },
): number {
  const place = { from: at(span.from), to: at(span.to) };
  // What comes later changes nothing here.
  const inBand = filtered(samples.subarray(0, place.to), butterworthBand({ sampleRateHz, ...band }));
  return meanPower(inBand, place);
}

/** An octave band with 24 dB per octave on either side, so that a neighbour's ringing stays out. */
function octave(samples: Float32Array, centreHz: number, sampleRateHz: number): Float64Array {
  const band = butterworthBand({
    sampleRateHz,
    lowHz: centreHz / HALF_OCTAVE,
    highHz: centreHz * HALF_OCTAVE,
  });
  return filtered(samples, [...band, ...band]);
}

function meanPower(
  samples: Float64Array,
  { from, to }: { readonly from: number; readonly to: number },
): number {
  let sum = 0;
  for (let i = Math.max(0, from); i < Math.min(to, samples.length); i += 1) sum += samples[i] * samples[i];
  return sum / Math.max(1, to - from);
}

/** Hops of 1 ms don't lie on whole samples at every rate; each takes the samples that begin in it. */
function hopPowers(samples: Float64Array, sampleRateHz: number): Float64Array {
  const samplesPerHop = (sampleRateHz * DECAY_HOP_MS) / 1000;
  return Float64Array.from({ length: Math.floor(samples.length / samplesPerHop) }, (_unused, hop) =>
    meanPower(samples, {
      from: Math.ceil(hop * samplesPerHop),
      to: Math.ceil((hop + 1) * samplesPerHop),
    }),
  );
}
