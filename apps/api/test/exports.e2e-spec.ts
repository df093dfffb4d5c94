import { randomUUID } from 'node:crypto';
import {
  CreateTryOutRequest,
  ExportResponse,
  exportResponse,
  myExportResponse,
  paths,
  RoomResponse,
  SetupResponse,
  TakeResponse,
} from '@thudline/contracts';
import sharp from 'sharp';
import { Export } from '../src/exports/entities/export.entity';
import { exportedTables, leftOutTables } from '../src/exports/export-tables';
import { AccountPurge } from '../src/housekeeping/account-purge';
import { ExportPurge } from '../src/housekeeping/export-purge';
import { Note } from '../src/notes/entities/note.entity';
import { ObjectStoreService } from '../src/storage/object-store.service';
import { Take } from '../src/takes/entities/take.entity';
import { User } from '../src/users/entities/user.entity';
import { Browser, joined, Person, rightPassword } from './support/person';
import { shortTake } from './support/recordings';
import { giveReport, shortTakeFacts } from './support/reported-take';
import { sharedBy } from './support/shares';
import { startTestApp, TestApp } from './support/test-app';
import { unzipped } from './support/unzipped';
import { until } from './support/until';
import { startWorker, WorkerProcess } from './support/worker-process';

const dayMs = 24 * 60 * 60 * 1000;

