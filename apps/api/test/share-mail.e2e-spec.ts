import { createdShareResponse, CreateShareRequest, paths, TakeResponse } from '@thudline/contracts';
import { Share } from '../src/shares/entities/share.entity';
import { User } from '../src/users/entities/user.entity';
import { MailSink, startMailSink, tokenIn } from './support/mail-sink';
import { Browser, joined, Person } from './support/person';
import { startTestApp, TestApp } from './support/test-app';
import { startWorker, WorkerProcess } from './support/worker-process';

describe('a link that is sent by mail', () => {
  let test: TestApp;
  let sink: MailSink;
  let worker: WorkerProcess;
  let juno: Person;
  let take: TakeResponse;

  beforeAll(async () => {
    sink = await startMailSink();
    test = await startTestApp({ SHARE_MAIL_LIMIT_PER_ACCOUNT: '3' });
    worker = startWorker(test, { SMTP_URL: sink.url });
    juno = await joined(test);
    take = await juno.makeTake();
  });
  afterAll(async () => {
    await worker?.stop('SIGTERM');
    await test?.close();
    await sink?.close();
  });

  const verify = (person: Person) =>
    test.em().nativeUpdate(User, { id: person.me.id }, { emailVerifiedAt: new Date() });
  const send = (changed: Partial<CreateShareRequest>) =>
    juno.post(paths.shares, { subject: { kind: 'take', takeId: take.id }, ...changed });

  it('is refused to whoever has not shown that their own address is theirs', async () => {
    const refused = await send({ mailTo: 'bex@example.org' }).expect(403);
    expect(refused.text).toContain('First open the link in the mail we sent you');
    expect(await test.em().count(Share, { owner: juno.me.id })).toBe(0);
  });

  it('reaches its reader and opens; its owner hears of the first time; neither page nor queue tells the token; a refused mail is tried again', async () => {
    await verify(juno);
    sink.refuse(1);
    const response = await send({ mailTo: 'bex@example.org', question: 'Flip it?' }).expect(201);
    const share = createdShareResponse.parse(response.body);
    expect(share).toMatchObject({ url: null, mailedTo: 'bex@example.org' });
    const mail = await sink.next('bex@example.org');
    expect(sink.refused()).toBe(1);
    expect(mail.subject).toBe('Juno sent you the sheet of a take');
    expect(mail.text).toContain('Flip it?');
    expect(mail.text).not.toContain(juno.me.email);
    const guest = new Browser(test);
    await guest.post(paths.openShare, { token: tokenIn(mail, 's') }).expect(200);
    await guest.get(paths.take(take.id)).expect(200);
    await new Browser(test).post(paths.openShare, { token: tokenIn(mail, 's') }).expect(200);
    const told = await sink.next(juno.me.email);
    expect(told.subject).toBe(`The sheet of take ${take.number} was opened`);
    expect(told.text).toContain(`/takes/${take.id}`);
    expect(told.headers.has('list')).toBe(true);
    const queued = await test
      .em()
      .getConnection()
      .execute<{ data: { kind: string } }[]>(`select data from pgboss.job where name = 'mail'`);
    expect(JSON.stringify(queued)).not.toContain(tokenIn(mail, 's'));
    expect(queued.filter(({ data }) => data.kind === 'opened')).toHaveLength(1);
  });

  it('is not sent for what is no address, nor without end', async () => {
    await verify(juno);
    const refused = await send({ mailTo: 'bex' }).expect(400);
    expect(refused.body).toMatchObject({ message: 'This is no mail address.' });
    await send({ mailTo: 'a@example.org' }).expect(201);
    await send({ mailTo: 'b@example.org' }).expect(201);
    const tooMany = await send({ mailTo: 'c@example.org' }).expect(429);
    expect(Number(tooMany.headers['retry-after'])).toBeGreaterThan(0);
    await send({}).expect(201);
  });
});
