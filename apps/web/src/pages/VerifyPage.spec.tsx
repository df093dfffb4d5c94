import { paths } from '@thudline/contracts';
import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { StrictMode } from 'react';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { sampleMe } from '../testing/sampleData';
import { VerifyPage } from './VerifyPage';

const token = 'a-token-of-one-mail-only';

function open(routes: FakeRoutes) {
  const server = fakeServer({ [`GET ${paths.me}`]: json(sampleMe), ...routes });
  const page = (
    <StrictMode>
      <VerifyPage />
    </StrictMode>
  );
  renderPage([{ path: '/verify/:token', element: page }], `/verify/${token}`);
  return server;
}

describe('the link that says an address is right', () => {
  it('is redeemed once and says so', async () => {
    const { requests } = open({ [`POST ${paths.verify}`]: () => ({ status: 204 }) });
    expect(screen.getByRole('status', { name: 'Loading' })).toBeInTheDocument();
    expect(await screen.findByRole('heading', { name: /^Your address is right\./ })).toBeInTheDocument();
    expect(await screen.findByRole('link', { name: 'Go to your takes' })).toHaveAttribute('href', '/takes');
    expect(requests.filter(({ path }) => path === paths.verify)).toEqual([
      { method: 'POST', path: paths.verify, body: { token } },
    ]);
  });

  it('leads to sign in where nobody is signed in', async () => {
    open({
      [`POST ${paths.verify}`]: () => ({ status: 204 }),
      [`GET ${paths.me}`]: refusal(401, 'not-signed-in', 'Sign in first.'),
      [`POST ${paths.refresh}`]: refusal(401, 'session-ended', 'Sign in again.'),
    });
    expect(await screen.findByRole('link', { name: 'Sign in' })).toHaveAttribute('href', '/sign-in');
  });

  it('says when it has ended, and where a new one comes from', async () => {
    open({ [`POST ${paths.verify}`]: refusal(410, 'link-ended', 'This link has ended.') });
    expect(await screen.findByRole('heading', { name: /^This link has ended\./ })).toBeInTheDocument();
    expect(await screen.findByRole('link', { name: 'Send a new one from the settings' })).toHaveAttribute(
      'href',
      '/settings',
    );
  });

  it('is tried again when the server was away', async () => {
    let away = true;
    open({
      [`POST ${paths.verify}`]: () =>
        away ? Promise.reject(new TypeError('Failed to fetch')) : { status: 204 },
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('The address could not be confirmed.');
    away = false;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByRole('heading', { name: /^Your address is right\./ })).toBeInTheDocument();
  });
});
