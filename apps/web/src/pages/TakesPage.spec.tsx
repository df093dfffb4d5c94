import { listTakesResponse, paths, type ListTakesResponse } from '@thudline/contracts';
import { act, fireEvent, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { takeHandedOverFiles } from '../features/upload/droppedFiles';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { measurement, sampleMe } from '../testing/sampleData';
import { listId, sampleList, sampleListItem } from '../testing/sampleList';
import { TakesPage } from './TakesPage';

const list = (page: ListTakesResponse) => json(listTakesResponse.parse(page));

function open(routes: FakeRoutes, at = '/takes') {
  const server = fakeServer({ [`GET ${paths.me}`]: json(sampleMe), ...routes });
  return { ...server, ...renderPage([{ path: '/takes', element: <TakesPage /> }], at) };
}

const twoTakes = sampleList([
  sampleListItem({ number: 14 }),
  sampleListItem({
    number: 13,
    title: '8 cm inside the port',
    summary: { status: 'fix', strong: 'Clipped in 4 places.', rest: 'Kick down 9 dB or more.' },
    kickPeakDbfs: null,
    kickClipped: true,
  }),
]);

describe('the list of takes', () => {
  it('keeps the place of the rows while it is loading', () => {
    open({ [`GET ${paths.takes}`]: () => new Promise(() => undefined) });
    expect(screen.getByRole('status', { name: 'Loading the takes' })).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Add a take' })).toHaveAttribute('href', '/takes/new');
  });

  it('says what went wrong and reads the list again', async () => {
    let working = false;
    open({
      [`GET ${paths.takes}`]: () =>
        working ? list(twoTakes)() : refusal(503, 'storage-unavailable', 'The store is away.')(),
    });
    expect(await screen.findByRole('alert')).toHaveTextContent(
      'The list could not be read. The store is away.',
    );
    working = true;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByRole('table', { name: 'Takes' })).toBeInTheDocument();
  });

  it('asks for a first take where there is none', async () => {
    open({ [`GET ${paths.takes}`]: list(sampleList([])) });
    expect(
      await screen.findByRole('heading', { name: /^Your first take needs 45 seconds of playing\./ }),
    ).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Add your first take' })).toHaveAttribute('href', '/takes/new');
  });

  it('shows each take with its sentence, its pictures in words and the way to its sheet', async () => {
    open({ [`GET ${paths.takes}`]: list(twoTakes) });
    const row = await screen.findByRole('row', { name: /8 cm inside, again/ });
    expect(within(row).getByRole('link', { name: /14/ })).toHaveAttribute('href', `/takes/${listId(14)}`);
    expect(row).toHaveTextContent('Fix: Flip the overhead. Turn the kick down 6.5 dB.');
    expect(
      within(row).getByRole('img', {
        name: 'Hardest hit: kick −2.7 dBFS, above the target; overhead −8.4 dBFS, on target.',
      }),
    ).toBeInTheDocument();
    expect(within(row).getByRole('img', { name: 'Low end of the two added: −0.7 dB.' })).toBeInTheDocument();
    const clipped = screen.getByRole('row', { name: /inside the port/ });
    expect(within(clipped).getByRole('img', { name: /kick clipped/ })).toBeInTheDocument();
    expect(screen.getByText('1–2 of 2')).toBeInTheDocument();
    expect(screen.queryByRole('link', { name: 'older' })).not.toBeInTheDocument();
  });

  it('says why a take could not be measured', async () => {
    const failed = sampleListItem({
      summary: null,
      measurement: measurement({ state: 'failed', reason: 'the files could not be read back.' }),
    });
    open({ [`GET ${paths.takes}`]: list(sampleList([failed])) });
    expect(await screen.findByRole('row', { name: /8 cm inside/ })).toHaveTextContent(
      'Not measured: the files could not be read back.',
    );
  });
});

describe('a take that is being measured', () => {
  const measuring = sampleListItem({
    summary: null,
    measurement: measurement({ state: 'running', stage: 'hits', progress: 0.5 }),
  });

  it('shows the step and how far it is, and stops when asked', async () => {
    let now = measuring;
    const { requests } = open({
      [`GET ${paths.takes}`]: () => list(sampleList([now]))(),
      [`POST ${paths.cancelMeasurement(measuring.id)}`]: () => {
        now = { ...measuring, measurement: measurement({ state: 'cancelled', progress: 0.5 }) };
        return { status: 204 };
      },
    });
    expect(await screen.findByText('Measuring: finding the hits, step 3 of 5')).toBeInTheDocument();
    expect(screen.getByRole('progressbar')).toHaveAttribute('aria-valuenow', '50');
    await userEvent.click(screen.getByRole('button', { name: 'stop measuring take 14, 8 cm inside, again' }));
    expect(await screen.findByText(/you stopped it/)).toBeInTheDocument();
    expect(requests.some(({ path }) => path === paths.cancelMeasurement(measuring.id))).toBe(true);
  });

  it('asks again by itself until the sheet is there', async () => {
    jest.useFakeTimers();
    try {
      let now = measuring;
      open({ [`GET ${paths.takes}`]: () => list(sampleList([now]))() });
      expect(await screen.findByText(/finding the hits/)).toBeInTheDocument();
      now = sampleListItem();
      await act(() => jest.advanceTimersByTimeAsync(1600));
      expect(await screen.findByText('Flip the overhead.')).toBeInTheDocument();
    } finally {
      jest.useRealTimers();
    }
  });
});

