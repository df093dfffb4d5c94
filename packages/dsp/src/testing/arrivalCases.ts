import { randomNumbers } from './randomNumbers';
import { smallKit, type SmallKitOptions } from './smallKit';

/** A made take whose arrival is known. */
export interface ArrivalCase {
  readonly name: string;
  readonly trueMs: number;
  readonly make: () => {
    readonly kick: Float32Array;
    readonly overhead: Float32Array;
    readonly sampleRateHz: number;
  };
}

type Change = (samples: Float32Array, sampleRateHz: number, random: () => number) => void;

interface Situation {
  readonly name: string;
  readonly kit?: SmallKitOptions;
  readonly kick?: Change;
  readonly overhead?: Change;
}

/** 20 ms of nothing, three times a second, at places that have to do with no hit. */
const dropouts: Change = (samples, sampleRateHz, random) => {
  for (let at = 0; at < samples.length; at += sampleRateHz / 3) {
    const start = Math.round(at + 0.1 * sampleRateHz * (1 + random()));
    samples.fill(0, start, start + Math.round(0.02 * sampleRateHz));
  }
};
/** A crash that rings through the take: bright noise that halves every second. */
const crash: Change = (samples, sampleRateHz, random) => {
  let before = 0;
  for (let i = 0; i < samples.length; i += 1) {
    const noise = random();
    samples[i] += 0.05 * 0.5 ** (i / sampleRateHz) * (noise - before);
    before = noise;
  }
};
/** Walls: the same sound again, softer, 3 to 40 ms later. */
const walls: Change = (samples, sampleRateHz, random) => {
  const echoes = Array.from({ length: 8 }, () => ({
    by: Math.round((0.0215 + 0.0185 * random()) * sampleRateHz),
    gain: 0.3 * random(),
  }));
  for (let i = samples.length - 1; i >= 0; i -= 1)
    for (const { by, gain } of echoes) if (i >= by) samples[i] += gain * samples[i - by];
};
const quieter: Change = (samples) => {
  for (let i = 0; i < samples.length; i += 1) samples[i] *= 0.01;
};

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
  { name: 'ringing crash', overhead: crash },
  { name: 'dropouts in both', kick: dropouts, overhead: dropouts },
  { name: 'low level', kick: quieter, overhead: quieter },
  { name: 'walls', overhead: walls },
  { name: 'walls, hats, turned over', kit: { hats: true, overheadGain: -0.3 }, overhead: walls },
];
const DELAYS_MS = [0.3, 1.37, 2.9, 5.2, 8];
const RATES_HZ = [48000, 44100, 96000];

/** Every situation at every delay, at changing rates and with its own seed. */
export const arrivalCases: readonly ArrivalCase[] = situations.flatMap((situation, place) =>
  DELAYS_MS.map((trueMs, i) => {
    const sampleRateHz = RATES_HZ[(place + i) % RATES_HZ.length];
    const seed = 1 + 100 * place + i;
    return {
      name: `${situation.name}, ${trueMs} ms at ${sampleRateHz} Hz`,
      trueMs,
      make() {
        const { kick, overhead } = smallKit({ ...situation.kit, sampleRateHz, seed, delayMs: trueMs });
        const random = randomNumbers(seed + 50);
        situation.kick?.(kick, sampleRateHz, random);
        situation.overhead?.(overhead, sampleRateHz, random);
        return { kick, overhead, sampleRateHz };
      },
    };
  }),
);
