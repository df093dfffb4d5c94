import { randomUUID } from 'node:crypto';
import {
  CreateRoomChangeRequest,
  CreateRoomRequest,
  listRoomChangesResponse,
  listRoomsResponse,
  paths,
  roomChangeResponse,
  RoomChangeResponse,
  RoomResponse,
  roomResponse,
  roomTrendResponse,
  takeResponse,
  TakeResponse,
} from '@thudline/contracts';
import { Browser, joined, Person, Upload } from './support/person';
import { giveReport, shortTakeFacts } from './support/reported-take';
import { withDecay, withNoise } from './support/room-facts';
import { startTestApp, TestApp } from './support/test-app';

const garage: CreateRoomRequest = {
  name: 'The garage',
  shape: { kind: 'box', lengthM: 5.2, widthM: 3.1, heightM: 2.4 },
  surfaces: [
    { place: 'floor', materialId: 'concrete-floor', areaM2: null },
    { place: 'left', materialId: 'timber-door', areaM2: 4.4 },
  ],
  temperatureC: 12,
  kit: { xM: 3, yM: 1.6, turnedDeg: 200 },
};

describe('rooms', () => {
  let test: TestApp;
  let juno: Person;
  let oda: Person;

  beforeAll(async () => {
    test = await startTestApp();
  });
  beforeEach(async () => {
    juno = await joined(test);
    oda = await joined(test, 'Oda');
  });
  afterAll(async () => test?.close());

  const makeRoom = async (request: CreateRoomRequest = garage): Promise<RoomResponse> =>
    roomResponse.parse((await juno.post(paths.rooms, request).expect(201)).body);
  const makeTake = (room: RoomResponse | null, day: string, changed: Partial<Upload> = {}) =>
    juno.makeTake({
      recordedAt: `${day}T19:40:00Z`,
      ...(room ? { roomId: room.id } : {}),
      ...changed,
    });
  const makeChange = async (room: RoomResponse, request: CreateRoomChangeRequest) =>
    roomChangeResponse.parse((await juno.post(paths.roomChanges(room.id), request).expect(201)).body);
  const changesOf = async (room: RoomResponse): Promise<RoomChangeResponse[]> =>
    listRoomChangesResponse.parse((await juno.get(paths.roomChanges(room.id)).expect(200)).body).items;
  const numbers = (takes: { number: number }[]) => takes.map(({ number }) => number);

  it('are kept with what is written down of them, and nothing else', async () => {
    const room = await makeRoom();
    expect(room).toMatchObject({ ...garage, takeCount: 0, changeCount: 0, lastTakeAt: null });
    const bare = await makeRoom({ name: 'Cellar' });
    expect(bare).toMatchObject({
      shape: { kind: 'box', lengthM: null, widthM: null, heightM: null },
      surfaces: [],
      temperatureC: null,
      kit: null,
    });
    const read = await juno.get(paths.room(room.id)).expect(200);
    expect(roomResponse.parse(read.body)).toEqual(room);
  });

  it('change field by field; null clears', async () => {
    const room = await makeRoom();
    const shape = { kind: 'other' as const, volumeM3: 38, surfaceM2: null };
    const changed = await juno.patch(paths.room(room.id), { shape, kit: null }).expect(200);
    expect(changed.body).toMatchObject({ name: garage.name, surfaces: garage.surfaces, shape, kit: null });
  });

  it('stand in a list, the one recorded in last first, with how much was recorded', async () => {
    const [cellar, attic] = [await makeRoom({ name: 'Cellar' }), await makeRoom({ name: 'Attic' })];
    await makeTake(cellar, '2026-10-05');
    await makeTake(cellar, '2026-10-09');
    const gone = await makeTake(attic, '2026-11-09');
    await juno.delete(paths.take(gone.id)).expect(204);
    const { items } = listRoomsResponse.parse((await juno.get(paths.rooms).expect(200)).body);
    expect(items).toMatchObject([
      { name: 'Cellar', takeCount: 2, firstTakeAt: '2026-10-05T19:40:00.000Z' },
      { name: 'Attic', takeCount: 0, firstTakeAt: null },
    ]);
  });

  it.each<[string, object]>([
    ['a room without a name', { name: ' ' }],
    ['a length of nothing', { name: 'x', shape: { ...garage.shape, lengthM: 0 } }],
    [
      'a material nobody knows',
      { name: 'x', surfaces: [{ place: 'floor', materialId: 'moss', areaM2: null }] },
    ],
    ['a place outside', { name: 'x', kit: { xM: -1, yM: 0, turnedDeg: 0 } }],
    ['a sauna', { name: 'x', temperatureC: 80 }],
  ])('refuse %s', async (_, request) => {
    const refused = await juno.post(paths.rooms, request).expect(400);
    expect(refused.body).toMatchObject({ code: 'bad-request' });
  });

  it('are nobody else’s, and nobody’s without signing in', async () => {
    const room = await makeRoom();
    const change = await makeChange(room, { happenedOn: '2026-10-19', what: 'Rug' });
    const [one, entry] = [paths.room(room.id), paths.roomChange(room.id, change.id)];
    for (const person of [oda, new Browser(test)]) {
      const status = person === oda ? 404 : 401;
      await person.get(one).expect(status);
      await person.patch(one, { name: 'Mine' }).expect(status);
      await person.delete(one).expect(status);
      await person.get(paths.roomChanges(room.id)).expect(status);
      await person.post(paths.roomChanges(room.id), { happenedOn: '2026-10-19', what: 'x' }).expect(status);
      await person.patch(entry, { what: 'x' }).expect(status);
      await person.delete(entry).expect(status);
      await person.get(paths.roomTrend(room.id)).expect(status);
    }
    await new Browser(test).get(paths.rooms).expect(401);
    await new Browser(test).post(paths.rooms, garage).expect(401);
    await juno.get(paths.room('nonsense')).expect(404);
    // A change is only found in its own room.
    const other = await makeRoom({ name: 'Other' });
    await juno.patch(paths.roomChange(other.id, change.id), { what: 'x' }).expect(404);
  });

  it('go with their log and leave their takes', async () => {
    const room = await makeRoom();
    const take = await makeTake(room, '2026-10-05');
    await makeChange(room, { happenedOn: '2026-10-19', what: 'Rug' });
    await juno.delete(paths.room(room.id)).expect(204);
    await juno.get(paths.room(room.id)).expect(404);
    expect((await juno.get(paths.take(take.id)).expect(200)).body).toMatchObject({ room: null });
  });

  describe('a take', () => {
    it('is recorded in one, can be moved to another and out of any', async () => {
      const [room, other] = [await makeRoom(), await makeRoom({ name: 'Cellar' })];
      const take = await makeTake(room, '2026-10-05');
      expect(take.room).toEqual({ id: room.id, name: room.name });
      const moved = await juno.patch(paths.take(take.id), { roomId: other.id }).expect(200);
      expect(takeResponse.parse(moved.body).room).toEqual({ id: other.id, name: 'Cellar' });
      const out = await juno.patch(paths.take(take.id), { roomId: null }).expect(200);
      expect(takeResponse.parse(out.body).room).toBeNull();
    });

    it('is not put into somebody else’s', async () => {
      const { id } = (await oda.post(paths.rooms, garage).expect(201)).body as RoomResponse;
      await expect(juno.makeTake({ roomId: id })).rejects.toThrow('not there any more');
      const take = await juno.makeTake();
      await juno.patch(paths.take(take.id), { roomId: id }).expect(400);
    });
  });

  describe('the log', () => {
    it('reads newest first and numbers the changes by day, then as they were put', async () => {
      const room = await makeRoom();
      const second = await makeChange(room, { happenedOn: '2026-11-02', what: 'Heater' });
      await makeChange(room, { happenedOn: '2026-10-19', what: 'Kit moved' });
      const third = await makeChange(room, { happenedOn: '2026-11-02', what: 'Rug' });
      const read = async () => (await changesOf(room)).map(({ number, what }) => [number, what]);
      expect(await read()).toEqual([
        [3, 'Rug'],
        [2, 'Heater'],
        [1, 'Kit moved'],
      ]);
      await juno.patch(paths.roomChange(room.id, third.id), { rank: -1 }).expect(200);
      expect((await read()).map(([, what]) => what)).toEqual(['Heater', 'Rug', 'Kit moved']);
      await juno.patch(paths.roomChange(room.id, second.id), { happenedOn: '2026-10-01' }).expect(200);
      expect((await read()).map(([, what]) => what)).toEqual(['Rug', 'Kit moved', 'Heater']);
      await juno.delete(paths.roomChange(room.id, third.id)).expect(204);
      expect(await read()).toHaveLength(2);
    });

    it('suggests takes by day, and takes those that are named instead', async () => {
      const room = await makeRoom();
      const takes: TakeResponse[] = [];
      for (const day of ['2026-10-05', '2026-10-18', '2026-10-20', '2026-11-05'])
        takes.push(await makeTake(room, day));
      await makeTake(null, '2026-10-18');
      const [first, near, next] = takes;
      const change = await makeChange(room, { happenedOn: '2026-10-19', what: 'Rug' });
      expect([numbers(change.before), numbers(change.after)]).toEqual([[near.number], [next.number]]);
      const named = await juno
        .patch(paths.roomChange(room.id, change.id), { beforeTakeIds: [near.id, first.id], cost: 'borrowed' })
        .expect(200);
      const { before, after, cost, what } = roomChangeResponse.parse(named.body);
      expect([numbers(before), numbers(after), cost, what]).toEqual([
        [first.number, near.number],
        [next.number],
        'borrowed',
        'Rug',
      ]);
      // Moved to the other side it leaves the one it was on.
      const moved = await juno
        .patch(paths.roomChange(room.id, change.id), { afterTakeIds: [near.id] })
        .expect(200);
      expect(numbers(roomChangeResponse.parse(moved.body).before)).toEqual([first.number]);
      await juno.delete(paths.take(near.id)).expect(204);
      expect((await changesOf(room))[0].after).toEqual([]);
      const log = listRoomChangesResponse.parse((await juno.get(paths.roomChanges(room.id))).body);
      expect(numbers(log.takes)).toEqual([takes[3].number, next.number, first.number]);
    });

    it('refuses takes of elsewhere, a take on both sides, and what says nothing', async () => {
      const room = await makeRoom();
      const [inside, outside] = [await makeTake(room, '2026-10-05'), await makeTake(null, '2026-10-05')];
      const bad = [
        { happenedOn: '2026-10-19', what: 'Rug', beforeTakeIds: [outside.id] },
        { happenedOn: '2026-10-19', what: 'Rug', beforeTakeIds: [inside.id], afterTakeIds: [inside.id] },
        { happenedOn: '2026-10-19', what: 'Rug', beforeTakeIds: [randomUUID()] },
        { happenedOn: '19 Oct', what: 'Rug' },
        { happenedOn: '2026-10-19', what: '' },
      ];
      for (const request of bad) await juno.post(paths.roomChanges(room.id), request).expect(400);
      expect(await changesOf(room)).toEqual([]);
    });

    it('says what is missing to tell what a change did', async () => {
      const room = await makeRoom();
      const alone = await makeChange(room, { happenedOn: '2026-10-01', what: 'Panels' });
      expect(alone.did).toMatchObject({ status: 'cannot-tell', strong: 'No take before it.' });
      const take = await makeTake(room, '2026-10-05');
      const last = await makeChange(room, { happenedOn: '2026-12-01', what: 'Kit turned' });
      expect(last.did).toEqual({
        status: 'cannot-tell',
        strong: 'No take since then.',
        rest: `Record one the way you recorded take ${take.number}, and it shows here.`,
      });
      await makeTake(room, '2026-12-01');
      const unmeasured = await makeChange(room, { happenedOn: '2026-11-20', what: 'Rug' });
      expect(unmeasured.did).toMatchObject({ strong: 'Not measured yet.' });
    });

    it('tells what a change did from the takes of both sides', async () => {
      const room = await makeRoom();
      const facts = await shortTakeFacts();
      const measured = async (day: string, noiseDbfs: number) => {
        const take = await makeTake(room, day);
        await giveReport(test, take, withNoise(facts, noiseDbfs));
        return take;
      };
      for (const day of ['2026-10-05', '2026-10-06']) await measured(day, -61);
      const loud = await measured('2026-11-03', -52);
      const change = await makeChange(room, { happenedOn: '2026-11-02', what: 'Fan heater left running' });
      expect(numbers(change.after)).toEqual([loud.number]);
      expect(change.did).toEqual({
        status: 'watch',
        strong: 'The overhead’s noise floor rose 9 dB, to −52 dBFS.',
        rest: 'Switch it off while you record.',
      });
      expect(change.figures[0]).toMatchObject({
        key: 'noise-overhead',
        before: -61,
        after: -52,
        clear: true,
        word: 'noisier',
      });
    });
  });

  describe('the trend', () => {
    it('holds a figure of every measured take, oldest first', async () => {
      const room = await makeRoom();
      const facts = await shortTakeFacts();
      const [second, first] = [await makeTake(room, '2026-11-01'), await makeTake(room, '2026-10-01')];
      await makeTake(room, '2026-11-02');
      await giveReport(test, first, withDecay(withNoise(facts, -70), 0.6));
      await giveReport(test, second, withDecay(withNoise(facts, -72), null));
      const trend = async (query: string) =>
        roomTrendResponse.parse((await juno.get(`${paths.roomTrend(room.id)}${query}`).expect(200)).body);
      expect((await trend('?figure=noise-overhead')).points).toMatchObject([
        { number: first.number, value: -70, iqr: null, recordedAt: '2026-10-01T19:40:00.000Z' },
        { number: second.number, value: -72 },
      ]);
      expect(await trend('')).toMatchObject({
        figure: 'decay-500',
        points: [{ number: first.number, value: 0.6, iqr: 0.04 }],
      });
      expect((await trend('?figure=cymbals-over-drums')).points).toEqual([]);
      await juno.get(`${paths.roomTrend(room.id)}?figure=warmth`).expect(400);
    });
  });
});
