import { paths, type OpenedShareResponse } from '@thudline/contracts';
import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { afterId, beforeId, servedComparison } from '../testing/sampleComparison';
import { takeId } from '../testing/sampleData';
import { roomId, sampleLog, sampleRoom } from '../testing/sampleRooms';
import { servedSheet } from '../testing/sampleSheet';
import { sampleOpenedShare, shareToken } from '../testing/sampleShares';
import { sampleRanking, sampleTryOut, tryOutId } from '../testing/sampleTryOut';
import { SharedPage } from './SharedPage';
// The page loads these when they are needed; here they are there already, so that no test waits for the compiler.
import '../features/shares/components/SharedComparison';
import '../features/shares/components/SharedRoom';
import '../features/shares/components/SharedTryOut';

const guestRights = { rights: { change: false, listen: true, download: false } };
const nobody: FakeRoutes = {
  [`GET ${paths.me}`]: refusal(401, 'not-signed-in', 'Sign in first.'),
  [`POST ${paths.refresh}`]: refusal(401, 'session-ended', 'Sign in again.'),
};

function open(routes: FakeRoutes) {
  const server = fakeServer({
    ...nobody,
    ...servedSheet(guestRights),
    [`POST ${paths.openShare}`]: json(sampleOpenedShare()),
    ...routes,
  });
  return { server, ...renderPage([{ path: '/s/:token', element: <SharedPage /> }], `/s/${shareToken}`) };
}

const linksOnThePage = () => screen.queryAllByRole('link').map((link) => link.getAttribute('href'));

