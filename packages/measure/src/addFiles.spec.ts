import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import {
  bytesSource,
  choiceLowEnd,
  createTrackLevel,
  measureTake,
  openWav,
  type Choice,
  type PairSpectrum,
} from '@thudline/dsp';
import { addFiles, type AddFilesOptions } from './addFiles';
import { simpleTake, takeFolder, type TakeFolder } from './testing/takeFolder';

const about = { name: 'Take 4', date: '2026-11-30', time: '18:05:09' };
const tracks: AddFilesOptions['tracks'] = [
  { role: 'kick', fileIndex: 0, channel: 0 },
  { role: 'overhead', fileIndex: 1, channel: 0 },
];
const asRecorded: Choice = { flipped: false, shiftMs: 0, gainDb: 0 };
/** The kick alone of a pair: what the two added would be with a silent overhead. */
const kickAlone: Choice = { flipped: false, shiftMs: 0, gainDb: -300 };

let folder: TakeFolder;
beforeAll(async () => {
  folder = await takeFolder();
});
afterAll(() => folder?.remove());

const take = simpleTake({ seconds: 6, overheadGain: -0.6, arrivalMs: 2.3 });
const paths = async (name: string, { kick, overhead } = take) => [
  await folder.wav(`${name}-kick.wav`, [kick]),
  await folder.wav(`${name}-overhead.wav`, [overhead]),
];
const add = async (name: string, choice: Choice, options: Partial<AddFilesOptions> = {}) => {
  const outPath = join(folder.path, `${name}.wav`);
  const inputs = options.paths ?? (await paths(name));
  const facts = await addFiles({ tracks, choice, outPath, about, ...options, paths: inputs });
  const bytes = await readFile(outPath);
  return { facts, bytes, file: await openWav(bytesSource(bytes)) };
};

/** Pair spectrum of the kick beside another track: the same kick hits, the same windows. */
async function besideKick(other: Float32Array | 'overhead'): Promise<PairSpectrum> {
  const source = async (samples: Float32Array) =>
    (await openWav(bytesSource(await readFile(await folder.wav('beside.wav', [samples]))))).track(0);
  const { pairSpectra } = await measureTake({
    tracks: [
      { role: 'kick', source: await source(take.kick) },
      { role: 'overhead', source: await source(other === 'overhead' ? take.overhead : other) },
    ],
  });
  const [spectrum] = pairSpectra;
  if (!spectrum) throw new Error('No kick hit was found.');
  return spectrum;
}

const energy = (bins: ArrayLike<number>, binHz: number): number =>
  Array.from(bins).reduce((sum, power, i) => (i * binHz >= 30 && i * binHz < 150 ? sum + power : sum), 0);

describe('an added file', () => {
  it.each<[string, Choice]>([
    ['flip-shift', { flipped: true, shiftMs: 1.637, gainDb: 3.2 }],
    ['shift', { flipped: false, shiftMs: 2.3, gainDb: 0 }],
    ['plain', asRecorded],
  ])('has the low end that was predicted within 0.1 dB: %s', async (name, choice) => {
    const { facts, file } = await add(name, choice);
    const predicted = await besideKick('overhead');
    const samples = await file.track(0).read(0, file.facts.frames);
    const measured = await besideKick(samples);
    const gain = 10 ** (facts.levelDb / 10);
    const addedDb = 10 * Math.log10(energy(measured.soo, measured.binHz) / gain);
    const powerDb =
      10 *
      Math.log10(
        energy(
          Array.from(predicted.skk, (skk, i) => skk + 10 ** (choice.gainDb / 10) * predicted.soo[i]),
          predicted.binHz,
        ),
      );
    expect(Math.abs(addedDb - powerDb - (choiceLowEnd(predicted, choice) ?? NaN))).toBeLessThan(0.1);
    expect(choiceLowEnd(predicted, kickAlone)).toBeCloseTo(0, 6);
  });

  it('is turned down only as far as its true peak asks', async () => {
    const loud = await add('loud', { flipped: true, shiftMs: 2.3, gainDb: 12 });
    expect(loud.facts.levelDb).toBeLessThan(0);
    const level = createTrackLevel({ sampleRateHz: 48000, quantisationStep: 2 ** -23 });
    level.push(await loud.file.track(0).read(0, loud.file.facts.frames));
    // 24-bit steps lie 138 dB below.
    expect(level.result().truePeakDbtp).toBeCloseTo(-1, 3);
    expect(loud.facts.truePeakDbtp).toBeCloseTo(-1, 6);
    expect((await add('soft', asRecorded)).facts.levelDb).toBe(0);
  });

  it('says in itself how it was made, and is the same bytes again', async () => {
    const choice = { flipped: true, shiftMs: 1.6, gainDb: 0 };
    const once = await add('once', choice);
    expect(once.file.facts).toMatchObject({
      encodingName: '24-bit PCM',
      channels: 1,
      frames: take.kick.length,
      broadcast: {
        description: 'Kick and overhead added: overhead flipped, 1.600 ms earlier.',
        originator: 'Thudline',
        date: '2026-11-30',
        time: '18:05:09',
      },
    });
    const text = once.bytes.subarray(0, 2000).toString('latin1');
    expect(text).toContain('INAM\x07\0\0\0Take 4\0');
    expect(text).toContain(
      'T=Thudline; kick+overhead, polarity -1, shift 1.600 ms, gain 0.00 dB, level 0.00 dB\r\n',
    );
    expect((await add('twice', choice)).facts).toEqual(once.facts);
    expect(once.facts.bytes).toBe(once.bytes.length);
  });

  it('is heard no louder than the two as recorded', async () => {
    // As recorded the low end cancels, so what is flipped is louder and turned down; beside itself nothing is.
    const { facts } = await add('heard', { flipped: true, shiftMs: 2.3, gainDb: 0 });
    expect(facts.listenGainDb).toBeLessThan(-1);
    expect((await add('same', asRecorded)).facts.listenGainDb).toBeCloseTo(0, 9);
  });

  it('tells its progress to the end, and pads an odd number of bytes', async () => {
    const told: number[] = [];
    const odd = { kick: take.kick.subarray(0, 100_001), overhead: take.overhead.subarray(0, 90_000) };
    const { facts, bytes } = await add('odd', asRecorded, {
      paths: await paths('odd', odd),
      onProgress: (progress) => told.push(progress),
    });
    expect([told[0] > 0, told.at(-1)]).toEqual([true, 1]);
    expect([...told].sort((a, b) => a - b)).toEqual(told);
    expect([facts.frames, bytes.length % 2]).toEqual([100_001, 0]);
  });

  it('is silent where both microphones are', async () => {
    const silence = { kick: new Float32Array(1000), overhead: new Float32Array(1000) };
    const { facts } = await add('silent', asRecorded, { paths: await paths('silent', silence) });
    expect(facts).toMatchObject({ levelDb: 0, truePeakDbtp: null, listenGainDb: 0 });
  });
});
