import { smallKit } from '../../testing/smallKit';
import { createDropouts } from './dropouts';
import { seededNoise } from './testing/seededNoise';

const sampleRateHz = 48000;

function dropouts(samples: Float32Array, { quantisationStep = 2 ** -23, size = samples.length } = {}) {
  const meter = createDropouts({ sampleRateHz, quantisationStep });
  for (let i = 0; i < samples.length; i += size) meter.push(samples.subarray(i, i + size));
  return meter.result().dropouts;
}
const none = { count: 0, firstAtS: null };
/** A ringing drum with a little hiss: 80 Hz, −6 dBFS at first. */
const ringing = (seed = 1) => {
  const noise = seededNoise({ length: 2 * sampleRateHz, rms: 2e-4, seed });
  return noise.map(
    (x, i) => x + 0.5 * Math.exp(-i / (0.5 * sampleRateHz)) * Math.sin((2 * Math.PI * 80 * i) / sampleRateHz),
  );
};
const without = (samples: Float32Array, start: number, length: number) =>
  samples.map((x, i) => (i >= start && i < start + length ? 0 : x));
const skipping = (samples: Float32Array, start: number, length: number) =>
  Float32Array.from([...samples.subarray(0, start), ...samples.subarray(start + length)]);

describe('dropouts', () => {
  it('are found where a buffer of any usual size is missing', () => {
    for (const length of [16, 32, 64, 128, 256, 512, 1024, 2048, 4096, 8192]) {
      // 20 160 samples are 33.6 cycles of the drum: well away from where it crosses zero by itself.
      expect(dropouts(without(ringing(), 20160, length))).toEqual({
        count: 1,
        firstAtS: 20160 / sampleRateHz,
      });
    }
  });

  it('are found where the wave jumps because samples were left out', () => {
    // Half a period of 80 Hz and a bit: the wave goes on upside down.
    const { count, firstAtS } = dropouts(skipping(ringing(), 20160, 350));
    expect(count).toBe(1);
    expect(firstAtS).toBeCloseTo(20160 / sampleRateHz, 4);
  });

  it('are counted by place, a quarter of a second apart', () => {
    const once = without(without(ringing(), 10160, 64), 10300, 64);
    expect(dropouts(once).count).toBe(1);
    expect(dropouts(without(without(ringing(), 10160, 64), 40160, 64)).count).toBe(2);
  });

  it('are a single wrong sample too', () => {
    expect(dropouts(ringing().map((x, i) => (i === 20160 ? x - 0.4 : x)))).toMatchObject({ count: 1 });
  });

  it('are none in hits as they are played, hats and all', () => {
    for (const seed of [1, 2, 3, 4]) {
      const { kick, overhead } = smallKit({ kicks: 5, hats: true, seed });
      expect([dropouts(kick), dropouts(overhead)]).toEqual([none, none]);
    }
  });

  it('are none where a gate closes, a fade ends, or silence was cut in for longer', () => {
    const gated = ringing().map((x, i) => {
      const within = i % 24000;
      return within < 12000
        ? x * Math.min(1, within / 480)
        : within < 14400
          ? x * (1 - (within - 12000) / 2400)
          : 0;
    });
    expect(dropouts(gated)).toEqual(none);
    expect(dropouts(without(ringing(), 20160, 12000))).toEqual(none);
    expect(dropouts(ringing().subarray(300))).toEqual(none);
  });

  it('are none in slow or quiet waves whose crossings are quantised to zeros', () => {
    for (const step of [2 ** -7, 2 ** -15]) {
      for (const amplitude of [3, 10, 60]) {
        const wave = Float32Array.from({ length: sampleRateHz }, (_, i) => {
          return Math.round(amplitude * Math.sin((2 * Math.PI * 30 * i) / sampleRateHz)) * step;
        });
        expect(dropouts(wave, { quantisationStep: step })).toEqual(none);
      }
    }
  });

  it('do not depend on how the file is cut, nor on polarity', () => {
    const broken = skipping(without(ringing(), 20160, 64), 50160, 350);
    const whole = dropouts(broken);
    expect(whole.count).toBe(2);
    for (const size of [1, 7, 777]) expect(dropouts(broken, { size })).toEqual(whole);
    expect(dropouts(broken.map((x) => -x))).toEqual(whole);
  });

  it('are none in silence and in next to nothing', () => {
    for (const length of [0, 1, 30, 48000])
      expect(dropouts(new Float32Array(length), { size: 4096 })).toEqual(none);
  });
});
