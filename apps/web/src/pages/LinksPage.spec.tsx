import { paths, type ShareResponse } from '@thudline/contracts';
import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { sampleMe, takeId } from '../testing/sampleData';
import { sampleShare } from '../testing/sampleShares';
import { LinksPage } from './LinksPage';

const roomId = '01890000-0000-7000-8000-000000000301';
const id = (n: number) => `01890000-0000-7000-8000-00000000020${n}`;

const forOda = sampleShare({ id: id(1), label: 'Oda', openedAt: '2020-01-05T12:00:00.000Z', openCount: 1 });
const ofRoom = sampleShare({
  id: id(2),
  subject: { kind: 'room', roomId },
  about: 'The garage',
  question: '',
});
const over = sampleShare({ id: id(3), label: 'Bex', expiresAt: '2020-01-01T00:00:00.000Z' });

function open(shares: ShareResponse[] = [forOda, ofRoom, over], routes: FakeRoutes = {}) {
  const server = fakeServer({
    [`GET ${paths.me}`]: json(sampleMe),
    [`GET ${paths.shares}`]: () => ({ json: { items: shares } }),
    ...routes,
  });
  renderPage([{ path: '/links', element: <LinksPage /> }], '/links');
  return server;
}

describe('all links in one place', () => {
  it('keeps its place while they are loading', () => {
    open([], { [`GET ${paths.shares}`]: () => new Promise(() => undefined) });
    expect(screen.getByRole('status', { name: 'Loading' })).toBeInTheDocument();
  });

  it('says how many are open, then for whom, what each opens and when it was opened', async () => {
    open();
    expect(await screen.findByRole('heading', { level: 1 })).toHaveTextContent(
      '2 links are open: 1 was not opened yet.',
    );
    const [first, second] = within(screen.getByRole('region', { name: 'Open' })).getAllByRole('listitem');
    expect(first).toHaveTextContent(/^Oda.*Loud chorus.*Sheet.*Opened 5 Jan 2020\..*Open until 11 Dec/);
    expect(within(first).getByRole('link')).toHaveAttribute('href', `/takes/${takeId}`);
    expect(second).toHaveTextContent(/^whoever has it.*The garage.*Room log.*Not opened yet\./);
    expect(within(second).getByRole('link')).toHaveAttribute('href', `/rooms/${roomId}`);
    const ended = within(screen.getByRole('region', { name: 'Ended' })).getByRole('listitem');
    expect(ended).toHaveTextContent('Its time is over.');
  });

  it('ends one at once, and takes it back', async () => {
    const shares = [forOda];
    const set = (revokedAt: string | null) => (shares[0] = { ...shares[0], revokedAt });
    open(shares, {
      [`DELETE ${paths.share(forOda.id)}`]: () => {
        set('2026-12-01T00:00:00.000Z');
        return { status: 204 };
      },
      [`POST ${paths.restoreShare(forOda.id)}`]: () => ({ json: set(null) }),
    });
    await userEvent.click(await screen.findByRole('button', { name: 'End the link for Oda' }));
    expect(await screen.findByRole('button', { name: 'Undo' })).toHaveFocus();
    expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent('No link is open.');
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }));
    expect(await screen.findByRole('button', { name: 'End the link for Oda' })).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Undo' })).not.toBeInTheDocument();
  });

  it('says the next step where nothing was sent', async () => {
    open([]);
    expect(await screen.findByRole('alert')).toHaveTextContent('You have sent nothing yet.');
    expect(screen.getByRole('link', { name: 'Go to your takes' })).toHaveAttribute('href', '/takes');
  });

  it('offers another try when they could not be loaded', async () => {
    let working = false;
    open([], {
      [`GET ${paths.shares}`]: () =>
        working ? json({ items: [forOda] })() : refusal(500, 'internal', 'Try again in a moment.')(),
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('The links could not be loaded.');
    working = true;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByText('Oda')).toBeInTheDocument();
  });
});
