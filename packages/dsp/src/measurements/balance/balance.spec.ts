import type { HitFacts } from '../../facts';
import { arrayTrack } from '../../testing/arrayTrack';
import { balance } from './balance';

const sampleRateHz = 48000;

interface Burst {
  readonly timeS: number;
  readonly kind: HitFacts['kind'];
  readonly amplitude: number;
  readonly lengthS?: number;
}

const hit = ({ timeS, kind }: Pick<Burst, 'timeS' | 'kind'>): HitFacts => ({ timeS, kind, peaksDbfs: [] });

/** A 997 Hz tone at each burst, where the K-weighting adds exactly what the offset takes back. */
const played = (bursts: readonly Burst[], offset = 0): { samples: Float32Array; hits: HitFacts[] } => {
  const endS = Math.max(...bursts.map((burst) => burst.timeS)) + 1;
  const samples = new Float32Array(Math.round(endS * sampleRateHz)).fill(offset);
  for (const { timeS, amplitude, lengthS = 0.1 } of bursts) {
    const start = Math.round(timeS * sampleRateHz);
    for (let i = 0; i < lengthS * sampleRateHz; i += 1)
      samples[start + i] += amplitude * Math.sin((2 * Math.PI * 997 * i) / sampleRateHz);
  }
  return { samples, hits: bursts.map(hit) };
};
const told = ({ samples, hits }: ReturnType<typeof played>) =>
  balance(arrayTrack(samples, sampleRateHz), hits);
const drums = (count: number, amplitude = 0.5): Burst[] =>
  Array.from({ length: count }, (_, i) => ({ timeS: 0.5 + i, kind: 'drum', amplitude }));
const cymbals = (count: number, amplitude = 0.25, startS = 20): Burst[] =>
  Array.from({ length: count }, (_, i) => ({ timeS: startS + i, kind: 'cymbal', amplitude }));

describe('cymbals against drums', () => {
  it('is the K-weighted level over 400 ms, on paper', async () => {
    const { drumsLufs, cymbalsLufs, differenceDb } = await told(played([...drums(5), ...cymbals(5)]));
    // A quarter of the 400 ms holds a sine of 0.5: −6.02 − 3.01 − 6.02 dB; its switching on and off adds a little.
    expect(Math.abs((drumsLufs ?? NaN) - -15.05)).toBeLessThan(0.05);
    expect(Math.abs((cymbalsLufs ?? NaN) - -21.07)).toBeLessThan(0.05);
    expect(differenceDb).toBeCloseTo(-6.02, 2);
  });

  it('keeps what each hit says', async () => {
    const { perHit, drumsLufs } = await told(played([...drums(4), ...cymbals(6)]));
    expect([perHit?.drumsLufs.length, perHit?.cymbalsLufs.length, drumsLufs]).toEqual([4, 6, null]);
    for (const level of perHit?.drumsLufs ?? []) expect(Math.abs(level - -15.05)).toBeLessThan(0.05);
  });

  it('doesn’t change with gain, polarity, or an offset of the file', async () => {
    const plain = played([...drums(5), ...cymbals(5)]);
    const { differenceDb } = await told(plain);
    const turned = { ...plain, samples: plain.samples.map((x) => -0.125 * x) };
    expect((await told(turned)).differenceDb).toBeCloseTo(differenceDb ?? NaN, 6);
    const offset = await told(played([...drums(5), ...cymbals(5)], 0.1));
    expect(offset.differenceDb).toBeCloseTo(differenceDb ?? NaN, 2);
  });

  it('needs five of each, and says which is missing', async () => {
    expect(await told(played([...drums(4), ...cymbals(5)]))).toMatchObject({
      drumsLufs: null,
      differenceDb: null,
      drumHits: 4,
      cymbalHits: 5,
      reason: 'too-few-drums',
    });
    expect((await told(played([...drums(5), ...cymbals(4)]))).reason).toBe('too-few-cymbals');
    expect((await told(played(drums(1)))).reason).toBe('too-few-of-both');
    expect((await told(played([...drums(5), ...cymbals(5)]))).reason).toBeNull();
  });

  it('leaves out hits that something was struck with, before, or right after', async () => {
    const busy = played([...drums(5), ...cymbals(5)]);
    const mixed = busy.hits.map((each) => ({ ...each, kind: 'mixed' as const }));
    expect((await told({ ...busy, hits: mixed })).drumHits).toBe(0);
    const beside = (timeS: number) => told({ ...busy, hits: [hit({ timeS, kind: 'kick' }), ...busy.hits] });
    expect((await beside(0.5 - 0.149)).drumHits).toBe(4);
    expect((await beside(0.5 - 0.151)).drumHits).toBe(5);
    const after = [busy.hits[0], hit({ timeS: 0.64, kind: 'kick' }), ...busy.hits.slice(1)];
    expect((await told({ ...busy, hits: after })).drumHits).toBe(4);
  });

  it('ends a hit at the next one', async () => {
    const crowded = [...drums(5), ...cymbals(5)].flatMap((burst): Burst[] => [
      burst,
      { ...burst, timeS: burst.timeS + 0.3, kind: 'mixed', amplitude: 1 },
    ]);
    const { drumsLufs } = await told(played(crowded));
    expect(Math.abs((drumsLufs ?? NaN) - -15.05)).toBeLessThan(0.05);
  });

  it('takes hits from the whole of a long take', async () => {
    const long = Array.from({ length: 250 }, (_, i): Burst => ({
      timeS: 0.5 + i,
      kind: 'drum',
      amplitude: i < 125 ? 0.1 : 0.4,
    }));
    const { drumsLufs, drumHits } = await told(played(long));
    expect(drumHits).toBe(100);
    // Half of them 12.04 dB louder, so the median lies in the middle of −29.03 and −16.99.
    expect(Math.abs((drumsLufs ?? NaN) - -23.01)).toBeLessThan(0.05);
  });

  it('can tell nothing from silence', async () => {
    const silent = { samples: new Float32Array(48000), hits: [hit({ timeS: 0.5, kind: 'drum' })] };
    expect(await told(silent)).toMatchObject({ drumHits: 0, differenceDb: null });
  });
});
