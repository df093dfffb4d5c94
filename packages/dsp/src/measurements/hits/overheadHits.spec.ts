import { randomNumbers } from '../../testing/randomNumbers';
import { createTrackPass } from '../pass/trackPass';
import { listHits, loudestHitDbfs } from './listHits';
import { createOverheadHits } from './overheadHits';

const sampleRateHz = 48000;

/** Noise bursts between two frequencies made of many sines, one every half second. */
const bursts = (lowHz: number, highHz: number, count = 6): Float32Array => {
  const random = randomNumbers(5);
  const tones = Array.from({ length: 40 }, (_, i) => ({
    hz: lowHz + ((highHz - lowHz) * (i + 0.5)) / 40,
    phase: 3 * random(),
  }));
  const samples = new Float32Array(sampleRateHz * (0.5 * count + 0.5)).map(() => 1e-5 * random());
  for (let n = 0; n < count; n += 1) {
    const start = Math.round((0.25 + 0.5 * n) * sampleRateHz);
    for (let i = 0; i < 9600; i += 1) {
      const s = i / sampleRateHz;
      const wave = tones.reduce((sum, tone) => sum + Math.sin(2 * Math.PI * tone.hz * s + tone.phase), 0);
      samples[start + i] += 0.02 * Math.exp(-s / 0.04) * wave;
    }
  }
  return samples;
};
const hitsIn = (overhead: Float32Array, rate = sampleRateHz) => {
  const finder = createOverheadHits(rate);
  const hops = [new Float32Array(overhead.length).fill(0.25), overhead].map((samples) =>
    createTrackPass({
      sampleRateHz: rate,
      quantisationStep: null,
      frames: overhead.length,
      listens: true,
    }).push(samples),
  );
  finder.push({ body: hops[1].body, bright: hops[1].bright, peaks: hops.map(({ peaks }) => peaks) });
  return finder.result();
};

describe('hits in the overhead', () => {
  it('are drums where 100 Hz to 1 kHz outweighs, cymbals where 5 to 15 kHz does', () => {
    expect(hitsIn(bursts(150, 900)).map((hit) => hit.kind)).toEqual(Array(6).fill('drum'));
    expect(hitsIn(bursts(6000, 14000)).map((hit) => hit.kind)).toEqual(Array(6).fill('cymbal'));
  });

  it('are mixed where neither outweighs, and where the rate leaves no treble to judge by', () => {
    const both = bursts(150, 900).map((x, i) => x + 0.6 * bursts6to14[i]);
    expect(new Set(hitsIn(both).map((hit) => hit.kind))).toEqual(new Set(['mixed']));
    expect(new Set(hitsIn(bursts(150, 900), 16000).map((hit) => hit.kind))).toEqual(new Set(['mixed']));
  });
  const bursts6to14 = bursts(6000, 14000);

  it('carry the peak of every track and the time they begin', () => {
    const overhead = bursts(150, 900);
    const [first] = hitsIn(overhead);
    expect(first.peaks[0]).toBe(0.25);
    const peak = overhead.reduce((most, x) => Math.max(most, Math.abs(x)), 0);
    // The bursts are alike but for noise of −100 dBFS, and the first need not be the loudest.
    expect(first.peaks[1]).toBeCloseTo(peak, 4);
    // A hop is 2 ms and the level is averaged over 10.
    expect(Math.abs(first.atSample / sampleRateHz - 0.25)).toBeLessThan(0.012);
  });

  it('are none in silence', () => {
    expect(hitsIn(new Float32Array(48000))).toEqual([]);
  });
});

describe('the list of hits', () => {
  const other = (atSample: number) => ({
    atSample,
    kind: 'cymbal' as const,
    levelDb: 0,
    struck: true,
    peaks: [0.01, 0.5],
  });

  it('tells what is struck with a kick as the kick, and the rest in order of time', () => {
    const kicks = [{ onsetSample: 48100, startSample: 48000, peaks: [0.5, 0.1] }];
    const hits = listHits(kicks, [other(24000), other(47000), other(49000), other(60000)], { sampleRateHz });
    expect(hits.map((hit) => [hit.timeS, hit.kind])).toEqual([
      [0.5, 'cymbal'],
      [1, 'kick'],
      [1.25, 'cymbal'],
    ]);
    expect(hits[1].peaksDbfs[0]).toBeCloseTo(-6.0206, 4);
  });

  it('looks for a kick where the overhead hears it when its file runs late', () => {
    const kicks = [{ onsetSample: 48100, startSample: 48000, peaks: [0.5, 0.1] }];
    const heard = [other(48000), other(64000)];
    expect(listHits(kicks, heard, { sampleRateHz, lateSamples: 16000 }).map((hit) => hit.kind)).toEqual([
      'kick',
      'cymbal',
    ]);
  });

  it('takes what swells after a kick for its ringing, unless it was struck, is louder, or comes later', () => {
    const kicks = [{ onsetSample: 48000, startSample: 48000, peaks: [0.5, 0.4] }];
    const swell = { ...other(48000 + 4800), struck: false, peaks: [0.1, 0.3] };
    const count = (hit: typeof swell): number => listHits(kicks, [hit], { sampleRateHz }).length;
    expect(count(swell)).toBe(1);
    expect(count({ ...swell, struck: true })).toBe(2);
    expect(count({ ...swell, peaks: [0.1, 0.41] })).toBe(2);
    expect(count({ ...swell, atSample: 48000 + 7300 })).toBe(2);
    expect(count({ ...swell, atSample: 48000 - 4800 })).toBe(2);
  });

  it('knows the loudest of each track, and null for none or silence', () => {
    const hits = listHits([{ onsetSample: 0, startSample: 0, peaks: [0.5, 0] }], [other(60000)], {
      sampleRateHz,
    });
    expect(loudestHitDbfs(hits, 0)).toBeCloseTo(-6.0206, 4);
    expect(loudestHitDbfs(hits, 1)).toBeCloseTo(-6.0206, 4);
    expect(loudestHitDbfs(hits.slice(0, 1), 1)).toBeNull();
    expect(loudestHitDbfs([], 0)).toBeNull();
  });
});
