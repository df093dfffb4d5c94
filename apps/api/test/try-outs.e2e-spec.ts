import { randomUUID } from 'node:crypto';
import {
  CreateTryOutRequest,
  listSetupsResponse,
  listTryOutsResponse,
  paths,
  setupResponse,
  TakeResponse,
  tryOutRankingResponse,
  TryOutResponse,
  tryOutResponse,
} from '@thudline/contracts';
import { TakeFacts } from '@thudline/dsp';
import { Browser, joined, Person } from './support/person';
import { giveReport, shortTakeFacts } from './support/reported-take';
import { startTestApp, TestApp } from './support/test-app';

describe('try-outs', () => {
  let test: TestApp;
  let juno: Person;
  let oda: Person;
  let takes: TakeResponse[];

  beforeAll(async () => {
    test = await startTestApp();
    juno = await joined(test, 'Juno');
    oda = await joined(test, 'Oda');
    takes = [await juno.makeTake({ title: 'Low' }), await juno.makeTake({ title: 'High' })];
  });
  afterAll(async () => test?.close());

  const heights = (changed: Partial<CreateTryOutRequest> = {}): CreateTryOutRequest => ({
    subject: 'overhead-height',
    unit: 'cm',
    places: takes.map(({ id: takeId }, i) => ({ takeId, position: 90 + 10 * i })),
    ...changed,
  });
  const made = async (changed: Partial<CreateTryOutRequest> = {}): Promise<TryOutResponse> => {
    const response = await juno.post(paths.tryOuts, heights(changed)).expect(201);
    return tryOutResponse.parse(response.body);
  };

  it('is made of takes that are there, in the order given', async () => {
    const tryOut = await made({ currentIndex: 0 });
    expect(tryOut).toMatchObject({ subject: 'overhead-height', unit: 'cm', reason: '', winnerPlaceId: null });
    expect(tryOut.places.map(({ take, position }) => [take?.title, position])).toEqual([
      ['Low', 90],
      ['High', 100],
    ]);
    expect(tryOut.currentPlaceId).toBe(tryOut.places[0].id);
    expect((await juno.get(paths.tryOut(tryOut.id)).expect(200)).body).toEqual(tryOut);
  });

  it('knows a take that comes later by its upload key', async () => {
    const uploadKey = randomUUID();
    const places = [
      { takeId: takes[0].id, label: 'felt beater' },
      { uploadKey, label: 'wooden beater', fileNames: ['k 02.wav', 'oh 02.wav'] },
    ];
    const tryOut = await made({ subject: 'other', differs: 'the beater', unit: 'label', places });
    expect(tryOut.places[1]).toMatchObject({ uploadKey, take: null, fileNames: ['k 02.wav', 'oh 02.wav'] });
    const take = await juno.makeTake({ uploadKey });
    await oda.makeTake({ uploadKey });
    const now = tryOutResponse.parse((await juno.get(paths.tryOut(tryOut.id)).expect(200)).body);
    expect(now.places[1].take?.id).toBe(take.id);
  });

  it('keeps a winner with a reason, what stands now, and other positions', async () => {
    const { id, places } = await made();
    const changes = {
      winnerPlaceId: places[1].id,
      currentPlaceId: places[0].id,
      reason: 'Fullest.\nNo crash.',
    };
    expect((await juno.patch(paths.tryOut(id), changes).expect(200)).body).toMatchObject(changes);
    const moved = await juno.patch(paths.tryOutPlace(id, places[0].id), { position: 85.5 }).expect(200);
    expect(tryOutResponse.parse(moved.body)).toMatchObject({ ...changes, places: [{ position: 85.5 }, {}] });
    const { items } = listTryOutsResponse.parse((await juno.get(paths.tryOuts).expect(200)).body);
    expect(items.find((item) => item.id === id)).toMatchObject({
      takeCount: 2,
      winner: { take: { title: 'High' } },
    });
    const cleared = await juno.patch(paths.tryOut(id), { winnerPlaceId: null }).expect(200);
    expect(cleared.body).toMatchObject({ winnerPlaceId: null, reason: changes.reason });
  });

  it('loses a place, not its take; a removed winner is none', async () => {
    const { id, places } = await made();
    await juno.patch(paths.tryOut(id), { winnerPlaceId: places[1].id }).expect(200);
    const left = await juno.delete(paths.tryOutPlace(id, places[1].id)).expect(200);
    expect(tryOutResponse.parse(left.body)).toMatchObject({ winnerPlaceId: null, places: [{}] });
    await juno.delete(paths.tryOut(id)).expect(204);
    await juno.get(paths.tryOut(id)).expect(404);
    await juno.get(paths.take(takes[1].id)).expect(200);
  });

  it('has a place back where it stood, and itself, when it is undone', async () => {
    const { id, places } = await made();
    await juno.patch(paths.tryOut(id), { winnerPlaceId: places[0].id }).expect(200);
    await juno.delete(paths.tryOutPlace(id, places[0].id)).expect(200);
    const back = await juno.post(paths.restoreTryOutPlace(id, places[0].id)).expect(200);
    expect(back.body).toMatchObject({ winnerPlaceId: places[0].id, places });
    await juno.delete(paths.tryOut(id)).expect(204);
    expect((await juno.get(paths.tryOuts).expect(200)).body).not.toMatchObject({
      items: expect.arrayContaining([expect.objectContaining({ id })]) as unknown,
    });
    await juno.delete(paths.tryOut(id)).expect(404);
    expect((await juno.post(paths.restoreTryOut(id)).expect(200)).body).toMatchObject({ id, places });
  });

  it('takes more takes in at its end, none twice', async () => {
    const { id, places } = await made();
    const [more, later] = [await juno.makeTake({ title: 'Higher' }), randomUUID()];
    const added = await juno
      .post(paths.tryOutPlaces(id), { places: [{ takeId: more.id, position: 110 }, { uploadKey: later }] })
      .expect(201);
    const now = tryOutResponse.parse(added.body).places;
    expect(now.map(({ position }) => position)).toEqual([90, 100, 110, null]);
    expect(now[2].take?.title).toBe('Higher');
    const twice = await juno.post(paths.tryOutPlaces(id), { places: [{ takeId: more.id }] }).expect(400);
    expect(twice.body).toMatchObject({ message: 'A take stands in a try-out only once.' });
    await juno.post(paths.tryOutPlaces(id), { places: [] }).expect(400);
    await juno.delete(paths.tryOutPlace(id, places[0].id)).expect(200);
    const again = await juno
      .post(paths.tryOutPlaces(id), { places: [{ takeId: takes[0].id, position: 95 }] })
      .expect(201);
    expect(tryOutResponse.parse(again.body).places.map(({ position }) => position)).toEqual([
      100,
      110,
      null,
      95,
    ]);
    const many = Array.from({ length: 21 }, () => ({ uploadKey: randomUUID() }));
    const full = await juno.post(paths.tryOutPlaces(id), { places: many }).expect(400);
    expect(full.body).toMatchObject({ message: 'A try-out has at most 24 takes.' });
  });

  describe('its winner', () => {
    const current = async (who: Person) =>
      listSetupsResponse.parse((await who.get(paths.setups).expect(200)).body).currentId;
    const newSetup = async (who: Person, body: object) =>
      setupResponse.parse((await who.post(paths.setups, body).expect(201)).body);
    const setupOf = async (who: Person, id: string) =>
      setupResponse.parse((await who.get(paths.setup(id)).expect(200)).body);

    it('becomes the setup that the next upload begins with, and can be taken back', async () => {
      const high = await newSetup(juno, { name: 'high', overhead: { aboveSnareCm: 90, tiltedDeg: 10 } });
      const other = await newSetup(juno, { name: 'other' });
      const recorded = await juno.makeTake({ setupId: high.id });
      await juno.makeTake({ setupId: other.id });
      expect(await current(juno)).toBe(other.id);
      const places = [
        { takeId: recorded.id, position: 112 },
        { takeId: takes[0].id, position: 90 },
      ];
      const { id, places: made2 } = await made({ places });
      const body = { winnerPlaceId: made2[0].id, reason: 'Fullest.' };
      const kept = tryOutResponse.parse((await juno.post(paths.tryOutSetup(id), body).expect(201)).body);
      expect(kept).toMatchObject({
        ...body,
        winnerSetup: { name: 'high, overhead 112 cm', isCurrent: true, copiedFrom: { id: high.id } },
      });
      const madeId = kept.winnerSetup?.id ?? '';
      expect(await setupOf(juno, madeId)).toMatchObject({ overhead: { aboveSnareCm: 112, tiltedDeg: 10 } });
      expect(await setupOf(juno, high.id)).toMatchObject({ overhead: { aboveSnareCm: 90 } });
      expect(await current(juno)).toBe(madeId);

      const undone = await juno.delete(paths.tryOutSetup(id)).expect(200);
      expect(undone.body).toMatchObject({ winnerSetup: null, winnerPlaceId: made2[0].id });
      expect(await current(juno)).toBe(other.id);
      await juno.get(paths.setup(madeId)).expect(404);
      const twice = await juno.delete(paths.tryOutSetup(id)).expect(409);
      expect(twice.body).toMatchObject({ message: 'No setup was made of this try-out’s winner.' });
    });

    it('starts from how things stood where its take has no setup', async () => {
      const mia = await joined(test, 'Mia');
      const [one, two] = [await mia.makeTake(), await mia.makeTake()];
      const places = [
        { takeId: one.id, label: 'felt' },
        { takeId: two.id, label: 'wood' },
      ];
      const request = { subject: 'other', differs: 'the beater', unit: 'label', places };
      const tryOut = tryOutResponse.parse((await mia.post(paths.tryOuts, request).expect(201)).body);
      const win = async (index: number) => {
        const answer = await mia.post(paths.tryOutSetup(tryOut.id), {
          winnerPlaceId: tryOut.places[index].id,
          reason: '',
        });
        return tryOutResponse.parse(answer.body).winnerSetup?.id ?? '';
      };
      const first = await win(0);
      expect(await setupOf(mia, first)).toMatchObject({ rest: 'the beater: felt', copiedFrom: null });
      const second = await win(1);
      expect(await setupOf(mia, second)).toMatchObject({ rest: 'the beater: wood', copiedFrom: null });
      await mia.get(paths.setup(first)).expect(404);
      await mia.makeTake({ setupId: second });
      await mia.delete(paths.tryOutSetup(tryOut.id)).expect(200);
      expect(await setupOf(mia, second)).toMatchObject({ takeCount: 1 });
    });

    it('is refused without a position, and for a place of another try-out', async () => {
      const { id, places } = await made({ places: takes.map(({ id: takeId }) => ({ takeId })) });
      const refused = await juno
        .post(paths.tryOutSetup(id), { winnerPlaceId: places[0].id, reason: '' })
        .expect(400);
      expect(refused.body).toMatchObject({ message: expect.stringContaining('Write down where') as unknown });
      const other = await made();
      const foreign = { winnerPlaceId: other.places[0].id, reason: '' };
      await juno.post(paths.tryOutSetup(id), foreign).expect(404);
      await juno.post(paths.tryOutSetup(id), {}).expect(400);
    });
  });

  it('ranks what is measured, by the measure and the polarity asked for', async () => {
    const made3 = [await juno.makeTake(), await juno.makeTake(), await juno.makeTake()];
    const waiting = await juno.makeTake();
    const facts = await shortTakeFacts();
    for (const [i, alike] of [-0.5, 0.4, -0.48].entries())
      await giveReport(test, made3[i], factsAlike(facts, alike));
    const { id, places } = await made({ places: [...made3, waiting].map((take) => ({ takeId: take.id })) });
    const ranking = async (query = '') =>
      tryOutRankingResponse.parse((await juno.get(`${paths.tryOutRanking(id)}${query}`).expect(200)).body);
    const order = (rows: { placeId: string }[]) =>
      rows.map(({ placeId }) => places.findIndex((place) => place.id === placeId));

    const best = await ranking();
    expect(best).toMatchObject({ measure: 'low-end', polarity: 'best-polarity', also: null, unit: 'dB' });
    expect(order(best.rows)).toEqual([0, 2, 1]);
    expect(best.rows.map(({ standing }) => standing)).toEqual(['best', 'as-good', 'as-good']);
    expect(best.rows[0]).toMatchObject({ rank: 1, flipped: true, hits: 8, word: 'fullest' });
    // Levels matched: the kick alone has 1, both together 2 + 2·0.5.
    expect(best.rows[0].value).toBeCloseTo(10 * Math.log10(3), 6);
    const recorded = await ranking('?polarity=as-recorded');
    expect(order(recorded.rows)).toEqual([1, 2, 0]);
    expect(recorded.rows.map(({ standing }) => standing)).toEqual(['best', 'worse', 'worse']);
    const both = await ranking('?also=evenness');
    expect(both).toMatchObject({ also: 'evenness', unit: 'steps' });
    const bleed = await ranking('?measure=bleed');
    expect(bleed.rows.every(({ rank, reason }) => rank === null && reason === 'too-few-hits')).toBe(true);
  });

  it('goes on without a deleted take, and has it back when it is restored', async () => {
    const take = await juno.makeTake();
    const { id } = await made({ places: [...takes, take].map((each) => ({ takeId: each.id })) });
    const count = async () =>
      tryOutResponse.parse((await juno.get(paths.tryOut(id)).expect(200)).body).places.length;
    await juno.delete(paths.take(take.id)).expect(204);
    expect(await count()).toBe(2);
    await juno.post(paths.restoreTake(take.id)).expect(200);
    expect(await count()).toBe(3);
  });

  it('refuses what is no try-out, in a sentence', async () => {
    const refused = async (body: object) => {
      const response = await juno.post(paths.tryOuts, body).expect(400);
      return JSON.stringify(response.body);
    };
    expect(await refused(heights({ places: [{ takeId: takes[0].id }] }))).toContain('at least two takes');
    const twice = [{ takeId: takes[0].id }, { takeId: takes[0].id }];
    expect(await refused(heights({ places: twice }))).toContain('only once');
    expect(await refused(heights({ subject: 'other' }))).toContain('what differs');
    expect(await refused(heights({ places: [{ takeId: takes[0].id }, {}] }))).toContain('Name a take');
    const { id, places } = await made();
    await juno.patch(paths.tryOutPlace(id, places[0].id), { position: 'high' }).expect(400);
    await juno.get(`${paths.tryOutRanking(id)}?measure=loudness`).expect(400);
    await juno.patch(paths.tryOut(id), { winnerPlaceId: randomUUID() }).expect(404);
  });

  it('is nothing to another player, nor can it be made of somebody’s takes', async () => {
    const { id, places } = await made();
    const other = await oda.post(paths.tryOuts, heights()).expect(400);
    expect(other.body).toMatchObject({ message: 'One of these takes is not there any more.' });
    await oda.get(paths.tryOut(id)).expect(404);
    await oda.get(paths.tryOutRanking(id)).expect(404);
    await oda.patch(paths.tryOut(id), { reason: 'mine' }).expect(404);
    await oda.patch(paths.tryOutPlace(id, places[0].id), { position: 1 }).expect(404);
    await oda.delete(paths.tryOutPlace(id, places[0].id)).expect(404);
    await oda.post(paths.restoreTryOutPlace(id, places[0].id)).expect(404);
    await oda.post(paths.tryOutPlaces(id), { places: [{ uploadKey: randomUUID() }] }).expect(404);
    await oda.post(paths.tryOutSetup(id), { winnerPlaceId: places[0].id, reason: '' }).expect(404);
    await oda.delete(paths.tryOutSetup(id)).expect(404);
    await oda.delete(paths.tryOut(id)).expect(404);
    await oda.post(paths.restoreTryOut(id)).expect(404);
    expect((await oda.get(paths.tryOuts).expect(200)).body).toEqual({ items: [] });
    await juno.get(paths.tryOut('nonsense')).expect(404);
  });

  it('asks who is there', async () => {
    const { id, places } = await made();
    const nobody = new Browser(test);
    await nobody.get(paths.tryOuts).expect(401);
    await nobody.post(paths.tryOuts, heights()).expect(401);
    await nobody.get(paths.tryOut(id)).expect(401);
    await nobody.get(paths.tryOutRanking(id)).expect(401);
    await nobody.patch(paths.tryOut(id), {}).expect(401);
    await nobody.patch(paths.tryOutPlace(id, places[0].id), {}).expect(401);
    await nobody.delete(paths.tryOutPlace(id, places[0].id)).expect(401);
    await nobody.post(paths.restoreTryOutPlace(id, places[0].id)).expect(401);
    await nobody.post(paths.tryOutPlaces(id), { places: [] }).expect(401);
    await nobody.post(paths.tryOutSetup(id), {}).expect(401);
    await nobody.delete(paths.tryOutSetup(id)).expect(401);
    await nobody.delete(paths.tryOut(id)).expect(401);
    await nobody.post(paths.restoreTryOut(id)).expect(401);
  });
});

/** Eight kick hits, equal energies in both microphones at matched levels, as alike as asked for. */
function factsAlike(facts: TakeFacts, alike: number): TakeFacts {
  const [pair] = facts.pairs;
  const hits = Array.from({ length: 8 }, (_, i) => ({
    timeS: 0.05 * i,
    kind: 'kick' as const,
    peaksDbfs: [-9, -12],
    kickFigures: {
      attackDb: -6,
      lowEnergy: { kick: 1, overhead: 1, cross: alike },
      overheadThirdOctavesDbfs: { hz63: -30, hz125: -30 },
    },
  }));
  return { ...facts, hits, pairs: [{ ...pair, agreement: { ...pair.agreement, matchGainDb: 0 } }] };
}