describe('deleting a take', () => {
  const deletable = () => {
    let takes = twoTakes.items;
    return open({
      [`GET ${paths.takes}`]: () => list(sampleList(takes))(),
      [`DELETE ${paths.take(listId(14))}`]: () => {
        takes = takes.slice(1);
        return { status: 204 };
      },
    });
  };

  it('asks first, and keeps the take when told so', async () => {
    const { requests } = deletable();
    await userEvent.click(await screen.findByRole('button', { name: 'delete take 14, 8 cm inside, again' }));
    expect(screen.getByRole('alert')).toHaveTextContent('Delete take 14, 8 cm inside, again?');
    expect(screen.getByRole('button', { name: 'Keep it' })).toHaveFocus();
    await userEvent.keyboard('{Escape}');
    expect(screen.getByRole('button', { name: 'delete take 14, 8 cm inside, again' })).toHaveFocus();
    expect(requests.some(({ method }) => method === 'DELETE')).toBe(false);
  });

  it('takes it from the list and the count', async () => {
    deletable();
    await userEvent.click(await screen.findByRole('button', { name: 'delete take 14, 8 cm inside, again' }));
    await userEvent.click(screen.getByRole('button', { name: 'Delete it' }));
    expect(await screen.findByText('1 of 1')).toBeInTheDocument();
    expect(screen.queryByText('8 cm inside, again')).not.toBeInTheDocument();
    expect(screen.getByRole('heading', { name: 'Takes' })).toHaveFocus();
  });

  it('says so when it did not work, with the take still there', async () => {
    open({
      [`GET ${paths.takes}`]: list(twoTakes),
      [`DELETE ${paths.take(listId(14))}`]: refusal(500, 'internal', 'Try again in a moment.'),
    });
    await userEvent.click(await screen.findByRole('button', { name: 'delete take 14, 8 cm inside, again' }));
    await userEvent.click(screen.getByRole('button', { name: 'Delete it' }));
    expect(await screen.findByText('Try again in a moment.')).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Keep it' })).toBeEnabled();
  });
});

describe('older takes', () => {
  const first = sampleList([sampleListItem({ number: 14 })], { total: 2, nextCursor: 'c1' });
  const second = sampleList([sampleListItem({ number: 13, title: 'the older one' })], { total: 2 });
  const routes: FakeRoutes = {
    [`GET ${paths.takes}?cursor=c1`]: list(second),
    [`GET ${paths.takes}`]: list(first),
  };

  it('are a page on, kept in the address, and back leads to the newest', async () => {
    const { address, router } = open(routes);
    await userEvent.click(await screen.findByRole('link', { name: 'older' }));
    expect(await screen.findByText('the older one')).toBeInTheDocument();
    expect(address()).toBe('/takes?after=c1&from=2');
    expect(screen.getByText('2 of 2')).toBeInTheDocument();
    await act(() => router.navigate(-1));
    expect(await screen.findByText('8 cm inside, again')).toBeInTheDocument();
  });

  it('open from the address alone', async () => {
    open(routes, '/takes?after=c1&from=2');
    expect(await screen.findByText('the older one')).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'newest' })).toHaveAttribute('href', '/takes');
  });
});

it('takes files dropped anywhere along to the page that adds a take', async () => {
  const { address } = open({ [`GET ${paths.takes}`]: list(twoTakes) });
  await screen.findByRole('table', { name: 'Takes' });
  const file = new File(['RIFF'], 'kick.wav');
  const dataTransfer = {
    types: ['Files'],
    files: [file],
    items: [{ kind: 'file', type: 'audio/wav', getAsFile: () => file }],
  };
  fireEvent.dragEnter(document.body, { dataTransfer });
  fireEvent.drop(screen.getByText('Let go to add the files'), { dataTransfer });
  await waitFor(() => expect(address()).toBe('/takes/new'));
  expect(takeHandedOverFiles()).toEqual([file]);
});
