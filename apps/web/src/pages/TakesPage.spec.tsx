import { listTakesResponse, paths, type ListTakesResponse, type TakeResponse } from '@thudline/contracts';
import { act, fireEvent, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { takeHandedOverFiles } from '../features/upload/droppedFiles';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { measurement, sampleMe, sampleTake } from '../testing/sampleData';
import { listId, sampleList, sampleListItem } from '../testing/sampleList';
import { sampleSetupItem } from '../testing/sampleSetups';
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

  it('counts the notes on each sheet, and those that are new', async () => {
    const takes = [
      sampleListItem({ number: 14, notes: 3, newNotes: 2 }),
      sampleListItem({ number: 13, title: 'felt', notes: 1 }),
      sampleListItem({ number: 12, title: 'no felt' }),
    ];
    open({ [`GET ${paths.takes}`]: list(sampleList(takes)) });
    expect(await screen.findByRole('row', { name: /8 cm inside, again.*2 new notes/ })).toBeInTheDocument();
    expect(screen.getByRole('row', { name: /felt.* 1 note/ })).toBeInTheDocument();
    expect(screen.getByRole('row', { name: /no felt/ })).not.toHaveAccessibleName(/\bnotes?\b/);
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

describe('a take that could not be measured', () => {
  const failed = sampleListItem({
    summary: null,
    measurement: measurement({ state: 'failed', reason: 'the files could not be read back.' }),
  });
  const again = () => screen.findByRole('button', { name: 'measure take 14, 8 cm inside, again again' });

  it('is measured again when asked', async () => {
    let now = failed;
    open({
      [`GET ${paths.takes}`]: () => list(sampleList([now]))(),
      [`POST ${paths.measureAgain(failed.id)}`]: () => {
        now = { ...failed, measurement: measurement({ state: 'queued', progress: 0 }) };
        return { status: 204 };
      },
    });
    await userEvent.click(await again());
    expect(await screen.findByText('Waiting to be measured')).toBeInTheDocument();
  });

  it('says in its row when that did not work', async () => {
    open({
      [`GET ${paths.takes}`]: list(sampleList([failed])),
      [`POST ${paths.measureAgain(failed.id)}`]: refusal(503, 'storage-unavailable', 'The store is away.'),
    });
    await userEvent.click(await again());
    expect(await screen.findByRole('alert')).toHaveTextContent('The store is away.');
    expect(await again()).toBeEnabled();
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

const chooseBox = (name: RegExp) => screen.findByRole('checkbox', { name });

describe('choosing takes', () => {
  it('says which are chosen, and clears them', async () => {
    open({ [`GET ${paths.takes}`]: list(twoTakes) });
    await userEvent.click(await chooseBox(/^choose take 14/));
    expect(screen.getByText('1 chosen:').parentElement).toHaveTextContent('1 chosen: take 14');
    await userEvent.click(await chooseBox(/^choose take 13/));
    expect(screen.getByText('2 chosen:').parentElement).toHaveTextContent('2 chosen: takes 13 and 14');
    await userEvent.click(screen.getByRole('button', { name: 'Clear' }));
    expect(await chooseBox(/^choose take 14/)).not.toBeChecked();
    expect(screen.queryByText(/chosen:/)).not.toBeInTheDocument();
  });

  it('keeps the choice on another page', async () => {
    open({
      [`GET ${paths.takes}?cursor=c1`]: list(sampleList([sampleListItem({ number: 3, title: 'third' })])),
      [`GET ${paths.takes}`]: list({ ...twoTakes, nextCursor: 'c1' }),
    });
    await userEvent.click(await chooseBox(/^choose take 14/));
    await userEvent.click(screen.getByRole('link', { name: 'older' }));
    await userEvent.click(await chooseBox(/^choose take 3/));
    expect(screen.getByText('2 chosen:').parentElement).toHaveTextContent('takes 3 and 14');
  });

  it('is not offered on a phone that may only read', async () => {
    open({
      [`GET ${paths.me}`]: json({ ...sampleMe, readOnly: true }),
      [`GET ${paths.takes}`]: list(twoTakes),
    });
    expect(await screen.findByRole('row', { name: /8 cm inside, again/ })).toBeInTheDocument();
    await waitFor(() => expect(screen.queryByRole('checkbox')).not.toBeInTheDocument());
    expect(screen.queryByRole('button', { name: /^tags of/ })).not.toBeInTheDocument();
  });
});

describe('deleting takes', () => {
  /** A server that deletes and restores, take by take. */
  const deletable = () => {
    let gone: number[] = [];
    const page = () => {
      const items = twoTakes.items.filter(({ number }) => !gone.includes(number));
      return list(sampleList(items, { everyTotal: items.length, deletedTotal: gone.length }))();
    };
    const routes: FakeRoutes = { [`GET ${paths.takes}`]: page };
    for (const number of [13, 14]) {
      routes[`DELETE ${paths.take(listId(number))}`] = () => {
        gone = [...gone, number];
        return { status: 204 };
      };
      routes[`POST ${paths.restoreTake(listId(number))}`] = () => {
        gone = gone.filter((each) => each !== number);
        return { status: 204 };
      };
    }
    return open(routes);
  };
  const deleteTake14 = async () => {
    await userEvent.click(await chooseBox(/^choose take 14/));
    await userEvent.click(screen.getByRole('button', { name: 'Delete it' }));
  };

  it('takes it from the list at once, and undo brings it back', async () => {
    deletable();
    await deleteTake14();
    expect(await screen.findByText('Take 14 is deleted.')).toBeInTheDocument();
    expect(screen.getByText('1 of 1')).toBeInTheDocument();
    expect(screen.queryByText('8 cm inside, again')).not.toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Undo' })).toHaveFocus();
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }));
    expect(await screen.findByText('Take 14 is back.')).toBeInTheDocument();
    expect(screen.getByText('8 cm inside, again')).toBeInTheDocument();
  });

  it('leaves the way back until it is dismissed', async () => {
    deletable();
    await deleteTake14();
    await userEvent.click(await screen.findByRole('button', { name: 'Dismiss' }));
    expect(screen.queryByText('Take 14 is deleted.')).not.toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'restore something deleted' })).toHaveAttribute(
      'href',
      '/takes?show=deleted',
    );
  });

  it('still offers undo when the last take is gone', async () => {
    deletable();
    await userEvent.click(await chooseBox(/^choose take 14/));
    await userEvent.click(await chooseBox(/^choose take 13/));
    await userEvent.click(screen.getByRole('button', { name: 'Delete them' }));
    expect(await screen.findByText('Takes 13 and 14 are deleted.')).toBeInTheDocument();
    expect(screen.getByRole('heading', { name: /^Your first take/ })).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }));
    expect(await screen.findByText('8 cm inside, again')).toBeInTheDocument();
  });

  it('says so when it did not work, with the take still there', async () => {
    open({
      [`GET ${paths.takes}`]: list(twoTakes),
      [`DELETE ${paths.take(listId(14))}`]: refusal(500, 'internal', 'Try again in a moment.'),
    });
    await deleteTake14();
    expect(await screen.findByText('Try again in a moment.')).toBeInTheDocument();
    expect(screen.getByText('8 cm inside, again')).toBeInTheDocument();
    expect(screen.getByText('1 chosen:')).toBeInTheDocument();
  });

  it('brings a take back from the list of deleted ones', async () => {
    let items = [sampleListItem({ deletedAt: '2026-11-30T20:00:00.000Z' })];
    open(
      {
        [`GET ${paths.takes}`]: () =>
          list(sampleList(items, { everyTotal: 3, deletedTotal: items.length }))(),
        [`POST ${paths.restoreTake(listId(14))}`]: () => {
          items = [];
          return { status: 204 };
        },
      },
      '/takes?show=deleted',
    );
    const row = await screen.findByRole('row', { name: /8 cm inside, again/ });
    expect(within(row).queryByRole('link')).not.toBeInTheDocument();
    await userEvent.click(within(row).getByRole('button', { name: 'restore take 14, 8 cm inside, again' }));
    expect(await screen.findByText('Take 14 is back.')).toBeInTheDocument();
    expect(screen.getByText(/Nothing you recorded is deleted\./)).toBeInTheDocument();
  });

  it('brings several back at once; chosen takes that are not deleted keep out of it', async () => {
    const gone = twoTakes.items.map((take) => ({ ...take, deletedAt: '2026-11-30T20:00:00.000Z' }));
    const there = sampleListItem({ number: 3, title: 'third' });
    let deleted = gone;
    const restored = (number: number) => () => {
      deleted = deleted.filter((take) => take.number !== number);
      return { status: 204 };
    };
    const { requests, router } = open({
      [`GET ${paths.takes}?show=deleted`]: () =>
        list(sampleList(deleted, { everyTotal: 1, deletedTotal: deleted.length }))(),
      [`GET ${paths.takes}`]: list(sampleList([there], { deletedTotal: 2 })),
      [`POST ${paths.restoreTake(listId(13))}`]: restored(13),
      [`POST ${paths.restoreTake(listId(14))}`]: restored(14),
    });
    await userEvent.click(await chooseBox(/^choose take 3/));
    await act(() => router.navigate('/takes?show=deleted'));
    await userEvent.click(await chooseBox(/^choose take 14/));
    await userEvent.click(await chooseBox(/^choose take 13/));
    expect(screen.queryByRole('button', { name: /^Delete/ })).not.toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Restore them' }));
    expect(await screen.findByText('Takes 13 and 14 are back.')).toBeInTheDocument();
    expect(requests.filter(({ method }) => method === 'POST')).toHaveLength(2);
    await act(() => router.navigate('/takes'));
    expect(screen.getByText('1 chosen:').parentElement).toHaveTextContent('take 3');
  });
});