describe('everything of an account', () => {
  let test: TestApp;
  let worker: WorkerProcess;

  beforeAll(async () => {
    test = await startTestApp();
    worker = startWorker(test);
  });
  afterAll(async () => {
    await worker?.stop('SIGTERM');
    await test?.close();
  });

  /** Somebody with something of every kind. */
  async function full(name: string) {
    const person = await joined(test, name);
    const room = (await person.post(paths.rooms, { name: 'Garage' }).expect(201)).body as RoomResponse;
    const setup = (await person.post(paths.setups, { name: 'Inside' }).expect(201)).body as SetupResponse;
    const photo = await sharp({ create: { width: 40, height: 30, channels: 3, background: '#345' } })
      .jpeg()
      .toBuffer();
    await person
      .written(person.agent.post(paths.setupPhoto(setup.id)))
      .attach('photo', photo, 'p.jpg')
      .expect(200);
    const takes = [
      await person.makeTake({ title: 'Loud: chorus', roomId: room.id, setupId: setup.id }),
      await person.makeTake({ title: '=cmd' }),
    ];
    for (const take of takes) await giveReport(test, take, await shortTakeFacts());
    const log = { happenedOn: '2026-11-01', what: 'Rug', category: 'other' };
    await person.post(paths.roomChanges(room.id), log).expect(201);
    const share = await sharedBy(person, takes[0]);
    const tryOut: CreateTryOutRequest = {
      subject: 'overhead-height',
      unit: 'cm',
      places: takes.map(({ id }, index) => ({ takeId: id, position: 90 + index })),
    };
    await person.post(paths.tryOuts, tryOut).expect(201);
    return { person, takes, share, room };
  }
  const mine = async (person: Person) =>
    myExportResponse.parse((await person.get(paths.export).expect(200)).body);
  async function made(person: Person): Promise<ExportResponse> {
    const asked = exportResponse.parse((await person.post(paths.export).expect(200)).body);
    expect(asked).toMatchObject({ file: null });
    return until(async () => {
      const { export: latest } = await mine(person);
      if (latest?.state === 'failed') throw new Error(latest.reason ?? 'failed');
      return latest?.state === 'done' && latest;
    });
  }
  const downloaded = async (browser: Browser, { id }: ExportResponse) => {
    const answer = await browser.get(paths.exportFile(id)).responseType('blob').expect(200);
    return {
      files: await unzipped(answer.body as Buffer),
      headers: answer.headers as Record<string, string>,
    };
  };
  /** Every row of every table that names one of these ids, by table. */
  async function rowsNaming(ids: string[]): Promise<Record<string, number>> {
    const tables = await test.em().execute<{ name: string }[]>(
      `select table_schema || '."' || table_name || '"' as name from information_schema.tables
       where table_schema in ('public', 'pgboss') and table_type = 'BASE TABLE'`,
    );
    const counts: Record<string, number> = {};
    for (const { name } of tables) {
      const [row] = await test
        .em()
        .execute<{ count: number }[]>(`select count(*)::int as count from ${name} t where t::text ~ ?`, [
          ids.join('|'),
        ]);
      if (row.count > 0) counts[name] = row.count;
    }
    return counts;
  }

  it('is in one archive: recordings bit for bit, sheets, and every row', async () => {
    const { person, takes } = await full('Juno');
    expect((await mine(person)).holds).toMatchObject({ takes: 2, rooms: 1 });
    const finished = await made(person);
    expect(finished.file?.name).toMatch(/^thudline \d{4}-\d\d-\d\d\.zip$/);
    const { files, headers } = await downloaded(person, finished);
    expect(headers['content-type']).toBe('application/zip');
    const [kick, overhead] = shortTake().files;
    expect(files.get(`takes/001 Loud chorus/${kick.name}`)?.equals(Buffer.from(kick.bytes))).toBe(true);
    expect(files.get(`takes/001 Loud chorus/${overhead.name}`)?.equals(Buffer.from(overhead.bytes))).toBe(
      true,
    );
    const parsed = (path: string) => JSON.parse(files.get(path)?.toString() ?? 'null') as unknown;
    expect(parsed('takes/001 Loud chorus/take.json')).toMatchObject({
      number: 1,
      room: 'Garage',
      setup: 'Inside',
    });
    expect(parsed('takes/001 Loud chorus/report.json')).toMatchObject({ takeId: takes[0].id });
    for (const table of Object.keys(exportedTables))
      expect(parsed(`data/${table}.json`)).toBeInstanceOf(Array);
    expect(parsed('data/share.json')).toHaveLength(1);
    expect(parsed('data/room_change.json')).toMatchObject([{ what: 'Rug' }]);
    expect(parsed('account.json')).toMatchObject({ email: person.me.email });
    expect(files.get('try-outs.csv')?.toString().split('\r\n')).toHaveLength(4);
    expect(files.get('takes.csv')?.toString()).toContain(`'=cmd`);
    expect([...files.keys()].filter((path) => path.startsWith('photos/'))).toHaveLength(1);
    expect(files.has('damaged.txt')).toBe(false);
  });

  it('holds nothing of anybody else’s, no secret, and no take that was deleted', async () => {
    const { person, takes, share } = await full('Runa');
    await person.delete(paths.take(takes[1].id)).expect(204);
    const { files } = await downloaded(person, await made(person));
    const texts = [...files]
      .filter(([path]) => /\.(json|csv|txt)$/.test(path))
      .map(([, bytes]) => bytes.toString());
    const all = texts.join('\n');
    const secrets = await test
      .em()
      .execute<{ secret: string }[]>(
        `select password_hash as secret from "user" union select token_hash from share where token_hash is not null`,
      );
    for (const { secret } of [...secrets, { secret: share.url!.split('/').at(-1) ?? '' }])
      expect(all).not.toContain(secret);
    expect(all).toContain(person.me.email);
    expect(all).not.toContain('juno-');
    expect([...files.keys()].some((path) => path.includes('=cmd'))).toBe(false);
  });

  it('knows of every table there is', async () => {
    const rows = await test
      .em()
      .execute<{ table_name: string }[]>(
        `select table_name from information_schema.tables where table_schema = 'public' and table_type = 'BASE TABLE'`,
      );
    const known = [...Object.keys(exportedTables), ...Object.keys(leftOutTables), 'mikro_orm_migrations'];
    expect(known.sort()).toEqual(rows.map((row) => row.table_name).sort());
  });

  it('is one archive at a time; asked again, a new one takes its place', async () => {
    const juno = await joined(test);
    const [one, other] = await Promise.all([juno.post(paths.export), juno.post(paths.export)]);
    expect((one.body as ExportResponse).id).toBe((other.body as ExportResponse).id);
    const first = await made(juno).catch(() => null);
    const second = await made(juno);
    expect(second.id).not.toBe(first?.id);
    await juno.get(paths.exportFile(second.id)).expect(200);
    expect((await test.bucket.keys()).filter((key) => key.includes(juno.me.id))).toHaveLength(1);
  });

  it('is told what was stored as other bytes than were uploaded, and gets the rest', async () => {
    const juno = await joined(test);
    const take = await juno.makeTake({ title: 'Hurt' });
    const [key] = (await test.bucket.keys()).filter((each) => each.startsWith(`takes/${take.id}/`));
    await test.bucket.overwrite(key, Buffer.from('something else'));
    const { files } = await downloaded(juno, await made(juno));
    expect(files.get('damaged.txt')?.toString()).toContain('takes/001 Hurt/');
  });

  it('is its owner’s alone, for a week', async () => {
    const [juno, oda] = [await joined(test), await joined(test, 'Oda')];
    const finished = await made(juno);
    await oda.get(paths.exportFile(finished.id)).expect(404);
    await juno.get(paths.exportFile('nonsense')).expect(404);
    await juno.get(paths.exportFile(randomUUID())).expect(404);
    await new Browser(test).get(paths.exportFile(finished.id)).expect(401);
    const purge = new ExportPurge(test.em(), test.app.get(ObjectStoreService, { strict: false }));
    await purge.run(new Date(Date.now() + 6.9 * dayMs));
    await juno.get(paths.exportFile(finished.id)).expect(200);
    await purge.run(new Date(Date.now() + 7.1 * dayMs));
    await juno.get(paths.exportFile(finished.id)).expect(404);
    expect((await test.bucket.keys()).filter((key) => key.includes(juno.me.id))).toEqual([]);
    expect((await mine(juno)).export).toBeNull();
  });

  it('is made by another worker when one is killed', async () => {
    const juno = await joined(test);
    await juno.makeTake();
    const asked = (await juno.post(paths.export).expect(200)).body as ExportResponse;
    // As a worker leaves it that died in the middle.
    await until(async () => (await mine(juno)).export?.state === 'done');
    const left = { state: 'running', attempt: 1, objectKey: null, bytes: null, expiresAt: null } as const;
    await test
      .em()
      .nativeUpdate(Export, { id: asked.id }, { ...left, heartbeatAt: new Date(Date.now() - 60_000) });
    await until(async () => (await mine(juno)).export?.state === 'done');
    expect(await test.em().findOneOrFail(Export, { id: asked.id })).toMatchObject({ attempt: 2 });
  });

  it('goes with the account: no row and no object is left, and nobody else loses anything', async () => {
    const { person, takes, share, room } = await full('Mika');
    const oda = await full('Oda');
    await made(person);
    await made(oda.person);
    const em = test.em();
    const take = em.getReference(Take, oda.takes[0].id);
    const author = em.getReference(User, person.me.id);
    const note = em.create(Note, { take, author, pinKind: 'take', body: 'Left behind.' });
    await em.flush();
    const ids = [person.me.id, share.id, room.id, ...takes.map(({ id }: TakeResponse) => id)];
    const objectsOf = async () =>
      (await test.bucket.keys()).filter((key) => ids.some((id) => key.includes(id))).length;
    const othersBefore = await rowsNaming([oda.person.me.id]);
    const photosBefore = (await test.bucket.keys()).filter((key) => key.startsWith('photos/')).length;
    expect(await objectsOf()).toBe(5);
    await person.post(paths.deletion, { password: rightPassword }).expect(201);
    const purge = new AccountPurge(test.em(), test.app.get(ObjectStoreService, { strict: false }));
    await purge.run(new Date(Date.now() + 6.9 * dayMs));
    expect(await objectsOf()).toBe(5);
    await purge.run(new Date(Date.now() + 7.1 * dayMs));
    expect(await rowsNaming(ids)).toEqual({});
    expect(await objectsOf()).toBe(0);
    expect((await test.bucket.keys()).filter((key) => key.startsWith('photos/')).length).toBe(
      photosBefore - 1,
    );
    expect(await rowsNaming([oda.person.me.id])).toEqual(othersBefore);
    await oda.person.get(paths.take(oda.takes[0].id)).expect(200);
    const left = await test.em().findOneOrFail(Note, note.id);
    expect(left).toMatchObject({ author: null, body: 'Left behind.' });
    await person.get(paths.me).expect(401);
  });
});
