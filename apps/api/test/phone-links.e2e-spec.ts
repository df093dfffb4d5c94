import { MeResponse, meResponse, paths, PhoneLinkResponse, phoneLinkResponse } from '@thudline/contracts';
import { Session } from '../src/auth/entities/session.entity';
import { OneTimeToken } from '../src/tokens/entities/one-time-token.entity';
import { Browser, joined, Person, rightPassword } from './support/person';
import { tokenOf } from './support/shares';
import { startTestApp, TestApp } from './support/test-app';

const hourMs = 60 * 60 * 1000;

describe('show on my phone', () => {
  let test: TestApp;
  let juno: Person;

  beforeAll(async () => {
    test = await startTestApp({ PHONE_LINK_LIMIT_PER_ACCOUNT: '5' });
  });
  beforeEach(async () => {
    juno = await joined(test);
  });
  afterAll(async () => test?.close());

  const made = async (): Promise<PhoneLinkResponse> =>
    phoneLinkResponse.parse((await juno.post(paths.phoneLinks).expect(201)).body);
  const phoneIn = async (): Promise<{ phone: Browser; me: MeResponse }> => {
    const phone = new Browser(test);
    const response = await phone.post(paths.openPhoneLink, { token: tokenOf(await made()) }).expect(200);
    return { phone, me: meResponse.parse(response.body) };
  };
  const refused = { code: 'read-only', message: expect.any(String) as string };

  it('gives a link that is good for ten minutes', async () => {
    const { url, expiresAt } = await made();
    expect(url).toMatch(/^http:\/\/thudline\.test\/phone\/[\w-]{43}$/);
    expect(Math.abs(Date.parse(expiresAt) - Date.now() - hourMs / 6)).toBeLessThan(60_000);
  });

  it('lets a phone read what its owner reads, told that it only reads', async () => {
    const take = await juno.makeTake({ title: 'Read me', tags: ['kit B'] });
    const { phone, me } = await phoneIn();
    expect(me).toEqual({ ...juno.me, readOnly: true });
    expect((await phone.get(paths.me)).body).toEqual(me);
    expect((await phone.get(paths.takes)).body).toMatchObject({ total: 1 });
    const seen = await phone.get(paths.take(take.id)).expect(200);
    expect(seen.body).toMatchObject({ tags: ['kit B'], rights: { change: false, listen: true } });
    await phone.get(paths.measurement(take.id)).expect(200);
    await phone.get(paths.listen(take.id)).expect(200);
  });

  it('lets it tick and sign out, and write nothing else', async () => {
    const take = await juno.makeTake({ title: 'Kept' });
    const { phone } = await phoneIn();
    await phone.patch(paths.take(take.id), { tickedActions: ['flip-overhead'] }).expect(200);
    expect((await juno.get(paths.take(take.id))).body).toMatchObject({ tickedActions: ['flip-overhead'] });
    const writes = [
      phone.patch(paths.take(take.id), { tickedActions: [], title: 'Changed' }),
      phone.delete(paths.take(take.id)),
      phone.post(paths.cancelMeasurement(take.id)),
      phone.post(paths.shares, { subject: { kind: 'take', takeId: take.id } }),
      phone.post(paths.takes),
      phone.patch(paths.me, { name: 'Someone' }),
      phone.post(paths.phoneLinks),
      phone.post(paths.changePassword, { oldPassword: rightPassword, password: 'another battery staple' }),
      phone.post(paths.resendVerification),
    ];
    for (const write of writes) {
      const response = await write;
      expect([response.status, response.body]).toEqual([403, refused]);
    }
    expect((await juno.get(paths.take(take.id))).body).toMatchObject({
      title: 'Kept',
      tickedActions: ['flip-overhead'],
    });
    await phone.post(paths.signOut).expect(204);
    await phone.get(paths.me).expect(401);
    await juno.get(paths.me).expect(200);
  });

  it('takes nothing from the browser that made it, when it is opened there', async () => {
    const opened = await juno.post(paths.openPhoneLink, { token: tokenOf(await made()) }).expect(200);
    expect(opened.body).toEqual(juno.me);
    await juno.patch(paths.me, { name: 'Still me' }).expect(200);
  });

  it('works once, also for two who scan it at the same moment', async () => {
    const token = tokenOf(await made());
    const opened = await Promise.all(
      [1, 2, 3].map(() => new Browser(test).post(paths.openPhoneLink, { token })),
    );
    expect(opened.map(({ status }) => status).sort()).toEqual([200, 410, 410]);
    await test.em().nativeUpdate(OneTimeToken, { user: juno.me.id }, { usedAt: null, expiresAt: new Date() });
    await new Browser(test).post(paths.openPhoneLink, { token }).expect(410);
  });

  it('ends after twelve hours, however much it is used, and with the password', async () => {
    const { phone } = await phoneIn();
    const session = () => test.em().findOneOrFail(Session, { user: juno.me.id, readOnly: true });
    const { expiresAt } = await session();
    expect(Math.abs(expiresAt.getTime() - Date.now() - 12 * hourMs)).toBeLessThan(60_000);
    await phone.post(paths.refresh).expect(204);
    expect((await session()).expiresAt).toEqual(expiresAt);
    expect((await phone.get(paths.me)).body).toMatchObject({ readOnly: true });
    await juno.post(paths.changePassword, { oldPassword: rightPassword, password: 'another battery staple' });
    await phone.get(paths.me).expect(401);
  });

  it('is not made without end', async () => {
    for (let i = 0; i < 5; i++) await made();
    await juno.post(paths.phoneLinks).expect(429);
    await new Browser(test).post(paths.phoneLinks).expect(401);
  });
});
