import { appHeader, createTakeRequest, paths, takeResponse } from '@thudline/contracts';
import { fireEvent, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { Link } from 'react-router-dom';
import { handOverFiles } from '../features/upload/droppedFiles';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { fakeUploads } from '../testing/fakeXhr';
import { renderPage } from '../testing/renderPage';
import { measurement, sampleReport, sampleTake, takeId } from '../testing/sampleData';
import { sampleList, sampleListItem } from '../testing/sampleList';
import { sampleSetupItem } from '../testing/sampleSetups';
import { toneFile } from '../testing/sampleWav';
import { NewTakePage } from './NewTakePage';

const kept = takeResponse.parse(
  sampleTake({
    title: '',
    note: '',
    hasReport: false,
    measurement: measurement({ state: 'queued', progress: 0 }),
  }),
);

function open(routes: FakeRoutes = {}) {
  const uploads = fakeUploads();
  const server = fakeServer({ [`GET ${paths.takes}`]: json(sampleList([sampleListItem()])), ...routes });
  const page = (
    <>
      <Link to="/takes">Takes</Link>
      <NewTakePage />
    </>
  );
  return { ...server, uploads, ...renderPage([{ path: '/takes/new', element: page }], '/takes/new') };
}

const kick = () => toneFile('kick_0412.wav', { tonesHz: [60] });
const overhead = () => toneFile('oh_0412.wav', { tonesHz: [3000] });

async function pick(container: HTMLElement, ...files: File[]) {
  await waitFor(() => expect(container.querySelector('input[type=file]')).not.toBeNull());
  await userEvent.upload(container.querySelector<HTMLInputElement>('input[type=file]')!, files);
}
const headlineIs = async (name: RegExp) =>
  expect(await screen.findByRole('heading', { level: 1, name })).toBeInTheDocument();
const measure = () => userEvent.click(screen.getByRole('button', { name: 'Measure this take' }));
const rowOf = (name: string) => screen.getByText(name).closest('li')!;

async function sendPair(page: ReturnType<typeof open>) {
  await pick(page.container, kick(), overhead());
  await headlineIs(/^Both files are here/);
  await measure();
  await waitFor(() => expect(page.uploads).toHaveLength(1));
  return page.uploads[0];
}

const fromJson = (fields: Record<string, FormDataEntryValue>) =>
  Object.fromEntries(
    ['tracks', 'doneActions', 'tags'].map((name) => [name, JSON.parse(fields[name] as string) as unknown]),
  );

describe('files that were sent before', () => {
  const { crypto } = globalThis;
  /** jsdom can't hash; what a file holds stands for its hash here. */
  beforeEach(() => {
    const digest = (_name: string, bytes: ArrayBuffer) =>
      Promise.resolve(
        new Uint8Array(32).fill(new Uint8Array(bytes).reduce((sum, byte) => (sum + byte) % 251, 0)),
      );
    Object.defineProperty(globalThis, 'crypto', {
      configurable: true,
      value: { subtle: { digest }, getRandomValues: crypto.getRandomValues.bind(crypto) },
    });
  });
  afterEach(() => Object.defineProperty(globalThis, 'crypto', { configurable: true, value: crypto }));

  it('are told with the take they are, and can be sent all the same', async () => {
    let asked = '';
    const before = { id: takeId, number: 12, title: 'felt beater' };
    const page = open({
      [`GET ${paths.sameFiles}`]: () => {
        asked = page.requests.findLast(({ path }) => path.startsWith(paths.sameFiles))!.path;
        const items = asked
          .split('sha256=')[1]
          .split(',')
          .map((sha256) => ({ sha256, take: before }));
        return json({ items })();
      },
    });
    await pick(page.container, kick(), overhead());
    expect(await screen.findByText('You sent these files before:')).toBeInTheDocument();
    expect(screen.getByText(/they are take 12, “felt beater”/)).toBeInTheDocument();
    expect(asked).toMatch(/sha256=[0-9a-f]{64},[0-9a-f]{64}$/);
    await measure();
    await waitFor(() => expect(page.uploads).toHaveLength(1));
  });

  it('are not told where nothing is known of them, and nothing waits for it', async () => {
    const page = open({ [`GET ${paths.sameFiles}`]: refusal(503, 'storage-unavailable', 'Away.') });
    await sendPair(page);
    expect(screen.queryByText(/sent before/)).not.toBeInTheDocument();
  });
});

describe('the setup of a new take', () => {
  const setups = (currentId: string | null) => ({
    [`GET ${paths.setups}`]: json({ items: [sampleSetupItem()], currentId }),
  });

  it('is sent along', async () => {
    const page = open(setups(null));
    await pick(page.container, kick(), overhead());
    await headlineIs(/^Both files are here/);
    await userEvent.selectOptions(await screen.findByLabelText('Setup'), 'one overhead, high');
    await measure();
    await waitFor(() => expect(page.uploads).toHaveLength(1));
    expect(page.uploads[0].form?.get('setupId')).toBe(sampleSetupItem().id);
  });

  it('begins with how things stand now, and may be none', async () => {
    const page = open(setups(sampleSetupItem().id));
    await pick(page.container, kick(), overhead());
    await headlineIs(/^Both files are here/);
    expect(await screen.findByLabelText('Setup')).toHaveDisplayValue('one overhead, high');
    await userEvent.selectOptions(screen.getByLabelText('Setup'), 'none written down');
    await measure();
    await waitFor(() => expect(page.uploads).toHaveLength(1));
    expect(page.uploads[0].form?.get('setupId')).toBeNull();
  });

  it('is not asked for before there is one', async () => {
    const page = open({ [`GET ${paths.setups}`]: json({ items: [], currentId: null }) });
    await pick(page.container, kick(), overhead());
    await headlineIs(/^Both files are here/);
    expect(screen.queryByLabelText('Setup')).not.toBeInTheDocument();
  });
});

describe('the page that adds a take', () => {
  it('shows someone new the check take, with the caution for their ears', async () => {
    open({ [`GET ${paths.takes}`]: json(sampleList([])) });
    await headlineIs(/^Your first take needs 45 seconds/);
    expect(screen.getByRole('heading', { name: 'The check take' })).toBeInTheDocument();
    expect(screen.getByText(/Protect your ears/)).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Choose files' })).toBeInTheDocument();
  });

  it('waits until it knows whether this is the first take', () => {
    open({ [`GET ${paths.takes}`]: () => new Promise(() => undefined) });
    expect(screen.getByRole('status', { name: 'Loading' })).toBeInTheDocument();
  });

  it('works even when the list of takes can’t be read', async () => {
    open({ [`GET ${paths.takes}`]: refusal(500, 'internal', 'Try again in a moment.') });
    await headlineIs(/^Drop in a kick file and an overhead file/);
  });

  it('says what is missing when sent too early', async () => {
    const { uploads } = open();
    await headlineIs(/^Drop in/);
    await measure();
    expect(screen.getByRole('alert')).toHaveTextContent('Add a kick file and an overhead file first.');
    expect(uploads).toHaveLength(0);
  });
});

describe('picked files', () => {
  it('are read in the browser: facts, roles and what told them', async () => {
    const { container } = open();
    await pick(
      container,
      toneFile('take 1.wav', { tonesHz: [3000] }),
      toneFile('take 2.wav', { tonesHz: [60] }),
    );
    await headlineIs(/^Both files are here/);
    const first = within(rowOf('take 1.wav'));
    expect(first.getByText('24-bit, 48 kHz, mono, 0:01')).toBeInTheDocument();
    expect(first.getByRole('radio', { name: 'overhead' })).toBeChecked();
    expect(first.getByText('guessed by its low end')).toBeInTheDocument();
    await userEvent.click(first.getByRole('radio', { name: 'kick' }));
    expect(within(rowOf('take 2.wav')).getByRole('radio', { name: 'overhead' })).toBeChecked();
    expect(first.getByText('chosen by you')).toBeInTheDocument();
  });

  it('are refused one by one, beside their names', async () => {
    const { container } = open();
    const lossy = new File([new TextEncoder().encode('ID3\u0004rest of a lossy file')], 'room phone.mp3');
    await pick(container, kick(), overhead(), lossy, new File([], 'empty.wav'));
    await headlineIs(/^Both files are here/);
    expect(rowOf('room phone.mp3')).toHaveTextContent(/Not sent: this is an MP3 file/);
    expect(rowOf('empty.wav')).toHaveTextContent(/Not sent: this file is empty/);
    await userEvent.click(screen.getByRole('button', { name: 'Clear empty.wav' }));
    expect(screen.queryByText('empty.wav')).not.toBeInTheDocument();
  });

  it('of different rates are told before anything is sent', async () => {
    const { container, uploads } = open();
    await pick(container, kick(), toneFile('oh_0412.wav', { sampleRateHz: 44_100 }));
    await headlineIs(/^These two don’t belong together/);
    expect(rowOf('oh_0412.wav')).toHaveTextContent('this file has 44.1 kHz and kick_0412.wav has 48 kHz');
    await measure();
    expect(uploads).toHaveLength(0);
  });

  it('beyond two are left aside by name', async () => {
    const { container } = open();
    await pick(container, kick(), overhead(), toneFile('room.wav'));
    await headlineIs(/^Both files are here/);
    await waitFor(() => expect(rowOf('room.wav')).toHaveTextContent(/Left aside: a take has two files/));
  });

  it('may be one stereo file with a microphone on each side', async () => {
    const { container, uploads } = open();
    await pick(container, toneFile('take.wav', { tonesHz: [3000, 60] }));
    await headlineIs(/^One stereo file is here/);
    const right = screen.getByRole('group', { name: 'Microphone of take.wav, right side' });
    expect(within(right).getByRole('radio', { name: 'kick' })).toBeChecked();
    await measure();
    await waitFor(() => expect(uploads).toHaveLength(1));
    expect(JSON.parse(uploads[0].form!.get('tracks') as string)).toEqual([
      { role: 'overhead', fileIndex: 0, channel: 0 },
      { role: 'kick', fileIndex: 0, channel: 1 },
    ]);
  });

  it('dropped on the list of takes are there from the start', async () => {
    handOverFiles([kick(), overhead()]);
    open();
    await headlineIs(/^Both files are here/);
  });

  it('can be dropped anywhere on the page', async () => {
    open();
    await headlineIs(/^Drop in/);
    const file = kick();
    const items = [{ kind: 'file', type: 'audio/wav', getAsFile: () => file }];
    const dataTransfer = { types: ['Files'], files: [file], items };
    fireEvent.dragEnter(document.body, { dataTransfer });
    fireEvent.drop(screen.getByText('Let go to add the files'), { dataTransfer });
    await headlineIs(/^Now the overhead file/);
  });
});

describe('sending', () => {
  it('posts text first, then the files, and opens the sheet', async () => {
    const page = open();
    await pick(page.container, kick(), overhead());
    await headlineIs(/^Both files are here/);
    await userEvent.type(screen.getByLabelText('Title'), 'overhead at 100');
    await userEvent.type(screen.getByLabelText('Note'), 'Same groove.');
    await measure();
    await waitFor(() => expect(page.uploads).toHaveLength(1));
    const { opened, headers, form } = page.uploads[0];
    expect(opened).toBe(`POST ${paths.takes}`);
    expect(headers).toEqual({ [appHeader.name]: appHeader.value });
    expect([...form!.keys()]).toEqual([
      'uploadKey',
      'title',
      'note',
      'recordedAt',
      'doneActions',
      'tags',
      'tracks',
      'files',
      'files',
    ]);
    const fields = Object.fromEntries([...form!.entries()].filter(([name]) => name !== 'files'));
    const request = createTakeRequest.parse({ ...fields, ...fromJson(fields) });
    expect(request).toMatchObject({ title: 'overhead at 100', note: 'Same groove.' });
    expect(form!.getAll('files').map((file) => (file as File).name)).toEqual([
      'kick_0412.wav',
      'oh_0412.wav',
    ]);
    await page.uploads[0].answer(201, { ...kept, title: 'overhead at 100', note: 'Same groove.' });
    await waitFor(() => expect(page.address()).toBe(`/takes/${takeId}`));
    expect(page.requests.some(({ method }) => method === 'PATCH')).toBe(false);
  });

  it('carries the ticks of the sheet before over, corrected here', async () => {
    const before = sampleTake({ tickedActions: ['flip-overhead'] });
    const page = open({
      [`GET ${paths.take(takeId)}`]: json(before),
      [`GET ${paths.takes}`]: json(sampleList([sampleListItem({ id: takeId })])),
      [`GET ${paths.report(takeId)}`]: json(sampleReport()),
    });
    await pick(page.container, kick(), overhead());
    expect(
      await screen.findByRole('heading', { name: 'What you changed since take 14' }),
    ).toBeInTheDocument();
    expect(screen.getByRole('checkbox', { name: /Press the polarity switch/ })).toBeChecked();
    await userEvent.click(screen.getByRole('checkbox', { name: /Turn the kick preamp down/ }));
    await measure();
    await waitFor(() => expect(page.uploads).toHaveLength(1));
    const form = page.uploads[0].form!;
    expect(form.get('followsTakeId')).toBe(takeId);
    expect(JSON.parse(form.get('doneActions') as string)).toEqual(['flip-overhead', 'kick-gain']);
  });

  it('lets a take follow no other', async () => {
    const page = open({
      [`GET ${paths.take(takeId)}`]: json(sampleTake()),
      [`GET ${paths.takes}`]: json(sampleList([sampleListItem({ id: takeId })])),
      [`GET ${paths.report(takeId)}`]: json(sampleReport()),
    });
    await pick(page.container, kick(), overhead());
    await userEvent.click(await screen.findByRole('button', { name: 'it doesn’t follow take 14' }));
    await measure();
    await waitFor(() => expect(page.uploads).toHaveLength(1));
    expect(page.uploads[0].form!.get('followsTakeId')).toBeNull();
  });

  it('shows how much of each file is there', async () => {
    const page = open();
    const upload = await sendPair(page);
    const size = kick().size;
    await upload.progress(1.5 * size + 1000, 2 * size + 1000);
    expect(screen.getByRole('progressbar', { name: 'Sent of kick_0412.wav' })).toHaveAttribute(
      'aria-valuenow',
      '100',
    );
    expect(screen.getByRole('progressbar', { name: 'Sent of oh_0412.wav' })).toHaveAttribute(
      'aria-valuenow',
      '50',
    );
    expect(rowOf('kick_0412.wav')).toHaveTextContent('sent');
    expect(rowOf('oh_0412.wav')).toHaveTextContent('36 of 72 kB');
  });

  it('keeps what is written while the files travel', async () => {
    const page = open({ [`PATCH ${paths.take(takeId)}`]: json({ ...kept, title: 'late title' }) });
    const upload = await sendPair(page);
    await userEvent.type(screen.getByLabelText('Title'), 'late title');
    await upload.answer(201, kept);
    await waitFor(() => expect(page.address()).toBe(`/takes/${takeId}`));
    expect(page.requests.find(({ method }) => method === 'PATCH')?.body).toEqual({
      title: 'late title',
      note: '',
    });
  });

  it('can be stopped, with everything still there to send again', async () => {
    const page = open();
    const upload = await sendPair(page);
    await userEvent.click(screen.getByRole('button', { name: 'Stop both' }));
    expect(upload.aborted).toBe(true);
    await headlineIs(/^Stopped\. Nothing was kept/);
    await userEvent.click(screen.getByRole('button', { name: 'Send it again' }));
    await waitFor(() => expect(page.uploads).toHaveLength(2));
  });

  it('tries again with the same key after a lost connection', async () => {
    const page = open();
    const upload = await sendPair(page);
    await upload.loseConnection();
    await headlineIs(/^The connection was lost/);
    await userEvent.click(screen.getByRole('button', { name: 'Send it again' }));
    await waitFor(() => expect(page.uploads).toHaveLength(2));
    expect(page.uploads[1].form!.get('uploadKey')).toBe(upload.form!.get('uploadKey'));
  });

  it('refreshes the session once and goes on', async () => {
    const page = open({ [`POST ${paths.refresh}`]: json({}) });
    const upload = await sendPair(page);
    await upload.answer(401, { code: 'not-signed-in', message: 'Sign in first.' });
    await waitFor(() => expect(page.uploads).toHaveLength(2));
    await page.uploads[1].answer(201, kept);
    await waitFor(() => expect(page.address()).toBe(`/takes/${takeId}`));
  });

  it('puts the server’s refusal beside the file it speaks of', async () => {
    const page = open();
    const upload = await sendPair(page);
    const message = 'oh_0412.wav is cut off; export it again.';
    await upload.answer(422, { code: 'wav-refused', message, details: { fileIndex: 1 } });
    expect(rowOf('oh_0412.wav')).toHaveTextContent(`Not sent: ${message}`);
    await headlineIs(/^Now the overhead file/);
  });

  it('says what the server says of the whole take', async () => {
    const page = open();
    const upload = await sendPair(page);
    await upload.answer(503, {
      code: 'storage-unavailable',
      message: 'The store is away. Try again in a moment.',
    });
    await headlineIs(/^This take was not kept/);
    expect(screen.getByRole('alert')).toHaveTextContent('The store is away.');
    expect(screen.getByRole('button', { name: 'Send it again' })).toBeInTheDocument();
  });

  it('asks before the page is left, in the app and in the browser', async () => {
    const page = open();
    const upload = await sendPair(page);
    const closing = new Event('beforeunload', { cancelable: true });
    window.dispatchEvent(closing);
    expect(closing.defaultPrevented).toBe(true);
    await userEvent.click(screen.getByRole('link', { name: 'Takes' }));
    expect(screen.getByRole('alertdialog')).toHaveTextContent('Files are still on their way.');
    await userEvent.click(screen.getByRole('button', { name: 'Stay here' }));
    expect(page.address()).toBe('/takes/new');
    expect(upload.aborted).toBe(false);
    await userEvent.click(screen.getByRole('link', { name: 'Takes' }));
    await userEvent.click(screen.getByRole('button', { name: 'Leave and stop them' }));
    await waitFor(() => expect(page.address()).toBe('/takes'));
    expect(upload.aborted).toBe(true);
  });
});
