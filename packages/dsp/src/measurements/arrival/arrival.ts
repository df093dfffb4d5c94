import type { ArrivalFacts, Swing } from '../../facts';
import { butterworthBand } from '../filters/butterworth';
import { filtered } from '../filters/filterChain';
import { interquartileRange, median } from '../statistics';
import { chooseArrival, type ArrivalEvidence } from './chooseArrival';
import { firstArrival, type FirstArrival } from './firstArrival';
import { createPhaseTransform, PHASE_STRETCH_MS, type PhaseSums } from './phaseTransform';
import { repeats } from './repeats';

/** One kick hit in both microphones. */
export interface HitStretch {
  readonly kick: Float32Array;
  readonly overhead: Float32Array;
  /** Index of the hit's onset in both. */
  readonly onsetAt: number;
}

export interface ArrivalMeter {
  add(hit: HitStretch): void;
  /** What was added so far, to be carried to another one that goes on from here. */
  part(): ArrivalPart;
  /** Adds what another one gathered from hits that come later. */
  include(later: ArrivalPart): void;
  result(): ArrivalFacts;
}

/** What was gathered from some of the hits; can cross a thread. */
export interface ArrivalPart {
  readonly hits: number;
  readonly overheadSounds: boolean;
  readonly arrivals: readonly HitArrival[];
  readonly phase: PhaseSums;
}

/** What a {@link HitStretch} must hold around its onset for the arrival. */
export const arrivalStretch = { beforeMs: 60, afterMs: 32 };

/** Both microphones alike, so that the filter delays both alike (docs/measurements.md, 4). */
const BAND = { lowHz: 100, highHz: 1500 };
/** The onset is where the energy rises most, up to 8 ms after the sound began; an overhead is seldom 9 m away. */
const FROM_MS = -20;
const TO_MS = 30;
/** Fewer hits than this whose beginning nothing hides, and the hidden ones are used as well. */
const CLEAR_HITS_WANTED = 3;
/** The first swing is told where this share of the hits agree on it; the share the verdict asks for too. */
const SWING_SHARE = 0.75;

/** What follows the first sound in the overhead must repeat from hit to hit, to be the drum's: from 0.5 ms before it. */
const BEGINNING_MS = { before: 0.5, after: 5 };
/** More than are compared; a long take's need not all be kept. */
const BEGINNINGS_KEPT = 60;

interface HitArrival {
  readonly kick: FirstArrival;
  readonly overhead: FirstArrival;
  /** The overhead's band around its first sound; null beyond the first hits. */
  readonly beginning: Float64Array | null;
}

/**
 * Gathers how much later the overhead hears each kick hit, and tells what holds over all of them.
 *
 * @param hitsBefore - how many hits of the take come before the first that is added here
 */
export function createArrivalMeter(sampleRateHz: number, hitsBefore = 0): ArrivalMeter {
  const sections = butterworthBand({ sampleRateHz, ...BAND });
  const phase = createPhaseTransform(sampleRateHz, hitsBefore);
  const samplesPerMs = sampleRateHz / 1000;
  const arrivals: HitArrival[] = [];
  const room = new Float64Array(
    Math.ceil((arrivalStretch.beforeMs + arrivalStretch.afterMs) * samplesPerMs) + 1,
  );
  let hits = 0;
  let overheadSounds = false;
  const cut = (samples: Float32Array, onsetAt: number, { before, after }: Around): Float32Array =>
    samples.subarray(
      Math.max(0, onsetAt - Math.round(before * samplesPerMs)),
      onsetAt + Math.round(after * samplesPerMs),
    );
  const first = (samples: Float32Array, onsetAt: number): FirstSound | null => {
    const around = { before: arrivalStretch.beforeMs, after: arrivalStretch.afterMs };
    const band = filtered(cut(samples, onsetAt, around), sections, room);
    const at = Math.min(onsetAt, Math.round(around.before * samplesPerMs));
    const [from, to] = [FROM_MS, TO_MS].map((ms) => at + Math.round(ms * samplesPerMs));
    const arrival = firstArrival(band, { sampleRateHz, from, to });
    return arrival && { arrival, band };
  };
  return {
    add({ kick, overhead, onsetAt }) {
      hits += 1;
      const inKick = first(kick, onsetAt)?.arrival;
      // Both are filtered in one room, so the overhead comes last.
      const inOverhead = first(overhead, onsetAt);
      if (inKick && inOverhead)
        arrivals.push({
          kick: inKick,
          overhead: inOverhead.arrival,
          beginning: arrivals.length < BEGINNINGS_KEPT ? beginningOf(inOverhead, samplesPerMs) : null,
        });
      overheadSounds ||= overhead.some((sample) => sample !== 0);
      const [k, o] = [kick, overhead].map((samples) => cut(samples, onsetAt, PHASE_STRETCH_MS));
      phase.add(k, o);
    },
    part: () => ({ hits, overheadSounds, arrivals, phase: phase.sums() }),
    include(later) {
      hits += later.hits;
      overheadSounds ||= later.overheadSounds;
      arrivals.push(...later.arrivals);
      phase.include(later.phase);
    },
    result: () => told(arrivals, { hits, overheadSounds, phase, samplesPerMs }),
  };
}

/** A first arrival, and the band in which it was found; the band is good until the next one. */
interface FirstSound {
  readonly arrival: FirstArrival;
  readonly band: Float64Array;
}

function beginningOf({ arrival, band }: FirstSound, samplesPerMs: number): Float64Array {
  const at = (ms: number): number => Math.round(arrival.at + ms * samplesPerMs);
  return band.slice(Math.max(0, at(-BEGINNING_MS.before)), at(BEGINNING_MS.after));
}

interface Around {
  readonly before: number;
  readonly after: number;
}

function told(
  arrivals: readonly HitArrival[],
  { samplesPerMs, ...evidence }: Omit<ArrivalEvidence, 'first'> & { readonly samplesPerMs: number },
): ArrivalFacts {
  const clear = arrivals.filter((arrival) => arrival.kick.clear && arrival.overhead.clear);
  const used = clear.length >= CLEAR_HITS_WANTED ? clear : arrivals;
  const delaysMs = used.map((arrival) => (arrival.overhead.at - arrival.kick.at) / samplesPerMs);
  const first = {
    medianMs: median(delaysMs),
    iqrMs: interquartileRange(delaysMs),
    hits: used.length,
    repeats: repeats(used.flatMap((arrival) => arrival.beginning ?? [])),
  };
  const chosen = chooseArrival({ ...evidence, first });
  return {
    ...chosen,
    arrivalSamples: chosen.arrivalMs === null ? null : chosen.arrivalMs * samplesPerMs,
    firstSwing: {
      kick: commonSwing(used.map((arrival) => arrival.kick.swing)),
      overhead: commonSwing(used.map((arrival) => arrival.overhead.swing)),
    },
  };
}

function commonSwing(swings: readonly Swing[]): Swing | null {
  const up = swings.filter((swing) => swing === 'up').length;
  if (swings.length === 0) return null;
  if (up >= SWING_SHARE * swings.length) return 'up';
  return swings.length - up >= SWING_SHARE * swings.length ? 'down' : null;
}
