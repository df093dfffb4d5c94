import { SignalError } from './assert';
import { measureTake, type MeasureTakeOptions } from './measureTake';
import { arrayTrack } from './testing/arrayTrack';
import { smallKit, type SmallKit, type SmallKitOptions } from './testing/smallKit';

const take = (
  { kick, overhead, sampleRateHz }: { kick: Float32Array; overhead: Float32Array; sampleRateHz: number },
  options: Partial<MeasureTakeOptions> = {},
) =>
  measureTake({
    tracks: [
      { role: 'kick', source: arrayTrack(kick, sampleRateHz) },
      { role: 'overhead', source: arrayTrack(overhead, sampleRateHz, 8191) },
    ],
    ...options,
  });
const delayed = (x: Float32Array, samples: number): Float32Array => x.map((_, i) => x[i - samples] ?? 0);
const made = new Map<string, SmallKit>();
/** Made once, however many tests use it. */
const kit = (options: SmallKitOptions = {}): SmallKit => {
  const name = JSON.stringify(options);
  const known = made.get(name) ?? smallKit({ delayMs: 1.6, kicks: 6, ...options });
  made.set(name, known);
  return known;
};

describe('a measured take', () => {
  it('holds the hits, the arrival and the verdict of the kit', async () => {
    const { facts, pairSpectra } = await take(kit());
    const [pair] = facts.pairs;
    expect(facts.hits.map((hit) => hit.kind)).toEqual(Array(6).fill('kick'));
    // Wanted on synthetic takes (docs/measurements.md, 4): 0.05 ms.
    expect(Math.abs((pair.arrival.arrivalMs ?? NaN) - 1.6)).toBeLessThan(0.05);
    expect(pair.agreement).toMatchObject({ verdict: 'keep', sure: true, agreeingHits: 6 });
    // The overhead hears the kick at 0.4: matched by 20·lg(1/0.4) = 7.96 dB; noise of −80 dBFS moves it little.
    expect(pair.agreement.matchGainDb).toBeCloseTo(7.96, 1);
    expect(pairSpectra[0]?.skk).toHaveLength(pair.spectrum?.binCount ?? 0);
    expect(facts.tracks.map((track) => track.role)).toEqual(['kick', 'overhead']);
    expect(facts.notices).toEqual([]);
  });

  it.each([44100, 48000, 96000])(
    'finds the arrival under hats within 0.3 ms at %i Hz',
    async (sampleRateHz) => {
      for (const delayMs of [0.9, 2.4, 5.1]) {
        const { facts } = await take(kit({ sampleRateHz, delayMs, hats: true, seed: 7 }));
        expect(Math.abs((facts.pairs[0].arrival.arrivalMs ?? NaN) - delayMs)).toBeLessThan(0.3);
      }
    },
  );

  it('changes nothing but the sign when the overhead is inverted', async () => {
    const { facts } = await take(kit());
    const { facts: inverted } = await take({ ...kit(), overhead: kit().overhead.map((x) => -x) });
    const gain = facts.pairs[0].agreement.flipGainMatchedDb ?? NaN;
    expect(inverted.pairs[0].agreement.verdict).toBe('flip');
    // "Done means": within 0.05 dB.
    expect(Math.abs((inverted.pairs[0].agreement.flipGainMatchedDb ?? NaN) + gain)).toBeLessThan(0.05);
    expect(inverted.pairs[0].arrival.arrivalMs).toBeCloseTo(facts.pairs[0].arrival.arrivalMs ?? NaN, 3);
  });

  it('moves the arrival with the overhead, to a sample', async () => {
    const { facts } = await take(kit());
    for (const samples of [-40, 1, 240]) {
      const { facts: moved } = await take({ ...kit(), overhead: delayed(kit().overhead, samples) });
      const change =
        (moved.pairs[0].arrival.arrivalSamples ?? NaN) - (facts.pairs[0].arrival.arrivalSamples ?? NaN);
      expect(Math.abs(change - samples)).toBeLessThanOrEqual(1);
    }
  });

  it('finds an overhead file that runs late, and tells neither arrival nor polarity of it', async () => {
    const uneven = kit({ kicks: 8, swingS: 0.06, hats: true });
    const { facts } = await take(uneven);
    expect(facts.pairs[0].lateStart).toBeNull();
    const overhead = delayed(uneven.overhead, 0.32 * 48000);
    const { facts: late, pairSpectra } = await take({ ...uneven, overhead });
    const [pair] = late.pairs;
    // Wanted (docs/measurements.md, 4): within 5 ms; the kit's own 1.6 ms can't be told apart.
    expect(Math.abs((pair.lateStart?.overheadLateMs ?? NaN) - 321.6)).toBeLessThan(5);
    expect(pair.arrival).toMatchObject({ arrivalMs: null, confidence: 0, reason: 'late-start' });
    expect(pair.agreement).toMatchObject({ verdict: 'cannot-tell', sure: false, reason: 'late-start' });
    expect([pair.spectrum, ...pairSpectra]).toEqual([null, null]);
    const peaks = (hits: typeof facts.hits) =>
      hits.filter(({ kind }) => kind === 'kick').map(({ peaksDbfs }) => Math.round(peaksDbfs[1] ?? NaN));
    expect(peaks(late.hits)).toEqual(peaks(facts.hits));
    expect(late.hits.length).toBe(facts.hits.length);
  });

  it('says the same of a quieter overhead once levels are matched', async () => {
    const { facts } = await take(kit({ noise: 0 }));
    const { facts: quiet } = await take({
      ...kit({ noise: 0 }),
      overhead: kit({ noise: 0 }).overhead.map((x) => x / 64),
    });
    const [a, b] = [facts.pairs[0].agreement, quiet.pairs[0].agreement];
    expect(b.verdict).toBe(a.verdict);
    // 64 is a power of two, so only float32 rounding differs.
    expect(b.flipGainMatchedDb).toBeCloseTo(a.flipGainMatchedDb ?? NaN, 4);
    expect((b.matchGainDb ?? NaN) - (a.matchGainDb ?? NaN)).toBeCloseTo(20 * Math.log10(64), 4);
    expect(Math.abs(b.flipGainRecordedDb ?? NaN)).toBeLessThan(Math.abs(a.flipGainRecordedDb ?? NaN));
  });

  it('holds the outline of each track over the shorter file', async () => {
    const { kick, overhead, sampleRateHz } = kit();
    const { peaks, facts } = await take({ kick, overhead: overhead.subarray(0, 100_003), sampleRateHz });
    expect(peaks.map((track) => track.map((level) => level.steps))).toEqual([
      [500, 2000, 8000],
      [500, 2000, 8000],
    ]);
    expect(facts.durationS).toBe(100_003 / sampleRateHz);
    const largest = kick.subarray(0, 100_003).reduce((most, x) => Math.max(most, Math.abs(x)), 0);
    for (const { pairs } of peaks[0])
      expect(Math.max(...pairs.map(Math.abs))).toBe(Math.round(127 * largest));
  });

  it('measures over the shorter file and says so', async () => {
    const { kick, overhead, sampleRateHz } = kit();
    const { facts } = await take({ kick, overhead: overhead.subarray(0, 96000), sampleRateHz });
    expect(facts.durationS).toBe(2);
    expect(facts.notices).toEqual([{ kind: 'lengths-differ', byS: kick.length / 48000 - 2 }]);
  });

  it('notices the same file twice, a silent one, and keeps what reading noticed', async () => {
    const { kick, sampleRateHz } = kit();
    const twice = await take({ kick, overhead: kick, sampleRateHz });
    expect(twice.facts.notices).toEqual([{ kind: 'same-file-twice' }]);
    const notices = [{ kind: 'cut-short', role: 'kick' } as const];
    const silent = await take({ kick, overhead: new Float32Array(kick.length), sampleRateHz }, { notices });
    expect(silent.facts.notices).toEqual([...notices, { kind: 'silent', role: 'overhead' }]);
    expect(silent.facts.pairs[0].agreement).toMatchObject({
      verdict: 'cannot-tell',
      reason: 'overhead-silent',
    });
    expect(silent.facts.pairs[0].arrival.reason).toBe('overhead-silent');
  });

  it.each([
    ['silence', new Float32Array(48000)],
    ['one sample', Float32Array.of(0.5)],
    ['ten milliseconds', new Float32Array(480).fill(0.1)],
  ])('can tell nothing from %s, without NaN or infinity', async (_name, samples) => {
    const { facts, pairSpectra } = await take({ kick: samples, overhead: samples, sampleRateHz: 48000 });
    expect(facts.pairs[0].agreement).toMatchObject({ verdict: 'cannot-tell' });
    expect(pairSpectra).toHaveLength(1);
    expect(JSON.parse(JSON.stringify(facts))).toEqual(facts);
  });

  it('tells its stages in order, from 0 to 1', async () => {
    const stages: [string, number][] = [];
    await take(kit({ kicks: 3 }), { onStage: (stage, progress) => stages.push([stage, progress]) });
    expect([...new Set(stages.map(([stage]) => stage))]).toEqual(['levels', 'hits', 'arrival', 'adding-up']);
    expect(stages.every(([, progress]) => progress > 0 && progress <= 1)).toBe(true);
    expect(stages.filter(([stage]) => stage === 'levels').at(-1)).toEqual(['levels', 1]);
  });

  it('refuses a take without one kick, and mixed rates', async () => {
    const source = arrayTrack(new Float32Array(10), 48000);
    await expect(measureTake({ tracks: [{ role: 'overhead', source }] })).rejects.toThrow(SignalError);
    const other = arrayTrack(new Float32Array(10), 44100);
    const tracks = [{ role: 'kick', source } as const, { role: 'overhead', source: other } as const];
    await expect(measureTake({ tracks })).rejects.toThrow('one sample rate');
  });
});