describe('tags', () => {
  const tagged = sampleList(
    [sampleListItem({ tags: ['rug'] }), sampleListItem({ number: 13, title: 'port' })],
    {
      tags: ['blankets', 'rug'],
    },
  );
  /** Keeps what is sent, so that the list tells it. */
  const taggable = () => {
    let items = tagged.items;
    const routes: FakeRoutes = {
      [`GET ${paths.takes}`]: () => list(sampleList(items, { tags: tagged.tags }))(),
    };
    for (const number of [13, 14]) {
      const asTake = () =>
        sampleTake({ id: listId(number), tags: items.find((each) => each.number === number)!.tags });
      routes[`GET ${paths.take(listId(number))}`] = () => ({ json: asTake() });
      routes[`PATCH ${paths.take(listId(number))}`] = (body) => {
        const { tags } = body as { tags: string[] };
        items = items.map((each) => (each.number === number ? { ...each, tags } : each));
        return { json: asTake() };
      };
    }
    return open(routes);
  };

  it('stand under the title and are written in the row', async () => {
    taggable();
    expect(await screen.findByRole('row', { name: /8 cm inside, again.* · rug/ })).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'tags of take 14, 8 cm inside, again' }));
    const field = screen.getByRole('textbox', {
      name: 'Tags of take 14, 8 cm inside, again, with commas between',
    });
    expect(field).toHaveFocus();
    expect(field).toHaveValue('rug');
    await userEvent.click(screen.getByRole('button', { name: 'blankets' }));
    await userEvent.type(field, ', second day');
    await userEvent.click(screen.getByRole('button', { name: 'Keep them' }));
    expect(await screen.findByText(/· rug · blankets · second day/)).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'tags of take 14, 8 cm inside, again' })).toHaveFocus();
  });

  it('are left as they were with Escape', async () => {
    const { requests } = taggable();
    await userEvent.click(await screen.findByRole('button', { name: 'tags of take 14, 8 cm inside, again' }));
    await userEvent.keyboard('x{Escape}');
    expect(screen.getByRole('button', { name: 'tags of take 14, 8 cm inside, again' })).toHaveFocus();
    expect(requests.some(({ method }) => method === 'PATCH')).toBe(false);
  });

  it('say under the field what is wrong with them', async () => {
    const { requests } = taggable();
    await userEvent.click(await screen.findByRole('button', { name: 'tags of take 14, 8 cm inside, again' }));
    await userEvent.keyboard('{Control>}a{/Control}' + 'x'.repeat(31) + '{Enter}');
    expect(await screen.findByRole('alert')).toHaveTextContent('A tag has at most 30 characters.');
    expect(requests.some(({ method }) => method === 'PATCH')).toBe(false);
  });

  it('are added to all chosen takes, which keep the ones they have', async () => {
    const { requests } = taggable();
    await userEvent.click(await chooseBox(/^choose take 14/));
    await userEvent.click(await chooseBox(/^choose take 13/));
    await userEvent.click(screen.getByRole('button', { name: 'Tag them' }));
    expect(screen.getByRole('textbox', { name: /^Tags for takes 13 and 14/ })).toHaveFocus();
    await userEvent.keyboard('garage');
    await userEvent.click(screen.getByRole('button', { name: 'Tag them' }));
    await waitFor(() =>
      expect(requests.filter(({ method }) => method === 'PATCH').map(({ body }) => body)).toEqual([
        { tags: ['rug', 'garage'] },
        { tags: ['garage'] },
      ]),
    );
    expect(await screen.findByText(/· rug · garage/)).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Tag them' })).toHaveFocus();
    expect(screen.getByText('Takes 13 and 14 are tagged garage.')).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }));
    expect(await screen.findByText('The tags are as they were.')).toBeInTheDocument();
    expect(requests.filter(({ method }) => method === 'PATCH').map(({ body }) => body)).toEqual([
      { tags: ['rug', 'garage'] },
      { tags: ['garage'] },
      { tags: ['rug'] },
      { tags: [] },
    ]);
  });
});

