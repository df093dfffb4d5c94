import type { TrackFacts } from '../../facts';

export interface Dropouts {
  push(block: Float32Array): void;
  result(): { readonly dropouts: NonNullable<TrackFacts['dropouts']> };
}

export interface DropoutsOptions {
  readonly sampleRateHz: number;
  readonly quantisationStep: number | null;
}

/*
 * Section 2 names zero runs and impossible jumps inside sound; the figures are our choice, and no real recording at hand
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
  let joined: Float32Array = new Float32Array(behind);
  const places: number[] = [];
  let zeros = { length: 0, afterSound: false };
  let back = { energy: 0, left: 0, start: 0 };
  let position = 0;

  const keep = (at: number): void => {
    if (places.length < placesKept) places.push(at);
  };
  const endZeros = (at: number): void => {
    if (zeros.length >= shortestZeros && zeros.length <= longest && zeros.afterSound)
      back = { energy: 0, left: window, start: at - zeros.length };
    zeros = { length: 0, afterSound: false };
  };
  const seeBack = (sample: number): void => {
    back.energy += sample * sample;
    back.left -= 1;
    if (back.left === 0 && back.energy / window >= enough) keep(back.start);
  };
  const seeZero = (samples: Float32Array, i: number): void => {
    zeros.length += 1;
    if (zeros.length !== shortestZeros) return;
    const end = i + 1 - shortestZeros;
    zeros.afterSound = powerOf(samples, end - window, end) >= enough;
  };

  return {
    push(block) {
      joined = withBlock(joined, behind, block);
      const samples = joined.subarray(0, behind + block.length);
      const offset = position - behind;
      for (let i = behind; i < samples.length; i += 1) {
        const sample = samples[i];
        if (sample === 0) seeZero(samples, i);
        else if (zeros.length > 0) endZeros(offset + i);
        if (back.left > 0) seeBack(sample);
        // The jump is looked at once enough samples after it are here.
        const at = i - jumpNeighbours - 1;
        const jump = Math.abs(samples[at] - samples[at - 1]);
        if (jump >= smallestJump && isAlone(samples, at, jump)) keep(offset + at);
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

function powerOf(samples: Float32Array, start: number, end: number): number {
  let energy = 0;
  for (let i = start; i < end; i += 1) energy += samples[i] * samples[i];
  return energy / (end - start);
}

/**
 * The steps right beside it are left out: a single wrong sample jumps there and back. Beside digital silence, as before a
 * file's first sample, a jump is a cut or the zeros' own business.
 */
function isAlone(samples: Float32Array, at: number, jump: number): boolean {
  let [mostBefore, mostAfter] = [0, 0];
  for (let away = 2; away <= jumpNeighbours + 1; away += 1) {
    mostBefore = Math.max(mostBefore, Math.abs(samples[at - away] - samples[at - away - 1]));
    mostAfter = Math.max(mostAfter, Math.abs(samples[at + away] - samples[at + away - 1]));
  }
  const most = Math.max(mostBefore, mostAfter);
  return Math.min(mostBefore, mostAfter) > 0 && most * steeper <= jump;
}
