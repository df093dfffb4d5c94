import { measurementEvent, paths, takeResponse } from '@thudline/contracts';
import { act, screen } from '@testing-library/react';
import { TakesSheet } from '../components/TakesSheet';
import { useTake } from '../../sheet/hooks/useTake';
import { fakeEvents } from '../../../testing/fakeEvents';
import { fakeServer, json } from '../../../testing/fakeServer';
import { renderPage } from '../../../testing/renderPage';
import { measurement, sampleMe, sampleTake, takeId } from '../../../testing/sampleData';
import { listId, sampleList, sampleListItem } from '../../../testing/sampleList';

const running = (stage: 'levels' | 'hits') =>
  measurement({ state: 'running', stage, progress: stage === 'hits' ? 0.5 : 0.2 });
const measuring = sampleListItem({ summary: null, measurement: running('levels') });

let events: ReturnType<typeof fakeEvents>;
beforeEach(() => {
  jest.useFakeTimers();
  events = fakeEvents();
});
afterEach(() => {
  events.restore();
  jest.useRealTimers();
});

const later = (ms: number) => act(() => jest.advanceTimersByTimeAsync(ms));

function openList(item = measuring) {
  const now = { item };
  const { requests } = fakeServer({
    [`GET ${paths.me}`]: json(sampleMe),
    [`GET ${paths.takes}`]: () => json(sampleList([now.item]))(),
  });
  const { unmount } = renderPage([{ path: '/takes', element: <TakesSheet /> }], '/takes');
  return { now, unmount, asked: () => requests.filter(({ path }) => path === paths.takes).length };
}
const event = (change: object) =>
  measurementEvent.parse({ takeId: listId(14), measurement: running('hits'), hasReport: false, ...change });

describe('the list while a take is being measured', () => {
  it('follows what the stream tells, without asking again', async () => {
    const { asked } = openList();
    await screen.findByText(/reading the levels, step 2/);
    const [stream] = events.streams;
    expect(stream.url).toBe(`${paths.events}?takes=${listId(14)}`);
    await stream.open();
    await stream.tell('measurement', event({}));
    expect(screen.getByText(/finding the hits, step 3/)).toBeInTheDocument();
    await later(10_000);
    expect(asked()).toBe(1);
  });

  it('reads the row again when the measurement is done, then lets go of the stream', async () => {
    const { now } = openList();
    await screen.findByText(/reading the levels/);
    const [stream] = events.streams;
    await stream.open();
    now.item = sampleListItem();
    await stream.tell('measurement', event({ measurement: measurement(), hasReport: true }));
    expect(await screen.findByText('Flip the overhead.')).toBeInTheDocument();
    expect(stream.readyState).toBe(2);
  });

  it('asks by itself where the stream is refused, and tries the stream again later', async () => {
    const { now } = openList();
    await screen.findByText(/reading the levels/);
    await events.streams[0].refuse();
    now.item = { ...measuring, measurement: running('hits') };
    await later(1100);
    expect(screen.getByText(/finding the hits/)).toBeInTheDocument();
    await later(30_000);
    expect(events.streams).toHaveLength(2);
  });

  it('closes the stream when the page is left', async () => {
    const { unmount } = openList();
    await screen.findByText(/reading the levels/);
    unmount();
    expect(events.streams.map(({ readyState }) => readyState)).toEqual([2]);
  });

  it('opens none where nothing is being measured', async () => {
    openList(sampleListItem());
    expect(await screen.findByText('Flip the overhead.')).toBeInTheDocument();
    expect(events.streams).toEqual([]);
  });
});

function Stage() {
  const { take } = useTake(takeId);
  return <p>{take ? `${take.measurement.stage ?? 'no stage'}, report: ${take.hasReport}` : 'loading'}</p>;
}

it('one take follows its stream too', async () => {
  let take = sampleTake({ hasReport: false, measurement: running('levels') });
  fakeServer({ [`GET ${paths.take(takeId)}`]: () => json(takeResponse.parse(take))() });
  renderPage([{ path: '/', element: <Stage /> }], '/');
  await screen.findByText('levels, report: false');
  const [stream] = events.streams;
  await stream.open();
  await stream.tell('measurement', event({ takeId }));
  expect(screen.getByText('hits, report: false')).toBeInTheDocument();
  take = sampleTake();
  await stream.tell('measurement', event({ takeId, measurement: measurement(), hasReport: true }));
  expect(await screen.findByText('no stage, report: true')).toBeInTheDocument();
});
