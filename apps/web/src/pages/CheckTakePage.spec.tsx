import { paths } from '@thudline/contracts';
import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { sampleMe, takeId } from '../testing/sampleData';
import { CheckTakePage } from './CheckTakePage';

function open(routes: FakeRoutes = {}) {
  fakeServer({
    [`GET ${paths.me}`]: refusal(401, 'not-signed-in', 'Sign in first.'),
    [`POST ${paths.refresh}`]: refusal(401, 'session-ended', 'Sign in again.'),
    [`GET ${paths.sampleSheet}`]: json({ takeId: null }),
    ...routes,
  });
  return renderPage([{ path: '/check-take', element: <CheckTakePage /> }], '/check-take');
}

describe('the check take', () => {
  it('says what to play, second by second, with the caution for the ears', async () => {
    open();
    const steps = within(await screen.findByRole('list')).getAllByRole('listitem');
    expect(steps.map((step) => step.textContent)).toEqual([
      '0–3 sSit still. That measures the noise.',
      '3–11 sKick alone, eight hits, the last two as hard as you ever play.',
      '11–27 sEight hard snare hits, two seconds apart. They measure the room.',
      '27–45 sYour loudest groove, crashes and all. Let it ring.',
    ]);
    expect(screen.getByText(/Protect your ears while you play/)).toBeInTheDocument();
  });

  it('can be printed', async () => {
    const print = jest.spyOn(window, 'print').mockImplementation(() => undefined);
    open();
    await userEvent.click(screen.getByRole('button', { name: 'Print this' }));
    expect(print).toHaveBeenCalledTimes(1);
  });

  it('leads a guest to join and someone signed in to the upload', async () => {
    const { unmount } = open();
    expect(await screen.findByRole('link', { name: 'Join' })).toHaveAttribute('href', '/join');
    unmount();
    open({ [`GET ${paths.me}`]: json(sampleMe) });
    expect(await screen.findByRole('link', { name: 'Add this take' })).toHaveAttribute('href', '/takes/new');
  });

  it('offers a sheet to read only where there is one', async () => {
    const { unmount } = open();
    await screen.findByRole('link', { name: 'Join' });
    expect(screen.queryByRole('link', { name: 'Read a sheet we made earlier' })).not.toBeInTheDocument();
    unmount();
    open({ [`GET ${paths.sampleSheet}`]: json({ takeId }) });
    expect(await screen.findByRole('link', { name: 'Read a sheet we made earlier' })).toHaveAttribute(
      'href',
      '/sample',
    );
  });
});
