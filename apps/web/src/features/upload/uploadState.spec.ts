import type { WavFacts } from '@thudline/dsp';
import { arrangement, canSend } from './arrangement';
import { headline, whyNotYet } from './headline';
import { takeRequest } from './takeBody';
import { emptyUpload, uploadReducer, type UploadAction, type UploadState } from './uploadState';

const file = (name: string) => new File(['x'], name, { lastModified: 0 });
const added = (...names: string[]): UploadAction => ({
  type: 'added',
  files: names.map((name) => ({ id: name, file: file(name) })),
});
const read = (
  id: string,
  { channels = 1, sampleRateHz = 48_000, lowEndRatios = [0.5] as (number | null)[] } = {},
): UploadAction => ({
  type: 'read',
  id,
  reading: { kind: 'ready', facts: { channels, sampleRateHz } as WavFacts, lowEndRatios },
});
const key = '0190c0de-0000-4000-8000-000000000001';
const start: UploadAction = { type: 'sendStarted', newKey: key, atMs: 0 };
const after = (...actions: UploadAction[]) => actions.reduce(uploadReducer, emptyUpload);
const arranged = (state: UploadState) => arrangement(state.files, state.chosen);
const roles = (state: UploadState) =>
  arranged(state).slots.map(({ key: slotKey, role, reason }) => [slotKey, role, reason]);
const pair = [
  added('a.wav', 'b.wav'),
  read('a.wav', { lowEndRatios: [0.1] }),
  read('b.wav', { lowEndRatios: [0.8] }),
];

describe('which file is which', () => {
  it('is guessed by the names', () => {
    expect(roles(after(added('oh_1.wav', 'kick_1.wav'), read('oh_1.wav'), read('kick_1.wav')))).toEqual([
      ['oh_1.wav:0', 'overhead', 'name'],
      ['kick_1.wav:0', 'kick', 'name'],
    ]);
  });
  it('is guessed by the low end where names say nothing', () => {
    expect(roles(after(...pair))).toEqual([
      ['a.wav:0', 'overhead', 'low-end'],
      ['b.wav:0', 'kick', 'low-end'],
    ]);
  });
  it('can be chosen, and choosing for one swaps the other', () => {
    const chosen: UploadAction = { type: 'roleChosen', chosen: { slotKey: 'a.wav:0', role: 'kick' } };
    expect(roles(after(...pair, chosen))).toEqual([
      ['a.wav:0', 'kick', 'chosen'],
      ['b.wav:0', 'overhead', 'chosen'],
    ]);
  });
  it('is guessed again when the chosen file is cleared', () => {
    const chosen: UploadAction = { type: 'roleChosen', chosen: { slotKey: 'a.wav:0', role: 'kick' } };
    const state = after(...pair, chosen, { type: 'removed', id: 'a.wav' }, added('oh.wav'), read('oh.wav'));
    expect(roles(state).map(([, role]) => role)).toEqual(['kick', 'overhead']);
  });
  it('is told for the two sides of a stereo file', () => {
    const state = after(added('take.wav'), read('take.wav', { channels: 2, lowEndRatios: [0.1, 0.9] }));
    expect(arranged(state).kind).toBe('stereo');
    expect(roles(state)).toEqual([
      ['take.wav:0', 'overhead', 'low-end'],
      ['take.wav:1', 'kick', 'low-end'],
    ]);
    expect(
      takeRequest({ ...state, uploadKey: key }, arranged(state), {
        previous: null,
        setupId: null,
        roomId: null,
        nowMs: 1,
      }).tracks,
    ).toEqual([
      { role: 'overhead', fileIndex: 0, channel: 0 },
      { role: 'kick', fileIndex: 0, channel: 1 },
    ]);
  });
});

describe('which files make the take', () => {
  it('leaves the third good file aside', () => {
    const state = after(...pair, added('c.wav'), read('c.wav'));
    expect(arranged(state).aside.map(({ id }) => id)).toEqual(['c.wav']);
    expect(canSend(arranged(state))).toBe(true);
  });
  it('takes the left-aside file when another is cleared', () => {
    const state = after(...pair, added('c.wav'), read('c.wav'), { type: 'removed', id: 'a.wav' });
    expect(arranged(state).used.map(({ id }) => id)).toEqual(['b.wav', 'c.wav']);
  });
  it('does not count a refused file', () => {
    const refused: UploadAction = { type: 'read', id: 'x.mp3', reading: { kind: 'refused', message: 'No.' } };
    const state = after(added('x.mp3'), refused, ...pair);
    expect(arranged(state).used.map(({ id }) => id)).toEqual(['a.wav', 'b.wav']);
  });
  it('refuses two rates before anything is sent', () => {
    const state = after(added('a.wav', 'b.wav'), read('a.wav'), read('b.wav', { sampleRateHz: 44_100 }));
    expect(canSend(arranged(state))).toBe(false);
    expect(whyNotYet(arranged(state))).toMatch(/one session/);
  });
  it('waits for a file that is still being read', () => {
    const state = after(...pair, added('c.wav'));
    expect(canSend(arranged(state))).toBe(false);
    expect(whyNotYet(arranged(state))).toMatch(/One moment/);
  });
  it('starts over with one stereo file instead', () => {
    const state = after(...pair, { type: 'replaced', files: [{ id: 's.wav', file: file('s.wav') }] });
    expect(state.files.map(({ id }) => id)).toEqual(['s.wav']);
  });
});

