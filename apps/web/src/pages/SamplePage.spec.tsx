import { paths } from '@thudline/contracts';
import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { sampleMe, takeId } from '../testing/sampleData';
import { servedSheet } from '../testing/sampleSheet';
import { SamplePage } from './SamplePage';

function open(routes: FakeRoutes) {
  fakeServer({
    [`GET ${paths.me}`]: refusal(401, 'not-signed-in', 'Sign in first.'),
    [`POST ${paths.refresh}`]: refusal(401, 'session-ended', 'Sign in again.'),
    [`GET ${paths.sampleSheet}`]: json({ takeId }),
    ...servedSheet({ rights: { change: false, listen: true, download: false } }),
    ...routes,
  });
  return renderPage([{ path: '/sample', element: <SamplePage /> }], '/sample');
}

describe('a sheet we made earlier', () => {
  it('waits without jumping', () => {
    open({ [`GET ${paths.sampleSheet}`]: () => new Promise(() => undefined) });
    expect(screen.getByRole('status', { name: 'Loading' })).toBeInTheDocument();
  });

  it('can be read, heard and flipped without an account', async () => {
    open({});
    expect(await screen.findByRole('heading', { level: 1 })).toHaveTextContent('Flip the overhead:');
    expect(screen.getByRole('button', { name: /^Hear this take/ })).toBeInTheDocument();
    expect(await screen.findByRole('group', { name: 'Choice' })).toBeInTheDocument();
    expect(screen.queryByRole('checkbox')).not.toBeInTheDocument();
  });

  it('has nothing to change even for the one who made it', async () => {
    open({ [`GET ${paths.me}`]: json(sampleMe), ...servedSheet() });
    expect(await screen.findByRole('heading', { name: 'Levels: hot' })).toBeInTheDocument();
    expect(screen.queryByRole('checkbox')).not.toBeInTheDocument();
  });

  it('says honestly that there is none', async () => {
    open({ [`GET ${paths.sampleSheet}`]: json({ takeId: null }) });
    expect(await screen.findByRole('alert')).toHaveTextContent('There is no sheet to show here yet.');
    expect(screen.getByRole('link', { name: 'Read the check take' })).toHaveAttribute('href', '/check-take');
  });

  it('offers another try after an error', async () => {
    let working = false;
    open({
      [`GET ${paths.report(takeId)}`]: (body) =>
        working
          ? servedSheet()[`GET ${paths.report(takeId)}`](body)
          : refusal(500, 'internal', 'Try again in a moment.')(),
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('The sheet could not be opened.');
    working = true;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByRole('heading', { name: 'Levels: hot' })).toBeInTheDocument();
  });
});
