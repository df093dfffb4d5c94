import { paths } from '@thudline/contracts';
import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { GuestOnly } from '../app/gates';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { sampleMe } from '../testing/sampleData';
import { JoinPage } from './JoinPage';

function open(routes: FakeRoutes, at = '/join') {
  const server = fakeServer({
    [`GET ${paths.me}`]: refusal(401, 'not-signed-in', 'Sign in first.'),
    [`POST ${paths.refresh}`]: refusal(401, 'session-ended', 'Sign in again.'),
    [`GET ${paths.signUp}`]: json({ signUp: 'open' }),
    ...routes,
  });
  const pages = [{ element: <GuestOnly />, children: [{ path: '/join', element: <JoinPage /> }] }];
  return { ...server, ...renderPage(pages, at) };
}

async function join(password = 'drumsdrums') {
  await userEvent.type(await screen.findByLabelText('Name'), 'Juno');
  await userEvent.type(screen.getByLabelText('E-mail'), 'juno@example.org');
  await userEvent.type(screen.getByLabelText('Password'), password);
  await userEvent.click(screen.getByRole('button', { name: 'Join' }));
}

describe('joining', () => {
  it('leads to the first take', async () => {
    const { requests, address } = open({ [`POST ${paths.join}`]: json(sampleMe, 201) });
    await join();
    await waitFor(() => expect(address()).toBe('/takes/new'));
    expect(requests.at(-1)?.body).toEqual({
      name: 'Juno',
      email: 'juno@example.org',
      password: 'drumsdrums',
    });
  });

  it('tells the rule for passwords beforehand and holds to it', async () => {
    const { requests } = open({});
    expect(await screen.findByLabelText('Password')).toHaveAccessibleDescription('At least 10 characters');
    await join('short');
    expect(screen.getByLabelText('Password')).toHaveAccessibleDescription(
      'A password needs at least 10 characters.',
    );
    expect(requests.some(({ path }) => path === paths.join)).toBe(false);
  });

  it('puts a taken address beside the address', async () => {
    const taken = 'This address has an account already. Sign in instead.';
    open({ [`POST ${paths.join}`]: refusal(409, 'email-taken', taken) });
    await join();
    await waitFor(() => expect(screen.getByLabelText('E-mail')).toHaveAccessibleDescription(taken));
    expect(screen.getByLabelText('Name')).toHaveValue('Juno');
  });

  it('puts what the server says of a field beside it, and never loses what it says of none', async () => {
    let fields: Record<string, string> = { name: 'That name is taken by the house.' };
    open({
      [`POST ${paths.join}`]: () => ({
        status: 400,
        json: { code: 'bad-request', message: 'Something is missing.', details: { fields } },
      }),
    });
    await join();
    await waitFor(() =>
      expect(screen.getByLabelText('Name')).toHaveAccessibleDescription(/taken by the house/),
    );
    fields = { shoeSize: 'Too large.' };
    await userEvent.click(screen.getByRole('button', { name: 'Join' }));
    expect(await screen.findByText('Something is missing.')).toBeInTheDocument();
  });

  it('says above the button what belongs to no field', async () => {
    open({ [`POST ${paths.join}`]: refusal(429, 'too-many-requests', 'Too many tries. Wait a minute.') });
    await join();
    expect(await screen.findByRole('alert')).toHaveTextContent('Too many tries. Wait a minute.');
  });
});

describe('joining by invitation', () => {
  const byInvitation = { [`GET ${paths.signUp}`]: json({ signUp: 'invited' }) };

  it('says so to whoever has none', async () => {
    open(byInvitation);
    expect(await screen.findByRole('heading', { name: /^By invitation\./ })).toBeInTheDocument();
    expect(screen.queryByLabelText('Name')).not.toBeInTheDocument();
  });

  it('hands in the one of the mail', async () => {
    const { requests } = open(
      { ...byInvitation, [`POST ${paths.join}`]: json(sampleMe, 201) },
      '/join?invitation=a-token-of-the-mail',
    );
    await join();
    await waitFor(() =>
      expect(requests.find(({ path }) => path === paths.join)?.body).toMatchObject({
        name: 'Juno',
        invitation: 'a-token-of-the-mail',
      }),
    );
  });
});
