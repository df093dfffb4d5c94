import { listSetupsResponse, paths, type SetupListItem } from '@thudline/contracts';
import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { sampleMe } from '../testing/sampleData';
import { sampleSetupItem } from '../testing/sampleSetups';
import { SetupsPage } from './SetupsPage';

const list = (items: SetupListItem[]) => json(listSetupsResponse.parse({ items, currentId: null }));
const open = (routes: FakeRoutes) => {
  fakeServer({ [`GET ${paths.me}`]: json(sampleMe), ...routes });
  return renderPage([{ path: '/setups', element: <SetupsPage /> }], '/setups');
};

describe('the list of setups', () => {
  it('keeps its place while it is loading', async () => {
    open({ [`GET ${paths.setups}`]: () => new Promise(() => undefined) });
    expect(await screen.findByRole('status', { name: 'Loading the setups' })).toBeInTheDocument();
  });

  it('says what went wrong and is read again', async () => {
    let working = false;
    open({
      [`GET ${paths.setups}`]: () =>
        working ? list([sampleSetupItem()])() : refusal(503, 'storage-unavailable', 'The store is away.')(),
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('The store is away.');
    working = true;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByRole('list', { name: 'Setups' })).toBeInTheDocument();
  });

  it('offers the first one where there is none', async () => {
    open({ [`GET ${paths.setups}`]: list([]) });
    expect(
      await screen.findByRole('heading', { name: /^Write down where the microphones stand\./ }),
    ).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Write down a setup' })).toHaveAttribute('href', '/setups/new');
  });

  it('tells of each where its microphones stand and which takes have it', async () => {
    const item = sampleSetupItem();
    const unused = sampleSetupItem({
      id: '01890000-0000-7000-8000-000000000053',
      name: 'new',
      takeCount: 0,
      lastUsedAt: null,
    });
    open({ [`GET ${paths.setups}`]: list([item, unused]) });
    const [first, second] = within(await screen.findByRole('list', { name: 'Setups' })).getAllByRole(
      'listitem',
    );
    expect(first).toHaveTextContent('kick 8 cm inside, overhead 90 cm above the snare');
    expect(within(first).getByRole('link', { name: 'one overhead, high' })).toHaveAttribute(
      'href',
      `/setups/${item.id}`,
    );
    expect(within(first).getByRole('link', { name: '1 take' })).toHaveAttribute(
      'href',
      `/takes?setup=${item.id}`,
    );
    expect(second).toHaveTextContent('no take yet');
  });
});
