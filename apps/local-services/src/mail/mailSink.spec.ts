import { mkdtemp, readdir, rm, stat } from 'node:fs/promises';
import { request } from 'node:http';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createTransport, type Transporter } from 'nodemailer';
import { type KeptMessage } from './keptMessage';
import { startMailSink, type MailSink } from './mailSink';

let directory: string;
let sink: MailSink;
let post: Transporter;

beforeEach(async () => {
  directory = await mkdtemp(join(tmpdir(), 'thudline-mail-'));
  sink = await startMailSink({ directory, smtpPort: 0, pagePort: 0 });
  post = createTransport(sink.smtpUrl);
});
afterEach(async () => {
  post.close();
  await sink.stop();
  await rm(directory, { recursive: true, force: true });
});

const mail = {
  from: 'Thudline <bench@example.org>',
  to: 'Juno <Juno@Example.org>',
  subject: 'A new password for your takes – 1 < 2',
  text: 'Open http://127.0.0.1/reset/abc?x=1&y=2 within the hour.',
  html: '<p>Open <a href="http://127.0.0.1/reset/abc">this</a><script>parent.x = 1</script></p>',
};

async function messages(to = ''): Promise<KeptMessage[]> {
  const answer = await fetch(`${sink.url}/messages${to && `?to=${encodeURIComponent(to)}`}`);
  return (await answer.json()) as KeptMessage[];
}

/** `fetch` sets the host by itself. */
const statusAs = (host: string): Promise<number | undefined> =>
  new Promise((resolve, reject) => {
    request(`${sink.url}/messages`, { headers: { Host: host } }, (answer) => {
      answer.resume();
      resolve(answer.statusCode);
    })
      .once('error', reject)
      .end();
  });

test('a mail that was sent can be read, with its text and its HTML', async () => {
  await post.sendMail({ ...mail, headers: { 'X-Kind': 'reset' } });
  expect(await messages()).toEqual([
    expect.objectContaining({
      from: '"Thudline" <bench@example.org>',
      to: ['juno@example.org'],
      subject: mail.subject,
      text: expect.stringContaining('/reset/abc?x=1&y=2 within') as string,
      html: expect.stringContaining('<a href="http://127.0.0.1/reset/abc">') as string,
      headers: expect.objectContaining({ 'x-kind': 'reset' }) as Record<string, string>,
    }),
  ]);
});

test('mails are found by who they went to, hidden copies too, newest first', async () => {
  await post.sendMail({ ...mail, subject: 'first' });
  await post.sendMail({ ...mail, to: 'oda@example.org', bcc: 'juno@example.org', subject: 'second' });
  await post.sendMail({ ...mail, to: 'oda@example.org', subject: 'third' });
  const subjects = (found: KeptMessage[]) => found.map(({ subject }) => subject);
  expect(subjects(await messages('JUNO@example.org'))).toEqual(['second', 'first']);
  expect(subjects(await messages())).toEqual(['third', 'second', 'first']);
  expect(await messages('nobody@example.org')).toEqual([]);
});

test('the page lists mails, and shows one with its HTML shut into a frame without scripts', async () => {
  expect(await (await fetch(sink.url)).text()).toContain('No mail yet');
  await post.sendMail(mail);
  const list = await (await fetch(sink.url)).text();
  expect(list).toContain('1 &lt; 2');
  const [, href] = /href="(\/read\/[^"]+)"/.exec(list)!;
  const answer = await fetch(sink.url + href);
  const page = await answer.text();
  expect(page).not.toContain('<script');
  expect(page).toMatch(/<iframe [^>]*sandbox="allow-popups allow-popups-to-escape-sandbox" srcdoc="/);
  expect(answer.headers.get('content-security-policy')).toContain("default-src 'none'");
});

test('a mail without an HTML part is shown as text only', async () => {
  await post.sendMail({ from: mail.from, to: mail.to, subject: 'plain', text: 'only <words>' });
  const [{ id, html }] = (await messages()) as [KeptMessage];
  expect(html).toBeNull();
  const page = await (await fetch(`${sink.url}/read/${id}`)).text();
  expect(page).toContain('only &lt;words&gt;');
  expect(page).not.toContain('<iframe');
});

test('mails outlive a restart, in files that only their owner can read', async () => {
  await post.sendMail({ ...mail, subject: 'kept' });
  await post.sendMail({ ...mail, subject: 'kept later' });
  await sink.stop();
  sink = await startMailSink({ directory, smtpPort: 0, pagePort: 0 });
  expect((await messages()).map(({ subject }) => subject)).toEqual(['kept later', 'kept']);
  const [name] = await readdir(directory);
  expect((await stat(join(directory, name))).mode & 0o777).toBe(0o600);
});

test('what is not there, not ours or not reading is refused', async () => {
  expect((await fetch(`${sink.url}/read/none`)).status).toBe(404);
  expect((await fetch(`${sink.url}/messages`, { method: 'DELETE' })).status).toBe(405);
  expect(await statusAs('elsewhere.example:80')).toBe(403);
  expect(await statusAs('localhost:80')).toBe(200);
});

test('a taken port is an error at once, and leaves nothing open', async () => {
  const smtpPort = Number(new URL(sink.smtpUrl).port);
  await expect(startMailSink({ directory, smtpPort, pagePort: 0 })).rejects.toThrow(/EADDRINUSE/);
});
