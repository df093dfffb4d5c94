import { createLoudness } from '@thudline/dsp';
import { matchedTakes, type HeardTake } from './matchedTakes';

const sampleRateHz = 48_000;
const seconds = 3;

/** Beats of a low tone in the kick and of a high one in the overhead. */
function sound(level: number, flipped = false) {
  const beats = (hz: number, size: number) =>
    Float32Array.from({ length: seconds * sampleRateHz }, (_, i) => {
      const since = (i % (sampleRateHz / 2)) / sampleRateHz;
      return size * level * Math.exp(-since * 6) * Math.sin(2 * Math.PI * hz * since);
    });
  return { sampleRateHz, kick: beats(60, 0.5), overhead: beats(60, flipped ? -0.2 : 0.2) };
}

const peakOf = (samples: Float32Array) => samples.reduce((top, value) => Math.max(top, Math.abs(value)), 0);

function playedLufs({ samples, gainDb }: HeardTake): number {
  const meter = createLoudness({ sampleRateHz });
  meter.push(samples.map((value) => value * 10 ** (gainDb / 20)));
  return meter.result().integratedLufs!;
}

describe('two takes ready to be switched between', () => {
  it('are equally loud within a tenth of a loudness unit', () => {
    const [quiet, loud] = matchedTakes([
      { sound: sound(0.2, true), overheadGainDb: 5.7 },
      { sound: sound(0.9), overheadGainDb: 2 },
    ]);
    expect(Math.abs(playedLufs(quiet) - playedLufs(loud))).toBeLessThan(0.1);
  });

  it('only ever have the louder one turned down', () => {
    const [quiet, loud] = matchedTakes([
      { sound: sound(0.3), overheadGainDb: 0 },
      { sound: sound(0.6), overheadGainDb: 0 },
    ]);
    expect(quiet.matchDb).toBe(0);
    // Twice the amplitude.
    expect(loud.matchDb).toBeCloseTo(-6.02, 1);
  });

  it('stay below full scale where both microphones peak together', () => {
    const takes = matchedTakes([
      { sound: sound(1), overheadGainDb: 12 },
      { sound: sound(0.9), overheadGainDb: 12 },
    ]);
    for (const { samples, gainDb } of takes)
      expect(peakOf(samples) * 10 ** (gainDb / 20)).toBeLessThanOrEqual(1.000001);
    expect(Math.abs(playedLufs(takes[0]) - playedLufs(takes[1]))).toBeLessThan(0.1);
  });

  it('are left as they are where one of them is silent', () => {
    const silent = {
      sampleRateHz,
      kick: new Float32Array(sampleRateHz),
      overhead: new Float32Array(sampleRateHz),
    };
    const takes = matchedTakes([
      { sound: silent, overheadGainDb: 0 },
      { sound: sound(0.5), overheadGainDb: 0 },
    ]);
    expect(takes.map(({ matchDb }) => matchDb)).toEqual([0, 0]);
  });
});
