import { listSessionsResponse, meResponse, MeResponse, paths } from '@thudline/contracts';
import { AuditEvent } from '../src/audit/entities/audit-event.entity';
import { User } from '../src/users/entities/user.entity';
import { MailSink, startMailSink, tokenIn } from './support/mail-sink';
import { Browser, joined, Person, rightPassword } from './support/person';
import { startTestApp, TestApp } from './support/test-app';
import { startWorker, WorkerProcess } from './support/worker-process';

const firefox = 'Mozilla/5.0 (X11; Linux x86_64; rv:133.0) Gecko/20100101 Firefox/133.0';

describe('an account', () => {
  let test: TestApp;
  let sink: MailSink;
  let worker: WorkerProcess;

  beforeAll(async () => {
    sink = await startMailSink();
    test = await startTestApp();
    worker = startWorker(test, { SMTP_URL: sink.url });
  });
  afterAll(async () => {
    await worker?.stop('SIGTERM');
    await test?.close();
    await sink?.close();
  });

  const signedIn = async ({ me }: Person, userAgent = firefox) => {
    const browser = new Browser(test);
    const request = browser.post(paths.signIn, { email: me.email, password: rightPassword });
    await request.set('User-Agent', userAgent).expect(200);
    return browser;
  };
  const sessionsOf = async (browser: Browser) =>
    listSessionsResponse.parse((await browser.get(paths.sessions).expect(200)).body).items;
  /** Whose first mail was read already. */
  const settled = async (name = 'Juno') => {
    const person = await joined(test, name);
    await sink.next(person.me.email);
    return person;
  };

  describe('the devices it is signed in on', () => {
    it('are told: this one first, with what each says it is', async () => {
      const juno = await settled();
      const laptop = await signedIn(juno);
      const sessions = await sessionsOf(laptop);
      expect(sessions).toHaveLength(2);
      expect(sessions[0]).toMatchObject({ device: 'Firefox on Linux', current: true, readOnly: false });
      expect(sessions[1]).toMatchObject({ current: false });
    });

    it('are signed out one by one, at once', async () => {
      const juno = await settled();
      const laptop = await signedIn(juno);
      const other = (await sessionsOf(juno)).find(({ current }) => !current);
      await juno.delete(paths.session(other?.id ?? '')).expect(204);
      await laptop.get(paths.me).expect(401);
      await laptop.post(paths.refresh).expect(401);
      await juno.get(paths.me).expect(200);
      await juno.delete(paths.session(other?.id ?? '')).expect(404);
    });

    it('are signed out all but this one', async () => {
      const juno = await settled();
      const others = [await signedIn(juno), await signedIn(juno)];
      await juno.delete(paths.sessions).expect(204);
      for (const other of others) await other.get(paths.me).expect(401);
      expect(await sessionsOf(juno)).toHaveLength(1);
    });

    it('are nobody else’s to sign out', async () => {
      const [juno, oda] = [await settled(), await settled('Oda')];
      const [session] = await sessionsOf(juno);
      await oda.delete(paths.session(session?.id ?? '')).expect(404);
      await oda.delete(paths.session('nonsense')).expect(404);
      await juno.get(paths.me).expect(200);
    });
  });

  describe('another address', () => {
    const ask = (person: Person, email: string, password = rightPassword) =>
      person.post(paths.changeEmail, { email, password });
    const fresh = () => `New-${Math.random().toString(36).slice(2)}@example.org`;

    it('is the account’s once the mail to it was opened; the old one is told at once', async () => {
      const juno = await settled();
      const email = fresh();
      await ask(juno, email).expect(204);
      const notice = await sink.next(juno.me.email);
      expect(notice.subject).toBe('Your address at Thudline is about to change');
      expect(notice.text).toContain(email);
      const token = tokenIn(await sink.next(email), 'new-address');
      expect((await juno.get(paths.me)).body).toMatchObject({ email: juno.me.email });
      await new Browser(test).post(paths.confirmEmail, { token }).expect(204);
      expect((await juno.get(paths.me)).body).toMatchObject({ email, emailVerified: true });
      const signIn = { password: rightPassword };
      await new Browser(test).post(paths.signIn, { ...signIn, email: juno.me.email }).expect(401);
      await new Browser(test).post(paths.signIn, { ...signIn, email }).expect(200);
      await new Browser(test).post(paths.confirmEmail, { token }).expect(410);
      expect(await test.em().count(AuditEvent, { userId: juno.me.id, kind: 'address-changed' })).toBe(1);
    });

    it('is refused where it is somebody’s, the same, no address, or the password is wrong', async () => {
      const [juno, oda] = [await settled(), await settled('Oda')];
      expect((await ask(juno, oda.me.email.toUpperCase()).expect(409)).body).toMatchObject({
        code: 'email-taken',
      });
      await ask(juno, juno.me.email.toUpperCase()).expect(400);
      await ask(juno, 'nowhere').expect(400);
      const wrong = await ask(juno, fresh(), 'not this one').expect(400);
      expect(wrong.body).toMatchObject({ details: { fields: { password: 'That is not your password.' } } });
      await new Browser(test)
        .post(paths.changeEmail, { email: fresh(), password: rightPassword })
        .expect(401);
      await juno.post(paths.confirmEmail, { token: 'x'.repeat(43) }).expect(410);
    });

    it('is not taken from somebody who joined with it meanwhile', async () => {
      const juno = await settled();
      const email = fresh();
      await ask(juno, email).expect(204);
      const token = tokenIn(await sink.next(email), 'new-address');
      await new Browser(test).post(paths.join, { name: 'Oda', email, password: rightPassword }).expect(201);
      await juno.post(paths.confirmEmail, { token }).expect(409);
      expect((await juno.get(paths.me)).body).toMatchObject({ email: juno.me.email });
    });

    it('is stopped by a new password', async () => {
      const juno = await settled();
      const email = fresh();
      await ask(juno, email).expect(204);
      const token = tokenIn(await sink.next(email), 'new-address');
      const password = 'another battery staple';
      await juno.post(paths.changePassword, { oldPassword: rightPassword, password }).expect(204);
      await juno.post(paths.confirmEmail, { token }).expect(410);
    });
  });

  describe('its deletion', () => {
    const ask = (person: Person, password = rightPassword) => person.post(paths.deletion, { password });

    it('takes a week, is told by mail, and can be stopped until then', async () => {
      const juno = await settled();
      const asked = meResponse.parse((await ask(juno).expect(201)).body);
      const days = (Date.parse(asked.deleteAfter ?? '') - Date.now()) / (24 * 60 * 60 * 1000);
      expect(days).toBeCloseTo(7, 2);
      const mail = await sink.next(juno.me.email);
      expect(mail.subject).toBe('Your Thudline account will be deleted');
      expect((await ask(juno).expect(201)).body).toMatchObject({ deleteAfter: asked.deleteAfter });
      const laptop = await signedIn(juno);
      expect((await laptop.get(paths.me).expect(200)).body).toMatchObject({ deleteAfter: asked.deleteAfter });
      expect((await laptop.delete(paths.deletion).expect(200)).body).toMatchObject({ deleteAfter: null });
      await laptop.delete(paths.deletion).expect(200);
    });

    it('needs the password, and somebody who is signed in', async () => {
      const juno = await settled();
      await ask(juno, 'not this one').expect(400);
      await new Browser(test).post(paths.deletion, { password: rightPassword }).expect(401);
      const { deleteAfter } = (await juno.get(paths.me)).body as MeResponse;
      expect(deleteAfter).toBeNull();
    });

    it('closes the account when its days are over', async () => {
      const juno = await settled();
      await ask(juno).expect(201);
      await test.em().nativeUpdate(User, { id: juno.me.id }, { deleteAfter: new Date(Date.now() - 1000) });
      await juno.get(paths.me).expect(401);
      await juno.post(paths.refresh).expect(401);
      const signIn = { email: juno.me.email, password: rightPassword };
      await new Browser(test).post(paths.signIn, signIn).expect(401);
    });
  });
});
