import { HOP_MS } from './hopMeter';
import { flooredPowerDb } from './levelHistogram';

export interface RiseOptions {
  /** Span the level is averaged over. */
  readonly windowMs: number;
  /** The level must rise by more than `riseDb` … */
  readonly riseDb: number;
  /** … within this time: */
  readonly withinMs: number;
  /** over its lowest level in that time, or over its level that long ago, which ripple deceives less. */
  readonly over: 'lowest' | 'earliest';
}

/** What a rise finder says after each hop. */
export interface RiseState {
  /** Level now, dB. */
  levelDb: number;
  /** True at the first hop of a rise. */
  begins: boolean;
  /** True while the level is rising by more than asked. */
  rising: boolean;
  /** How much power the last two hops added; largest where the rise is steepest. */
  addedPower: number;
}

/** Watches one band's power hop by hop for rises. */
export interface RiseFinder {
  /** @returns the same object each time: a new one every 2 ms would be most of what a long take allocates */
  push(hopPower: number): Readonly<RiseState>;
}

/** Steepness is looked at over this many hops. */
const STEEPNESS_HOPS = 2;

/** Before the first sample there is silence, so a take that begins with a hit has its rise too. */
export function createRiseFinder({ windowMs, riseDb, withinMs, over }: RiseOptions): RiseFinder {
  const window = new Float64Array(Math.max(1, Math.round(windowMs / HOP_MS)));
  const past = new Float64Array(Math.max(1, Math.round(withinMs / HOP_MS)));
  // Beside the powers, since a logarithm costs more than all else here.
  const pastDb = new Float64Array(past.length).fill(flooredPowerDb(0));
  let hop = 0;
  const state: RiseState = { levelDb: flooredPowerDb(0), begins: false, rising: false, addedPower: 0 };
  return {
    push(hopPower) {
      window[hop % window.length] = hopPower;
      let sum = 0;
      for (let i = 0; i < window.length; i += 1) sum += window[i];
      const power = sum / window.length;
      const at = hop % past.length;
      const beforeDb = over === 'lowest' ? lowest(pastDb) : pastDb[at];
      const justBefore = past[(hop - STEEPNESS_HOPS + past.length * STEEPNESS_HOPS) % past.length];
      const levelDb = flooredPowerDb(power);
      past[at] = power;
      pastDb[at] = levelDb;
      hop += 1;
      state.levelDb = levelDb;
      const rising = levelDb - beforeDb > riseDb;
      state.begins = rising && !state.rising;
      state.rising = rising;
      state.addedPower = power - justBefore;
      return state;
    },
  };
}

function lowest(levels: Float64Array): number {
  let least = levels[0];
  for (let i = 1; i < levels.length; i += 1) if (levels[i] < least) least = levels[i];
  return least;
}
