import type { HitKind } from '../../facts';
import { median } from '../statistics';
import { HOP_MS, hopSamples } from './hopMeter';
import { createLevelHistogram, flooredPowerDb } from './levelHistogram';
import { createRiseFinder } from './riseFinder';

/** Something struck, as the overhead hears it. */
export interface OverheadHit {
  readonly atSample: number;
  readonly kind: Exclude<HitKind, 'kick'>;
  readonly levelDb: number;
  /** True where the bright band rose too, as it does under a stick or a beater. */
  readonly struck: boolean;
  /** Largest |x| of each track in the 100 ms after, linear. */
  readonly peaks: readonly number[];
}

/** Hops of 2 ms: the overhead's bands, and the largest |x| of every track. */
export interface StruckHops {
  readonly body: Float64Array;
  readonly bright: Float64Array;
  readonly peaks: readonly Float64Array[];
}

export interface OverheadHitFinder {
  push(hops: StruckHops): void;
  /** @returns in order of time; kick hits are among them */
  result(): OverheadHit[];
}

/** Bands and limits of docs/measurements.md, 3: over 12 dB a drum, under 0 dB a cymbal, between them told as mixed. */
export const BODY_BAND = { lowHz: 100, highHz: 1000 };
export const BRIGHT_BAND = { lowHz: 5000, highHz: 15000 };
const DRUM_OVER_DB = 12;
const CYMBAL_UNDER_DB = 0;
/** Below this rate too little of the bright band is left to judge by. */
const LOWEST_RATE_FOR_KINDS_HZ = 32000;
/** Our choice, simple on purpose: a rise of more than 6 dB in 20 ms, as a stick makes it and ringing seldom does. */
const RISE = { windowMs: 10, riseDb: 6, withinMs: 20, over: 'earliest' } as const;
/** A much softer rise this soon after a hit is that hit's own ringing, unless the bright band rises with it. */
const RINGING_WITHIN_HOPS = 400 / HOP_MS;
const RINGING_BELOW_DB = 6;
const BRIGHT_WITHIN_HOPS = 20 / HOP_MS;
const OVER_FLOOR_DB = 15;
const BELOW_REFERENCE_DB = 30;
const REFERENCE_SHARE = 0.25;
const FOLLOW_HOPS = 100 / HOP_MS;
const APART_HOPS = 50 / HOP_MS;

interface OpenHit {
  readonly startHop: number;
  body: number;
  bright: number;
  levelDb: number;
  readonly peaks: number[];
  struck: boolean;
}

const nothingYet = {
  body: 0,
  bright: 0,
  levelDb: flooredPowerDb(0),
  struck: false,
};

/** Finds what the overhead hears struck, in the one pass over all tracks; memory only for the hits. */
export function createOverheadHits(sampleRateHz: number): OverheadHitFinder {
  const rises = createRiseFinder(RISE);
  const brightRises = createRiseFinder(RISE);
  const histogram = createLevelHistogram();
  const hits: OpenHit[] = [];
  let hop = 0;
  const next = (hops: StruckHops, index: number): void => {
    const rise = rises.push(hops.body[index] + hops.bright[index]);
    histogram.add(rise.levelDb);
    const brightRising = brightRises.push(hops.bright[index]).rising;
    const last = hits.at(-1);
    if (rise.begins && (!last || hop - last.startHop >= APART_HOPS)) {
      hits.push({ ...nothingYet, startHop: hop, peaks: hops.peaks.map(() => 0) });
    }
    const open = hits.at(-1);
    const age = open ? hop - open.startHop : Infinity;
    if (open && age < FOLLOW_HOPS) {
      follow(open, hops, index);
      open.levelDb = Math.max(open.levelDb, rise.levelDb);
      open.struck ||= brightRising && age <= BRIGHT_WITHIN_HOPS;
    }
    hop += 1;
  };
  return {
    push(hops) {
      for (let i = 0; i < hops.body.length; i += 1) next(hops, i);
    },
    result: () => select(hits, histogram.percentileDb(0.1)).map((hit) => told(hit, sampleRateHz)),
  };
}

function follow(open: OpenHit, { body, bright, peaks }: StruckHops, index: number): void {
  open.body += body[index];
  open.bright += bright[index];
  for (let track = 0; track < peaks.length; track += 1) {
    open.peaks[track] = Math.max(open.peaks[track], peaks[track][index]);
  }
}

function select(hits: readonly OpenHit[], floorDb: number): OpenHit[] {
  const sorted = hits.map((hit) => hit.levelDb).sort((a, b) => b - a);
  const referenceDb = median(sorted.slice(0, Math.ceil(sorted.length * REFERENCE_SHARE))) ?? 0;
  const limitDb = Math.max(floorDb + OVER_FLOOR_DB, referenceDb - BELOW_REFERENCE_DB);
  let lastStruck: OpenHit | null = null;
  return hits.filter((hit) => {
    if (hit.levelDb < limitDb || (!hit.struck && lastStruck && isRinging(hit, lastStruck))) return false;
    lastStruck = hit;
    return true;
  });
}

function isRinging(hit: OpenHit, of: OpenHit): boolean {
  return hit.startHop - of.startHop < RINGING_WITHIN_HOPS && hit.levelDb < of.levelDb - RINGING_BELOW_DB;
}

function told(hit: OpenHit, sampleRateHz: number): OverheadHit {
  return {
    atSample: hit.startHop * hopSamples(sampleRateHz),
    kind:
      sampleRateHz < LOWEST_RATE_FOR_KINDS_HZ
        ? 'mixed'
        : kindOf(flooredPowerDb(hit.body) - flooredPowerDb(hit.bright)),
    levelDb: hit.levelDb,
    struck: hit.struck,
    peaks: hit.peaks,
  };
}

function kindOf(bodyOverBrightDb: number): OverheadHit['kind'] {
  if (bodyOverBrightDb > DRUM_OVER_DB) return 'drum';
  return bodyOverBrightDb < CYMBAL_UNDER_DB ? 'cymbal' : 'mixed';
}
