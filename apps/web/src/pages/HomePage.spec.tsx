import { paths } from '@thudline/contracts';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { sampleMe, takeId } from '../testing/sampleData';
import { servedSheet } from '../testing/sampleSheet';
import { HomePage } from './HomePage';

function open(routes: FakeRoutes) {
  fakeServer({ [`POST ${paths.refresh}`]: refusal(401, 'session-ended', 'Sign in again.'), ...routes });
  return renderPage([{ path: '/', element: <HomePage /> }], '/');
}

const guest: FakeRoutes = { [`GET ${paths.me}`]: refusal(401, 'not-signed-in', 'Sign in first.') };
const sample: FakeRoutes = {
  [`GET ${paths.sampleSheet}`]: json({ takeId }),
  ...servedSheet({ rights: { change: false, listen: true, download: false } }),
};

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
    expect(await screen.findByRole('link', { name: 'Sign in' })).toHaveAttribute('href', '/sign-in');
  });

  it('ends earlier where there is no sheet to show', async () => {
    open({ ...guest, [`GET ${paths.sampleSheet}`]: json({ takeId: null }) });
    expect(await screen.findByRole('link', { name: 'Sign in' })).toBeInTheDocument();
    expect(screen.queryByRole('region', { name: 'A sheet we made earlier' })).not.toBeInTheDocument();
    expect(screen.queryByRole('link', { name: 'Read the whole sheet' })).not.toBeInTheDocument();
  });

  it('shows the heart of a real sheet that can be flipped without an account', async () => {
    open({ ...guest, ...sample });
    const sheet = await screen.findByRole('region', { name: 'A sheet we made earlier' });
    expect(within(sheet).getByRole('heading', { level: 2 })).toHaveTextContent('Flip the overhead:');
    expect(within(sheet).getByRole('img', { name: /Kick: hardest hit/ })).toBeInTheDocument();
    expect(await within(sheet).findByRole('button', { name: /on repeat$/ })).toBeEnabled();
    expect(
      await within(sheet).findByRole('img', { name: /Low end of the two added.*flipped \+/ }),
    ).toBeInTheDocument();
    const choices = within(sheet).getByRole('group', { name: 'Choice' });
    expect(within(choices).getAllByRole('button')).toHaveLength(2);
    await userEvent.click(within(choices).getByRole('button', { name: 'as recorded' }));
    expect(
      within(sheet).getByRole('img', { name: /Low end of the two added.*a difference of 0\.0 dB/ }),
    ).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Read the whole sheet' })).toHaveAttribute('href', '/sample');
  });

  it('leaves the sheet out when it can’t be read', async () => {
    let asked = false;
    open({
      ...guest,
      ...sample,
      [`GET ${paths.report(takeId)}`]: () => {
        asked = true;
        return refusal(500, 'internal', 'Not now.')();
      },
    });
    await waitFor(() => expect(asked).toBe(true));
    await waitFor(() =>
      expect(screen.queryByRole('status', { name: 'Loading a sheet' })).not.toBeInTheDocument(),
    );
    expect(screen.queryByRole('region', { name: 'A sheet we made earlier' })).not.toBeInTheDocument();
    expect(screen.queryByRole('alert')).not.toBeInTheDocument();
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