describe('a sheet that was sent', () => {
  it('waits without jumping while the link is opened', () => {
    open({ [`POST ${paths.openShare}`]: () => new Promise(() => undefined) });
    expect(screen.getByRole('status', { name: 'Loading' })).toBeInTheDocument();
  });

  it('says who sent it, what they ask, and the line', async () => {
    open({});
    expect(await screen.findByText('sent by Juno')).toBeInTheDocument();
    expect(screen.getByText(/open until 11 Dec/)).toBeInTheDocument();
    expect(await screen.findByText('May I stop moving the overhead now?')).toBeInTheDocument();
    expect(screen.getByText('Juno asks')).toBeInTheDocument();
    expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent('Flip the overhead:');
  });

  it('exchanges the token once, and no other address carries it', async () => {
    const { server } = open({});
    await screen.findByRole('heading', { name: 'Levels: hot' });
    const opened = server.requests.filter(({ path }) => path === paths.openShare);
    expect(opened).toEqual([{ method: 'POST', path: paths.openShare, body: { token: shareToken } }]);
    expect(server.requests.filter(({ path }) => path.includes(shareToken))).toEqual([]);
  });

  it('can be heard and compared, and has nothing that writes', async () => {
    open({});
    expect(await screen.findByRole('button', { name: /^Hear this take/ })).toBeInTheDocument();
    expect(await screen.findByRole('button', { name: /on repeat$/ })).toBeInTheDocument();
    expect(screen.getByText(/Phone speakers can’t play this low/)).toBeInTheDocument();
    expect(screen.queryByRole('checkbox')).not.toBeInTheDocument();
    for (const name of [/Send this sheet/, /change title or note/, /End this link/])
      expect(screen.queryByRole('button', { name })).not.toBeInTheDocument();
    expect(screen.queryByRole('link', { name: /Add the next take|Big print/ })).not.toBeInTheDocument();
  });

  it('stays read-only for the owner who opens their own link', async () => {
    open({ ...servedSheet() });
    await screen.findByRole('heading', { name: 'Levels: hot' });
    expect(screen.queryByRole('checkbox')).not.toBeInTheDocument();
  });

  it('asks for no sound where the link allows reading only', async () => {
    const { server } = open({
      ...servedSheet({ rights: { change: false, listen: false, download: false } }),
      [`POST ${paths.openShare}`]: json(sampleOpenedShare({ canListen: false, question: '' })),
    });
    expect(await screen.findByRole('img', { name: /Low end of the two added/ })).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: /Hear this take|on repeat/ })).not.toBeInTheDocument();
    expect(screen.queryByText('Juno asks')).not.toBeInTheDocument();
    expect(server.requests.filter(({ path }) => path.startsWith(paths.excerpt(takeId)))).toEqual([]);
  });

  it.each([
    ['an ended link', refusal(410, 'link-ended', 'This link has ended.')],
    ['an unknown link', refusal(404, 'not-found', 'There is nothing here.')],
    ['a link that lost a part', refusal(400, 'bad-request', 'Too short.')],
  ])('says the next step for %s', async (_, answer) => {
    open({ [`POST ${paths.openShare}`]: answer });
    expect(await screen.findByRole('alert')).toHaveTextContent(
      'This link opens nothing any more. It has ended, or a part of it was lost on the way. Ask whoever sent it for a new one.',
    );
    expect(screen.getByRole('link', { name: 'See what Thudline does' })).toHaveAttribute('href', '/');
  });

  it('says the same where the link ended while the sheet was open', async () => {
    open({ [`GET ${paths.take(takeId)}`]: refusal(404, 'not-found', 'There is nothing here.') });
    expect(await screen.findByRole('alert')).toHaveTextContent('This link opens nothing any more.');
  });

  it('says so while the take is still being measured', async () => {
    open(servedSheet({ ...guestRights, hasReport: false }));
    expect(await screen.findByRole('alert')).toHaveTextContent('This sheet isn’t ready yet.');
  });

  it('offers another try when the server is away', async () => {
    let working = false;
    open({
      [`POST ${paths.openShare}`]: () =>
        working ? json(sampleOpenedShare())() : refusal(500, 'internal', 'Try again in a moment.')(),
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('This could not be opened.');
    working = true;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    await waitFor(() => expect(screen.getByText('sent by Juno')).toBeInTheDocument());
  });

  describe('with a passphrase', () => {
    const asking = (answers: FakeRoutes[string][]) =>
      open({ [`POST ${paths.openShare}`]: () => (answers.shift() ?? needed)(undefined) });
    const needed = refusal(403, 'passphrase-needed', 'This link asks for a passphrase.');
    const wrong = refusal(403, 'wrong-passphrase', 'This is not the passphrase.');

    it('tells nothing before it is given, says when it is wrong, and opens with the right one', async () => {
      const { server } = asking([needed, wrong, json(sampleOpenedShare())]);
      const field = await screen.findByLabelText('Passphrase');
      expect(document.body).not.toHaveTextContent('Juno');
      await userEvent.type(field, 'guess{Enter}');
      expect(await screen.findByText('This is not the passphrase.')).toBeInTheDocument();
      await userEvent.clear(field);
      await userEvent.type(field, 'brushes{Enter}');
      expect(await screen.findByText('sent by Juno')).toBeInTheDocument();
      const given = server.requests.filter(({ path }) => path === paths.openShare).map(({ body }) => body);
      expect(given).toEqual([
        { token: shareToken },
        { token: shareToken, passphrase: 'guess' },
        { token: shareToken, passphrase: 'brushes' },
      ]);
    });

    it('asks for something to be written', async () => {
      asking([needed]);
      await userEvent.click(await screen.findByRole('button', { name: 'Open it' }));
      expect(await screen.findByText('Write the passphrase first.')).toBeInTheDocument();
    });
  });

  describe('that is more than a sheet', () => {
    const shown = (subject: OpenedShareResponse['subject'], routes: FakeRoutes) =>
      open({ [`POST ${paths.openShare}`]: json(sampleOpenedShare({ subject })), ...routes });

    it('shows a try-out to read and hear, with nothing to choose and no way to its sheets', async () => {
      shown(
        { kind: 'try-out', tryOutId },
        {
          [`GET ${paths.tryOut(tryOutId)}`]: json(sampleTryOut()),
          [`GET ${paths.tryOutRanking(tryOutId)}`]: json(sampleRanking()),
        },
      );
      expect(await screen.findByRole('table', { name: 'The takes, best first' })).toBeInTheDocument();
      expect(screen.getByText('May I stop moving the overhead now?')).toBeInTheDocument();
      expect(screen.queryByRole('radio', { name: /wins$/ })).not.toBeInTheDocument();
      expect(linksOnThePage()).toEqual(['#page', '/']);
    });

    it('shows a room’s log to read, with nothing to change and no way to its sheets', async () => {
      shown(
        { kind: 'room', roomId },
        {
          [`GET ${paths.room(roomId)}`]: json(sampleRoom()),
          [`GET ${paths.roomChanges(roomId)}`]: json({ ...sampleLog(), takes: [] }),
          [`GET ${paths.roomTrend(roomId)}`]: json({ figure: 'decay-500', points: [] }),
        },
      );
      expect(await screen.findByRole('heading', { name: 'What changed, newest first' })).toBeInTheDocument();
      expect(screen.queryByRole('button', { name: /changed something|edit/ })).not.toBeInTheDocument();
      expect(linksOnThePage()).toEqual(['#page', '/']);
    });

    it('shows a comparison of these two takes and no others', async () => {
      const { server } = shown(
        { kind: 'comparison', takeId: beforeId, otherTakeId: afterId },
        {
          ...servedComparison(),
          ...nobody,
        },
      );
      expect(await screen.findByRole('table', { name: 'What differed' })).toBeInTheDocument();
      expect(screen.queryByRole('combobox')).not.toBeInTheDocument();
      expect(linksOnThePage()).toEqual(['#page', '/']);
      expect(server.requests.some(({ path }) => path.startsWith(`${paths.takes}?`))).toBe(false);
    });

    it.each([
      ['a try-out', { kind: 'try-out', tryOutId: takeId }, paths.tryOut(takeId)],
      ['a room', { kind: 'room', roomId: takeId }, paths.room(takeId)],
    ] as const)('says that %s has ended meanwhile', async (_, subject, path) => {
      shown(subject, {
        [`GET ${path}`]: refusal(404, 'not-found', 'There is nothing here.'),
        [`GET ${paths.roomChanges(takeId)}`]: refusal(404, 'not-found', 'There is nothing here.'),
      });
      expect(await screen.findByRole('alert')).toHaveTextContent('This link opens nothing any more.');
    });
  });
});
