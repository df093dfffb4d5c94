import { paths } from '@thudline/contracts';
import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { sampleMe } from '../testing/sampleData';
import { HomePage } from './HomePage';

function open(routes: FakeRoutes) {
  fakeServer({ [`POST ${paths.refresh}`]: refusal(401, 'session-ended', 'Sign in again.'), ...routes });
  return renderPage([{ path: '/', element: <HomePage /> }], '/');
}

describe('the first page', () => {
  it('waits until it knows who is there', () => {
    open({ [`GET ${paths.me}`]: () => new Promise(() => undefined) });
    expect(screen.getByRole('status', { name: 'Loading' })).toBeInTheDocument();
  });

  it('tells a guest what this does, and the two ways in', async () => {
    open({ [`GET ${paths.me}`]: refusal(401, 'not-signed-in', 'Sign in first.') });
    expect(await screen.findByRole('heading', { level: 1 })).toHaveTextContent(
      'Drop in a kick file and an overhead file. Read what to change before the next take.',
    );
    expect(screen.getByRole('link', { name: 'Join' })).toHaveAttribute('href', '/join');
    expect(screen.getByRole('link', { name: 'Sign in' })).toHaveAttribute('href', '/sign-in');
  });

  it('leads someone signed in to their takes', async () => {
    const { address } = open({ [`GET ${paths.me}`]: json(sampleMe) });
    await waitFor(() => expect(address()).toBe('/takes'));
  });

  it('offers another try when the server is away', async () => {
    let working = false;
    open({
      [`GET ${paths.me}`]: () =>
        working ? json(sampleMe)() : refusal(500, 'internal', 'Try again in a moment.')(),
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('This page could not be opened.');
    working = true;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByText('elsewhere')).toBeInTheDocument();
  });
});
