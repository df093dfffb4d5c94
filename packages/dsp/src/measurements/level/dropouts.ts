import type { TrackFacts } from '../../facts';
import { createSpanCutter, type Spans } from '../spans';

export interface Dropouts {
  push(block: Float32Array, spans?: Spans): void;
  result(): { readonly dropouts: NonNullable<TrackFacts['dropouts']> };
}

export interface DropoutsOptions {
  readonly sampleRateHz: number;
  readonly quantisationStep: number | null;
}

/*
 * Zero runs and impossible jumps inside sound (measurements.md, 2); the figures are our choice, and no real recording at hand
 * holds one by them.
 */
/** An audio interface's buffer holds 16 samples at least and 8192 at most, which is 186 ms at 44.1 kHz. */
const shortestZeros = 16;
const longestZerosS = 0.2;
/** Sound reaches the zeros on both sides: this loud over this time. A gate or a fade gets quiet before. */
const soundPower = 10 ** (-50 / 10);
const soundS = 0.001;
/** Sound whose waves span fewer steps than this crosses zero too slowly to tell. */
const stepsOfSound = 4;
/** A jump that no wave makes: at least −30 dBFS in one sample, and eight times any other step near it. */
const smallestJump = 10 ** (-30 / 20);
const steeper = 8;
const jumpNeighbours = 32;
/** Places nearer than this are one. */
const placeS = 0.25;
const placesKept = 10_000;

/** Sound that came back after zeros, and how much of it was heard. */
interface Back {
  energy: number;
  /** Samples still to hear. */
  left: number;
  /** Where the zeros began, and where hearing goes on, in the file. */
  readonly start: number;
  heardTo: number;
}

interface Range {
  readonly from: number;
  readonly to: number;
}

/**
 * Where samples are missing: sound that stops at zero from one sample to the next and comes back as suddenly, or a wave
 * that jumps.
 *
 * @returns a meter; places nearer than a quarter of a second count as one
 */
export function createDropouts(options: DropoutsOptions): Dropouts {
  const window = Math.max(8, Math.round(soundS * options.sampleRateHz));
  const longest = Math.round(longestZerosS * options.sampleRateHz);
  const enough = Math.max(soundPower, (stepsOfSound * (options.quantisationStep ?? 0)) ** 2);
  const behind = Math.max(window + shortestZeros, 2 * (jumpNeighbours + 2));
  const alone = createSpanCutter([]);
  let joined: Float32Array = new Float32Array(behind);
  const places: number[] = [];
  /** How long the zeros are that the last block ended in; 0 where it ended in sound. */
  let openZeros = { length: 0, afterSound: false };
  let back: Back | null = null;
  let position = 0;

  const keep = (at: number): void => {
    if (places.length < placesKept) places.push(at);
  };
  const hearBack = (samples: Float32Array, offset: number, end: number): void => {
    if (!back) return;
    const from = back.heardTo - offset;
    const to = Math.min(end, from + back.left);
    back.energy += energyOf(samples, from, to);
    back.heardTo += to - from;
    back.left -= to - from;
    if (back.left > 0) return;
    if (back.energy / window >= enough) keep(back.start);
    back = null;
  };
  const seeZeros = (samples: Float32Array, offset: number): void => {
    const end = samples.length;
    // A run of zeros that counts holds one of these places, wherever it begins.
    const first = behind + ((shortestZeros - (position % shortestZeros)) % shortestZeros);
    for (let at = openZeros.length > 0 ? behind : first; at < end;) {
      if (openZeros.length === 0 && samples[at] !== 0) {
        at += shortestZeros;
        continue;
      }
      let { length, afterSound } = openZeros;
      if (length === 0) {
        let start = at;
        while (start > behind - shortestZeros && samples[start - 1] === 0) start -= 1;
        length = at - start;
        afterSound = powerOf(samples, start - window, start) >= enough;
      }
      while (at < end && samples[at] === 0) {
        at += 1;
        length += 1;
      }
      openZeros = { length, afterSound };
      if (at === end) return;
      openZeros = { length: 0, afterSound: false };
      if (length >= shortestZeros && length <= longest && afterSound) {
        hearBack(samples, offset, at);
        back = { energy: 0, left: window, start: offset + at - length, heardTo: offset + at };
      }
      at += gridAfter(offset + at) - (offset + at);
    }
  };
  /** A jump is looked at once enough samples after it are here. */
  const seeJumps = (samples: Float32Array, offset: number, { from, to }: Range): void => {
    let before = samples[from - 1];
    for (let at = from; at < to; at += 1) {
      const sample = samples[at];
      const jump = Math.abs(sample - before);
      before = sample;
      if (jump >= smallestJump && isAlone(samples, at, jump)) keep(offset + at);
    }
  };

  return {
    push(block, spans = alone.cut(block)) {
      joined = withBlock(joined, behind, block);
      const samples = joined.subarray(0, behind + block.length);
      const offset = position - behind;
      seeZeros(samples, offset);
      hearBack(samples, offset, samples.length);
      const last = samples.length - jumpNeighbours - 1;
      seeJumps(samples, offset, { from: behind - jumpNeighbours - 1, to: Math.min(behind, last) });
      let from = behind;
      for (let span = 0; span < spans.count && from < last; span += 1) {
        const to = behind + spans.ends[span];
        const high = Math.max(spans.highs[span], samples[from - 1]);
        const low = Math.min(spans.lows[span], samples[from - 1]);
        if (high - low >= smallestJump) seeJumps(samples, offset, { from, to: Math.min(to, last) });
        from = to;
      }
      joined.copyWithin(0, block.length, samples.length);
      position += block.length;
    },
    result() {
      const far = placeS * options.sampleRateHz;
      const sorted = [...places].sort((a, b) => a - b);
      const first = sorted.filter((at, i) => i === 0 || at - sorted[i - 1] > far);
      const [firstAt] = first;
      return {
        dropouts: {
          count: first.length,
          firstAtS: first.length === 0 ? null : firstAt / options.sampleRateHz,
        },
      };
    },
  };
}

/** @returns `joined`, or a longer one, with the block behind the samples that lead it in */
function withBlock(joined: Float32Array, behind: number, block: Float32Array): Float32Array {
  let fitting = joined;
  if (joined.length < behind + block.length) {
    fitting = new Float32Array(behind + block.length);
    fitting.set(joined.subarray(0, behind));
  }
  fitting.set(block, behind);
  return fitting;
}

function gridAfter(at: number): number {
  return (Math.floor(at / shortestZeros) + 1) * shortestZeros;
}

function powerOf(samples: Float32Array, start: number, end: number): number {
  return energyOf(samples, start, end) / (end - start);
}

function energyOf(samples: Float32Array, start: number, end: number): number {
  let energy = 0;
  for (let i = start; i < end; i += 1) energy += samples[i] * samples[i];
  return energy;
}

/**
 * The steps right beside it are left out: a single wrong sample jumps there and back. Beside digital silence, as before a
 * file's first sample, a jump is a cut or the zeros' own business.
 */
function isAlone(samples: Float32Array, at: number, jump: number): boolean {
  const most = jump / steeper;
  let [mostBefore, mostAfter] = [0, 0];
  for (let away = 2; away <= jumpNeighbours + 1; away += 1) {
    mostBefore = Math.max(mostBefore, Math.abs(samples[at - away] - samples[at - away - 1]));
    mostAfter = Math.max(mostAfter, Math.abs(samples[at + away] - samples[at + away - 1]));
    // Nearly always so at the first step, which makes this fast.
    if (mostBefore > most || mostAfter > most) return false;
  }
  return mostBefore > 0 && mostAfter > 0;
}