describe('sending', () => {
  it('keeps the key for another try after a lost connection or a stop', () => {
    for (const type of ['lost', 'stopped'] as const) {
      const again = after(...pair, start, { type }, { ...start, newKey: 'another' });
      expect(again.uploadKey).toBe(key);
      expect(again.sending.phase).toBe('sending');
    }
  });
  it('takes a new key when files or roles change', () => {
    expect(after(...pair, start, { type: 'lost' }, { type: 'removed', id: 'a.wav' }).uploadKey).toBeNull();
    const chosen: UploadAction = { type: 'roleChosen', chosen: { slotKey: 'a.wav:0', role: 'kick' } };
    expect(after(...pair, start, { type: 'lost' }, chosen).uploadKey).toBeNull();
  });
  it('goes on while a further file is dropped or the title is written', () => {
    const state = after(...pair, start, added('c.wav'), { type: 'titleWritten', title: 'rug' });
    expect(state.sending.phase).toBe('sending');
    expect(state.uploadKey).toBe(key);
  });
  it('ignores a late report of progress after a stop', () => {
    const late: UploadAction = { type: 'progressed', report: { atMs: 5, loadedBytes: 1, totalBytes: 2 } };
    expect(after(...pair, start, { type: 'stopped' }, late).sending.phase).toBe('stopped');
  });
  it('knows whether a stop came too late', () => {
    const sent = (loadedBytes: number): UploadAction => ({
      type: 'progressed',
      report: { atMs: 5, loadedBytes, totalBytes: 20 },
    });
    expect(after(...pair, start, sent(19), { type: 'stopped' }).sending).toMatchObject({ allSent: false });
    expect(after(...pair, start, sent(20), { type: 'stopped' }).sending).toMatchObject({ allSent: true });
  });
  it('puts a refusal beside the file it speaks of', () => {
    const state = after(...pair, start, {
      type: 'refused',
      message: 'b.wav is damaged.',
      details: { fileIndex: 1 },
    });
    expect(state.files[1].reading).toEqual({ kind: 'refused', message: 'b.wav is damaged.' });
    expect(state.sending.phase).toBe('choosing');
  });
  it('says a refusal of the whole take as such', () => {
    expect(after(...pair, start, { type: 'refused', message: 'The store is away.' }).sending).toEqual({
      phase: 'refused',
      message: 'The store is away.',
    });
  });
});

describe('the sentence at the top', () => {
  const words = (state: UploadState, secondsLeft: number | null = null) => {
    const { strong, rest } = headline({
      arranged: arranged(state),
      sending: state.sending,
      secondsLeft,
      pickedCount: state.files.length,
    });
    return `${strong} ${rest}`.trim();
  };
  it('follows what is there', () => {
    expect(words(emptyUpload)).toMatch(/^Drop in a kick file and an overhead file\./);
    expect(words(after(added('a.wav')))).toMatch(/^Looking at/);
    expect(words(after(added('kick.wav'), read('kick.wav')))).toBe(
      'Now the overhead file. The kick is here.',
    );
    expect(words(after(added('oh.wav'), read('oh.wav')))).toBe('Now the kick file. The overhead is here.');
    expect(words(after(...pair))).toMatch(/^Both files are here\./);
  });
  it('follows the files on their way', () => {
    expect(words(after(...pair, start), 38)).toBe('Two files are on their way. About 40 seconds left.');
    expect(words(after(...pair, added('c.wav'), read('c.wav'), start), 38)).toMatch(
      /^Two of three files are/,
    );
    const stereo = after(added('s.wav'), read('s.wav', { channels: 2, lowEndRatios: [0.1, 0.9] }), start);
    expect(words(stereo)).toBe('One file is on its way.');
    expect(words(after(...pair, start), 0)).toMatch(/^Both files have arrived\./);
    expect(words(after(...pair, start, { type: 'lost' }))).toMatch(/^The connection was lost\./);
    expect(words(after(...pair, start, { type: 'stopped' }))).toMatch(/^Stopped\. Nothing was kept\./);
  });
});
