import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import {
  listSharesResponse,
  paths,
  ReportResponse,
  reportResponse,
  TakeResponse,
  takeResponse,
} from '@thudline/contracts';
import request from 'supertest';
import { AuditEvent } from '../src/audit/entities/audit-event.entity';
import { Share } from '../src/shares/entities/share.entity';
import { User } from '../src/users/entities/user.entity';
import { Browser, joined, Person } from './support/person';
import { giveReport, shortTakeFacts } from './support/reported-take';
import { openedBy, sharedBy, tokenOf } from './support/shares';
import { startTestApp, TestApp } from './support/test-app';

describe('shares', () => {
  let test: TestApp;
  let webDist: string;
  let juno: Person;
  let take: TakeResponse;
  let guest: Browser;

  beforeAll(async () => {
    webDist = await mkdtemp(join(tmpdir(), 'thudline-web-'));
    const page = '<!doctype html><html><head><title>Thudline</title></head><body></body></html>';
    await writeFile(join(webDist, 'index.html'), page);
    test = await startTestApp({ WEB_DIST: webDist });
    juno = await joined(test);
    const before = await juno.makeTake({ title: 'Before' });
    const fields = { title: 'Loud & <clear>', note: 'My note.', tags: ['felt'], followsTakeId: before.id };
    take = await juno.makeTake(fields);
    await juno.patch(paths.take(take.id), { tickedActions: ['flip-overhead'] });
    await giveReport(test, take, await shortTakeFacts());
  });
  beforeEach(() => {
    guest = new Browser(test);
  });
  afterAll(async () => {
    await test?.close();
    await rm(webDist, { recursive: true, force: true });
  });

  const stored = (id: string) => test.em().findOneOrFail(Share, { id });
  const pagePath = ({ url }: { url: string | null }) => new URL(url ?? '').pathname;
  const ended = { code: 'link-ended', message: expect.any(String) as string };

  it('gives an address with a token that is kept only as a hash', async () => {
    const share = await sharedBy(juno, take, { question: ' What would you change first? ' });
    expect(share).toMatchObject({
      subject: { kind: 'take', takeId: take.id },
      about: 'Loud & <clear>',
      label: '',
      question: 'What would you change first?',
      canListen: true,
      canDownload: false,
      canNote: false,
      hasPassphrase: false,
      mailedTo: null,
      revokedAt: null,
      openCount: 0,
    });
    expect(share.url).toMatch(/^http:\/\/thudline\.test\/s\/[\w-]{43}$/);
    const dayMs = 24 * 60 * 60 * 1000;
    expect(Date.parse(share.expiresAt!) - Date.parse(share.createdAt)).toBeCloseTo(7 * dayMs, -4);
    expect(JSON.stringify(await stored(share.id))).not.toContain(tokenOf(share));
    expect(await test.em().count(AuditEvent, { kind: 'share-made', subjectId: share.id })).toBe(1);
  });

  it('opens the sheet to somebody signed out, and hides what leads elsewhere', async () => {
    const share = await sharedBy(juno, take, { question: 'Flip it?', expiresInDays: null });
    expect(await openedBy(guest, share)).toEqual({
      subject: { kind: 'take', takeId: take.id },
      from: 'Juno',
      question: 'Flip it?',
      expiresAt: null,
      canListen: true,
      canDownload: false,
      canNote: false,
    });
    const seen = takeResponse.parse((await guest.get(paths.take(take.id)).expect(200)).body);
    expect(seen).toMatchObject({
      title: 'Loud & <clear>',
      note: 'My note.',
      player: 'Juno',
      rights: { change: false, listen: true, download: false },
      tickedActions: [],
      tags: [],
      follows: null,
      followedBy: null,
    });
    const report = reportResponse.parse((await guest.get(paths.report(take.id)).expect(200)).body);
    expect(report).toEqual((await juno.get(paths.report(take.id))).body as ReportResponse);
    await guest.get(`${paths.excerpt(take.id)}?startS=0&durationS=0.1`).expect(200);
    await guest.get(paths.listen(take.id)).set('Range', 'bytes=0-99').expect(206);
  });

  it('sets a cookie that scripts cannot read, for the API only, and no address carries the token', async () => {
    const share = await sharedBy(juno, take);
    const response = await guest.post(paths.openShare, { token: tokenOf(share) }).expect(200);
    const [line] = response.headers['set-cookie'] as unknown as string[];
    expect(line).toMatch(/^thudline_links=.*Path=\/api;.*HttpOnly.*SameSite=Lax/);
    expect(line).not.toContain(tokenOf(share));
    const forged = line.split(';')[0].replace(/=.{8}/, '=01890000');
    await request(test.server).get(paths.take(take.id)).set('Cookie', forged).expect(401);
  });

  it('refuses listening and downloads where the link allows neither', async () => {
    await openedBy(guest, await sharedBy(juno, take, { canListen: false }));
    await guest.get(paths.take(take.id)).expect(200);
    await guest.get(`${paths.excerpt(take.id)}?startS=0&durationS=0.1`).expect(403);
    await guest.get(paths.listen(take.id)).expect(403);
    await guest.get(paths.takeFile(take.id, take.files[0].id)).expect(403);
    await guest.patch(paths.take(take.id), { title: 'Mine' }).expect(403);
    await openedBy(guest, await sharedBy(juno, take, { canDownload: true }));
    await guest.get(paths.takeFile(take.id, take.files[0].id)).expect(200);
  });

  it('lets several be open in one browser', async () => {
    const other = await juno.makeTake();
    await openedBy(guest, await sharedBy(juno, take));
    await openedBy(guest, await sharedBy(juno, other));
    await guest.get(paths.take(take.id)).expect(200);
    await guest.get(paths.take(other.id)).expect(200);
  });

  it('opens another player’s sheet to somebody signed in, and lists it nowhere', async () => {
    const oda = await joined(test, 'Oda');
    await openedBy(oda, await sharedBy(juno, take));
    await oda.get(paths.take(take.id)).expect(200);
    expect((await oda.get(paths.takes)).body).toMatchObject({ total: 0 });
    await oda.get(paths.sharesOf({ kind: 'take', takeId: take.id })).expect(404);
  });

  it('ends at once when its owner ends it, also for whoever has it open', async () => {
    const share = await sharedBy(juno, take);
    await openedBy(guest, share);
    await (await joined(test, 'Oda')).delete(paths.share(share.id)).expect(404);
    await guest.delete(paths.share(share.id)).expect(401);
    await guest.get(paths.take(take.id)).expect(200);
    await juno.delete(paths.share(share.id)).expect(204);
    await juno.delete(paths.share(share.id)).expect(204);
    await guest.get(paths.take(take.id)).expect(404);
    await guest.get(paths.listen(take.id)).expect(404);
    const again = await guest.post(paths.openShare, { token: tokenOf(share) }).expect(410);
    expect(again.body).toEqual(ended);
  });

  it('is opened again when its owner takes the ending back, by the same address', async () => {
    const share = await sharedBy(juno, take);
    await openedBy(guest, share);
    await juno.delete(paths.share(share.id)).expect(204);
    await (await joined(test, 'Oda')).post(paths.restoreShare(share.id)).expect(404);
    await guest.post(paths.restoreShare(share.id)).expect(401);
    const restored = await juno.post(paths.restoreShare(share.id)).expect(200);
    expect(restored.body).toMatchObject({ id: share.id, revokedAt: null });
    await juno.post(paths.restoreShare(share.id)).expect(200);
    await guest.get(paths.take(take.id)).expect(200);
    await openedBy(guest, share);
    expect(await test.em().count(AuditEvent, { kind: 'share-reopened', subjectId: share.id })).toBe(1);
  });

  it('is listed with all others of its owner’s, and nobody else’s', async () => {
    const lio = await joined(test, 'Lio');
    const other = await lio.makeTake();
    const first = await sharedBy(lio, other, { label: 'Oda' });
    const second = await sharedBy(lio, await lio.makeTake());
    const { items } = listSharesResponse.parse((await lio.get(paths.shares).expect(200)).body);
    expect(items.map(({ id, label }) => [id, label])).toEqual([
      [second.id, ''],
      [first.id, 'Oda'],
    ]);
    await lio.get(`${paths.shares}?kind=take`).expect(400);
    await guest.get(paths.shares).expect(401);
  });

  it('ends at the moment that was chosen', async () => {
    const expiresAt = new Date(Date.now() + 3_600_000).toISOString();
    expect(await sharedBy(juno, take, { expiresAt })).toMatchObject({ expiresAt });
    const subject = { kind: 'take', takeId: take.id };
    const over = await juno.post(paths.shares, { subject, expiresAt: '2020-01-01T00:00:00Z' }).expect(400);
    expect(over.body).toMatchObject({ message: 'Choose a day that is still to come.' });
  });

  it('ends by itself when its time is over', async () => {
    const share = await sharedBy(juno, take, { expiresInDays: 1 });
    await openedBy(guest, share);
    await test.em().nativeUpdate(Share, { id: share.id }, { expiresAt: new Date(Date.now() - 1) });
    await guest.get(paths.take(take.id)).expect(404);
    await guest.post(paths.openShare, { token: tokenOf(share) }).expect(410);
  });

  it('opens nothing while its owner’s account is locked', async () => {
    const lio = await joined(test, 'Lio');
    const locked = await lio.makeTake();
    const share = await sharedBy(lio, locked);
    await openedBy(guest, share);
    await test.em().nativeUpdate(User, { id: lio.me.id }, { lockedAt: new Date() });
    await guest.get(paths.take(locked.id)).expect(404);
    await guest.post(paths.openShare, { token: tokenOf(share) }).expect(410);
  });

  it('ends with its take', async () => {
    const gone = await juno.makeTake();
    const share = await sharedBy(juno, gone);
    await openedBy(guest, share);
    await juno.delete(paths.take(gone.id)).expect(204);
    await guest.get(paths.take(gone.id)).expect(404);
    await guest.post(paths.openShare, { token: tokenOf(share) }).expect(410);
  });

  it('answers a link that never was like one that has ended', async () => {
    const response = await guest.post(paths.openShare, { token: 'x'.repeat(43) }).expect(410);
    expect(response.body).toEqual(ended);
    await guest.post(paths.openShare, { token: 'short' }).expect(400);
  });

  it('tells its owner every link of a take, and how often each was opened, but no address', async () => {
    const shared = await juno.makeTake();
    const first = await sharedBy(juno, shared);
    const second = await sharedBy(juno, shared, { question: 'And now?' });
    await openedBy(guest, first);
    await openedBy(guest, first);
    const response = await juno.get(paths.sharesOf({ kind: 'take', takeId: shared.id })).expect(200);
    const { items } = listSharesResponse.parse(response.body);
    expect(items).toMatchObject([
      { id: second.id, question: 'And now?', openCount: 0, openedAt: null },
      { id: first.id, openCount: 2, openedAt: expect.any(String) as string },
    ]);
    expect(response.text).not.toContain(tokenOf(first));
  });

  describe('the page behind a link', () => {
    it('tells title and verdict in its head, no other site its address, and no search engine anything', async () => {
      const share = await sharedBy(juno, take, { question: 'Secret question?' });
      const { text, headers } = await request(test.server).get(pagePath(share)).expect(200);
      expect(text).toContain('<meta property="og:title" content="Loud &amp; &lt;clear&gt;">');
      expect(text).toMatch(/<meta property="og:description" content="[^"]+">/);
      expect(text).not.toContain('Secret question');
      expect(text).not.toContain('My note');
      expect(headers).toMatchObject({
        'referrer-policy': 'no-referrer',
        'x-robots-tag': 'noindex, nofollow',
        'cache-control': 'no-cache',
      });
      expect((await stored(share.id)).openCount).toBe(0);
    });

    it('tells nothing of a link that has ended', async () => {
      const share = await sharedBy(juno, take);
      await juno.delete(paths.share(share.id)).expect(204);
      const { text, headers } = await request(test.server).get(pagePath(share)).expect(200);
      expect(text).toContain('<title>Thudline</title>');
      expect(text).not.toContain('og:title');
      expect(headers).toMatchObject({
        'referrer-policy': 'no-referrer',
        'x-robots-tag': 'noindex, nofollow',
      });
    });
  });
});

it('reading as a guest is refused after too many requests from one address, and players read on', async () => {
  const test = await startTestApp({ GUEST_READ_LIMIT_PER_ADDRESS: '3' });
  try {
    const juno = await joined(test);
    const take = await juno.makeTake();
    const guest = new Browser(test);
    await openedBy(guest, await sharedBy(juno, take));
    for (let i = 0; i < 3; i++) await guest.get(paths.take(take.id)).expect(200);
    await guest.get(paths.take(take.id)).expect(429);
    await juno.get(paths.take(take.id)).expect(200);
  } finally {
    await test.close();
  }
});

it('opening links is refused after too many tries from one address', async () => {
  const test = await startTestApp({ OPEN_LINK_LIMIT_PER_ADDRESS: '3' });
  try {
    const guest = new Browser(test);
    for (let i = 0; i < 3; i++) await guest.post(paths.openShare, { token: 'x'.repeat(43) }).expect(410);
    await guest.post(paths.openShare, { token: 'x'.repeat(43) }).expect(429);
  } finally {
    await test.close();
  }
});
