import { paths } from '@thudline/contracts';
import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { GuestOnly } from '../app/gates';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { sampleMe } from '../testing/sampleData';
import { SignInPage } from './SignInPage';

const signedOut = refusal(401, 'not-signed-in', 'Sign in first.');

function open(routes: FakeRoutes, state: unknown = null) {
  const server = fakeServer({
    [`GET ${paths.me}`]: signedOut,
    [`POST ${paths.refresh}`]: refusal(401, 'session-ended', 'Sign in again.'),
    ...routes,
  });
  const pages = [{ element: <GuestOnly />, children: [{ path: '/sign-in', element: <SignInPage /> }] }];
  return { ...server, ...renderPage(pages, { pathname: '/sign-in', state }) };
}

async function fill(email: string, password: string) {
  await userEvent.type(await screen.findByLabelText('E-mail'), email);
  await userEvent.type(screen.getByLabelText('Password'), password);
}
const signIn = () => userEvent.click(screen.getByRole('button', { name: 'Sign in' }));

describe('signing in', () => {
  it('sends what was typed once, and goes on to the takes', async () => {
    const { requests, address } = open({ [`POST ${paths.signIn}`]: json(sampleMe) });
    await fill(' juno@example.org', 'drumsdrums');
    await userEvent.keyboard('{Enter}');
    await waitFor(() => expect(address()).toBe('/takes'));
    expect(requests.filter(({ path }) => path === paths.signIn).map(({ body }) => body)).toEqual([
      { email: 'juno@example.org', password: 'drumsdrums', stay: true },
    ]);
  });

  it('goes back to where one wanted to go', async () => {
    const { address } = open({ [`POST ${paths.signIn}`]: json(sampleMe) }, { from: '/takes?after=c1' });
    await fill('juno@example.org', 'drumsdrums');
    await signIn();
    await waitFor(() => expect(address()).toBe('/takes?after=c1'));
  });

  it('stays for this visit only when the box is not ticked', async () => {
    const { requests } = open({ [`POST ${paths.signIn}`]: json(sampleMe) });
    await fill('juno@example.org', 'drumsdrums');
    await userEvent.click(screen.getByRole('checkbox', { name: 'Stay signed in on this device' }));
    await signIn();
    await waitFor(() => expect(requests.at(-1)?.body).toMatchObject({ stay: false }));
  });

  it('does not say which half is wrong, and keeps both', async () => {
    open({ [`POST ${paths.signIn}`]: refusal(401, 'wrong-sign-in', 'No.') });
    await fill('juno@example.org', 'wrong one');
    await signIn();
    expect(await screen.findByRole('alert')).toHaveTextContent(
      'E-mail and password don’t go together. Try again, or set a new password.',
    );
    expect(screen.getByRole('link', { name: 'set a new password' })).toHaveAttribute('href', '/forgot');
    expect(screen.getByLabelText('E-mail')).toHaveValue('juno@example.org');
    expect(screen.getByLabelText('Password')).toHaveValue('wrong one');
    expect(screen.getByLabelText('Password')).toHaveFocus();
  });

  it('asks for what is missing, beside the field, without asking the server', async () => {
    const { requests } = open({});
    await screen.findByLabelText('E-mail');
    await signIn();
    expect(screen.getByLabelText('E-mail')).toHaveAccessibleDescription(/Write a whole e-mail address/);
    expect(screen.getByLabelText('Password')).toHaveAccessibleDescription('Write your password.');
    expect(screen.getByLabelText('E-mail')).toHaveFocus();
    expect(requests.some(({ path }) => path === paths.signIn)).toBe(false);
  });

  it('shows a slow answer on the button and does not send twice', async () => {
    let finish: (answer: { json: unknown }) => void = () => undefined;
    const { requests } = open({
      [`POST ${paths.signIn}`]: () => new Promise((resolve) => (finish = resolve)),
    });
    await fill('juno@example.org', 'drumsdrums');
    await signIn();
    await userEvent.click(await screen.findByRole('button', { name: 'Signing in…' }));
    expect(requests.filter(({ path }) => path === paths.signIn)).toHaveLength(1);
    finish({ json: sampleMe });
    expect(await screen.findByText('elsewhere')).toBeInTheDocument();
  });

  it('says so when the server is away', async () => {
    open({ [`POST ${paths.signIn}`]: () => Promise.reject(new TypeError('Failed to fetch')) });
    await fill('juno@example.org', 'drumsdrums');
    await signIn();
    expect(await screen.findByRole('alert')).toHaveTextContent('The server did not answer.');
  });

  it('has a way on for who forgot the password', async () => {
    open({});
    expect(await screen.findByRole('link', { name: 'Forgot the password?' })).toHaveAttribute(
      'href',
      '/forgot',
    );
  });

  it('lets a password be seen and filled in by the browser', async () => {
    open({});
    const password = await screen.findByLabelText('Password');
    expect(password).toHaveAttribute('type', 'password');
    expect(password).toHaveAttribute('autocomplete', 'current-password');
    expect(screen.getByLabelText('E-mail')).toHaveAttribute('autocomplete', 'username');
    await userEvent.click(screen.getByRole('button', { name: 'show password' }));
    expect(password).toHaveAttribute('type', 'text');
  });
});