describe('the setup of chosen takes', () => {
  it('is said for all of them, and taken back', async () => {
    const before: Record<number, TakeResponse['setup']> = { 13: null, 14: { id: listId(50), name: 'low' } };
    const high = sampleSetupItem();
    const routes: FakeRoutes = {
      [`GET ${paths.takes}`]: list(twoTakes),
      [`GET ${paths.setups}`]: json({ items: [high], currentId: null }),
    };
    for (const number of [13, 14]) {
      const take = sampleTake({ id: listId(number), setup: before[number] });
      routes[`GET ${paths.take(take.id)}`] = json(take);
      routes[`PATCH ${paths.take(take.id)}`] = json(take);
    }
    const { requests } = open(routes);
    await userEvent.click(await chooseBox(/^choose take 14/));
    await userEvent.click(await chooseBox(/^choose take 13/));
    const setups = await screen.findByRole('combobox', { name: 'Recorded with' });
    await userEvent.selectOptions(setups, 'one overhead, high');
    expect(
      await screen.findByText('Takes 13 and 14 are recorded with one overhead, high.'),
    ).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }));
    expect(await screen.findByText('The setups are as they were.')).toBeInTheDocument();
    expect(requests.filter(({ method }) => method === 'PATCH').map(({ body }) => body)).toEqual([
      { setupId: high.id },
      { setupId: high.id },
      { setupId: listId(50) },
      { setupId: null },
    ]);
  });
});

