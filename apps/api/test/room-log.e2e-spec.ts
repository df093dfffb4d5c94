import {
  CreateRoomChangeRequest,
  CreateSetupRequest,
  listRoomChangesResponse,
  paths,
  roomChangeResponse,
  RoomResponse,
  roomResponse,
  roomTrendResponse,
  setupResponse,
  trendFigures,
} from '@thudline/contracts';
import sharp from 'sharp';
import { Photo } from '../src/photos/entities/photo.entity';
import { cameraPhoto } from './support/camera-photo';
import { Browser, joined, Person, Upload } from './support/person';
import { giveReport, shortTakeFacts } from './support/reported-take';
import { withDecay, withNoise } from './support/room-facts';
import { startTestApp, TestApp } from './support/test-app';
import { unzipped } from './support/unzipped';

describe('the log of a room', () => {
  let test: TestApp;
  let juno: Person;
  let oda: Person;
  let room: RoomResponse;

  beforeAll(async () => {
    test = await startTestApp();
    oda = await joined(test, 'Oda');
  });
  beforeEach(async () => {
    juno = await joined(test);
    room = roomResponse.parse((await juno.post(paths.rooms, { name: 'The garage' }).expect(201)).body);
  });
  afterAll(async () => test?.close());

  const makeTake = (day: string, changed: Partial<Upload> = {}) =>
    juno.makeTake({ recordedAt: `${day}T19:40:00Z`, roomId: room.id, ...changed });
  const makeChange = async (request: CreateRoomChangeRequest) =>
    roomChangeResponse.parse((await juno.post(paths.roomChanges(room.id), request).expect(201)).body);
  const makeSetup = async (fields: CreateSetupRequest) =>
    setupResponse.parse((await juno.post(paths.setups, fields).expect(201)).body).id;
  const measured = async (day: string, changed: Partial<Upload> = {}) => {
    const take = await makeTake(day, changed);
    await giveReport(test, take, withDecay(withNoise(await shortTakeFacts(), -61), 0.6));
    return take;
  };
  const addPhoto = (path: string, bytes: Buffer) =>
    juno.written(juno.agent.post(path)).attach('photo', bytes, 'photo.jpg');

  describe('tells what a change did', () => {
    const usual: CreateSetupRequest = {
      name: 'usual',
      kick: { insideCm: 0 },
      kickPreamp: { gainDb: 30 },
      overheadPreamp: { gainDb: 41 },
    };

    it('but not where a microphone moved as well, and says so', async () => {
      await measured('2026-10-05', { setupId: await makeSetup(usual) });
      await measured('2026-10-20', { setupId: await makeSetup({ ...usual, kick: { insideCm: 5 } }) });
      expect(await makeChange({ happenedOn: '2026-10-19', what: 'Kit moved' })).toMatchObject({
        did: {
          status: 'cannot-tell',
          strong: 'Can’t be compared:',
          rest: 'the kick microphone moved as well, from 0 cm to 5 cm inside.',
        },
        figures: [],
        caveats: [],
      });
    });

    it('without noise where a preamp was turned', async () => {
      await measured('2026-10-05', { setupId: await makeSetup(usual) });
      const louder = { ...usual, overheadPreamp: { gainDb: 44 } };
      await measured('2026-10-20', { setupId: await makeSetup(louder) });
      const change = await makeChange({ happenedOn: '2026-10-19', what: 'Rug' });
      expect(change.figures.filter(({ key }) => key.startsWith('noise'))).toEqual([]);
      expect(change.caveats).toEqual([
        'The overhead preamp changed as well, from 41 dB to 44 dB: noise and low end aren’t compared.',
      ]);
    });

    it('of as many of the newest changes as are asked for, and leaves the others untold', async () => {
      for (const day of ['2026-10-05', '2026-10-20', '2026-11-05']) await measured(day);
      await makeChange({ happenedOn: '2026-10-19', what: 'Rug' });
      await makeChange({ happenedOn: '2026-11-01', what: 'Curtain' });
      await makeChange({ happenedOn: '2026-11-20', what: 'Heater' });
      const told = async (query: string) => {
        const answer = await juno.get(paths.roomChanges(room.id) + query).expect(200);
        return listRoomChangesResponse.parse(answer.body).items.map(({ what, isTold }) => [what, isTold]);
      };
      expect(await told('?told=2')).toEqual([
        // No take since then: nothing to compare.
        ['Heater', true],
        ['Curtain', true],
        ['Rug', false],
      ]);
      expect(await told('')).toEqual([
        ['Heater', true],
        ['Curtain', true],
        ['Rug', true],
      ]);
      await juno.get(`${paths.roomChanges(room.id)}?told=many`).expect(400);
    });

    it('and says where setups aren’t written down, and which other changes lie between', async () => {
      await measured('2026-10-05');
      await measured('2026-10-20');
      await makeChange({ happenedOn: '2026-10-10', what: 'Heater' });
      const change = await makeChange({ happenedOn: '2026-10-19', what: 'Rug' });
      expect(change.number).toBe(2);
      expect(change.caveats).toEqual([
        'Not every take has its setup written down: nobody knows whether the microphones stood alike.',
        'Change 1 lies between these takes as well.',
      ]);
      expect(change.figures.length).toBeGreaterThan(0);
    });
  });

  describe('keeps photos', () => {
    it('of the room and of a change: drawn anew, upright, without place and date', async () => {
      const change = await makeChange({ happenedOn: '2026-10-19', what: 'Rug' });
      const sent = await cameraPhoto();
      expect((await sharp(sent).metadata()).exif).toBeDefined();
      const ofRoom = await addPhoto(paths.roomPhoto(room.id), sent).expect(200);
      const ofChange = await addPhoto(paths.roomChangePhoto(room.id, change.id), sent).expect(200);
      const photos = [roomResponse.parse(ofRoom.body).photo, roomChangeResponse.parse(ofChange.body).photo];
      for (const photo of photos) {
        const got = await juno.get(paths.photo(photo!.id)).buffer(true).expect(200);
        const kept = await sharp(got.body as Buffer).metadata();
        expect(kept).toMatchObject({ format: 'jpeg', width: 1024, height: 2048 });
        expect([kept.exif, kept.xmp, kept.iptc, kept.orientation]).toEqual(Array(4).fill(undefined));
        await oda.get(paths.photo(photo!.id)).expect(404);
      }
      const log = listRoomChangesResponse.parse((await juno.get(paths.roomChanges(room.id))).body);
      expect(log.items[0].photo).toEqual(photos[1]);
    });

    it('until they are taken off, or what they show goes', async () => {
      const change = await makeChange({ happenedOn: '2026-10-19', what: 'Rug' });
      const ids: string[] = [];
      for (const path of [paths.roomPhoto(room.id), paths.roomChangePhoto(room.id, change.id)]) {
        await addPhoto(path, await cameraPhoto()).expect(200);
        expect((await juno.delete(path).expect(200)).body).toMatchObject({ photo: null });
        const added = await addPhoto(path, await cameraPhoto()).expect(200);
        ids.push((added.body as { photo: { id: string } }).photo.id);
      }
      expect(await test.em().count(Photo, { id: { $in: ids } })).toBe(2);
      await juno.delete(paths.room(room.id)).expect(204);
      expect(await test.em().count(Photo, { id: { $in: ids } })).toBe(0);
    });

    it('and no other files, of nobody else', async () => {
      const change = await makeChange({ happenedOn: '2026-10-19', what: 'Rug' });
      for (const path of [paths.roomPhoto(room.id), paths.roomChangePhoto(room.id, change.id)]) {
        await addPhoto(path, Buffer.from('RIFF is no photo')).expect(422);
        await juno.post(path).expect(400);
        for (const [person, status] of [[oda, 404] as const, [new Browser(test), 401] as const]) {
          await person.post(path).expect(status);
          await person.delete(path).expect(status);
        }
      }
    });
  });

  describe('is kept as one file', () => {
    it('with the room’s measures, every figure over time and the photos', async () => {
      const take = await measured('2026-10-05');
      const change = await makeChange({ happenedOn: '2026-10-19', what: '=Rug, old' });
      await addPhoto(paths.roomChangePhoto(room.id, change.id), await cameraPhoto()).expect(200);
      const got = await juno
        .get(paths.roomFile(room.id))
        .buffer(true)
        .parse((answer, done) => {
          const parts: Buffer[] = [];
          answer.on('data', (part: Buffer) => parts.push(part));
          answer.on('end', () => done(null, Buffer.concat(parts)));
        })
        .expect(200);
      expect(got.headers['content-type']).toBe('application/zip');
      expect(got.headers['content-disposition']).toBe('attachment; filename="the-garage.zip"');
      const files = await unzipped(got.body as Buffer);
      const names = ['read me.txt', 'room.json', 'changes.json', 'changes.csv', 'figures.csv'];
      expect([...files.keys()]).toEqual([...names, 'photos/change-1.jpg']);
      const text = (path: string) => files.get(path)!.toString();
      expect(JSON.parse(text('room.json'))).toMatchObject({ name: 'The garage', takeCount: 1 });
      expect(JSON.parse(text('changes.json'))).toMatchObject([{ number: 1, what: '=Rug, old' }]);
      expect(text('changes.csv')).toContain(`1,2026-10-19,"'=Rug, old",other,`);
      const row = `decay-500,2026-10-05T19:40:00.000Z,${take.number},0.6,0.04,`;
      expect(text('figures.csv').split('\r\n')).toContain(row);
      expect((await sharp(files.get('photos/change-1.jpg')).metadata()).exif).toBeUndefined();
    });

    it('by nobody else', async () => {
      await oda.get(paths.roomFile(room.id)).expect(404);
      await new Browser(test).get(paths.roomFile(room.id)).expect(401);
    });
  });

  it('has company: the figures of a setup over time, for its player only', async () => {
    const setupId = await makeSetup({ name: 'high' });
    const own = await measured('2026-10-05', { setupId });
    await measured('2026-10-06');
    const path = paths.setupTrend(setupId);
    const read = await juno.get(`${path}?figure=noise-overhead`).expect(200);
    expect(roomTrendResponse.parse(read.body).points).toMatchObject([
      { takeId: own.id, value: -61, setup: { id: setupId, name: 'high' } },
    ]);
    for (const figure of trendFigures)
      roomTrendResponse.parse((await juno.get(`${path}?figure=${figure}`).expect(200)).body);
    await juno.get(`${path}?figure=warmth`).expect(400);
    await oda.get(path).expect(404);
    await new Browser(test).get(path).expect(401);
  });
});
