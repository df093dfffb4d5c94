import { randomUUID } from 'node:crypto';
import {
  accountResponse,
  AccountResponse,
  installationSettings,
  listAccountsResponse,
  ListAccountsResponse,
  listAuditResponse,
  listFailedWorkResponse,
  paths,
} from '@thudline/contracts';
import { AddedFile } from '../src/added-files/entities/added-file.entity';
import { Export } from '../src/exports/entities/export.entity';
import { InvitationMailWriter } from '../src/mail/invitation-mail-writer';
import { Mailer } from '../src/mail/mailer';
import { Measurement } from '../src/measuring/entities/measurement.entity';
import { User } from '../src/users/entities/user.entity';
import { MailSink, startMailSink } from './support/mail-sink';
import { Browser, joined, Person, rightPassword } from './support/person';
import { shortTake } from './support/recordings';
import { startTestApp, TestApp } from './support/test-app';

describe('whoever runs the installation', () => {
  let test: TestApp;
  let sink: MailSink;
  let ada: Person;
  let juno: Person;

  beforeAll(async () => {
    sink = await startMailSink();
    test = await startTestApp({ SMTP_URL: sink.url });
    ada = await joined(test, 'Ada');
    juno = await joined(test, 'Juno');
    await test.em().nativeUpdate(User, { id: ada.me.id }, { roles: ['player', 'admin'] });
  });
  afterAll(async () => {
    await test?.close();
    await sink?.close();
  });

  const accounts = async (query = ''): Promise<ListAccountsResponse> =>
    listAccountsResponse.parse((await ada.get(`${paths.adminAccounts}${query}`).expect(200)).body);
  const change = async (person: Person, body: object): Promise<AccountResponse> =>
    accountResponse.parse((await ada.patch(paths.adminAccount(person.me.id), body).expect(200)).body);
  const audited = async (query = '') =>
    listAuditResponse.parse((await ada.get(`${paths.adminAudit}${query}`).expect(200)).body);

  it('is nobody else: not a player, not a teacher, not a guest', async () => {
    const oda = await joined(test, 'Oda');
    await test.em().nativeUpdate(User, { id: oda.me.id }, { roles: ['player', 'teacher'] });
    const reads = [paths.adminAccounts, paths.adminWork, paths.adminAudit, paths.adminSettings];
    for (const [browser, status] of [
      [juno, 403],
      [oda, 403],
      [new Browser(test), 401],
    ] as const) {
      for (const path of reads) await browser.get(path).expect(status);
      await browser.patch(paths.adminAccount(oda.me.id), { roles: ['admin'] }).expect(status);
      await browser.patch(paths.adminSettings, { signUp: 'invited' }).expect(status);
      await browser.post(paths.adminVerification(oda.me.id)).expect(status);
      await browser.post(paths.adminInvitations, { email: 'x@example.org' }).expect(status);
      await browser.post(paths.adminRetry('mail', randomUUID())).expect(status);
    }
  });

  describe('over accounts', () => {
    it('finds them by a part of name or address, whatever its case, and nothing by a pattern’s signs', async () => {
      const found = await accounts(`?find=${encodeURIComponent(juno.me.email.slice(0, 12).toUpperCase())}`);
      expect(found.items).toMatchObject([
        { id: juno.me.id, takes: 0, bytes: 0, locked: false, roles: ['player'] },
      ]);
      expect(found.total).toBe(1);
      expect((await accounts('?find=%25')).items).toEqual([]);
      expect((await accounts('?find=_')).total).toBe(0);
      await ada.get(`${paths.adminAccounts}?after=nonsense`).expect(400);
    });

    it('lists the newest first, page by page', async () => {
      const all = await accounts();
      expect(
        all.items
          .map(({ id }) => id)
          .sort()
          .reverse(),
      ).toEqual(all.items.map(({ id }) => id));
      const rest = await accounts(`?after=${all.items[0].id}`);
      expect(rest.items).toEqual(all.items.slice(1));
      expect([all.next, rest.next]).toEqual([null, null]);
    });

    it('tells what each keeps', async () => {
      const mika = await joined(test, 'Mika');
      await mika.makeTake();
      const bytes = shortTake().files.reduce((sum, file) => sum + file.bytes.length, 0);
      const { items } = await accounts('?find=mika-');
      expect(items).toMatchObject([{ takes: 1, bytes }]);
      expect((await accounts()).bytes).toBeGreaterThanOrEqual(bytes);
    });

    it('locks one, at once, and opens it again', async () => {
      const mika = await joined(test, 'Mika');
      expect(await change(mika, { locked: true })).toMatchObject({ locked: true });
      await mika.get(paths.me).expect(401);
      const signIn = { email: mika.me.email, password: rightPassword };
      await new Browser(test).post(paths.signIn, signIn).expect(401);
      expect(await change(mika, { locked: false })).toMatchObject({ locked: false });
      await mika.get(paths.me).expect(200);
      const { items } = await audited(`?account=${mika.me.id}`);
      expect(items.filter(({ subject }) => subject)).toMatchObject([
        { kind: 'account-unlocked', account: { name: 'Ada' }, subject: { name: 'Mika' } },
        { kind: 'account-locked', account: { name: 'Ada' }, subject: { name: 'Mika' } },
      ]);
    });

    it('gives and takes roles; everybody stays a player', async () => {
      const oda = await joined(test, 'Oda');
      expect(await change(oda, { roles: ['teacher', 'admin'] })).toMatchObject({
        roles: ['player', 'teacher', 'admin'],
      });
      await oda.get(paths.adminSettings).expect(200);
      expect(await change(oda, { roles: [] })).toMatchObject({ roles: ['player'] });
      await oda.get(paths.adminSettings).expect(403);
    });

    it('can’t shut out whoever does it, and refuses what makes no sense', async () => {
      for (const body of [{ locked: true }, { roles: ['teacher'] }]) {
        const refused = await ada.patch(paths.adminAccount(ada.me.id), body).expect(409);
        expect(refused.body).toMatchObject({ code: 'conflict' });
      }
      for (const body of [{ roles: ['king'] }, { quotaBytes: -1 }, { name: 'x' }])
        await ada.patch(paths.adminAccount(juno.me.id), body).expect(400);
      await ada.patch(paths.adminAccount(randomUUID()), { locked: true }).expect(404);
      await ada.patch(paths.adminAccount('nonsense'), { locked: true }).expect(404);
      await ada.post(paths.adminVerification('nonsense')).expect(404);
    });

    it('has the mail sent again that verifies an address', async () => {
      const queued = async () =>
        (
          await test
            .em()
            .execute(`select 1 from pgboss.job where name = 'mail' and data->>'userId' = ?`, [juno.me.id])
        ).length;
      const before = await queued();
      await ada.post(paths.adminVerification(juno.me.id)).expect(204);
      expect(await queued()).toBe(before + 1);
    });
  });

  describe('over room', () => {
    it('sets how much one account keeps: what has no room is refused with a sentence, and nothing stays', async () => {
      const mika = await joined(test, 'Mika');
      const { files } = shortTake();
      const bytes = files.reduce((sum, file) => sum + file.bytes.length, 0);
      await mika.makeTake();
      // Less than the least limit that can be set, so that the test's takes are small.
      await test.em().nativeUpdate(User, { id: mika.me.id }, { quotaBytes: bytes * 2 - 1 });
      const keysBefore = await test.bucket.keys();
      const refused = await mika.upload(shortTake()).expect(413);
      expect(refused.body).toMatchObject({ code: 'too-large' });
      expect((refused.body as { message: string }).message).toMatch(/has no room\. Delete takes/);
      expect(await test.bucket.keys()).toEqual(keysBefore);
      expect(await change(mika, { quotaBytes: null })).toMatchObject({ quotaBytes: null });
      await mika.makeTake();
    });

    it('sets it for all, too, at once', async () => {
      await ada.patch(paths.adminSettings, { accountBytes: 1_000_000 }).expect(200);
      const mika = await joined(test, 'Mika');
      const large = { ...shortTake(), note: 'x' };
      large.files = large.files.map((file) => ({
        ...file,
        bytes: Buffer.concat([file.bytes, Buffer.alloc(600_000)]),
      }));
      await mika.upload(large).expect(413);
      const usual = { accountBytes: 20_000_000_000 };
      await ada.patch(paths.adminSettings, usual).expect(200);
      expect(installationSettings.parse((await ada.get(paths.adminSettings)).body)).toMatchObject(usual);
      for (const body of [{ accountBytes: 10 }, { signUp: 'closed' }, { other: 1 }])
        await ada.patch(paths.adminSettings, body).expect(400);
    });
  });

  it('lets people join by invitation only, where they want it so', async () => {
    await ada.patch(paths.adminSettings, { signUp: 'invited' }).expect(200);
    expect((await new Browser(test).get(paths.signUp).expect(200)).body).toEqual({ signUp: 'invited' });
    const email = `runa-${randomUUID()}@example.org`;
    const join = { name: 'Runa', email, password: rightPassword };
    const refused = await new Browser(test).post(paths.join, join).expect(403);
    expect((refused.body as { message: string }).message).toContain('by invitation');
    await ada.post(paths.adminInvitations, { email }).expect(204);
    const mailer = new Mailer(test.config);
    const writer = new InvitationMailWriter(test.em(), mailer, test.config);
    await writer.write({ kind: 'join-invitation', email, fromUserId: ada.me.id });
    mailer.onApplicationShutdown();
    const mail = await sink.next(email);
    expect(mail.subject).toBe('Ada invites you to Thudline');
    const [, invitation] = /\/join\?invitation=([\w.-]+)/.exec(mail.text ?? '') ?? [];
    await new Browser(test).post(paths.join, { ...join, email: 'other@example.org', invitation }).expect(403);
    await new Browser(test).post(paths.join, { ...join, invitation: `${invitation}x` }).expect(403);
    await new Browser(test).post(paths.join, { ...join, invitation }).expect(201);
    await ada.post(paths.adminInvitations, { email }).expect(409);
    await ada.patch(paths.adminSettings, { signUp: 'open' }).expect(200);
    await joined(test, 'Anybody');
  });

  describe('over work that failed', () => {
    const work = async () =>
      listFailedWorkResponse.parse((await ada.get(paths.adminWork).expect(200)).body).items;
    const retry = (kind: string, id: string) => ada.post(paths.adminRetry(kind, id));

    it('sees it with its reason, and has it done again', async () => {
      const mika = await joined(test, 'Mika');
      const take = await mika.makeTake();
      const em = test.em();
      const measurement = await em.findOneOrFail(Measurement, { take: take.id });
      Object.assign(measurement, { state: 'failed', reason: 'It broke.' });
      const choice = { flipped: true, shiftMs: 0, gainDb: 0 };
      const added = em.create(AddedFile, {
        take: take.id,
        ...choice,
        state: 'failed',
        progress: 0,
        heartbeatAt: new Date(),
        reason: 'It broke as well.',
      });
      const archive = em.create(Export, {
        owner: mika.me.id,
        state: 'failed',
        progress: 0,
        heartbeatAt: new Date(),
        reason: 'So did this.',
      });
      await em.flush();
      await em.execute(
        `update pgboss.job set state = 'retry', retry_count = 1, start_after = now() + interval '1 hour',
           output = '{"message": "Busy"}' where name = 'mail' and data->>'userId' = ?`,
        [mika.me.id],
      );
      const failed = (await work()).filter(({ account }) => account?.id === mika.me.id);
      const told = failed.map(({ kind, what, reason }) => [kind, what, reason]).sort();
      expect(told).toEqual([
        ['added-file', 'take 1', 'It broke as well.'],
        ['export', 'everything', 'So did this.'],
        ['mail', 'verify', 'Busy'],
        ['measurement', 'take 1', 'It broke.'],
      ]);
      const mail = failed.find(({ kind }) => kind === 'mail');
      expect(Date.parse(mail?.againAt ?? '')).toBeGreaterThan(Date.now() + 60_000);
      for (const { kind, id } of failed) await retry(kind, id).expect(204);
      const left = (await work()).filter(({ account }) => account?.id === mika.me.id);
      expect(left.map(({ kind }) => kind)).toEqual(['mail']);
      expect(Date.parse(left[0].againAt ?? '')).toBeLessThanOrEqual(Date.now());
      expect(await test.em().findOneOrFail(AddedFile, added.id)).toMatchObject({ state: 'queued' });
      expect(await test.em().findOneOrFail(Export, archive.id)).toMatchObject({
        state: 'queued',
        attempt: 0,
      });
      const again = { 'added-file': 404, export: 404, measurement: 409, mail: 204 };
      for (const { kind, id } of failed) await retry(kind, id).expect(again[kind]);
    });

    it('refuses what isn’t there', async () => {
      for (const kind of ['measurement', 'added-file', 'export', 'mail', 'nonsense'])
        await retry(kind, randomUUID()).expect(404);
      await retry('mail', 'nonsense').expect(404);
    });
  });

  it('reads what happened, newest first, of one account where it is named', async () => {
    const mika = await joined(test, 'Mika');
    const all = await audited();
    expect(all.items[0]).toMatchObject({ kind: 'joined', account: { id: mika.me.id, name: 'Mika' } });
    expect((await audited(`?account=${mika.me.id}`)).items.map(({ kind }) => kind)).toEqual(['joined']);
    const next = await audited(`?after=${all.items[0].id}`);
    expect(next.items[0]?.id).toBe(all.items[1]?.id);
  });
});
