import { paths } from '@thudline/contracts';
import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { takeId } from '../testing/sampleData';
import { servedSheet } from '../testing/sampleSheet';
import { sampleOpenedShare, shareToken } from '../testing/sampleShares';
import { SharedSheetPage } from './SharedSheetPage';

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
  return { server, ...renderPage([{ path: '/s/:token', element: <SharedSheetPage /> }], `/s/${shareToken}`) };
}

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
      'This link opens no sheet. It has ended, or a part of it was lost on the way. Ask whoever sent it for a new one.',
    );
    expect(screen.getByRole('link', { name: 'See what Thudline does' })).toHaveAttribute('href', '/');
  });

  it('says the same where the link ended while the sheet was open', async () => {
    open({ [`GET ${paths.take(takeId)}`]: refusal(404, 'not-found', 'There is nothing here.') });
    expect(await screen.findByRole('alert')).toHaveTextContent('This link opens no sheet.');
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
    expect(await screen.findByRole('alert')).toHaveTextContent('The sheet could not be opened.');
    working = true;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    await waitFor(() => expect(screen.getByText('sent by Juno')).toBeInTheDocument());
  });
});
