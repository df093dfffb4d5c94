import { MessageChannel } from 'node:worker_threads';
import { decodePairSpectrum, decodePeaks, encodeWav } from '@thudline/dsp';
import { measureFiles, type MeasureFilesOptions } from './measureFiles';
import { simpleTake, takeFolder, type TakeFolder } from './testing/takeFolder';
import type { TrackChoice } from './trackChoice';
import { measureJob, type MeasureProgress } from './worker';

const twoFiles: readonly TrackChoice[] = [
  { role: 'kick', fileIndex: 0, channel: 0 },
  { role: 'overhead', fileIndex: 1, channel: 0 },
];
const sides = (kick: number, overhead: number): TrackChoice[] => [
  { role: 'kick', fileIndex: 0, channel: kick },
  { role: 'overhead', fileIndex: 0, channel: overhead },
];
const sampleRateHz = 48000;

let folder: TakeFolder;
beforeAll(async () => {
  folder = await takeFolder();
});
afterAll(() => folder?.remove());

const measure = (paths: string[], tracks = twoFiles, options: Partial<MeasureFilesOptions> = {}) =>
  measureFiles({ files: paths.map((path) => ({ path })), tracks, ...options });
const takePaths = async (name: string, take = simpleTake({ seconds: 4 })) => [
  await folder.wav(`${name}-kick.wav`, [take.kick]),
  await folder.wav(`${name}-overhead.wav`, [take.overhead]),
];

describe('measureFiles', () => {
  it('measures two mono files and tells what they are', async () => {
    const paths = await takePaths('plain');
    const { take, files } = await measure(paths);
    expect(files.map(({ path, facts }) => [path, facts.encodingName, facts.frames])).toEqual(
      paths.map((path) => [path, '24-bit PCM', 4 * sampleRateHz]),
    );
    expect(take.facts).toMatchObject({ sampleRateHz, durationS: 4, notices: [] });
    expect(take.facts.tracks.map(({ role }) => role)).toEqual(['kick', 'overhead']);
    // Kicks at 1.0, 1.5 … 3.0 s; the onset lies within a few ms of each.
    const kicks = take.facts.hits
      .filter(({ kind }) => kind === 'kick')
      .map(({ timeS }) => Math.round(timeS * 100) / 100);
    expect(kicks).toEqual([1, 1.5, 2, 2.5, 3]);
    expect(take.facts.pairs[0].agreement.verdict).toBe('flip');
  });

  it('finds the same in one stereo file as in two, whichever side is the kick', async () => {
    const { kick, overhead } = simpleTake({ seconds: 4 });
    const two = await measure(await takePaths('two'));
    const stereo = await folder.wav('stereo.wav', [overhead, kick]);
    const one = await measure([stereo], sides(1, 0));
    expect(one.take.facts).toEqual(two.take.facts);
  });

  it('measures over the shorter file and says by how much', async () => {
    const { kick, overhead } = simpleTake({ seconds: 4 });
    const loudEnd = kick.slice();
    loudEnd[loudEnd.length - 10] = 0.99;
    const paths = [
      await folder.wav('long.wav', [loudEnd]),
      await folder.wav('short.wav', [overhead.subarray(0, 3 * sampleRateHz)]),
    ];
    const { take } = await measure(paths);
    expect(take.facts.durationS).toBe(3);
    expect(take.facts.notices).toEqual([{ kind: 'lengths-differ', byS: 1 }]);
    expect(take.facts.tracks[0].samplePeakDbfs).toBeLessThan(-3);
  });

  it('says when both files hold the same sound, and when one is silent', async () => {
    const { kick } = simpleTake({ seconds: 4 });
    const again = await measure([await folder.wav('a.wav', [kick]), await folder.wav('b.wav', [kick])]);
    expect(again.take.facts.notices).toContainEqual({ kind: 'same-file-twice' });
    const silent = await measure([
      await folder.wav('c.wav', [kick]),
      await folder.wav('d.wav', [new Float32Array(kick.length)]),
    ]);
    expect(silent.take.facts.notices).toContainEqual({ kind: 'silent', role: 'overhead' });
    expect(silent.take.facts.notices).not.toContainEqual({ kind: 'same-file-twice' });
  });

  it('says when a header claims more than the file holds', async () => {
    const { kick, overhead } = simpleTake({ seconds: 4 });
    const whole = encodeWav({ channels: [overhead], sampleRateHz, bitDepth: 24 });
    const cut = await folder.bytes('cut.wav', whole.subarray(0, whole.length - 30_000));
    const { take } = await measure([await folder.wav('whole.wav', [kick]), cut]);
    expect(take.facts.notices).toContainEqual({ kind: 'cut-short', role: 'overhead' });
  });

  it('tells the stages in order, with progress from 0 to 1', async () => {
    const told: [string, number][] = [];
    await measure(await takePaths('stages'), twoFiles, {
      onStage: (stage, progress) => told.push([stage, progress]),
    });
    expect([...new Set(told.map(([stage]) => stage))]).toEqual(['levels', 'hits', 'arrival', 'adding-up']);
    expect(told.every(([, progress]) => progress >= 0 && progress <= 1)).toBe(true);
  });

  it('stops when it is told to', async () => {
    const stop = new AbortController();
    const onStage = () => stop.abort(new Error('enough'));
    const paths = await takePaths('stop');
    await expect(measure(paths, twoFiles, { signal: stop.signal, onStage })).rejects.toThrow('enough');
  });
});

