import { paths } from '@thudline/contracts';
import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { ForgotPage } from './ForgotPage';

function open(routes: FakeRoutes) {
  const server = fakeServer(routes);
  renderPage([{ path: '/forgot', element: <ForgotPage /> }], '/forgot');
  return server;
}
const send = async (email: string) => {
  await userEvent.type(screen.getByLabelText('E-mail'), email);
  await userEvent.click(screen.getByRole('button', { name: 'Send the link' }));
};

describe('a forgotten password', () => {
  it('sends a link, and says nothing of whether there is such an account', async () => {
    const { requests } = open({ [`POST ${paths.forgot}`]: () => ({ status: 204 }) });
    await send(' juno@example.org');
    expect(await screen.findByRole('heading', { name: /^Look into your mail\./ })).toBeInTheDocument();
    expect(screen.getByRole('status')).toHaveTextContent(
      'If there is an account for juno@example.org, a mail is on its way.',
    );
    expect(requests).toEqual([{ method: 'POST', path: paths.forgot, body: { email: 'juno@example.org' } }]);
  });

  it('can be sent again', async () => {
    open({ [`POST ${paths.forgot}`]: () => ({ status: 204 }) });
    await send('juno@example.org');
    await userEvent.click(await screen.findByRole('button', { name: 'send it again' }));
    expect(screen.getByRole('button', { name: 'Send the link' })).toBeInTheDocument();
  });

  it('asks for a whole address before it asks the server', async () => {
    const { requests } = open({});
    await send('juno');
    expect(screen.getByLabelText('E-mail')).toHaveAccessibleDescription(/Write a whole e-mail address/);
    expect(screen.getByLabelText('E-mail')).toHaveFocus();
    expect(requests).toEqual([]);
  });

  it('says so when it was asked too often', async () => {
    open({ [`POST ${paths.forgot}`]: refusal(429, 'too-many-requests', 'Wait a minute, then try again.') });
    await send('juno@example.org');
    expect(await screen.findByRole('alert')).toHaveTextContent('Wait a minute, then try again.');
    expect(screen.getByLabelText('E-mail')).toHaveValue('juno@example.org');
  });
});
