import { appHeader, meResponse, paths } from '@thudline/contracts';
import { AuditEvent } from '../src/audit/entities/audit-event.entity';
import { Session } from '../src/auth/entities/session.entity';
import { User } from '../src/users/entities/user.entity';
import { Browser, joined, origin, rightPassword } from './support/person';
import { startTestApp, TestApp } from './support/test-app';

const cookiesOf = (response: { headers: Record<string, unknown> }) => {
  const lines = (response.headers['set-cookie'] ?? []) as string[];
  return Object.fromEntries(lines.map((line) => [line.split('=')[0], line]));
};
const valueOf = (line = '') => line.split(';')[0];

describe('accounts', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await startTestApp();
  });
  afterAll(async () => test?.close());

  describe('joining', () => {
    it('signs the new player in with cookies that scripts cannot read', async () => {
      const browser = new Browser(test);
      const response = await browser
        .post(paths.join, { name: 'Juno', email: 'Juno.Join@example.org', password: rightPassword })
        .expect(201);
      expect(meResponse.parse(response.body)).toMatchObject({ name: 'Juno', roles: ['player'] });
      for (const line of Object.values(cookiesOf(response))) {
        expect(line).toMatch(/HttpOnly/);
        expect(line).toMatch(/SameSite=Lax/);
        expect(line).toMatch(/Max-Age=2592000/);
      }
      const me = await browser.get(paths.me).expect(200);
      expect(me.body).toEqual(response.body);
    });

    it('refuses an address that has an account, whatever its letters', async () => {
      await new Browser(test).post(paths.join, {
        name: 'A',
        email: 'twice@example.org',
        password: rightPassword,
      });
      const again = await new Browser(test)
        .post(paths.join, { name: 'B', email: 'Twice@Example.org', password: rightPassword })
        .expect(409);
      expect(again.body).toMatchObject({
        code: 'email-taken',
        details: { fields: { email: expect.any(String) as string } },
      });
    });

    it('tells each wrong field in a sentence', async () => {
      const response = await new Browser(test)
        .post(paths.join, { name: ' ', email: 'x', password: 'short' })
        .expect(400);
      expect(response.body).toMatchObject({
        code: 'bad-request',
        details: {
          fields: {
            name: 'Write the name others should see.',
            password: 'A password needs at least 10 characters.',
          },
        },
      });
    });

    it('keeps passwords only as argon2id hashes', async () => {
      const person = await joined(test);
      const { passwordHash } = await test.em().findOneOrFail(User, { id: person.me.id });
      expect(passwordHash).toMatch(/^\$argon2id\$/);
    });
  });

  describe('signing in', () => {
    it('works with the right password and any letters of the address', async () => {
      const person = await joined(test);
      const browser = new Browser(test);
      const response = await browser
        .post(paths.signIn, { email: person.me.email.toUpperCase(), password: rightPassword, stay: true })
        .expect(200);
      expect(response.body).toEqual(person.me);
      await browser.get(paths.me).expect(200);
    });

    it('ends with the browser session when the player does not want to stay', async () => {
      const person = await joined(test);
      const response = await new Browser(test).post(paths.signIn, {
        email: person.me.email,
        password: rightPassword,
        stay: false,
      });
      for (const line of Object.values(cookiesOf(response))) expect(line).not.toMatch(/Max-Age|Expires/);
    });

    it('answers a wrong password and an unknown account alike', async () => {
      const person = await joined(test);
      const wrong = await new Browser(test)
        .post(paths.signIn, { email: person.me.email, password: 'not this one' })
        .expect(401);
      const unknown = await new Browser(test)
        .post(paths.signIn, { email: 'nobody@example.org', password: 'not this one' })
        .expect(401);
      expect(unknown.body).toEqual(wrong.body);
      expect(wrong.body).toMatchObject({ code: 'wrong-sign-in' });
    });

    it('refuses a locked account, and what it has open', async () => {
      const person = await joined(test);
      await test.em().nativeUpdate(User, { id: person.me.id }, { lockedAt: new Date() });
      await person.get(paths.me).expect(401);
      await person.post(paths.refresh).expect(401);
      await new Browser(test)
        .post(paths.signIn, { email: person.me.email, password: rightPassword })
        .expect(401);
    });

    it('is refused after ten failures, also with the right password, and says how long to wait', async () => {
      const person = await joined(test);
      const attempt = (password: string) =>
        new Browser(test).post(paths.signIn, { email: person.me.email, password });
      for (let i = 0; i < 10; i++) await attempt('not this one').expect(401);
      const response = await attempt(rightPassword).expect(429);
      expect(response.body).toMatchObject({ code: 'too-many-requests' });
      expect(Number(response.headers['retry-after'])).toBeGreaterThan(0);
      expect(Number(response.headers['retry-after'])).toBeLessThanOrEqual(900);
    });

    it('refuses a body without a password in a sentence', async () => {
      const response = await new Browser(test).post(paths.signIn, { email: 'a@example.org' }).expect(400);
      expect(response.body).toMatchObject({ code: 'bad-request', message: 'Write your password.' });
    });

    it('is written to the audit log', async () => {
      const person = await joined(test);
      await new Browser(test).post(paths.signIn, { email: person.me.email, password: 'not this one' });
      await new Browser(test).post(paths.signIn, { email: person.me.email, password: rightPassword });
      const events = await test.em().find(AuditEvent, { userId: person.me.id }, { orderBy: { id: 'asc' } });
      expect(events.map((event) => event.kind)).toEqual(['joined', 'sign-in-failed', 'signed-in']);
    });
  });

  describe('refreshing', () => {
    it('gives new cookies, and the old refresh token the same ones within a minute', async () => {
      const person = await joined(test);
      const session = await test.em().findOneOrFail(Session, { user: person.me.id });
      const stale = new Browser(test);
      const signIn = await stale.post(paths.signIn, { email: person.me.email, password: rightPassword });
      const old = valueOf(cookiesOf(signIn).thudline_refresh);
      const first = await stale.post(paths.refresh).expect(204);
      const again = await new Browser(test).post(paths.refresh).set('Cookie', old).expect(204);
      expect(valueOf(cookiesOf(first).thudline_refresh)).not.toBe(old);
      expect(valueOf(cookiesOf(again).thudline_refresh)).toBe(valueOf(cookiesOf(first).thudline_refresh));
      expect(session.revokedAt).toBeNull();
    });

    it('ends the session when an old refresh token comes back later', async () => {
      const browser = new Browser(test);
      const person = await joined(test);
      const signIn = await browser.post(paths.signIn, { email: person.me.email, password: rightPassword });
      const old = valueOf(cookiesOf(signIn).thudline_refresh);
      await browser.post(paths.refresh).expect(204);
      const longAgo = new Date(Date.now() - 61_000);
      await test.em().nativeUpdate(Session, { user: person.me.id }, { rotatedAt: longAgo });
      const reuse = await new Browser(test).post(paths.refresh).set('Cookie', old).expect(401);
      expect(reuse.body).toMatchObject({ code: 'session-ended' });
      await browser.get(paths.me).expect(401);
      await browser.post(paths.refresh).expect(401);
      expect(await test.em().count(AuditEvent, { userId: person.me.id, kind: 'session-reused' })).toBe(1);
    });

    it('gives two tabs that refresh at the same moment the same session', async () => {
      const person = await joined(test);
      const signIn = await new Browser(test).post(paths.signIn, {
        email: person.me.email,
        password: rightPassword,
      });
      const cookie = valueOf(cookiesOf(signIn).thudline_refresh);
      const refresh = () => new Browser(test).post(paths.refresh).set('Cookie', cookie);
      const [left, right] = await Promise.all([refresh(), refresh()]);
      expect([left.status, right.status]).toEqual([204, 204]);
      expect(cookiesOf(left).thudline_refresh).toBe(cookiesOf(right).thudline_refresh);
    });

    it('refuses a forged token without ending the session', async () => {
      const person = await joined(test);
      const session = await test.em().findOneOrFail(Session, { user: person.me.id });
      const forged = `thudline_refresh=${session.id}.0.${'A'.repeat(43)}`;
      await new Browser(test).post(paths.refresh).set('Cookie', forged).expect(401);
      await new Browser(test).post(paths.refresh).set('Cookie', 'thudline_refresh=nonsense').expect(401);
      await person.get(paths.me).expect(200);
    });

    it('refuses without a cookie', async () => {
      const response = await new Browser(test).post(paths.refresh).expect(401);
      expect(response.body).toMatchObject({ code: 'session-ended' });
    });
  });

  describe('signing out', () => {
    it('ends the session at once, also for a copied access token', async () => {
      const person = await joined(test);
      const signIn = await person.post(paths.signIn, { email: person.me.email, password: rightPassword });
      const copied = valueOf(cookiesOf(signIn).thudline_access);
      await person.post(paths.signOut).expect(204);
      await person.get(paths.me).expect(401);
      await new Browser(test).get(paths.me).set('Cookie', copied).expect(401);
    });

    it('is no error when nobody is signed in', async () => {
      await new Browser(test).post(paths.signOut).expect(204);
    });
  });

  describe('writes', () => {
    const body = { name: 'Juno', email: 'elsewhere@example.org', password: rightPassword };

    it('are refused from another origin, without an origin, and without the app header', async () => {
      const { agent } = new Browser(test);
      const join = () => agent.post(paths.join).send(body);
      await join().set(appHeader.name, appHeader.value).set('Origin', 'http://elsewhere.test').expect(403);
      await join().set(appHeader.name, appHeader.value).expect(403);
      const response = await join().set('Origin', origin).expect(403);
      expect(response.body).toMatchObject({ code: 'forbidden' });
    });
  });

  it('refuses an access token that somebody else signed', async () => {
    const none = Buffer.from('{"alg":"none","typ":"JWT"}').toString('base64url');
    const claims = Buffer.from('{"sub":"x","sid":"y"}').toString('base64url');
    await new Browser(test).get(paths.me).set('Cookie', `thudline_access=${none}.${claims}.`).expect(401);
  });
});