describe('measureFiles refuses', () => {
  const refusal = (paths: string[], tracks = twoFiles) =>
    measure(paths, tracks).then(
      () => null,
      (error: Error) => error,
    );
  const short = new Float32Array(1000);

  it('different sample rates', async () => {
    const paths = [await folder.wav('48.wav', [short]), await folder.wav('44.wav', [short], 44100)];
    expect(await refusal(paths)).toMatchObject({
      name: 'MeasureRefusal',
      code: 'rates-differ',
      fileIndex: null,
      message:
        'The files have different sample rates (48000 and 44100 Hz); export both from one session at one rate.',
    });
  });

  it('a channel that is not there, and the same channel twice', async () => {
    const stereo = await folder.wav('two-sides.wav', [short, short]);
    for (const channel of [2, -1, 0.5]) {
      expect(await refusal([stereo], sides(0, channel))).toMatchObject({
        code: 'no-such-channel',
        fileIndex: 0,
      });
    }
    expect(await refusal([stereo], sides(1, 1))).toMatchObject({ code: 'same-channel' });
  });

  it('what is no WAV, no file or a folder, and says which', async () => {
    const good = await folder.wav('good.wav', [short]);
    const mp3 = await folder.bytes('take.mp3', Uint8Array.of(0x49, 0x44, 0x33, 4, 0, 0, 0, 0, 0, 0, 0, 0));
    expect(await refusal([good, mp3])).toMatchObject({ code: 'wav-refused', reason: 'lossy', fileIndex: 1 });
    expect(await refusal([`${good}x`, good])).toMatchObject({ code: 'unreadable', fileIndex: 0 });
    expect(await refusal([good, folder.path])).toMatchObject({ code: 'unreadable', fileIndex: 1 });
  });
});

describe('measureJob', () => {
  it('gives facts, spectra and outlines that can cross a thread, and tells its progress', async () => {
    const paths = await takePaths('job');
    const { port1, port2 } = new MessageChannel();
    const told: MeasureProgress[] = [];
    port1.on('message', (progress: MeasureProgress) => told.push(progress));
    const closed = new Promise((done) => port1.once('close', done));
    const result = structuredClone(await measureJob({ paths, tracks: twoFiles, port: port2 }));
    await closed;
    const direct = await measure(paths);
    if (result.outcome !== 'measured') throw new Error('This take should be measured.');
    expect(result.facts).toEqual(direct.take.facts);
    const layout = result.facts.pairs[0].spectrum!;
    expect(decodePairSpectrum(result.spectra[0]!, layout)).toEqual(direct.take.pairSpectra[0]);
    expect(result.peaks.map(decodePeaks)).toEqual(direct.take.peaks);
    expect(new Set(told.map(({ stage }) => stage)).size).toBe(4);
  });

  it('returns a refusal as data', async () => {
    const result = await measureJob({ paths: [`${folder.path}/nothing.wav`], tracks: sides(0, 1) });
    expect(structuredClone(result)).toEqual({
      outcome: 'refused',
      refusal: {
        code: 'unreadable',
        message: 'There is no such file; check its name and folder.',
        fileIndex: 0,
        reason: null,
      },
    });
  });
});
