import { join } from 'node:path';
import { measureFiles } from '../measureFiles';
import { simpleTake, takeFolder, type TakeFolder } from '../testing/takeFolder';
import type { TrackChoice } from '../trackChoice';

/** Only what is built has a thread to start: from source a take is measured in one. */
let built: typeof import('../measureFiles');

const tracks: readonly TrackChoice[] = [
  { role: 'kick', fileIndex: 0, channel: 0 },
  { role: 'overhead', fileIndex: 1, channel: 0 },
];
let folder: TakeFolder;
let files: { path: string }[];
beforeAll(async () => {
  // In `dist` when this runs, which the compiler doesn't know.
  built = (await import(join(__dirname, '../../dist/measureFiles.js'))) as typeof built;
  folder = await takeFolder();
  const { kick, overhead } = simpleTake({ seconds: 12 });
  files = [
    { path: await folder.wav('kick.wav', [kick]) },
    { path: await folder.wav('overhead.wav', [overhead]) },
  ];
});
afterAll(() => folder?.remove());

describe('a take measured in two threads', () => {
  it('has the same sheet, outline and pair spectrum as in one', async () => {
    const alone = await measureFiles({ files, tracks });
    expect(await built.measureFiles({ files, tracks })).toEqual(alone);
    expect(alone.take.facts.hits.length).toBeGreaterThan(10);
  });

  it('may follow another one, refused or measured, in the same helper', async () => {
    const alone = await measureFiles({ files, tracks });
    const missing = [files[0], { path: join(folder.path, 'missing.wav') }] as { path: string }[];
    await expect(built.measureFiles({ files: missing, tracks })).rejects.toMatchObject({
      code: 'unreadable',
    });
    for (let time = 0; time < 2; time += 1) {
      expect((await built.measureFiles({ files, tracks })).take).toEqual(alone.take);
    }
  });

  it.each(['levels', 'hits'])('stops in the middle of the %s when it is told to', async (stage) => {
    const stop = new AbortController();
    const onStage = (at: string): void => {
      if (at === stage) stop.abort(new Error('enough'));
    };
    const { signal } = stop;
    await expect(built.measureFiles({ files, tracks, onStage, signal })).rejects.toThrow('enough');
  });
});
