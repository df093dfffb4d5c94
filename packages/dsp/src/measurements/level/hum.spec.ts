import { hum } from './hum';
import { seededNoise } from './testing/seededNoise';

/** Half the usual rate, for speed: hum lies below 500 Hz. */
const rateHz = 24000;

/** Partials' levels against the strongest: a dimmer's buzz, a transformer's field, a ground loop's odd ones. */
const patternsDb = [
  [-6, 0, -10, -8, -18, -14, -24, -20],
  [0, -12, -8, -20, -14, -26, -18, -30],
  [0, -30, -3, -30, -6, -30, -9, -30],
];

/** A second of a room at rest: hiss, and rumble below 160 Hz where `rumble` is above 0. RMS as named. */
function room({ seed, rmsDbfs, rumble, sampleRateHz = rateHz }: Room): Float32Array {
  const hiss = seededNoise({ length: sampleRateHz, rms: 1, seed });
  let low = 0;
  const coefficient = 1 - Math.exp((-2 * Math.PI * 160) / sampleRateHz);
  const both = hiss.map((x) => x + rumble * (low += coefficient * (x - low)));
  const rms = Math.sqrt(both.reduce((sum, x) => sum + x * x, 0) / both.length);
  return both.map((x) => (x * 10 ** (rmsDbfs / 20)) / rms);
}
interface Room {
  readonly seed: number;
  readonly rmsDbfs: number;
  readonly rumble: number;
  readonly sampleRateHz?: number;
}

/** Taken out of the global once: looking it up for every sample is what takes the time in a test's own context. */
const { sin, PI } = Math;

/** @param levels - [Hz, peak dBFS] each */
function tones(levels: readonly (readonly [number, number])[], sampleRateHz = rateHz): Float32Array {
  const sum = new Float32Array(sampleRateHz);
  levels.forEach(([frequencyHz, peakDbfs], n) => {
    const [amplitude, step] = [10 ** (peakDbfs / 20), (2 * PI * frequencyHz) / sampleRateHz];
    for (let i = 0; i < sum.length; i += 1) sum[i] += amplitude * sin(step * i + n);
  });
  return sum;
}
const mixed = (a: Float32Array, b: Float32Array) => a.map((x, i) => x + b[i]);
const humOf = (mainsHz: number, strongestDbfs: number, patternDb = patternsDb[0]) =>
  patternDb.map((db, i) => [mainsHz * (i + 1), strongestDbfs + db] as const);

describe('hum', () => {
  it('is found in all of 144 rooms that have it, with the mains it comes from', () => {
    let found = 0;
    for (const mainsHz of [50, 60]) {
      // A grid's frequency strays a little.
      for (const stray of [0.997, 1, 1.002]) {
        for (const pattern of patternsDb) {
          // The strongest partial against all noise. Rumble of −70 dBFS below 160 Hz hides what lies under it.
          for (const [rumble, ...levels] of [
            [0, -9, -3, 3, 9],
            [9, 0, 4, 8, 12],
          ]) {
            for (const overNoiseDb of levels) {
              const seed = 1 + found;
              const quiet = room({ seed, rmsDbfs: -70, rumble });
              const told = hum(
                mixed(quiet, tones(humOf(mainsHz * stray, -70 + overNoiseDb, pattern))),
                rateHz,
              );
              expect(told).toMatchObject({ mainsHz });
              found += 1;
            }
          }
        }
      }
    }
    expect(found).toBe(144);
  });

  it('is not found in any of 48 rooms without it', () => {
    const others = [
      [],
      // A fan and its multiples; a fridge's one tone; a drum that rings in sympathy; the second mains multiple alone.
      [87, 174, 261, 348].map((hz) => [hz, -70] as const),
      [[50, -66] as const],
      [[100, -66] as const, [159, -70] as const, [214, -72] as const, [327, -75] as const],
    ];
    const told = others.flatMap((levels, other) =>
      [0, 9].flatMap((rumble) =>
        [1, 2, 3, 4, 5, 6].map((seed) =>
          hum(mixed(room({ seed: 100 * other + seed, rmsDbfs: -70, rumble }), tones(levels)), rateHz),
        ),
      ),
    );
    expect(told).toEqual(Array(48).fill(null));
  });

  it('reads the level of what hums: RMS, a full-scale sine at −3.01', () => {
    // Partials at −6, 0, −10 … dB: powers add up to 1.54 of the strongest, so 1.88 dB above it.
    const powers = patternsDb[0].reduce((sum, db) => sum + 10 ** (db / 10), 0);
    for (const sampleRateHz of [44100, 48000, 96000]) {
      const told = hum(tones(humOf(50, -40), sampleRateHz), sampleRateHz);
      // A peak between two points of the spectrum reads up to 0.4 dB low.
      expect(Math.abs((told?.levelDbfs ?? NaN) - (-40 - 3.01 + 10 * Math.log10(powers)))).toBeLessThan(0.4);
    }
  });

  it('needs three multiples, one of them the first or the second', () => {
    const quiet = room({ seed: 5, rmsDbfs: -80, rumble: 0 });
    const at = (...hz: number[]) => hum(mixed(quiet, tones(hz.map((each) => [each, -60] as const))), rateHz);
    expect(at(50, 100)).toBeNull();
    expect(at(50, 100, 350)).toMatchObject({ mainsHz: 50 });
    expect(at(120, 240, 480)).toMatchObject({ mainsHz: 60 });
    expect(at(150, 200, 250, 350)).toBeNull();
    expect(at(50, 150, 450)).toBeNull();
  });

  it('moves with the level and not with polarity', () => {
    const sound = mixed(room({ seed: 3, rmsDbfs: -70, rumble: 9 }), tones(humOf(60, -64)));
    const whole = hum(sound, rateHz);
    expect(
      hum(
        sound.map((x) => -x),
        rateHz,
      ),
    ).toEqual(whole);
    expect(
      (whole?.levelDbfs ?? NaN) -
        (hum(
          sound.map((x) => x / 2),
          rateHz,
        )?.levelDbfs ?? NaN),
    ).toBeCloseTo(6.0206, 4);
  });

  it('is none in silence, and refuses nothing at all', () => {
    expect(hum(new Float32Array(48000), 48000)).toBeNull();
    expect(() => hum(new Float32Array(0), 48000)).toThrow('hold no sample');
    expect(() => hum(new Float32Array(10), -1)).toThrow('sampleRateHz must be a finite number');
  });
});
