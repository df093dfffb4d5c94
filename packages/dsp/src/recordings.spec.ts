import { existsSync } from 'node:fs';
import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { measureTake } from './measureTake';
import { createTrackLevel } from './measurements/level/trackLevel';
import { arrayTrack } from './testing/arrayTrack';
import { bytesSource } from './wav/bytesSource';
import { openWav } from './wav/openWav';

/** Real kits that are not part of the project: see "Done means" of issue 2. */
const folder = join(__dirname, '../../../../shared/recordings');

const measured = async (name: string) => {
  const source = async (file: string) =>
    (await openWav(bytesSource(await readFile(join(folder, name, file))))).track(0);
  return { kick: await source('kick.wav'), overhead: await source('overhead.wav') };
};
type Tracks = Awaited<ReturnType<typeof measured>>;
const pairOf = async ({ kick, overhead }: Tracks) => {
  const { facts } = await measureTake({
    tracks: [
      { role: 'kick', source: kick },
      { role: 'overhead', source: overhead },
    ],
  });
  const { balance, room, hits } = facts;
  return { ...facts.pairs[0], hits, balance, room };
};
const changed = async (tracks: Tracks, change: (x: Float32Array) => Float32Array): Promise<Tracks> => {
  const samples = await tracks.overhead.read(0, tracks.overhead.frames);
  return { ...tracks, overhead: arrayTrack(change(samples), tracks.overhead.sampleRateHz) };
};

const kits = existsSync(folder) ? describe : describe.skip;

kits('real kits', () => {
  it('gogodze: flip, 1.4 ± 0.3 dB, arrival 1.6 ± 0.2 ms, eight kicks', async () => {
    const { arrival, agreement, hits } = await pairOf(await measured('grooves/gogodze-pop-90bpm'));
    expect(hits.filter((hit) => hit.kind === 'kick')).toHaveLength(8);
    expect(agreement).toMatchObject({ verdict: 'flip', sure: true });
    expect(Math.abs((agreement.flipGainMatchedDb ?? NaN) - 1.4)).toBeLessThan(0.3);
    expect(Math.abs((arrival.arrivalMs ?? NaN) - 1.6)).toBeLessThan(0.2);
    expect(arrival.firstSwing).toEqual({ kick: 'up', overhead: 'down' });
  });

  it('gogodze inverted: keep, the figure changing sign within 0.05 dB', async () => {
    const tracks = await measured('grooves/gogodze-pop-90bpm');
    const { agreement } = await pairOf(tracks);
    const inverted = await pairOf(await changed(tracks, (x) => x.map((value) => -value)));
    expect(inverted.agreement.verdict).toBe('keep');
    const sum = (inverted.agreement.flipGainMatchedDb ?? NaN) + (agreement.flipGainMatchedDb ?? NaN);
    expect(Math.abs(sum)).toBeLessThan(0.05);
  });

  it('muldjord: either way or not to be told, arrival 2.7 ± 0.4 ms, eight kicks', async () => {
    const { arrival, agreement, hits } = await pairOf(await measured('grooves/muldjord-rock-100bpm'));
    expect(hits.filter((hit) => hit.kind === 'kick')).toHaveLength(8);
    expect(['either-way', 'cannot-tell']).toContain(agreement.verdict);
    expect(Math.abs((arrival.arrivalMs ?? NaN) - 2.7)).toBeLessThan(0.4);
  });

  it.each(['gogodze-pop-90bpm', 'muldjord-rock-100bpm'])(
    '%s: the arrival moves with the overhead',
    async (name) => {
      const tracks = await measured(`grooves/${name}`);
      const { arrival } = await pairOf(tracks);
      for (const samples of [-100, 37, 300]) {
        const moved = await pairOf(await changed(tracks, (x) => x.map((_, i) => x[i - samples] ?? 0)));
        const change = (moved.arrival.arrivalSamples ?? NaN) - (arrival.arrivalSamples ?? NaN);
        expect(Math.abs(change - samples)).toBeLessThanOrEqual(1);
      }
    },
  );

  it.each(['gogodze-pop-90bpm', 'muldjord-rock-100bpm'])(
    '%s: every snare has a hat on it, so nothing is told of drums against cymbals or of the room',
    async (name) => {
      const { balance, room } = await pairOf(await measured(`grooves/${name}`));
      expect(balance).toMatchObject({ drumsLufs: null, differenceDb: null, drumHits: 0 });
      expect(room).toMatchObject({ decayS: null, snareHits: 0, reason: 'too-few-snares' });
    },
  );

  it.each([
    ...['gogodze-pop-90bpm', 'muldjord-rock-100bpm'].map((name) => `grooves/${name}`),
    ...['gogodze-vl2-rr1', 'gogodze-vl4-rr1', 'gogodze-vl6-rr1'].map((name) => `hits/${name}`),
    ...['kickL-12', 'kickL-20', 'kickR-14', 'kickR-23'].map((name) => `hits/muldjord-${name}`),
  ])('%s: nothing is called clipped, squashed or dropped out', async (name) => {
    for (const track of Object.values(await measured(name))) {
      const level = createTrackLevel(track);
      for await (const block of track.blocks()) level.push(block);
      expect(level.result()).toMatchObject({
        clipping: { runCount: 0 },
        looksFlattened: false,
        dropouts: { count: 0 },
      });
    }
  });

  it.each([
    ['gogodze-vl2-rr1', 1.2, 1.8],
    ['gogodze-vl4-rr1', 1.2, 1.8],
    ['gogodze-vl6-rr1', 1.2, 1.8],
    ['muldjord-kickL-12', 2.1, 3.5],
    ['muldjord-kickL-20', 2.1, 3.5],
    ['muldjord-kickR-14', 2.1, 3.5],
    ['muldjord-kickR-23', 2.1, 3.5],
  ])('%s: one kick, its arrival, and nothing called sure', async (name, fromMs, toMs) => {
    const { arrival, agreement, hits } = await pairOf(await measured(`hits/${name}`));
    expect(hits.filter((hit) => hit.kind === 'kick')).toHaveLength(1);
    expect(agreement.sure).toBe(false);
    // The ranges seen by hand: 1.25–1.66 and 2.2–3.4 ms, and a tenth beyond for another way of reading them.
    expect(arrival.arrivalMs).toBeGreaterThan(fromMs);
    expect(arrival.arrivalMs).toBeLessThan(toMs);
    expect(arrival.confidence).toBeLessThan(0.5);
  });
});

if (!existsSync(folder)) {
  it('real kits: left out, the recordings are not here', () => {
    expect(existsSync(folder)).toBe(false);
  });
}