describe('the filter sentence', () => {
  it('asks for the takes of one setup', async () => {
    const high = { id: listId(50), name: 'one overhead, high' };
    const { address } = open({
      [`GET ${paths.takes}`]: list(sampleList([sampleListItem()], { setups: [high] })),
    });
    const setups = await screen.findByRole('combobox', { name: 'With setup' });
    await userEvent.selectOptions(setups, 'one overhead, high');
    expect(address()).toBe(`/takes?setup=${high.id}`);
  });

  const some = sampleList([sampleListItem()], { tags: ['blankets', 'rug'], everyTotal: 20, total: 1 });
  const choose = (label: string, words: string) =>
    userEvent.selectOptions(screen.getByRole('combobox', { name: label }), words);

  it('asks for what it says, keeps it in the address, and back takes it back', async () => {
    const { address, requests, router } = open({ [`GET ${paths.takes}`]: list(some) });
    await screen.findByRole('table', { name: 'Takes' });
    await choose('Show', 'clipped takes');
    await choose('Tagged', 'rug');
    await choose('In which order', 'hardest kick first');
    expect(address()).toBe('/takes?show=clipped&order=hardest-kick&tag=rug');
    await waitFor(() =>
      expect(requests.at(-1)?.path).toBe(`${paths.takes}?show=clipped&order=hardest-kick&tag=rug`),
    );
    await act(() => router.navigate(-1));
    expect(screen.getByRole('combobox', { name: 'In which order' })).toHaveDisplayValue('newest first');
    expect(address()).toBe('/takes?show=clipped&tag=rug');
  });

  it('opens as the address says', async () => {
    open({ [`GET ${paths.takes}`]: list(some) }, '/takes?show=to-flip&tag=old&find=port');
    expect(await screen.findByRole('table', { name: 'Takes' })).toBeInTheDocument();
    expect(screen.getByRole('combobox', { name: 'Show' })).toHaveDisplayValue('takes to flip');
    expect(screen.getByRole('combobox', { name: 'Tagged' })).toHaveDisplayValue('old');
    expect(screen.getByRole('searchbox')).toHaveValue('port');
  });

  it('looks for words a moment after they are typed, as one step for back', async () => {
    const { address, requests, router } = open({ [`GET ${paths.takes}`]: list(some) });
    await screen.findByRole('table', { name: 'Takes' });
    await userEvent.type(screen.getByRole('searchbox', { name: 'Find a title, note or finding' }), 'port ');
    expect(screen.getByRole('searchbox')).toHaveValue('port ');
    await waitFor(() => expect(address()).toBe('/takes?find=port'));
    expect(screen.getByRole('searchbox')).toHaveValue('port ');
    await waitFor(() => expect(requests.at(-1)?.path).toBe(`${paths.takes}?find=port`));
    await userEvent.type(screen.getByRole('searchbox'), 'again{Enter}');
    await waitFor(() => expect(address()).toBe('/takes?find=port+again'));
    await act(() => router.navigate(-1));
    expect(address()).toBe('/takes');
    expect(screen.getByRole('searchbox')).toHaveValue('');
  });

  it('that fits nothing offers wider ones with what they hold', async () => {
    const none = (total: number) =>
      list(sampleList([], { total, everyTotal: 20, tags: ['rug'], deletedTotal: 1 }));
    open(
      {
        [`GET ${paths.takes}?show=clipped&tag=rug`]: none(0),
        [`GET ${paths.takes}?tag=rug&limit=1`]: none(7),
        [`GET ${paths.takes}?show=clipped&limit=1`]: none(2),
      },
      '/takes?show=clipped&tag=rug',
    );
    expect(
      await screen.findByText(
        (_, element) =>
          element?.textContent === 'No take fits that sentence. Nothing you tagged rug has clipped.' &&
          element.tagName === 'H2',
      ),
    ).toBeInTheDocument();
    const offers = within(screen.getByRole('list'));
    await waitFor(() => expect(offers.getAllByRole('listitem')).toHaveLength(3));
    expect(offers.getAllByRole('listitem').map((item) => item.textContent)).toEqual([
      'Every take tagged rug 7 takes',
      'Clipped takes 2 takes',
      'Every take 20 takes',
    ]);
    expect(offers.getByRole('link', { name: 'Clipped takes' })).toHaveAttribute(
      'href',
      '/takes?show=clipped',
    );
    expect(screen.getByText('0 of 20 takes')).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'restore something deleted' })).toBeInTheDocument();
  });

  it('that could not be asked does not show the rows of the one before', async () => {
    open({
      [`GET ${paths.takes}?show=hot`]: refusal(503, 'storage-unavailable', 'The store is away.'),
      [`GET ${paths.takes}`]: list(some),
    });
    await screen.findByRole('table', { name: 'Takes' });
    await choose('Show', 'hot takes');
    expect(await screen.findByRole('alert')).toHaveTextContent('The store is away.');
    expect(screen.queryByRole('table')).not.toBeInTheDocument();
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
