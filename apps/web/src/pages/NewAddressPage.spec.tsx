import { paths } from '@thudline/contracts';
import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { sampleMe } from '../testing/sampleData';
import { NewAddressPage } from './NewAddressPage';

const token = 'a-token-of-one-mail-only';

function open(routes: FakeRoutes) {
  const server = fakeServer({ [`GET ${paths.me}`]: json(sampleMe), ...routes });
  renderPage([{ path: '/new-address/:token', element: <NewAddressPage /> }], `/new-address/${token}`);
  return server;
}

describe('the link that makes another address count', () => {
  it('is redeemed and says so', async () => {
    const { requests } = open({ [`POST ${paths.confirmEmail}`]: () => ({ status: 204 }) });
    expect(screen.getByRole('status', { name: 'Loading' })).toBeInTheDocument();
    expect(
      await screen.findByRole('heading', { name: /^Your address is the new one\./ }),
    ).toBeInTheDocument();
    expect(requests.filter(({ method }) => method === 'POST')).toEqual([
      { method: 'POST', path: paths.confirmEmail, body: { token } },
    ]);
  });

  it('says when it has ended, and where another one comes from', async () => {
    open({ [`POST ${paths.confirmEmail}`]: refusal(410, 'link-ended', 'This link has ended.') });
    expect(await screen.findByRole('link', { name: 'Ask again from the settings' })).toBeInTheDocument();
  });

  it('says when somebody else has the address now, and is tried again when the server was away', async () => {
    let away = true;
    open({
      [`POST ${paths.confirmEmail}`]: () =>
        away ? refusal(409, 'email-taken', 'This e-mail address has an account already.')() : { status: 204 },
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('This e-mail address has an account already.');
    away = false;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(
      await screen.findByRole('heading', { name: /^Your address is the new one\./ }),
    ).toBeInTheDocument();
  });
});
