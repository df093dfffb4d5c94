import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import {
  listRoomChangesResponse,
  paths,
  roomResponse,
  RoomResponse,
  setupResponse,
  ShareSubject,
  TakeResponse,
  TryOutResponse,
  tryOutResponse,
} from '@thudline/contracts';
import request from 'supertest';
import { Share } from '../src/shares/entities/share.entity';
import { User } from '../src/users/entities/user.entity';
import { Browser, joined, Person } from './support/person';
import { giveReport, shortTakeFacts } from './support/reported-take';
import { linkTo, openedBy } from './support/shares';
import { startTestApp, TestApp } from './support/test-app';

/** Two takes to compare, two of a try-out, two of a room's change, one of that room beside it, and one for nobody. */
const names = ['before', 'after', 'low', 'high', 'bare', 'panels', 'beside', 'hidden'] as const;
type Name = (typeof names)[number];

describe('a link', () => {
  let test: TestApp;
  let webDist: string;
  let juno: Person;
  let takes: Record<Name, TakeResponse>;
  let tryOut: TryOutResponse;
  let room: RoomResponse;
  let routes: Map<string, string>;
  let subjects: Record<ShareSubject['kind'], ShareSubject>;

  beforeAll(async () => {
    webDist = await mkdtemp(join(tmpdir(), 'thudline-web-'));
    await writeFile(join(webDist, 'index.html'), '<html><head><title>Thudline</title></head></html>');
    test = await startTestApp({ WEB_DIST: webDist });
    juno = await joined(test);
    const setup = await juno.post(paths.setups, { name: 'Secret setup' }).expect(201);
    const { id: setupId } = setupResponse.parse(setup.body);
    room = roomResponse.parse((await juno.post(paths.rooms, { name: 'The garage' }).expect(201)).body);
    const facts = await shortTakeFacts();
    const made = await Promise.all(
      names.map(async (title, index) => {
        const inRoom = ['bare', 'panels', 'beside'].includes(title) ? { roomId: room.id } : {};
        const recordedAt = `2026-10-0${index + 1}T19:40:00Z`;
        const take = await juno.makeTake({ title, note: `note of ${title}`, recordedAt, setupId, ...inRoom });
        await giveReport(test, take, facts);
        return [title, take] as const;
      }),
    );
    takes = Object.fromEntries(made) as Record<Name, TakeResponse>;
    const places = [takes.low, takes.high].map(({ id: takeId }, i) => ({ takeId, position: 90 + 10 * i }));
    const about = { subject: 'overhead-height', unit: 'cm', places };
    tryOut = tryOutResponse.parse((await juno.post(paths.tryOuts, about).expect(201)).body);
    const change = { happenedOn: '2026-10-06', what: 'Panels' };
    const sides = { beforeTakeIds: [takes.bare.id], afterTakeIds: [takes.panels.id] };
    await juno.post(paths.roomChanges(room.id), { ...change, ...sides }).expect(201);
    routes = routesOf(setupId);
    subjects = {
      take: { kind: 'take', takeId: takes.before.id },
      comparison: { kind: 'comparison', takeId: takes.before.id, otherTakeId: takes.after.id },
      'try-out': { kind: 'try-out', tryOutId: tryOut.id },
      room: { kind: 'room', roomId: room.id },
    };
  });
  afterAll(async () => {
    await test?.close();
    await rm(webDist, { recursive: true, force: true });
  });

  /** Everything that can be read of this player, by a name. */
  function routesOf(setupId: string): Map<string, string> {
    const all: [string, string][] = names.flatMap((name) => {
      const { id, files } = takes[name];
      return [
        [`sheet of ${name}`, paths.take(id)],
        [`report of ${name}`, paths.report(id)],
        [`notes of ${name}`, paths.notes(id)],
        [`added files of ${name}`, paths.addedFiles(id)],
        [`excerpt of ${name}`, `${paths.excerpt(id)}?startS=0&durationS=0.1`],
        [`sound of ${name}`, paths.listen(id)],
        [`file of ${name}`, paths.takeFile(id, files[0].id)],
      ];
    });
    const [before, after, hidden] = [takes.before.id, takes.after.id, takes.hidden.id];
    all.push(
      ['comparison', paths.comparison(before, after)],
      ['comparison backwards', paths.comparison(after, before)],
      ['comparison with another', paths.comparison(before, hidden)],
      ['comparison of the try-out', paths.comparison(takes.low.id, takes.high.id)],
      ['comparison of the change', paths.comparison(takes.bare.id, takes.panels.id)],
      ['try-out', paths.tryOut(tryOut.id)],
      ['ranking', paths.tryOutRanking(tryOut.id)],
      ['room', paths.room(room.id)],
      ['log', paths.roomChanges(room.id)],
      ['trend', paths.roomTrend(room.id)],
      ['setup', paths.setup(setupId)],
      ...[paths.takes, paths.tryOuts, paths.rooms, paths.setups, paths.shares, paths.me].map(
        (path): [string, string] => [path, path],
      ),
    );
    return new Map(all);
  }

  const sheetOf = (name: Name) => [`sheet of ${name}`, `report of ${name}`, `notes of ${name}`];
  const soundOf = (name: Name) => [`excerpt of ${name}`, `sound of ${name}`];

  /** What answers with anything but a refusal. */
  async function openTo(browser: Browser): Promise<string[]> {
    const open: string[] = [];
    for (const [name, path] of routes) {
      const response = await browser.get(path);
      const { code } = response.body as { code?: string };
      const isRefused = [401, 403].includes(response.status) || code === 'not-found';
      if (!isRefused) open.push(name);
    }
    return open;
  }

  const pages = {
    take: { reads: sheetOf('before'), hears: soundOf('before'), title: 'before' },
    comparison: {
      reads: ['comparison', 'report of before', 'report of after'],
      hears: [...soundOf('before'), ...soundOf('after')],
      title: 'before and after',
    },
    'try-out': {
      reads: ['try-out', 'ranking'],
      hears: [...soundOf('low'), ...soundOf('high')],
      title: 'Try-out: how high the overhead hangs',
    },
    room: {
      reads: ['room', 'log', 'trend'],
      hears: [...soundOf('bare'), ...soundOf('panels')],
      title: 'The garage',
    },
  };

  describe.each(Object.entries(pages))('to one %s', (kind, { reads, hears, title }) => {
    const subject = () => subjects[kind as ShareSubject['kind']];

    it('opens what it names to a guest, and nothing beyond it', async () => {
      const guest = new Browser(test);
      expect(await openedBy(guest, await linkTo(juno, subject()))).toMatchObject({ subject: subject() });
      expect((await openTo(guest)).sort()).toEqual([...reads, ...hears].sort());
    });

    it('gives no sound where it doesn’t allow listening', async () => {
      const guest = new Browser(test);
      await openedBy(guest, await linkTo(juno, subject(), { canListen: false }));
      expect((await openTo(guest)).sort()).toEqual([...reads].sort());
    });

    it('opens nothing any more once it is ended', async () => {
      const guest = new Browser(test);
      const share = await linkTo(juno, subject());
      await openedBy(guest, share);
      await juno.delete(paths.share(share.id)).expect(204);
      expect(await openTo(guest)).toEqual([]);
    });

    it('can be made by nobody but the player', async () => {
      const oda = await joined(test, 'Oda');
      await oda.post(paths.shares, { subject: subject() }).expect(404);
      await oda.get(paths.sharesOf(subject())).expect(404);
      await new Browser(test).post(paths.shares, { subject: subject() }).expect(401);
      await new Browser(test).get(paths.sharesOf(subject())).expect(401);
    });

    it('may be open to one person without a link, once they are signed in', async () => {
      const oda = await joined(test, 'Oda');
      const [owner, grantee] = [juno, oda].map(({ me }) => test.em().getReference(User, me.id));
      const { id } = await linkTo(juno, subject());
      const em = test.em();
      await em.nativeUpdate(Share, { id }, { owner, grantee, tokenHash: null });
      const theirs = new Set([...reads, ...hears]);
      const own: string[] = [paths.takes, paths.tryOuts, paths.rooms, paths.setups, paths.shares, paths.me];
      expect((await openTo(oda)).filter((name) => !own.includes(name)).sort()).toEqual([...theirs].sort());
      expect((await oda.get(paths.takes)).body).toMatchObject({ total: 0 });
      const lio = await joined(test, 'Lio');
      expect((await openTo(lio)).filter((name) => !own.includes(name))).toEqual([]);
      await em.nativeUpdate(Share, { id }, { revokedAt: new Date() });
      expect((await openTo(oda)).filter((name) => !own.includes(name))).toEqual([]);
    });

    it('has a head with title and verdict, for no search engine', async () => {
      const { url } = await linkTo(juno, subject(), { question: 'Secret question?' });
      const page = await request(test.server).get(new URL(url!).pathname).expect(200);
      expect(page.text).toContain(`<meta property="og:title" content="${title}">`);
      for (const secret of ['Secret', 'note of', 'Juno', 'hidden'])
        expect([secret, page.text.includes(secret)]).toEqual([secret, false]);
      expect(page.headers).toMatchObject({
        'referrer-policy': 'no-referrer',
        'x-robots-tag': 'noindex, nofollow',
      });
    });

    it('tells of neither setups, files, addresses nor other takes, wherever it leads', async () => {
      const guest = new Browser(test);
      await openedBy(guest, await linkTo(juno, subject(), { label: 'Secret label' }));
      for (const name of reads) {
        const { text } = await guest.get(routes.get(name)!);
        for (const secret of ['Secret', 'example.org', juno.me.id, 'hidden', 'beside'])
          expect([name, secret, text.includes(secret)]).toEqual([name, secret, false]);
      }
    });
  });

  it('to a try-out tells nothing of uploads, made or to come', async () => {
    const guest = new Browser(test);
    await openedBy(guest, await linkTo(juno, subjects['try-out']));
    const seen = tryOutResponse.parse((await guest.get(paths.tryOut(tryOut.id))).body);
    expect(seen.places.map(({ fileNames }) => fileNames)).toEqual([[], []]);
    const keys = tryOut.places.map(({ uploadKey }) => uploadKey);
    expect(seen.places.filter(({ uploadKey }) => keys.includes(uploadKey))).toEqual([]);
  });

  it('to a room doesn’t list the takes that a change could be given', async () => {
    const guest = new Browser(test);
    await openedBy(guest, await linkTo(juno, subjects.room));
    const log = listRoomChangesResponse.parse((await guest.get(paths.roomChanges(room.id))).body);
    expect(log.items).toHaveLength(1);
    expect(log.takes).toEqual([]);
  });

  it('to more than a sheet lets nobody download or write', async () => {
    for (const kind of ['comparison', 'try-out', 'room'] as const)
      for (const right of ['canDownload', 'canNote']) {
        const request = { subject: subjects[kind], [right]: true };
        const refused = await juno.post(paths.shares, request).expect(400);
        expect(refused.text).toContain('Only a link to one take');
      }
  });

  it('goes with the try-out it names, and with each take that is taken out; both come back', async () => {
    const about = {
      subject: 'overhead-height',
      unit: 'cm',
      places: [{ takeId: takes.low.id }, { takeId: takes.high.id }],
    };
    const { id, places } = tryOutResponse.parse((await juno.post(paths.tryOuts, about)).body);
    const guest = new Browser(test);
    await openedBy(guest, await linkTo(juno, { kind: 'try-out', tryOutId: id }));
    const statuses = async () =>
      Promise.all(
        [paths.tryOut(id), paths.listen(takes.low.id), paths.listen(takes.high.id)].map(
          async (path) => (await guest.get(path)).status,
        ),
      );
    expect(await statuses()).toEqual([200, 200, 200]);
    await juno.delete(paths.tryOutPlace(id, places[0].id)).expect(200);
    expect(await statuses()).toEqual([200, 404, 200]);
    await juno.post(paths.restoreTryOutPlace(id, places[0].id)).expect(200);
    await juno.delete(paths.tryOut(id)).expect(204);
    expect(await statuses()).toEqual([404, 404, 404]);
    await juno.post(paths.shares, { subject: { kind: 'try-out', tryOutId: id } }).expect(404);
    await juno.post(paths.restoreTryOut(id)).expect(200);
    expect(await statuses()).toEqual([200, 200, 200]);
  });

  it('to a try-out doesn’t name the setup its winner was made to', async () => {
    const body = { winnerPlaceId: tryOut.places[0].id, reason: '' };
    const kept = await juno.post(paths.tryOutSetup(tryOut.id), body).expect(201);
    expect(tryOutResponse.parse(kept.body).winnerSetup).not.toBeNull();
    const guest = new Browser(test);
    await openedBy(guest, await linkTo(juno, subjects['try-out']));
    expect((await guest.get(paths.tryOut(tryOut.id)).expect(200)).body).toMatchObject({ winnerSetup: null });
    await juno.delete(paths.tryOutSetup(tryOut.id)).expect(200);
  });
});
