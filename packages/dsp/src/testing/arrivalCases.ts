import { randomNumbers } from './randomNumbers';
import {
  bleed,
  clipped,
  crash,
  dropouts,
  earlyEchoes,
  quieter,
  snares,
  sticks,
  walls,
} from './arrivalChanges';
import { smallKit, type SmallKit, type SmallKitOptions } from './smallKit';

/** A made take whose arrival is known. */
export interface ArrivalCase {
  readonly name: string;
  readonly trueMs: number;
  /** Something struck with every kick hides it: told wrongly, so long as it isn't told as sure. */
  readonly isHidden: boolean;
  readonly make: () => {
    readonly kick: Float32Array;
    readonly overhead: Float32Array;
    readonly sampleRateHz: number;
  };
}

interface Situation {
  readonly name: string;
  readonly isHidden?: boolean;
  readonly kit?: SmallKitOptions;
  /** What is done to both microphones once the kicks are in. */
  readonly change?: (kit: SmallKit, random: () => number) => void;
}

const situations: readonly Situation[] = [
  { name: 'plain' },
  { name: 'hats on the instant', kit: { hats: true } },
  { name: 'turned over', kit: { overheadGain: -0.4 } },
  { name: 'noise', kit: { noise: 0.01 } },
  { name: 'two hits', kit: { kicks: 2 } },
  { name: 'one hit', kit: { kicks: 1 } },
  { name: 'fast', kit: { kicks: 16, everyS: 0.1, bodyS: 0.04 } },
  { name: 'soft overhead', kit: { overheadGain: 0.02, noise: 1e-3 } },
  { name: 'soft, under hats', kit: { overheadGain: 0.05, hats: true } },
  { name: 'ringing crash', change: (kit, random) => crash(kit.overhead, kit, random) },
  {
    name: 'dropouts in both',
    change(kit, random) {
      dropouts(kit.kick, kit, random);
      dropouts(kit.overhead, kit, random);
    },
  },
  {
    name: 'low level',
    change(kit) {
      quieter(kit.kick);
      quieter(kit.overhead);
    },
  },
  { name: 'walls', change: (kit, random) => walls(kit.overhead, kit, random) },
  {
    name: 'walls, hats, turned over',
    kit: { hats: true, overheadGain: -0.3 },
    change: (kit, random) => walls(kit.overhead, kit, random),
  },
  { name: 'loud noise', kit: { noise: 0.03 } },
  { name: 'hats on every eighth', change: sticks({ level: 0.2, perKick: 2 }) },
  { name: 'loud hats', kit: { overheadGain: -0.1 }, change: sticks({ level: 0.4, perKick: 2 }) },
  {
    name: 'uneven sixteenths',
    kit: { overheadGain: 0.15 },
    change: sticks({ level: 0.3, perKick: 4, unevenMs: 2 }),
  },
  { name: 'snares between', change: snares({ bleed: 0.1 }) },
  {
    name: 'soft crash',
    kit: { overheadGain: 0.05 },
    change: (kit, random) => crash(kit.overhead, kit, random),
  },
  {
    name: 'near walls',
    kit: { overheadGain: 0.3 },
    change: (kit, random) => earlyEchoes(kit.overhead, kit, random),
  },
  { name: 'kick microphone hears the room', change: bleed },
  { name: 'overhead clipped', kit: { overheadGain: 2 }, change: (kit) => clipped(kit.overhead) },
  { name: 'three hits, hats', kit: { kicks: 3, hats: true } },
  { name: 'very soft, noise', kit: { overheadGain: 0.02, noise: 6e-3 } },
  { name: 'hidden by hats', isHidden: true, kit: { overheadGain: 0.1, hats: true } },
  { name: 'hidden by hats, turned over', isHidden: true, kit: { overheadGain: -0.07, hats: true } },
  {
    name: 'hidden by loud hats',
    isHidden: true,
    kit: { overheadGain: 0.03 },
    change: sticks({ level: 0.4, perKick: 2 }),
  },
  {
    name: 'a snare with each kick',
    isHidden: true,
    kit: { overheadGain: 0.2 },
    change: snares({ bleed: 0.1, onKick: true }),
  },
  {
    name: 'a loud snare with each kick',
    isHidden: true,
    kit: { overheadGain: 0.08 },
    change: snares({ bleed: 0.3, onKick: true }),
  },
];
const DELAYS_MS = [0.3, 1.37, 2.9, 5.2, 8];
const RATES_HZ = [48000, 44100, 96000];
/** A case in nine, since these take four times as long. */
const FINE_RATE_HZ = 192000;
const FINE_EVERY = 9;

/** Every situation at every delay, at changing rates and with its own seed. */
export const arrivalCases: readonly ArrivalCase[] = situations.flatMap((situation, place) =>
  DELAYS_MS.map((trueMs, i) => {
    const isFine = (place + 2 * i) % FINE_EVERY === 1;
    const sampleRateHz = isFine ? FINE_RATE_HZ : RATES_HZ[(place + i) % RATES_HZ.length];
    const seed = 1 + 100 * place + i;
    return {
      name: `${situation.name}, ${trueMs} ms at ${sampleRateHz} Hz`,
      trueMs,
      isHidden: situation.isHidden ?? false,
      make() {
        const kit = smallKit({ ...situation.kit, sampleRateHz, seed, delayMs: trueMs });
        situation.change?.(kit, randomNumbers(seed + 50));
        return kit;
      },
    };
  }),
);
