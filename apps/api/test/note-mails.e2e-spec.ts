import { paths, TakeResponse } from '@thudline/contracts';
import { Share } from '../src/shares/entities/share.entity';
import { User } from '../src/users/entities/user.entity';
import { MailSink, startMailSink } from './support/mail-sink';
import { noteBy, sendTo } from './support/notes';
import { Browser, joined, Person } from './support/person';
import { openedBy, sharedBy } from './support/shares';
import { startTestApp, TestApp } from './support/test-app';
import { until } from './support/until';
import { startWorker, WorkerProcess } from './support/worker-process';

describe('mails about notes', () => {
  let test: TestApp;
  let sink: MailSink;
  let worker: WorkerProcess;
  let juno: Person;
  let oda: Person;
  let take: TakeResponse;

  /** Somebody whose address is theirs, and whose first mail was read. */
  const settled = async (name: string) => {
    const person = await joined(test, name);
    await sink.next(person.me.email);
    await test.em().nativeUpdate(User, { id: person.me.id }, { emailVerifiedAt: new Date() });
    return person;
  };

  beforeAll(async () => {
    sink = await startMailSink();
    test = await startTestApp();
    worker = startWorker(test, { SMTP_URL: sink.url });
  });
  beforeEach(async () => {
    [juno, oda] = [await settled('Juno'), await settled('Oda')];
    take = await juno.makeTake({ title: 'felt' });
  });
  afterAll(async () => {
    await worker?.stop('SIGTERM');
    await test?.close();
    await sink?.close();
  });

  const guestOfLink = async () => {
    const guest = new Browser(test);
    const share = await sharedBy(juno, take, { canNote: true });
    await openedBy(guest, share);
    expect((await sink.next(juno.me.email)).subject).toBe('The sheet of take 1 was opened');
    return { guest, share };
  };
  /** A mail to somebody else that is sent later shows that the queue is past those before. */
  const queuePassed = () => settled('Wren');

  it('tell the player what a guest wrote, and lead to it', async () => {
    const { guest } = await guestOfLink();
    const note = await noteBy(guest, take, { body: 'Leave it there.', guestName: 'Bex' });
    const mail = await sink.next(juno.me.email);
    expect(mail.subject).toBe('Bex wrote on take 1');
    expect(mail.text).toContain('> Leave it there.');
    expect(mail.text).toContain(`http://thudline.test/takes/${take.id}#note-${note.id}`);
    expect(mail.html).toContain('Leave it there.');
  });

  it('tell a teacher of the player’s answer, and nobody of their own', async () => {
    await sendTo(test, take, { from: juno, to: oda });
    const note = await noteBy(oda, take, { body: 'Flip it.' });
    expect((await sink.next(juno.me.email)).subject).toBe('Oda wrote on take 1');
    await noteBy(juno, take, { body: 'Done.', parentId: note.id });
    expect((await sink.next(oda.me.email)).subject).toBe('Juno answered on take 1');
    await queuePassed();
    expect([sink.count(juno.me.email), sink.count(oda.me.email)]).toEqual([2, 2]);
  });

  it('go to nobody whose address is not known to be theirs, who is locked out, or who may read it no more', async () => {
    const shareId = await sendTo(test, take, { from: juno, to: oda });
    const note = await noteBy(oda, take);
    await sink.next(juno.me.email);
    await test.em().nativeUpdate(Share, { id: shareId }, { revokedAt: new Date() });
    await noteBy(juno, take, { parentId: note.id });
    const { guest } = await guestOfLink();
    await test.em().nativeUpdate(User, { id: juno.me.id }, { emailVerifiedAt: null });
    await noteBy(guest, take, { guestName: 'Bex' });
    await queuePassed();
    expect([sink.count(juno.me.email), sink.count(oda.me.email)]).toEqual([3, 1]);
  });

  it('tell whoever asked for something what was ticked, once for all of it', async () => {
    await sendTo(test, take, { from: juno, to: oda });
    const { nextItems } = await noteBy(oda, take, { nextItems: ['Flip it', 'Rest'] });
    for (const { id } of nextItems) await juno.patch(paths.nextItem(take.id, id), { done: true }).expect(200);
    // They wait ten minutes for more ticks; the test brings the moment nearer.
    const bringNearer = `update pgboss.job set start_after = now() where data->>'kind' = 'ticked'`;
    await test.em().execute(bringNearer);
    const mail = await sink.next(oda.me.email);
    expect(mail.subject).toBe('Juno did what you asked for');
    expect(mail.text).toContain('> Flip it\n\n> Rest');
    await until(async () => {
      const [{ left }] = await test
        .em()
        .execute<{ left: string }[]>(
          `select count(*) as left from pgboss.job where data->>'kind' = 'ticked' and state <> 'completed'`,
        );
      return left === '0';
    });
    expect(sink.count(oda.me.email)).toBe(2);
  });
});
