import { paths } from '@thudline/contracts';
import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { UnsubscribePage } from './UnsubscribePage';

const token = 'a-token-of-one-mail-only';

function open(routes: FakeRoutes = {}) {
  let wanted = true;
  const server = fakeServer({
    [`POST ${paths.readMailChoice}`]: () => ({ json: { choice: 'notes', wanted } }),
    [`POST ${paths.mailChoice}`]: (body) => {
      ({ wanted } = body as { wanted: boolean });
      return { json: { choice: 'notes', wanted } };
    },
    ...routes,
  });
  renderPage([{ path: '/unsubscribe/:token', element: <UnsubscribePage /> }], `/unsubscribe/${token}`);
  return server;
}

describe('the link at the foot of a mail', () => {
  it('stops such mails with one button, and sends them again', async () => {
    const { requests } = open();
    expect(screen.getByRole('status', { name: 'Loading' })).toBeInTheDocument();
    await userEvent.click(await screen.findByRole('button', { name: 'Stop these mails' }));
    expect(
      await screen.findByRole('heading', { name: /^Stopped\. You get no more mails about notes/ }),
    ).toBeVisible();
    await userEvent.click(screen.getByRole('button', { name: 'Send them again' }));
    expect(await screen.findByRole('button', { name: 'Stop these mails' })).toBeInTheDocument();
    expect(requests.filter(({ path }) => path === paths.mailChoice).map(({ body }) => body)).toEqual([
      { token, wanted: false },
      { token, wanted: true },
    ]);
  });

  it('stops nothing by being opened: mail programs look at links before people do', async () => {
    const { requests } = open();
    await screen.findByRole('button', { name: 'Stop these mails' });
    expect(requests.map(({ path }) => path)).toEqual([paths.readMailChoice]);
  });

  it('says when it is not whole', async () => {
    open({ [`POST ${paths.readMailChoice}`]: refusal(410, 'link-ended', 'This link has ended.') });
    expect(await screen.findByRole('alert')).toHaveTextContent('This link has ended.');
  });

  it('says when it could not be stopped', async () => {
    open({ [`POST ${paths.mailChoice}`]: refusal(500, 'internal', 'Something went wrong here.') });
    await userEvent.click(await screen.findByRole('button', { name: 'Stop these mails' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('Something went wrong here.');
  });
});
