import { paths } from '@thudline/contracts';
import { QueueSender } from '../src/queue/queue-sender';
import { User } from '../src/users/entities/user.entity';
import { Browser, rightPassword } from './support/person';
import { startTestApp, TestApp } from './support/test-app';

describe('joining', () => {
  let test: TestApp;
  let joins = 0;

  beforeEach(async () => {
    test = await startTestApp({ MAIL_LIMIT_PER_ADDRESS: '3', TRUST_PROXY: 'true' });
  });
  afterEach(async () => {
    jest.restoreAllMocks();
    await test?.close();
  });

  const join = (changed: object = {}) => {
    const email = `juno-${++joins}@example.org`;
    return new Browser(test).post(paths.join, { name: 'Juno', email, password: rightPassword, ...changed });
  };

  it('keeps no account when the mail that verifies its address can’t be queued, so that it can be tried again', async () => {
    const email = 'again@example.org';
    jest
      .spyOn(test.app.get(QueueSender, { strict: false }), 'sendWith')
      .mockRejectedValueOnce(new Error('The queue is away.'));
    await join({ email }).expect(500);
    expect(await test.em().count(User, { emailLower: email })).toBe(0);
    await join({ email }).expect(201);
    const jobs = await test.em().execute<{ data: unknown }[]>('select data from pgboss.job');
    const { id } = await test.em().findOneOrFail(User, { emailLower: email });
    expect(jobs.map(({ data }) => data)).toEqual([{ kind: 'verify', userId: id }]);
  });

  it('counts among the mails that one address may ask for', async () => {
    await join().expect(201);
    await new Browser(test).post(paths.forgot, { email: 'juno@example.org' }).expect(204);
    await join().expect(201);
    await join().expect(429);
    await new Browser(test).post(paths.forgot, { email: 'juno@example.org' }).expect(429);
  });

  it('counts every address of one IPv6 network together', async () => {
    const joinFrom = (address: string) => join().set('X-Forwarded-For', address);
    for (const last of ['1', '2', '3']) await joinFrom(`2001:db8:0:7::${last}`).expect(201);
    await joinFrom('2001:db8:0:7:ffff::1').expect(429);
    await joinFrom('2001:db8:0:8::1').expect(201);
  });

  it('refuses a name that would carry a link into our mails', async () => {
    const response = await join({ name: 'Win at https://example.org' }).expect(400);
    expect(response.body).toMatchObject({
      details: { fields: { name: 'Write a name without the address of a page.' } },
    });
  });
});
