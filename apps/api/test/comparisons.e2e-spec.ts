import { randomUUID } from 'node:crypto';
import {
  comparisonResponse,
  ComparisonResponse,
  paths,
  SetupResponse,
  TakeResponse,
  UpdateSetupRequest,
} from '@thudline/contracts';
import { bytesSource, measureTake, openWav, TakeMeasurement } from '@thudline/dsp';
import { getScenario, synthesiseTake } from '@thudline/fixtures';
import { Browser, joined, Person, Upload } from './support/person';
import { wav } from './support/recordings';
import { giveReport } from './support/reported-take';
import { openedBy, sharedBy } from './support/shares';
import { startTestApp, TestApp } from './support/test-app';

jest.setTimeout(60_000);

const played = (scenario: string) => synthesiseTake(getScenario(scenario).parameters);

async function measured(tracks: ReturnType<typeof played>): Promise<TakeMeasurement> {
  const source = async (samples: Float32Array) =>
    (await openWav(bytesSource(wav([samples], tracks.sampleRateHz)))).track(0);
  return measureTake({
    tracks: [
      { role: 'kick', source: await source(tracks.kick) },
      { role: 'overhead', source: await source(tracks.overhead) },
    ],
  });
}

describe('comparing two takes', () => {
  let test: TestApp;
  let juno: Person;
  let oda: Person;
  let hot: TakeMeasurement;
  let inverted: TakeMeasurement;
  let flippedKickDown: TakeMeasurement;

  beforeAll(async () => {
    test = await startTestApp();
    juno = await joined(test, 'Juno');
    oda = await joined(test, 'Oda');
    const star = played('hot-kick-opposite-overhead');
    hot = await measured(star);
    inverted = await measured({ ...star, overhead: star.overhead.map((sample) => -sample) });
    flippedKickDown = await measured(played('flipped-kick-down'));
  });
  afterAll(async () => test?.close());

  async function takeOf(found: TakeMeasurement, changed: Partial<Upload> = {}): Promise<TakeResponse> {
    const take = await juno.makeTake(changed);
    await giveReport(test, take, found.facts, found.pairSpectra);
    return take;
  }
  async function compared(before: TakeResponse, after: TakeResponse): Promise<ComparisonResponse> {
    const answer = await juno.get(paths.comparison(before.id, after.id)).expect(200);
    return comparisonResponse.parse(answer.body);
  }
  const lineOf = ({ line }: ComparisonResponse) =>
    line.map(({ action, reason }) => `${action} ${reason}`).join(' ');

  it('says of a take and itself that no figure changed', async () => {
    const take = await takeOf(hot);
    const { figures, line, polarity, caveats } = await compared(take, take);
    expect(figures.length).toBeGreaterThan(10);
    expect(figures.filter(({ change }) => change !== null).length).toBeGreaterThan(8);
    for (const figure of figures)
      expect([figure.key, figure.clear, figure.word]).toEqual([figure.key, false, null]);
    expect(figures.filter(({ change }) => change !== null && change !== 0)).toEqual([]);
    expect(line).toEqual([{ action: 'The same take twice:', reason: 'no clear change, as it should be.' }]);
    expect(polarity).toMatchObject({ seen: 'as-before', confirmed: true, sentence: '' });
    expect(caveats.some(({ about }) => about === 'matching')).toBe(false);
  });

  it('says in words that a take with its overhead inverted was flipped, though nothing was noted', async () => {
    const [before, after] = [await takeOf(hot), await takeOf(inverted)];
    const comparison = await compared(before, after);
    expect(comparison.polarity).toMatchObject({ noted: false, seen: 'flipped', confirmed: false });
    expect(comparison.polarity.sentence).toMatch(
      /^The sound says the overhead was flipped .* in (\d+) of \1 hits\.$/,
    );
    expect(lineOf(comparison)).toMatch(/^The overhead was flipped: \d\.\d dB of low end came back\./);
    const { beforeDb, afterDb, expectedDb } = comparison.polarity;
    expect(afterDb).toBeCloseTo(expectedDb!, 2);
    expect(afterDb! - beforeDb!).toBeGreaterThan(0.5);
    expect(comparison.figures.find(({ key }) => key === 'low-end')).toMatchObject({
      clear: true,
      word: 'fuller',
    });
  });

  it('confirms a flip that was noted, and opens with what became of it', async () => {
    const before = await takeOf(hot);
    const after = await takeOf(flippedKickDown, {
      followsTakeId: before.id,
      doneActions: ['flip-overhead', 'kick-gain'],
    });
    const comparison = await compared(before, after);
    expect(lineOf(comparison)).toMatch(
      /^The flip worked: \d\.\d dB of low end came back; we expected \d\.\d\./,
    );
    expect(comparison.polarity).toMatchObject({ noted: true, seen: 'flipped', confirmed: true });
    expect(comparison.polarity.sentence).toMatch(/^You noted a flip, and the sound confirms it:/);
    expect(comparison.differed).toContainEqual({
      what: 'done in between',
      before: '',
      after: 'overhead polarity switched, kick preamp turned',
    });
    expect(comparison.figures.find(({ key }) => key === 'attack')).toMatchObject({
      reason: 'strength-unmatched',
    });
    expect(comparison.caveats.map(({ about }) => about)).toContain('matching');
    const kick = comparison.findings.find(({ topic }) => topic === 'kick-level');
    expect(kick).toMatchObject({ before: { status: 'watch' }, after: { status: 'good' } });
  });

  it('contradicts a flip that was noted and isn’t in the sound', async () => {
    const before = await takeOf(hot);
    const after = await takeOf(hot, { followsTakeId: before.id, doneActions: ['flip-overhead'] });
    const { polarity, caveats } = await compared(before, after);
    expect(polarity).toMatchObject({ noted: true, seen: 'as-before', confirmed: false });
    expect(polarity.sentence).toMatch(/^You noted a flip, but the sound says nothing turned over/);
    expect(caveats.map(({ about }) => about)).toContain('the flip');
  });

  it('tells the same of two takes that were swapped', async () => {
    const before = await takeOf(hot);
    const after = await takeOf(flippedKickDown, { followsTakeId: before.id, doneActions: ['flip-overhead'] });
    const swapped = await compared(after, before);
    expect(swapped.polarity).toMatchObject({ noted: true, seen: 'flipped', confirmed: true });
    expect(lineOf(swapped)).toMatch(/^The overhead was flipped: \d\.\d dB of low end was lost\./);
    expect(swapped.differed[0]).toMatchObject({ before: 'overhead polarity switched', after: '' });
  });

  it('names both takes, their notes and tags where they differ', async () => {
    const before = await takeOf(hot, { title: 'One', note: 'As always.', tags: ['chorus'] });
    const after = await takeOf(hot, { title: 'Two', note: 'A little lower.' });
    const comparison = await compared(before, after);
    expect(comparison.before).toMatchObject({
      id: before.id,
      number: before.number,
      title: 'One',
      canListen: true,
    });
    expect(comparison.after).toMatchObject({ id: after.id, title: 'Two' });
    expect(comparison.differed).toEqual([
      { what: 'tags', before: 'chorus', after: '' },
      { what: 'note', before: 'As always.', after: 'A little lower.' },
    ]);
  });

  it('says in which rooms they were recorded, and when that was the same', async () => {
    const roomOf = async (name: string) =>
      (await juno.post(paths.rooms, { name }).expect(201)).body as { id: string };
    const [garage, hall] = [await roomOf('the garage'), await roomOf('the hall')];
    const [one, two, three] = [
      await takeOf(hot, { roomId: garage.id }),
      await takeOf(hot, { roomId: hall.id }),
      await takeOf(hot, { roomId: garage.id }),
    ];
    expect((await compared(one, two)).differed).toEqual([
      { what: 'room', before: 'the garage', after: 'the hall' },
    ]);
    expect(await compared(one, three)).toMatchObject({ differed: [], same: 'Room of both: the garage.' });
  });

  it('sets what is written down of both setups beside each other, and takes a flip from there', async () => {
    const setupOf = async (fields: UpdateSetupRequest) =>
      (await juno.post(paths.setups, fields).expect(201)).body as SetupResponse;
    const usual = await setupOf({ name: 'usual', kick: { insideCm: 8 }, kickPreamp: { gainDb: 38 } });
    const flipped = await setupOf({
      name: 'flipped',
      kick: { insideCm: 8 },
      kickPreamp: { gainDb: 31.5 },
      overheadPreamp: { polarity: true },
    });
    const before = await takeOf(hot, { setupId: usual.id });
    const after = await takeOf(flippedKickDown, { setupId: flipped.id });
    const { differed, same, polarity } = await compared(before, after);
    expect(differed).toEqual([
      { what: 'setup', before: 'usual', after: 'flipped' },
      { what: 'kick preamp', before: '38 dB', after: '31.5 dB' },
      { what: 'overhead polarity', before: 'not pressed', after: 'pressed' },
    ]);
    expect(same).toBe('The same in both setups: positions.');
    expect(polarity).toMatchObject({ noted: true, seen: 'flipped', confirmed: true });
  });

  it('matches hits by strength where both setups write down the same gains', async () => {
    const gains = { kickPreamp: { gainDb: 38 }, overheadPreamp: { gainDb: 42 } };
    const setup = (await juno.post(paths.setups, { name: 'kept', ...gains }).expect(201))
      .body as SetupResponse;
    const [before, after] = [
      await takeOf(hot, { setupId: setup.id }),
      await takeOf(hot, { setupId: setup.id }),
    ];
    const { figures, same } = await compared(before, after);
    expect(figures.find(({ key }) => key === 'attack')).toMatchObject({ clear: false, reason: null });
    expect(same).toBe('Setup of both: kept.');
  });

  it('refuses takes that aren’t measured yet', async () => {
    const [ready, waiting] = [await takeOf(hot), await juno.makeTake()];
    for (const [before, after] of [
      [ready, waiting],
      [waiting, ready],
    ]) {
      const answer = await juno.get(paths.comparison(before.id, after.id)).expect(404);
      expect(answer.body).toEqual({
        code: 'not-measured-yet',
        message: 'This take has not been measured yet.',
      });
    }
  });

  it('answers 404 where either take is somebody else’s, deleted or none at all', async () => {
    const [own, others] = [await takeOf(hot), await oda.makeTake()];
    const deleted = await takeOf(hot);
    await juno.delete(paths.take(deleted.id)).expect(204);
    for (const id of [others.id, deleted.id, randomUUID(), 'nonsense']) {
      await juno.get(paths.comparison(own.id, id)).expect(404);
      await juno.get(paths.comparison(id, own.id)).expect(404);
    }
  });

  it('asks somebody signed out to sign in', async () => {
    const take = await takeOf(hot);
    await new Browser(test).get(paths.comparison(take.id, take.id)).expect(401);
  });

  it('opens to a guest who may read both takes, without the player’s tags', async () => {
    const [before, after] = [await takeOf(hot, { tags: ['chorus'] }), await takeOf(hot)];
    const guest = new Browser(test);
    await openedBy(guest, await sharedBy(juno, before));
    await guest.get(paths.comparison(before.id, after.id)).expect(404);
    await openedBy(guest, await sharedBy(juno, after));
    const answer = await guest.get(paths.comparison(before.id, after.id)).expect(200);
    expect(comparisonResponse.parse(answer.body).differed).toEqual([]);
  });
});
