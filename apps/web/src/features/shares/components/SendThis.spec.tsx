import { paths, type ShareResponse } from '@thudline/contracts';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../../../testing/fakeServer';
import { renderPage } from '../../../testing/renderPage';
import { takeId } from '../../../testing/sampleData';
import { sampleCreatedShare, sampleShare } from '../../../testing/sampleShares';
import { SendThis } from './SendThis';

const createdUrl = sampleCreatedShare().url ?? '';
const subject = { kind: 'take', takeId } as const;

function open(routes: FakeRoutes = {}, shares: ShareResponse[] = []) {
  const server = fakeServer({
    [`GET ${paths.sharesOf(subject)}`]: () => ({ json: { items: shares } }),
    [`POST ${paths.shares}`]: json(sampleCreatedShare(), 201),
    ...routes,
  });
  renderPage([{ path: '/', element: <SendThis subject={subject} /> }], '/');
  return server;
}

const openDialog = async () => {
  await userEvent.click(screen.getByRole('button', { name: 'Send this sheet' }));
  return screen.findByRole('dialog', { name: 'Send this sheet' });
};

describe('sending a sheet', () => {
  it('says that nobody has it while there is no link', async () => {
    open();
    expect(await screen.findByText(/Nobody has it yet/)).toBeInTheDocument();
  });

  it('makes a link for a week with listening and no files unless told otherwise', async () => {
    const server = open();
    const dialog = await openDialog();
    await userEvent.click(within(dialog).getByRole('button', { name: 'Make the link' }));
    await screen.findByRole('dialog', { name: 'The link is ready' });
    expect(server.requests).toContainEqual({
      method: 'POST',
      path: paths.shares,
      body: {
        subject,
        label: '',
        question: '',
        expiresInDays: 7,
        canListen: true,
        canDownload: false,
        canNote: false,
      },
    });
  });

  it('sends what was asked and chosen', async () => {
    const server = open();
    const dialog = await openDialog();
    await userEvent.type(within(dialog).getByLabelText(/Who is it for/), 'Oda');
    await userEvent.type(within(dialog).getByLabelText(/A passphrase/), 'brushes');
    await userEvent.click(within(dialog).getByRole('checkbox', { name: 'They may leave notes' }));
    await userEvent.click(within(dialog).getByRole('button', { name: 'What would you change first?' }));
    await userEvent.click(within(dialog).getByRole('radio', { name: 'until I end it' }));
    await userEvent.click(within(dialog).getByRole('checkbox', { name: 'They may listen' }));
    await userEvent.click(within(dialog).getByRole('checkbox', { name: 'They may download the files' }));
    await userEvent.click(within(dialog).getByRole('button', { name: 'Make the link' }));
    await waitFor(() =>
      expect(server.requests).toContainEqual({
        method: 'POST',
        path: paths.shares,
        body: {
          subject,
          label: 'Oda',
          passphrase: 'brushes',
          question: 'What would you change first?',
          expiresInDays: null,
          canListen: false,
          canDownload: true,
          canNote: true,
        },
      }),
    );
  });

  it('tells the address once, copies it, and says that it is told only now', async () => {
    open();
    const user = userEvent.setup();
    await user.click(within(await openDialog()).getByRole('button', { name: 'Make the link' }));
    const dialog = await screen.findByRole('dialog', { name: 'The link is ready' });
    expect(within(dialog).getByText(/told only this once/)).toBeInTheDocument();
    expect(within(dialog).getByLabelText('Address of the link')).toHaveValue(createdUrl);
    await user.click(within(dialog).getByRole('button', { name: 'Copy' }));
    expect(await within(dialog).findByText(/Copied\. Paste it/)).toBeInTheDocument();
    expect(await navigator.clipboard.readText()).toBe(createdUrl);
  });

  it('selects the address where the browser does not copy', async () => {
    open();
    const user = userEvent.setup();
    await user.click(within(await openDialog()).getByRole('button', { name: 'Make the link' }));
    jest.spyOn(navigator.clipboard, 'writeText').mockRejectedValue(new Error('refused'));
    await user.click(screen.getByRole('button', { name: 'Copy' }));
    expect(await screen.findByText(/copy it by hand/)).toBeInTheDocument();
    const field: HTMLInputElement = screen.getByLabelText('Address of the link');
    expect(field.selectionEnd).toBe(createdUrl.length);
  });

  it('keeps what was written when the link could not be made', async () => {
    open({ [`POST ${paths.shares}`]: refusal(429, 'too-many-requests', 'Wait a minute.') });
    const dialog = await openDialog();
    await userEvent.type(within(dialog).getByLabelText(/Your question/), 'Why so thin?');
    await userEvent.click(within(dialog).getByRole('button', { name: 'Make the link' }));
    expect(await within(dialog).findByRole('alert')).toHaveTextContent('Wait a minute.');
    expect(within(dialog).getByLabelText(/Your question/)).toHaveValue('Why so thin?');
  });

  it('lists open links with what became of them, and folds ended ones', async () => {
    const ended = sampleShare({
      id: '01890000-0000-7000-8000-000000000102',
      question: 'Old one',
      revokedAt: '2026-12-01T00:00:00.000Z',
    });
    open({}, [sampleShare({ openCount: 3, openedAt: '2020-01-05T12:00:00.000Z' }), ended]);
    const list = await screen.findByRole('list', { name: 'Links that open this sheet' });
    expect(within(list).getAllByRole('listitem')).toHaveLength(1);
    expect(list).toHaveTextContent('Opened 5 Jan 2020, 3 times so far. Open until 11 Dec, with listening.');
    expect(screen.getByText('1 link ended')).toBeInTheDocument();
  });

  it('mails it instead where an address is given, and tells no link', async () => {
    const mailed = { ...sampleCreatedShare({ mailedTo: 'bex@example.org', hasPassphrase: true }), url: null };
    const server = open({ [`POST ${paths.shares}`]: json(mailed, 201) });
    const dialog = await openDialog();
    await userEvent.type(within(dialog).getByLabelText(/Mail it to/), 'bex@example.org');
    await userEvent.click(within(dialog).getByRole('button', { name: 'Mail the link' }));
    const done = await screen.findByRole('dialog', { name: 'The mail is on its way' });
    expect(done).toHaveTextContent('It goes to bex@example.org.');
    expect(done).toHaveTextContent('Tell them the passphrase yourself');
    const sent = server.requests.find(({ method }) => method === 'POST');
    expect(sent?.body).toMatchObject({ mailTo: 'bex@example.org' });
  });

  it('asks for the day before a link until a day is made', async () => {
    const server = open();
    const dialog = await openDialog();
    await userEvent.click(within(dialog).getByRole('radio', { name: 'until a day' }));
    await userEvent.click(within(dialog).getByRole('button', { name: 'Make the link' }));
    expect(within(dialog).getByRole('alert')).toHaveTextContent('Choose the day until which it opens.');
    expect(server.requests.some(({ method }) => method === 'POST')).toBe(false);
  });

  it('lets a room’s log be read, and offers neither sound nor files nor notes', async () => {
    const room = { kind: 'room', roomId: takeId } as const;
    fakeServer({ [`GET ${paths.sharesOf(room)}`]: json({ items: [] }) });
    renderPage([{ path: '/', element: <SendThis subject={room} /> }], '/');
    await userEvent.click(screen.getByRole('button', { name: 'Send this room log' }));
    const dialog = await screen.findByRole('dialog', { name: 'Send this room log' });
    expect(within(dialog).queryByRole('checkbox')).not.toBeInTheDocument();
    expect(dialog).toHaveTextContent('It opens this room’s log, and none of its sheets.');
  });

  it('ends a link at once, and opens it again when that is taken back', async () => {
    const shares = [sampleShare({ label: 'Oda' })];
    const set = (revokedAt: string | null) => (shares[0] = { ...shares[0], revokedAt });
    open(
      {
        [`DELETE ${paths.share(shares[0].id)}`]: () => {
          set('2026-12-01T00:00:00.000Z');
          return { status: 204 };
        },
        [`POST ${paths.restoreShare(shares[0].id)}`]: () => ({ json: set(null) }),
      },
      shares,
    );
    expect(await screen.findByText(/Oda has it/)).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'End this link' }));
    expect(await screen.findByText('1 link ended')).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }));
    expect(await screen.findByRole('button', { name: 'End this link' })).toBeInTheDocument();
    expect(screen.queryByText('1 link ended')).not.toBeInTheDocument();
  });

  it('says why a link could not be ended', async () => {
    open(
      { [`DELETE ${paths.share(sampleShare().id)}`]: refusal(500, 'internal', 'Try again in a moment.') },
      [sampleShare()],
    );
    await userEvent.click(await screen.findByRole('button', { name: 'End this link' }));
    expect(await screen.findByText('Try again in a moment.')).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'End this link' })).toBeInTheDocument();
  });

  it('offers another try when the links could not be loaded', async () => {
    let working = false;
    open({
      [`GET ${paths.sharesOf(subject)}`]: () =>
        working ? { json: { items: [] } } : refusal(500, 'internal', 'Try again in a moment.')(),
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('The links could not be loaded.');
    working = true;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByText(/Nobody has it yet/)).toBeInTheDocument();
  });
});
