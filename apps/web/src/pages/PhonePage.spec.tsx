import { paths } from '@thudline/contracts';
import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { sampleMe } from '../testing/sampleData';
import { sampleList, sampleListItem } from '../testing/sampleList';
import { PhonePage } from './PhonePage';

const token = 'p'.repeat(43);
const used = refusal(410, 'link-ended', 'This link was used or has ended.');
const nobody: FakeRoutes = {
  [`GET ${paths.me}`]: refusal(401, 'not-signed-in', 'Sign in first.'),
  [`POST ${paths.refresh}`]: refusal(401, 'session-ended', 'Sign in again.'),
};
const letIn: FakeRoutes = {
  [`POST ${paths.openPhoneLink}`]: json({ ...sampleMe, readOnly: true }),
  [`GET ${paths.me}`]: json({ ...sampleMe, readOnly: true }),
};

function open(routes: FakeRoutes) {
  const server = fakeServer({ [`GET ${paths.takes}`]: json(sampleList([sampleListItem()])), ...routes });
  return { server, ...renderPage([{ path: '/phone/:token', element: <PhonePage /> }], `/phone/${token}`) };
}

describe('a phone that scanned the code', () => {
  it('is let in once and goes on to the newest take in Big print', async () => {
    const { server, address } = open(letIn);
    await waitFor(() => expect(address()).toBe(`/takes/${sampleListItem().id}/big`));
    expect(server.requests.filter(({ path }) => path === paths.openPhoneLink)).toEqual([
      { method: 'POST', path: paths.openPhoneLink, body: { token } },
    ]);
  });

  it('shows the check take while there is no take yet', async () => {
    open({ ...letIn, [`GET ${paths.takes}`]: json(sampleList([])) });
    expect(await screen.findByText('Eight hard snare hits')).toBeInTheDocument();
    expect(screen.getByText('Your first take appears here by itself.')).toBeInTheDocument();
  });

  it('finds its way when the page is loaded again with the code used up', async () => {
    const { address } = open({ ...letIn, [`POST ${paths.openPhoneLink}`]: used });
    await waitFor(() => expect(address()).toBe(`/takes/${sampleListItem().id}/big`));
  });

  it('offers another try when the server is away', async () => {
    let working = false;
    const { address } = open({
      ...letIn,
      [`POST ${paths.openPhoneLink}`]: () =>
        working ? json(sampleMe)() : refusal(429, 'too-many-requests', 'Wait a minute.')(),
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('This code could not be used. Wait a minute.');
    working = true;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    await waitFor(() => expect(address()).toBe(`/takes/${sampleListItem().id}/big`));
  });

  it('says what to do when the code works no more', async () => {
    open({ ...nobody, [`POST ${paths.openPhoneLink}`]: used });
    expect(await screen.findByRole('alert')).toHaveTextContent('This code doesn’t work any more.');
    expect(screen.getByRole('link', { name: 'Sign in on this phone' })).toHaveAttribute('href', '/sign-in');
  });
});
