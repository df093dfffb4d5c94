import { randomUUID } from 'node:crypto';
import {
  emptySetup,
  listSetupsResponse,
  listTakesResponse,
  paths,
  setupResponse,
  SetupResponse,
  takeResponse,
} from '@thudline/contracts';
import sharp from 'sharp';
import { Photo } from '../src/photos/entities/photo.entity';
import { Setup } from '../src/setups/entities/setup.entity';
import { cameraPhoto } from './support/camera-photo';
import { Browser, joined, Person } from './support/person';
import { giveReport, shortTakeFacts } from './support/reported-take';
import { openedBy, sharedBy } from './support/shares';
import { startTestApp, TestApp } from './support/test-app';

describe('setups', () => {
  let test: TestApp;
  let juno: Person;
  let oda: Person;

  beforeAll(async () => {
    test = await startTestApp();
    oda = await joined(test, 'Oda');
  });
  beforeEach(async () => {
    juno = await joined(test);
  });
  afterAll(async () => test?.close());

  const make = async (body: object = {}, who = juno): Promise<SetupResponse> =>
    setupResponse.parse((await who.post(paths.setups, body).expect(201)).body);
  const read = async (id: string): Promise<SetupResponse> =>
    setupResponse.parse((await juno.get(paths.setup(id)).expect(200)).body);
  const list = async () => listSetupsResponse.parse((await juno.get(paths.setups).expect(200)).body).items;

  it('may stay empty, and are numbered where they have no name', async () => {
    const first = await make();
    expect(first).toMatchObject({ ...emptySetup, name: 'Setup 1', takeCount: 0, takes: [], measured: null });
    expect((await make()).name).toBe('Setup 2');
    expect(await read(first.id)).toEqual(first);
  });

  it('keep what is written and leave the rest of a group as it was', async () => {
    const { id } = await make({ name: 'Low', kick: { insideCm: 8, which: 'a dynamic' }, rest: 'felt' });
    const changed = await juno
      .patch(paths.setup(id), {
        kick: { insideCm: null, heightCm: 28.5 },
        overheadPreamp: { polarity: true },
      })
      .expect(200);
    expect(changed.body).toMatchObject({
      name: 'Low',
      kick: { insideCm: null, heightCm: 28.5, which: 'a dynamic' },
      overheadPreamp: { polarity: true, pad: false },
      rest: 'felt',
    });
    expect(await read(id)).toEqual(changed.body);
  });

  it('refuse numbers and words that make no sense, in one sentence, and change nothing', async () => {
    const { id } = await make({ name: 'Low' });
    const refused = await juno.patch(paths.setup(id), { kick: { insideCm: 900 } }).expect(400);
    expect(refused.body).toMatchObject({
      code: 'bad-request',
      details: { fields: { 'kick.insideCm': 'A distance here lies between −300 and 500 cm.' } },
    });
    await juno.patch(paths.setup(id), { kick: { insideCm: 'eight' } }).expect(400);
    await juno.patch(paths.setup(id), { name: ' ' }).expect(400);
    await juno.post(paths.setups, { name: 'x'.repeat(61) }).expect(400);
    expect((await read(id)).name).toBe('Low');
  });

  it('are copied with changes and remember where they came from', async () => {
    const from = await make({ name: '8 cm inside' });
    const copy = await make({ name: 'High', overhead: { aboveSnareCm: 90 }, copiedFromId: from.id });
    expect(copy.copiedFrom).toEqual({ id: from.id, name: '8 cm inside' });
    await juno.delete(paths.setup(from.id)).expect(204);
    expect((await read(copy.id)).copiedFrom).toBeNull();
    await oda.post(paths.setups, { copiedFromId: copy.id }).expect(404);
  });

  it('answer 404 to everybody else, and 401 to somebody signed out', async () => {
    const { id } = await make();
    for (const who of [oda, new Browser(test)]) {
      const status = who === oda ? 404 : 401;
      await who.get(paths.setup(id)).expect(status);
      await who.patch(paths.setup(id), { name: 'Mine' }).expect(status);
      await who.delete(paths.setup(id)).expect(status);
      await who.post(paths.setupPhoto(id)).expect(status);
      await who.delete(paths.setupPhoto(id)).expect(status);
    }
    await new Browser(test).get(paths.setups).expect(401);
    await new Browser(test).post(paths.setups, {}).expect(401);
    await juno.get(paths.setup('nonsense')).expect(404);
    await juno.get(paths.setup(randomUUID())).expect(404);
    expect((await read(id)).name).toBe('Setup 1');
  });

  describe('of takes', () => {
    it('are given while uploading, changed and taken off later', async () => {
      const [one, other] = [await make({ name: 'One' }), await make({ name: 'Other' })];
      const take = await juno.makeTake({ setupId: one.id });
      expect(take.setup).toEqual({ id: one.id, name: 'One' });
      const changed = await juno.patch(paths.take(take.id), { setupId: other.id }).expect(200);
      expect(takeResponse.parse(changed.body).setup).toEqual({ id: other.id, name: 'Other' });
      await juno.patch(paths.take(take.id), { title: 'Still' }).expect(200);
      expect((await read(other.id)).takes).toEqual([{ id: take.id, number: take.number }]);
      const cleared = await juno.patch(paths.take(take.id), { setupId: null }).expect(200);
      expect(takeResponse.parse(cleared.body).setup).toBeNull();
    });

    it('have to be the player’s own', async () => {
      const theirs = await make({}, oda);
      const take = await juno.makeTake();
      const refused = await juno.patch(paths.take(take.id), { setupId: theirs.id }).expect(400);
      expect(refused.body).toMatchObject({ message: 'This setup is not there any more.' });
      await expect(juno.makeTake({ setupId: theirs.id })).rejects.toThrow(
        'This setup is not there any more.',
      );
    });

    it('are not told to a guest', async () => {
      const { id } = await make();
      const take = await juno.makeTake({ setupId: id });
      const guest = new Browser(test);
      await openedBy(guest, await sharedBy(juno, take, {}));
      expect(takeResponse.parse((await guest.get(paths.take(take.id)).expect(200)).body).setup).toBeNull();
    });

    it('can’t be removed while takes have them', async () => {
      const { id } = await make();
      const take = await juno.makeTake({ setupId: id });
      const refused = await juno.delete(paths.setup(id)).expect(409);
      expect(refused.body).toMatchObject({
        message: 'A take was recorded with this setup. Give it another one first.',
      });
      await juno.delete(paths.take(take.id)).expect(204);
      await juno.delete(paths.setup(id)).expect(204);
      await juno.post(paths.restoreTake(take.id)).expect(200);
    });

    it('tell what the newest one whose arrival is known measured', async () => {
      const { id } = await make();
      const facts = await shortTakeFacts();
      const told = structuredClone(facts);
      Object.assign(told.pairs[0].arrival, { arrivalMs: 2.7, arrivalIqrMs: 0.1, confidence: 0.9 });
      Object.assign(facts.pairs[0].arrival, { arrivalMs: 1.1, confidence: 0.4 });
      const older = await juno.makeTake({ setupId: id, recordedAt: '2026-11-01T10:00:00Z' });
      const newer = await juno.makeTake({ setupId: id, recordedAt: '2026-11-02T10:00:00Z' });
      await giveReport(test, older, told);
      await giveReport(test, newer, facts);
      expect(await read(id)).toMatchObject({
        takeCount: 2,
        takes: [{ id: newer.id }, { id: older.id }],
        measured: { takeId: older.id, number: older.number, arrivalMs: 2.7, arrivalIqrMs: 0.1 },
      });
    });
  });

  describe('in lists', () => {
    it('stand with the one used last first, and with their takes counted', async () => {
      const [used, newest] = [await make({ name: 'Used' }), await make({ name: 'New' })];
      await juno.makeTake({ setupId: used.id });
      const gone = await juno.makeTake({ setupId: newest.id });
      await juno.delete(paths.take(gone.id)).expect(204);
      expect((await list()).map(({ name, takeCount }) => [name, takeCount])).toEqual([
        ['Used', 1],
        ['New', 0],
      ]);
    });

    it('find the takes recorded with them', async () => {
      const { id, name } = await make({ name: 'High' });
      await make({ name: 'Never used' });
      const take = await juno.makeTake({ setupId: id });
      await juno.makeTake();
      const found = listTakesResponse.parse((await juno.get(`${paths.takes}?setup=${id}`).expect(200)).body);
      expect(found.items.map((item) => item.id)).toEqual([take.id]);
      expect(found.setups).toEqual([{ id, name }]);
      await juno.get(`${paths.takes}?setup=nonsense`).expect(400);
      const others = await oda.get(`${paths.takes}?setup=${id}`).expect(200);
      expect(listTakesResponse.parse(others.body).items).toEqual([]);
    });
  });

  describe('with a photo', () => {
    const addPhoto = (id: string, bytes: Buffer, name = 'photo.jpg') =>
      juno.written(juno.agent.post(paths.setupPhoto(id))).attach('photo', bytes, name);

    it('keep it upright and small, without what the camera wrote into it', async () => {
      const { id } = await make();
      const sent = await cameraPhoto();
      expect((await sharp(sent).metadata()).exif).toBeDefined();
      const { photo } = setupResponse.parse((await addPhoto(id, sent).expect(200)).body);
      expect(photo).toMatchObject({ widthPx: 1024, heightPx: 2048 });
      const got = await juno.get(paths.photo(photo!.id)).buffer(true).expect(200);
      expect(got.headers['content-type']).toBe('image/jpeg');
      const kept = await sharp(got.body as Buffer).metadata();
      expect(kept).toMatchObject({ format: 'jpeg', width: 1024, height: 2048 });
      expect([kept.exif, kept.xmp, kept.iptc, kept.orientation]).toEqual(Array(4).fill(undefined));
    });

    it('show it to nobody else', async () => {
      const { id } = await make();
      const { photo } = setupResponse.parse((await addPhoto(id, await cameraPhoto())).body);
      await oda.get(paths.photo(photo!.id)).expect(404);
      await new Browser(test).get(paths.photo(photo!.id)).expect(401);
      await juno.get(paths.photo('nonsense')).expect(404);
    });

    it('let go of it, of the one before it, and of it with the setup', async () => {
      const { id } = await make();
      const photoOf = async () =>
        setupResponse.parse((await addPhoto(id, await cameraPhoto()).expect(200)).body).photo!.id;
      const [first, second] = [await photoOf(), await photoOf()];
      await juno.get(paths.photo(first)).expect(404);
      expect((await juno.delete(paths.setupPhoto(id)).expect(200)).body).toMatchObject({ photo: null });
      await juno.get(paths.photo(second)).expect(404);
      const third = await photoOf();
      await juno.delete(paths.setup(id)).expect(204);
      expect(await test.em().count(Photo, { id: third })).toBe(0);
      expect(await test.em().count(Setup, { id })).toBe(0);
    });

    it('refuse what is no photo, none at all, and one that is too large', async () => {
      const { id } = await make();
      const noPhoto = await addPhoto(id, Buffer.from('RIFF is no photo')).expect(422);
      expect(noPhoto.body).toEqual({
        code: 'photo-refused',
        message: 'This is no photo that can be read. Add a JPEG, a PNG or a WebP.',
      });
      const drawing = Buffer.from('<svg xmlns="http://www.w3.org/2000/svg" width="9" height="9"/>');
      await addPhoto(id, drawing, 'drawing.svg').expect(422);
      await juno.post(paths.setupPhoto(id)).expect(400);
      const large = await addPhoto(id, Buffer.alloc(10 * 1024 * 1024 + 1)).expect(413);
      expect(large.body).toMatchObject({ message: 'A photo may have 10 MB. Make it smaller first.' });
      expect((await read(id)).photo).toBeNull();
    });
  });
});
