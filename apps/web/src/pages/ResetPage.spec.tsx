import { paths } from '@thudline/contracts';
import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { ResetPage } from './ResetPage';

const token = 'a-token-of-one-mail-only';

function open(routes: FakeRoutes) {
  const server = fakeServer(routes);
  renderPage([{ path: '/reset/:token', element: <ResetPage /> }], `/reset/${token}`);
  return server;
}
const setIt = async (password: string) => {
  await userEvent.type(screen.getByLabelText('New password'), password);
  await userEvent.click(screen.getByRole('button', { name: 'Set it' }));
};

describe('the link to set a new password', () => {
  it('sets it and leads to sign in', async () => {
    const { requests } = open({ [`POST ${paths.reset}`]: () => ({ status: 204 }) });
    await setIt('a-quiet-kit-8');
    expect(await screen.findByRole('heading', { name: /^Your new password is set\./ })).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Sign in' })).toHaveAttribute('href', '/sign-in');
    expect(requests[0]).toEqual({
      method: 'POST',
      path: paths.reset,
      body: { token, password: 'a-quiet-kit-8' },
    });
  });

  it('says how long a password is before it asks the server', async () => {
    const { requests } = open({});
    await setIt('short');
    expect(screen.getByLabelText('New password')).toHaveAccessibleDescription(
      'A password needs at least 10 characters.',
    );
    expect(requests).toEqual([]);
  });

  it('offers a new link when it was used before', async () => {
    open({ [`POST ${paths.reset}`]: refusal(410, 'link-ended', 'This link has ended.') });
    await setIt('a-quiet-kit-8');
    expect(await screen.findByRole('heading', { name: /^This link has ended\./ })).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Send a new link' })).toHaveAttribute('href', '/forgot');
  });

  it('keeps what was typed when the server is away', async () => {
    open({ [`POST ${paths.reset}`]: () => Promise.reject(new TypeError('Failed to fetch')) });
    await setIt('a-quiet-kit-8');
    expect(await screen.findByRole('alert')).toHaveTextContent('The server did not answer.');
    expect(screen.getByLabelText('New password')).toHaveValue('a-quiet-kit-8');
  });
});
