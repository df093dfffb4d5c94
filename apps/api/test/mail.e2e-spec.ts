import { MeResponse, paths } from '@thudline/contracts';
import { AuditEvent } from '../src/audit/entities/audit-event.entity';
import { OneTimeToken } from '../src/tokens/entities/one-time-token.entity';
import { User } from '../src/users/entities/user.entity';
import { MailSink, startMailSink, tokenIn } from './support/mail-sink';
import { Browser, joined, Person, rightPassword } from './support/person';
import { startTestApp, TestApp } from './support/test-app';
import { until } from './support/until';
import { startWorker, WorkerProcess } from './support/worker-process';

const newPassword = 'another battery staple';

describe('mail', () => {
  let test: TestApp;
  let sink: MailSink;
  let worker: WorkerProcess;

  beforeAll(async () => {
    sink = await startMailSink();
    test = await startTestApp();
    worker = startWorker(test, { SMTP_URL: sink.url, MAIL_FROM: 'Thudline <bench@thudline.test>' });
  });
  afterAll(async () => {
    await worker?.stop('SIGTERM');
    await test?.close();
    await sink?.close();
  });

  const signIn = (person: Person, password: string) =>
    new Browser(test).post(paths.signIn, { email: person.me.email, password });
  const meOf = async (person: Person) => (await person.get(paths.me).expect(200)).body as MeResponse;
  /** Somebody who joined, whose first mail was read already. */
  const settled = async (name = 'Juno') => {
    const person = await joined(test, name);
    return { person, welcome: await sink.next(person.me.email) };
  };
  const resetToken = async (person: Person) => {
    await new Browser(test).post(paths.forgot, { email: person.me.email }).expect(204);
    return tokenIn(await sink.next(person.me.email), 'reset');
  };

  describe('verifying an address', () => {
    it('works with the link that is sent on joining, also when it is opened twice', async () => {
      const { person, welcome } = await settled();
      expect(welcome.from?.text).toBe('"Thudline" <bench@thudline.test>');
      expect(welcome.html).toContain(`/verify/${tokenIn(welcome, 'verify')}`);
      expect((await meOf(person)).emailVerified).toBe(false);
      const token = tokenIn(welcome, 'verify');
      await new Browser(test).post(paths.verify, { token }).expect(204);
      await new Browser(test).post(paths.verify, { token }).expect(204);
      expect((await meOf(person)).emailVerified).toBe(true);
    });

    it('sends another mail when asked, but not to whoever is verified, and not for ever', async () => {
      const { person } = await settled();
      await person.post(paths.resendVerification).expect(204);
      const token = tokenIn(await sink.next(person.me.email), 'verify');
      await person.post(paths.verify, { token }).expect(204);
      for (let i = 0; i < 4; i++) await person.post(paths.resendVerification).expect(204);
      await person.post(paths.resendVerification).expect(429);
      // A mail that goes out later shows that the queue is past those.
      await settled();
      expect(sink.count(person.me.email)).toBe(2);
    });

    it('refuses a link that is over, one for something else, and one that never was', async () => {
      const { person, welcome } = await settled();
      const reset = await resetToken(person);
      await person.post(paths.verify, { token: reset }).expect(410);
      await person.post(paths.verify, { token: 'x'.repeat(43) }).expect(410);
      await test.em().nativeUpdate(OneTimeToken, { user: person.me.id }, { expiresAt: new Date(0) });
      const over = await person.post(paths.verify, { token: tokenIn(welcome, 'verify') }).expect(410);
      expect(over.body).toMatchObject({ code: 'link-ended' });
    });
  });

  describe('a forgotten password', () => {
    it('is replaced through the mail; every session ends and the address counts as verified', async () => {
      const { person } = await settled();
      const token = await resetToken(person);
      await new Browser(test).post(paths.reset, { token, password: newPassword }).expect(204);
      await person.get(paths.me).expect(401);
      await person.post(paths.refresh).expect(401);
      await signIn(person, rightPassword).expect(401);
      const back = await signIn(person, newPassword).expect(200);
      expect(back.body).toMatchObject({ emailVerified: true });
      expect(await test.em().count(AuditEvent, { userId: person.me.id, kind: 'password-reset' })).toBe(1);
    });

    it('takes a link once, and the newer of two ends the older', async () => {
      const { person } = await settled();
      const [older, newer] = [await resetToken(person), await resetToken(person)];
      const tries = [1, 2].map(() =>
        new Browser(test).post(paths.reset, { token: newer, password: newPassword }),
      );
      const statuses = (await Promise.all(tries)).map(({ status }) => status);
      expect(statuses.sort()).toEqual([204, 410]);
      await new Browser(test).post(paths.reset, { token: older, password: 'a third password' }).expect(410);
      await signIn(person, newPassword).expect(200);
    });

    it('answers alike for an address without an account, and writes to nobody', async () => {
      const { person } = await settled();
      const unknown = await new Browser(test).post(paths.forgot, { email: 'nobody@example.org' });
      const known = await new Browser(test).post(paths.forgot, { email: person.me.email.toUpperCase() });
      expect([unknown.status, unknown.text]).toEqual([known.status, known.text]);
      await sink.next(person.me.email);
      expect(sink.count('nobody@example.org')).toBe(0);
    });

    it('writes a person at most five times an hour, whether there is such an account or not', async () => {
      for (let i = 0; i < 5; i++) {
        await new Browser(test).post(paths.forgot, { email: 'often@example.org' }).expect(204);
      }
      await new Browser(test).post(paths.forgot, { email: 'Often@example.org' }).expect(429);
    });

    it('does not open an account that is locked', async () => {
      const { person } = await settled();
      const token = await resetToken(person);
      await test.em().nativeUpdate(User, { id: person.me.id }, { lockedAt: new Date() });
      await new Browser(test).post(paths.reset, { token, password: newPassword }).expect(410);
    });

    it('keeps the token only as a hash, and never in the queue', async () => {
      const { person } = await settled();
      const token = await resetToken(person);
      const rows = await test.em().find(OneTimeToken, { user: person.me.id });
      const jobs = await test.em().execute<{ data: unknown }[]>('select data from pgboss.job');
      expect(jobs.length).toBeGreaterThan(0);
      expect(JSON.stringify([rows, jobs])).not.toContain(token);
    });
  });

  describe('another password', () => {
    const change = (person: Person, oldPassword: string) =>
      person.post(paths.changePassword, { oldPassword, password: newPassword });

    it('ends every other session and keeps this one', async () => {
      const { person } = await settled();
      const other = new Browser(test);
      await other.post(paths.signIn, { email: person.me.email, password: rightPassword }).expect(200);
      await change(person, rightPassword).expect(204);
      await person.get(paths.me).expect(200);
      await other.get(paths.me).expect(401);
      await signIn(person, newPassword).expect(200);
    });

    it('needs the old one, and does not let it be guessed', async () => {
      const { person } = await settled();
      const wrong = await change(person, 'not this one').expect(400);
      expect(wrong.body).toMatchObject({
        details: { fields: { oldPassword: 'That is not your password.' } },
      });
      for (let i = 0; i < 9; i++) await change(person, 'not this one').expect(400);
      await change(person, rightPassword).expect(429);
      await signIn(person, rightPassword).expect(200);
    });
  });

  it('is sent later when the mail server is busy, and nobody waits for it', async () => {
    sink.refuse(1);
    const person = await joined(test, 'Patience');
    await until(() => Promise.resolve(sink.refused() === 1));
    // The queue waits longer and longer; the test brings the moment nearer.
    await until(async () => {
      await test.em().execute(`update pgboss.job set start_after = now() where state = 'retry'`);
      return sink.count(person.me.email) === 1;
    });
  });
});
