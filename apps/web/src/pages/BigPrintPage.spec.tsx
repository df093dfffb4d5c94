import { paths, type TakeListItem, type TakeResponse } from '@thudline/contracts';
import { screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { measurement, sampleReport, sampleTake, takeId } from '../testing/sampleData';
import { sampleList, sampleListItem } from '../testing/sampleList';
import { noteId, sampleNotes, sampleThread } from '../testing/sampleNotes';
import { servedSheet } from '../testing/sampleSheet';
import { BigPrintPage } from './BigPrintPage';

const thisTake = sampleListItem({ id: takeId, number: 14 });
const nextTake = sampleListItem({ number: 15 });
const nextMeasuring = sampleListItem({
  number: 15,
  summary: null,
  measurement: measurement({ state: 'running', stage: 'hits', progress: 0.4 }),
});

function open(routes: FakeRoutes = {}, list: TakeListItem[] = [thisTake]) {
  const served = { list };
  const server = fakeServer({
    ...servedSheet(),
    [`GET ${paths.takes}`]: () => ({ json: sampleList(served.list) }),
    ...routes,
  });
  const page = renderPage(
    [{ path: '/takes/:takeId/big', element: <BigPrintPage /> }],
    `/takes/${takeId}/big`,
  );
  return { server, served, ...page };
}

/** Ticks are kept by the fake as the server keeps them. */
function keepingTicks(actions = sampleReport().actions): FakeRoutes {
  let take: TakeResponse = sampleTake({ tickedActions: ['overhead-gain-leave'] });
  return {
    [`GET ${paths.take(takeId)}`]: () => ({ json: take }),
    [`GET ${paths.report(takeId)}`]: json(sampleReport({ actions })),
    [`PATCH ${paths.take(takeId)}`]: (body) => {
      take = { ...take, ...(body as Partial<TakeResponse>) };
      return { json: take };
    },
  };
}

beforeEach(() => sessionStorage.clear());

describe('Big print', () => {
  it('waits without jumping', () => {
    open({ [`GET ${paths.take(takeId)}`]: () => new Promise(() => undefined) });
    expect(screen.getByRole('status', { name: 'Loading' })).toBeInTheDocument();
  });

  it('shows what notes ask for below that, and ticks it', async () => {
    const item = { id: noteId(50), text: 'Play eight bars again', doneAt: null, isNews: false };
    const { server } = open({
      [`GET ${paths.notes(takeId)}`]: json(sampleNotes([sampleThread({ nextItems: [item] })])),
      [`PATCH ${paths.nextItem(takeId, item.id)}`]: json({ ...item, doneAt: '2026-12-03T10:00:00.000Z' }),
    });
    expect(await screen.findByRole('heading', { name: 'Play eight bars again' })).toBeInTheDocument();
    expect(screen.getByText('Oda asks for this.')).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Play eight bars again: done' }));
    expect(
      await screen.findByRole('button', { name: 'Play eight bars again: done', pressed: true }),
    ).toBeInTheDocument();
    expect(server.requests).toContainEqual(
      expect.objectContaining({
        method: 'PATCH',
        path: paths.nextItem(takeId, item.id),
        body: { done: true },
      }),
    );
  });

  it('shows only what to do', async () => {
    open();
    const heads = await screen.findAllByRole('heading', { level: 2 });
    expect(heads.map((head) => head.textContent)).toEqual(['Flip the overhead', 'Kick down 6.5 dB']);
    expect(screen.queryByText(/Leave the overhead preamp/)).not.toBeInTheDocument();
    expect(screen.getByText('The next take appears here by itself.')).toBeInTheDocument();
  });

  it('ticks both, keeps what else was ticked, and takes it back', async () => {
    const { server } = open(keepingTicks());
    await userEvent.click(await screen.findByRole('button', { name: 'Both done' }));
    expect(await screen.findByRole('heading', { name: 'Done: Flip the overhead' })).toBeInTheDocument();
    expect(server.requests.find((r) => r.method === 'PATCH')?.body).toEqual({
      tickedActions: ['overhead-gain-leave', 'flip-overhead', 'kick-gain'],
    });
    await userEvent.click(screen.getByRole('button', { name: 'Take it back' }));
    expect(await screen.findByRole('button', { name: 'Both done' })).toBeInTheDocument();
  });

  it('ticks only the first', async () => {
    const { server } = open(keepingTicks());
    await userEvent.click(await screen.findByRole('button', { name: 'Only the first' }));
    expect(await screen.findByRole('heading', { name: 'Done: Flip the overhead' })).toBeInTheDocument();
    expect(screen.getByRole('heading', { name: 'Kick down 6.5 dB' })).toBeInTheDocument();
    expect(server.requests.find((r) => r.method === 'PATCH')?.body).toEqual({
      tickedActions: ['overhead-gain-leave', 'flip-overhead'],
    });
  });

  it('has a button for each where there are more than two', async () => {
    const third = { id: 'look-for-noise', action: 'Switch off fans and heaters.', detail: '', leave: false };
    const { server } = open(keepingTicks([...sampleReport().actions, third]));
    expect(await screen.findByRole('button', { name: 'All done' })).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Switch off fans and heaters' }));
    expect(await screen.findByRole('button', { name: 'Switch off fans and heaters: done' })).toHaveAttribute(
      'aria-pressed',
      'true',
    );
    expect(server.requests.find((r) => r.method === 'PATCH')?.body).toEqual({
      tickedActions: ['overhead-gain-leave', 'look-for-noise'],
    });
  });

  it('says so when a tick could not be kept', async () => {
    open({ [`PATCH ${paths.take(takeId)}`]: refusal(500, 'internal', 'Something went wrong here.') });
    await userEvent.click(await screen.findByRole('button', { name: 'Both done' }));
    expect(await screen.findByText('Something went wrong here.')).toBeInTheDocument();
    expect(screen.getByRole('heading', { name: 'Flip the overhead' })).toBeInTheDocument();
  });

  it('says that all is well where nothing is to be done', async () => {
    open({
      [`GET ${paths.report(takeId)}`]: json(
        sampleReport({
          actions: [],
          line: [{ action: 'Good take.', reason: 'Keep everything where it is.' }],
        }),
      ),
    });
    expect(await screen.findByRole('heading', { name: 'Good take.' })).toBeInTheDocument();
    expect(screen.queryByRole('button')).not.toBeInTheDocument();
  });

  it('only reads along on a phone that was let in', async () => {
    open(servedSheet({ rights: { change: false, listen: true, download: true } }));
    expect(await screen.findByText(/This phone only reads along/)).toBeInTheDocument();
    expect(screen.queryByRole('button')).not.toBeInTheDocument();
  });

  it('goes on to the next take by itself once that is measured', async () => {
    const { served, address } = open({}, [nextMeasuring, thisTake]);
    expect(
      await screen.findByText('Take 15 is being measured. It appears here by itself.'),
    ).toBeInTheDocument();
    served.list = [nextTake, thisTake];
    await waitFor(() => expect(address()).toBe(`/takes/${nextTake.id}/big`), { timeout: 5000 });
  });

  it('goes on even when the next take came while the phone slept and the page is loaded anew', async () => {
    const first = open();
    await screen.findByRole('heading', { name: 'Flip the overhead' });
    first.unmount();
    const { address } = open({}, [nextTake, thisTake]);
    await waitFor(() => expect(address()).toBe(`/takes/${nextTake.id}/big`));
  });

  it('stays with an old take that was opened on purpose', async () => {
    const { address } = open({}, [nextTake, thisTake]);
    expect(await screen.findByRole('heading', { name: 'Flip the overhead' })).toBeInTheDocument();
    expect(address()).toBe(`/takes/${takeId}/big`);
  });

  it('says why the next take does not come', async () => {
    open({}, [{ ...nextMeasuring, measurement: measurement({ state: 'failed' }) }, thisTake]);
    expect(await screen.findByText(/Take 15 could not be measured/)).toBeInTheDocument();
  });

  it('shows how far the measurement has come before there is anything to do', async () => {
    open(servedSheet({ hasReport: false, measurement: measurement({ state: 'running', stage: 'hits' }) }));
    expect(await screen.findByRole('progressbar', { name: 'Measuring' })).toBeInTheDocument();
  });

  it('says that a take is not here', async () => {
    open({ [`GET ${paths.take(takeId)}`]: refusal(404, 'not-found', 'There is nothing here.') });
    expect(await screen.findByRole('alert')).toHaveTextContent('There is no such take here.');
  });

  it('offers another try when the server is away', async () => {
    let working = false;
    open({
      [`GET ${paths.take(takeId)}`]: () =>
        working ? json(sampleTake())() : refusal(500, 'internal', 'Try again in a moment.')(),
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('This take could not be opened.');
    working = true;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByRole('heading', { name: 'Flip the overhead' })).toBeInTheDocument();
  });
});
