import { paths } from '@thudline/contracts';
import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../../../testing/fakeServer';
import { renderPage } from '../../../testing/renderPage';
import { ShowOnPhone } from './ShowOnPhone';

const url = `https://thudline.example.org/phone/${'p'.repeat(43)}`;
const minutesFromNow = (minutes: number) => new Date(Date.now() + minutes * 60_000).toISOString();

async function open(routes: FakeRoutes) {
  const server = fakeServer(routes);
  renderPage([{ path: '/', element: <ShowOnPhone /> }], '/');
  await userEvent.click(screen.getByRole('button', { name: 'Show on my phone' }));
  return server;
}

describe('showing Big print on a phone', () => {
  it('makes no link before it is asked for', async () => {
    const { requests } = fakeServer({});
    renderPage([{ path: '/', element: <ShowOnPhone /> }], '/');
    expect(await screen.findByRole('button', { name: 'Show on my phone' })).toBeInTheDocument();
    expect(requests).toEqual([]);
  });

  it('draws a code to scan, with its address for those who can’t scan', async () => {
    await open({ [`POST ${paths.phoneLinks}`]: json({ url, expiresAt: minutesFromNow(5) }) });
    expect(await screen.findByRole('img', { name: /Code to scan/ })).toBeInTheDocument();
    expect(screen.getByLabelText('Or open this address on it')).toHaveValue(url);
    expect(screen.getByText(/Works once, until \d\d:\d\d/)).toBeInTheDocument();
  });

  it('offers a new code when the time of one is over', async () => {
    let minutes = -1;
    await open({ [`POST ${paths.phoneLinks}`]: () => json({ url, expiresAt: minutesFromNow(minutes) })() });
    expect(await screen.findByText(/This code has ended/)).toBeInTheDocument();
    minutes = 5;
    await userEvent.click(screen.getByRole('button', { name: 'Make a new code' }));
    expect(await screen.findByRole('img', { name: /Code to scan/ })).toBeInTheDocument();
  });

  it('says why there is no code, and offers another try', async () => {
    let working = false;
    await open({
      [`POST ${paths.phoneLinks}`]: () =>
        working
          ? json({ url, expiresAt: minutesFromNow(5) })()
          : refusal(403, 'read-only', 'This phone may only read along.')(),
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('This phone may only read along.');
    working = true;
    await userEvent.click(screen.getByRole('button', { name: 'Make a new code' }));
    expect(await screen.findByRole('img', { name: /Code to scan/ })).toBeInTheDocument();
  });
});
