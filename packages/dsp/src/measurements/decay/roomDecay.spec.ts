import type { HitFacts } from '../../facts';
import { arrayTrack } from '../../testing/arrayTrack';
import { randomNumbers } from '../../testing/randomNumbers';
import { median } from '../statistics';
import { roomDecay } from './roomDecay';

const { exp, sin, PI, LN10 } = Math;

interface Drum {
  readonly decayS: number;
  readonly count?: number;
  readonly everyS?: number;
  readonly wires?: boolean;
  readonly sampleRateHz?: number;
}

/** Noise that falls by 60 dB in `decayS`, as a snare in a room; without wires, a drum of 150 Hz and little else. */
const played = ({ decayS, count = 8, everyS = 1.5, wires = true, sampleRateHz = 48000 }: Drum) => {
  const random = randomNumbers(3);
  const lengthS = count * everyS + 1;
  const samples = Float32Array.from({ length: Math.round(lengthS * sampleRateHz) }, () => 1e-5 * random());
  const hits = Array.from({ length: count }, (_, i): HitFacts => {
    const timeS = 0.5 + i * everyS;
    const start = Math.round(timeS * sampleRateHz);
    const frames = Math.min(samples.length - start, Math.round(1.4 * sampleRateHz));
    for (let n = 0; n < frames; n += 1) {
      const s = n / sampleRateHz;
      const fall = exp((-3 * LN10 * s) / decayS);
      samples[start + n] += fall * (wires ? 0.3 * random() : 0.5 * sin(2 * PI * 150 * s) + 1e-3 * random());
    }
    // Told 8 ms late, as hits in the overhead are.
    return { timeS: timeS + 0.008, kind: 'drum', peaksDbfs: [null, -10] };
  });
  return { overhead: arrayTrack(samples, sampleRateHz), hits };
};
const told = ({ overhead, hits }: ReturnType<typeof played>) => roomDecay(overhead, { hits, place: 1 });

describe('the decay of the room', () => {
  it.each([
    [0.3, 48000],
    [0.5, 44100],
    [0.5, 96000],
  ])('is what the snare was made with: %d s at %d Hz', async (decayS, sampleRateHz) => {
    const { bands, reason, snareHits, decayS: middleS } = await told(played({ decayS, sampleRateHz }));
    expect([reason, snareHits]).toEqual([null, 8]);
    expect(bands.map((band) => band.centreHz)).toEqual([500, 1000, 2000, 4000]);
    // Median of eight noise bursts, each within 6 %.
    for (const { t20S, earlyS } of bands) {
      expect(Math.abs((t20S?.median ?? NaN) / decayS - 1)).toBeLessThan(0.06);
      expect(Math.abs((earlyS?.median ?? NaN) / decayS - 1)).toBeLessThan(0.15);
    }
    expect(Math.abs((middleS ?? NaN) / decayS - 1)).toBeLessThan(0.06);
  });

  it('keeps what each hit says, also where six are too few', async () => {
    const { bands } = await told(played({ decayS: 0.4 }));
    for (const { t20S, perHit } of bands) {
      expect(perHit?.t20S).toHaveLength(8);
      // Kept to a ten-thousandth.
      expect(median(perHit?.t20S ?? [])).toBeCloseTo(t20S?.median ?? NaN, 3);
    }
    const few = await told(played({ decayS: 0.4, count: 5 }));
    expect(few.bands[1].t20S).toBeNull();
    expect(few.bands[1].perHit?.t20S).toHaveLength(5);
  });

  it('tells how bright each snare is: white noise by the widths of its bands', async () => {
    const { brightnessPerHitDb } = await told(played({ decayS: 0.4 }));
    expect(brightnessPerHitDb).toHaveLength(8);
    // 8 kHz against 0.9 kHz; every edge lies π/(2√2) times higher for noise, the uppermost less (the bilinear transform).
    const expected = 10 * Math.log10(8000 / 900);
    expect(Math.abs((median(brightnessPerHitDb ?? []) ?? NaN) - expected)).toBeLessThan(0.5);
    const dull = await told(played({ decayS: 0.4, wires: false }));
    expect(dull.brightnessPerHitDb).toEqual([]);
  });

  it('doesn’t change with gain and polarity', async () => {
    const { overhead, hits } = played({ decayS: 0.4 });
    const samples = (await overhead.read(0, overhead.frames)).map((x) => -x / 64);
    const turned = await told({ overhead: arrayTrack(samples, 48000), hits });
    expect(turned.decayS).toBeCloseTo((await told({ overhead, hits })).decayS ?? NaN, 6);
  });

  it('needs six loud hits with wires', async () => {
    const nothing = { decayS: null, earlyS: null, reason: 'too-few-snares' };
    expect(await told(played({ decayS: 0.4, count: 5 }))).toMatchObject({ ...nothing, snareHits: 5 });
    expect(await told(played({ decayS: 0.4, wires: false }))).toMatchObject({ ...nothing, snareHits: 0 });
    const { overhead, hits } = played({ decayS: 0.4 });
    const soft = hits.map((hit, i) => ({ ...hit, peaksDbfs: [null, i < 3 ? -10 : -17] }));
    expect((await told({ overhead, hits: soft })).snareHits).toBe(3);
    const mixed = hits.map((hit) => ({ ...hit, kind: 'mixed' as const }));
    expect((await told({ overhead, hits: mixed })).snareHits).toBe(0);
  });

  it('leaves out what follows too soon on something else, and what is soon cut off', async () => {
    const { overhead, hits } = played({ decayS: 0.4 });
    const beside = (s: number) =>
      hits.flatMap((hit) => [hit, { ...hit, timeS: hit.timeS + s, kind: 'kick' as const }]);
    const inOrder = (list: HitFacts[]) => [...list].sort((a, b) => a.timeS - b.timeS);
    expect((await told({ overhead, hits: inOrder(beside(-0.1)) })).snareHits).toBe(0);
    expect((await told({ overhead, hits: inOrder(beside(0.15)) })).snareHits).toBe(0);
    expect((await told({ overhead, hits: inOrder(beside(0.25)) })).snareHits).toBe(8);
  });

  it('says so where the next hit comes before 35 dB are gone', async () => {
    const { overhead, hits } = played({ decayS: 0.8 });
    const next = hits.flatMap((hit) => [hit, { ...hit, timeS: hit.timeS + 0.3, kind: 'kick' as const }]);
    expect(await told({ overhead, hits: next })).toMatchObject({ decayS: null, reason: 'cut-short' });
  });

  it('reads no more than 24 hits of a long take', async () => {
    expect((await told(played({ decayS: 0.3, count: 30, everyS: 0.6 }))).snareHits).toBe(24);
  });

  it('can tell nothing from a take without drums', async () => {
    const { overhead } = played({ decayS: 0.3, count: 1 });
    expect(await told({ overhead, hits: [] })).toMatchObject({ snareHits: 0, reason: 'too-few-snares' });
  });
});
