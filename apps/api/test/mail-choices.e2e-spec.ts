import { EntityManager } from '@mikro-orm/postgresql';
import { MailChoice, mailChoiceResponse, paths } from '@thudline/contracts';
import request from 'supertest';
import { ChosenMail } from '../src/mail/chosen-mail';
import { DigestMailWriter } from '../src/mail/digest-mail-writer';
import { Digests } from '../src/mail/digests';
import { mailChoiceToken } from '../src/mail/mail-choice-token';
import { MailQueue } from '../src/mail/mail-queue';
import { Mailer } from '../src/mail/mailer';
import { weekEnd, weekMs } from '../src/mail/week';
import { Take } from '../src/takes/entities/take.entity';
import { User } from '../src/users/entities/user.entity';
import { MailSink, startMailSink } from './support/mail-sink';
import { Browser, joined, Person } from './support/person';
import { startTestApp, TestApp } from './support/test-app';

const content = { subject: 'Something', text: 'Words\n', html: '<p>Words</p>' };

describe('mails that somebody chooses', () => {
  let test: TestApp;
  let sink: MailSink;
  let mailer: Mailer;
  let chosen: ChosenMail;

  beforeAll(async () => {
    sink = await startMailSink();
    test = await startTestApp({ SMTP_URL: sink.url });
    mailer = new Mailer(test.config);
    chosen = new ChosenMail(test.em(), mailer, test.config);
  });
  afterAll(async () => {
    mailer?.onApplicationShutdown();
    await test?.close();
    await sink?.close();
  });

  const userOf = ({ me }: Person) => test.em().findOneOrFail(User, me.id);
  const tokenFor = (choice: MailChoice, to: { email: string; userId: string | null }) =>
    mailChoiceToken(test.config.jwtSecret, choice, to);
  const guest = () => new Browser(test);
  const read = async (token: string) =>
    mailChoiceResponse.parse((await guest().post(paths.readMailChoice, { token }).expect(200)).body);

  it('carry the way out: at their foot, and in the headers that mail programs read', async () => {
    const juno = await joined(test);
    await chosen.toUser(await userOf(juno), 'notes', content);
    const mail = await sink.next(juno.me.email);
    const [, token] = /http:\/\/thudline\.test\/unsubscribe\/([\w.-]+)/.exec(mail.text ?? '') ?? [];
    expect(mail.html).toContain(`/unsubscribe/${token}`);
    const header = (name: string) =>
      mail.headerLines.find(({ key }) => key === name)?.line.replace(/\s+/g, ' ');
    expect(header('list-unsubscribe')).toContain(`<http://thudline.test${paths.stopMail}?token=${token}>`);
    expect(header('list-unsubscribe-post')).toBe('List-Unsubscribe-Post: List-Unsubscribe=One-Click');
  });

  it('stop at one click of a mail program: no cookie, no page of ours', async () => {
    const juno = await joined(test);
    const token = tokenFor('notes', { email: juno.me.email, userId: juno.me.id });
    const oneClick = request(test.server).post(`${paths.stopMail}?token=${token}`).type('form');
    await oneClick.send('List-Unsubscribe=One-Click').expect(204);
    expect((await juno.get(paths.me)).body).toMatchObject({ settings: { mailNotes: false, mailSent: true } });
    await chosen.toUser(await userOf(juno), 'notes', content);
    await chosen.toAddress(juno.me.email.toUpperCase(), 'notes', content);
    await chosen.toUser(await userOf(juno), 'sent', { ...content, subject: 'Another' });
    expect((await sink.next(juno.me.email)).subject).toBe('Another');
    expect(sink.count(juno.me.email)).toBe(1);
  });

  it('are read and set signed out, and come again when they are wanted again', async () => {
    const juno = await joined(test);
    const token = tokenFor('opened', { email: juno.me.email, userId: juno.me.id });
    expect(await read(token)).toEqual({ choice: 'opened', wanted: true });
    await guest().post(paths.mailChoice, { token, wanted: false }).expect(200);
    expect(await read(token)).toEqual({ choice: 'opened', wanted: false });
    await guest().post(paths.mailChoice, { token, wanted: true }).expect(200);
    expect(await read(token)).toEqual({ choice: 'opened', wanted: true });
  });

  it('stop for an address without an account, too', async () => {
    const email = 'somebody@example.org';
    await chosen.toAddress(email, 'sent', content);
    const mail = await sink.next(email);
    const [, token = ''] = /\/unsubscribe\/([\w.-]+)/.exec(mail.text ?? '') ?? [];
    expect(token).not.toContain(email);
    await guest().post(paths.mailChoice, { token, wanted: false }).expect(200);
    await guest().post(paths.mailChoice, { token, wanted: false }).expect(200);
    await chosen.toAddress('Somebody@Example.org', 'sent', content);
    expect(sink.count(email)).toBe(1);
    await guest().post(paths.mailChoice, { token, wanted: true }).expect(200);
    await chosen.toAddress(email, 'sent', content);
    expect(sink.count(email)).toBe(2);
  });

  it('don’t follow a token that is not ours, or of somebody who has gone', async () => {
    const gone = tokenFor('notes', { email: '', userId: '01890000-0000-7000-8000-000000000000' });
    for (const token of [`${'x'.repeat(43)}.${'y'.repeat(43)}`, gone, `${gone}x`]) {
      await guest().post(paths.readMailChoice, { token }).expect(410);
      await guest().post(paths.mailChoice, { token, wanted: false }).expect(410);
      await request(test.server).post(`${paths.stopMail}?token=${token}`).expect(410);
    }
    await request(test.server).post(paths.stopMail).expect(400);
  });

  describe('about a week', () => {
    const monday = weekEnd(new Date());
    const digests = () =>
      new Digests(test.app.get(EntityManager), test.app.get(MailQueue, { strict: false }));
    const wanting = async (name: string) => {
      const person = await joined(test, name);
      await person.patch(paths.me, { settings: { mailDigest: true } }).expect(200);
      await test.em().nativeUpdate(User, { id: person.me.id }, { emailVerifiedAt: new Date() });
      return person;
    };
    const queued = async ({ me }: Person) =>
      test
        .em()
        .execute<{ until: string }[]>(
          `select data->>'until' as until from pgboss.job where name = 'mail' and data->>'kind' = 'digest' and data->>'userId' = ?`,
          [me.id],
        );

    it('are asked for once a week, from the week in which they were switched on', async () => {
      const [juno, oda] = [await wanting('Juno'), await joined(test, 'Oda')];
      const later = (weeks: number, ms = 0) => new Date(monday.getTime() + weeks * weekMs + ms);
      await digests().run(later(0, 60_000));
      expect(await queued(juno)).toEqual([]);
      await Promise.all([digests().run(later(1, 1)), digests().run(later(1, 2))]);
      await digests().run(later(2, -1));
      expect(await queued(juno)).toEqual([{ until: later(1).toISOString() }]);
      await digests().run(later(3, 5));
      expect(await queued(juno)).toHaveLength(2);
      expect(await queued(oda)).toEqual([]);
    });

    it('tell what happened in it, and nothing of another week or of nothing', async () => {
      const juno = await wanting('Juno');
      const [inside, before] = [
        await juno.makeTake({ title: 'Inside' }),
        await juno.makeTake({ title: 'Before' }),
      ];
      const made = (id: string, createdAt: Date) => test.em().nativeUpdate(Take, { id }, { createdAt });
      await made(inside.id, new Date(monday.getTime() - 1));
      await made(before.id, new Date(monday.getTime() - weekMs - 1));
      const writer = new DigestMailWriter(test.em(), chosen, test.config);
      const write = (until: Date) =>
        writer.write({ kind: 'digest', userId: juno.me.id, until: until.toISOString() });
      await write(new Date(monday.getTime() + weekMs));
      await write(monday);
      const mail = await sink.next(juno.me.email);
      expect(mail.subject).toBe('Your week: 1 take');
      expect(sink.count(juno.me.email)).toBe(1);
      await juno.patch(paths.me, { settings: { mailDigest: false } }).expect(200);
      await write(monday);
      expect(sink.count(juno.me.email)).toBe(1);
    });
  });
});
