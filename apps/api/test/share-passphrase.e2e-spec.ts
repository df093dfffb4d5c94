import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { paths, TakeResponse } from '@thudline/contracts';
import request from 'supertest';
import { Share } from '../src/shares/entities/share.entity';
import { Browser, joined, Person } from './support/person';
import { openedBy, sharedBy, tokenOf } from './support/shares';
import { startTestApp, TestApp } from './support/test-app';

describe('a link with a passphrase', () => {
  let test: TestApp;
  let webDist: string;
  let juno: Person;
  let take: TakeResponse;
  let guest: Browser;

  beforeAll(async () => {
    webDist = await mkdtemp(join(tmpdir(), 'thudline-web-'));
    await writeFile(join(webDist, 'index.html'), '<html><head><title>Thudline</title></head></html>');
    test = await startTestApp({
      WEB_DIST: webDist,
      PASSPHRASE_LIMIT_PER_ADDRESS: '3',
      PASSPHRASE_LIMIT_PER_LINK: '100',
    });
    juno = await joined(test);
    take = await juno.makeTake({ title: 'Secret title' });
  });
  beforeEach(() => {
    guest = new Browser(test);
  });
  afterAll(async () => {
    await test?.close();
    await rm(webDist, { recursive: true, force: true });
  });

  const passphrase = 'brushes at noon';
  const open = (token: string, given?: string) =>
    guest.post(paths.openShare, { token, ...(given === undefined ? {} : { passphrase: given }) });

  it('keeps the passphrase only as a hash, and tells its owner that there is one', async () => {
    const share = await sharedBy(juno, take, { passphrase });
    expect(share.hasPassphrase).toBe(true);
    expect(JSON.stringify(share)).not.toContain(passphrase);
    const stored = await test.em().findOneOrFail(Share, { id: share.id });
    expect(stored.passphraseHash).toMatch(/^\$argon2id\$/);
  });

  it('opens nothing and counts nothing before it is given', async () => {
    const share = await sharedBy(juno, take, { passphrase });
    const asked = await open(tokenOf(share)).expect(403);
    expect(asked.body).toEqual({ code: 'passphrase-needed', message: 'This link asks for a passphrase.' });
    const refused = await open(tokenOf(share), 'sticks at noon').expect(403);
    expect(refused.body).toMatchObject({ code: 'wrong-passphrase' });
    expect(refused.headers['set-cookie']).toBeUndefined();
    await guest.get(paths.take(take.id)).expect(401);
    expect(await test.em().findOneOrFail(Share, { id: share.id })).toMatchObject({ openCount: 0 });
    await open(tokenOf(share), ` ${passphrase} `).expect(200);
    await guest.get(paths.take(take.id)).expect(200);
    expect(await test.em().findOneOrFail(Share, { id: share.id })).toMatchObject({ openCount: 1 });
  });

  it('is not asked for again where it was given, and is elsewhere', async () => {
    const share = await sharedBy(juno, take, { passphrase });
    await open(tokenOf(share), passphrase).expect(200);
    await open(tokenOf(share)).expect(200);
    await new Browser(test).post(paths.openShare, { token: tokenOf(share) }).expect(403);
  });

  it('refuses more tries than are needed, the right one too, and says when to try again', async () => {
    const share = await sharedBy(juno, take, { passphrase });
    for (let i = 0; i < 3; i++) await open(tokenOf(share), `guess number ${i}`).expect(403);
    const tooMany = await open(tokenOf(share), passphrase).expect(429);
    expect(Number(tooMany.headers['retry-after'])).toBeGreaterThan(0);
    await openedBy(guest, await sharedBy(juno, take));
    const other = await sharedBy(juno, take, { passphrase });
    await open(tokenOf(other), passphrase).expect(200);
  });

  it('tells a messenger nothing of what it opens', async () => {
    const share = await sharedBy(juno, take, { passphrase });
    const page = await request(test.server)
      .get(`/s/${tokenOf(share)}`)
      .expect(200);
    expect(page.text).not.toContain('Secret title');
    expect(page.headers).toMatchObject({
      'x-robots-tag': 'noindex, nofollow',
      'referrer-policy': 'no-referrer',
    });
    const open = await request(test.server).get(`/s/${tokenOf(await sharedBy(juno, take))}`);
    expect(open.text).toContain('Secret title');
  });

  it('refuses a passphrase that is too short, with one sentence', async () => {
    const subject = { kind: 'take', takeId: take.id };
    const refused = await juno.post(paths.shares, { subject, passphrase: ' abc ' }).expect(400);
    expect(refused.body).toMatchObject({ message: 'A passphrase has at least 6 characters.' });
  });
});
