import { paths, type ReportResponse, type TakeResponse } from '@thudline/contracts';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeEvents } from '../testing/fakeEvents';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { measurement, sampleMe, sampleReport, sampleTake, takeId } from '../testing/sampleData';
import { servedSheet } from '../testing/sampleSheet';
import { SheetPage } from './SheetPage';

/** jsdom has no canvas to draw outlines on. */
jest.mock('wavesurfer.js', () => ({
  __esModule: true,
  default: { create: () => ({ on() {}, destroy() {} }) },
}));

const newest = { version: '5', measuredAt: '2026-12-01T12:00:00.000Z' };
const older = { version: '4', measuredAt: '2026-11-03T12:00:00.000Z' };
const reportOf = ({ version, measuredAt }: typeof newest, overrides: Partial<ReportResponse> = {}) =>
  sampleReport({ dspVersion: version, measuredAt, ...overrides });
const oldLine = [{ action: 'Keep the overhead:', reason: 'it adds up.' }];
const reports: FakeRoutes = {
  [`GET ${paths.report(takeId)}?version=5`]: json(reportOf(newest)),
  // Fewer hits than the newer version found.
  [`GET ${paths.report(takeId)}?version=4`]: json(
    reportOf(older, { line: oldLine, hits: sampleReport().hits.slice(0, 1) }),
  ),
};

function open(take: Partial<TakeResponse>, routes: FakeRoutes = {}) {
  const server = fakeServer({
    ...servedSheet(take),
    [`GET ${paths.me}`]: json(sampleMe),
    [`GET ${paths.sharesOf({ kind: 'take', takeId })}`]: json({ items: [] }),
    ...reports,
    ...routes,
  });
  const page = renderPage([{ path: '/takes/:takeId', element: <SheetPage /> }], `/takes/${takeId}`);
  return { server, ...page };
}

const line = () => screen.findByRole('heading', { level: 1 });

describe('the version of the measurements', () => {
  it('is told with its day, quietly, where there is only one', async () => {
    open({ sheetVersions: [newest] });
    expect(await screen.findByText(/Measured 1 Dec 2026 with version 5/)).toBeInTheDocument();
    expect(screen.queryByLabelText('Version of the sheet')).not.toBeInTheDocument();
    expect(screen.queryByText(/older sheet/)).not.toBeInTheDocument();
  });

  it('can be an older one, and the sheet says so and leads back', async () => {
    const { address } = open({ sheetVersions: [newest, older] });
    const select = await screen.findByLabelText('Version of the sheet');
    const options = within(select).getAllByRole('option');
    expect(options.map((option) => option.textContent)).toEqual([
      'as measured on 1 Dec 2026, version 5',
      'as measured on 3 Nov 2026, version 4',
    ]);
    await userEvent.selectOptions(select, '4');
    await waitFor(async () => expect(await line()).toHaveTextContent('Keep the overhead:'));
    expect(address()).toBe(`/takes/${takeId}?version=4`);
    expect(screen.getByText(/This is an older sheet/).parentElement).toHaveTextContent(
      'as version 4 of the measurements made it on 3 Nov 2026',
    );
    await userEvent.click(screen.getByRole('button', { name: 'Show the newest' }));
    await waitFor(async () => expect(await line()).toHaveTextContent('Flip the overhead:'));
    expect(address()).toBe(`/takes/${takeId}`);
    expect(screen.queryByText(/This is an older sheet/)).not.toBeInTheDocument();
  });

  it('in an address that names none there is reads as the newest', async () => {
    const server = fakeServer({
      ...servedSheet({ sheetVersions: [newest] }),
      [`GET ${paths.me}`]: json(sampleMe),
      ...reports,
    });
    renderPage([{ path: '/takes/:takeId', element: <SheetPage /> }], `/takes/${takeId}?version=77`);
    expect(await line()).toHaveTextContent('Flip the overhead:');
    expect(server.requests.map(({ path }) => path)).not.toContain(`${paths.report(takeId)}?version=77`);
  });

  it('changes on the open page by itself once the take was measured again', async () => {
    const events = fakeEvents();
    let take = sampleTake({ sheetVersions: [older], renewal: 'waiting' });
    open({}, { [`GET ${paths.take(takeId)}`]: () => ({ json: take }) });
    expect(await line()).toHaveTextContent('Keep the overhead:');
    expect(await screen.findByText(/measured again by itself/)).toBeInTheDocument();
    const heading = await line();
    take = sampleTake({ sheetVersions: [newest, older] });
    await events.streams[0].open();
    await events.streams[0].tell('measurement', { takeId, measurement: measurement(), hasReport: true });
    await waitFor(async () => expect(await line()).toHaveTextContent('Flip the overhead:'));
    // The sheet is the same one: nothing was taken away from whoever reads or writes on it.
    expect(heading).toBeInTheDocument();
    expect(screen.queryByText(/measured again by itself/)).not.toBeInTheDocument();
    expect(events.streams[0].readyState).toBe(2);
    events.restore();
  });

  it('that could not be renewed stays, and can be tried once more', async () => {
    const { server } = open(
      { sheetVersions: [older], renewal: 'failed' },
      { [`POST ${paths.measureAgain(takeId)}`]: refusal(409, 'conflict', 'Nothing new to find.') },
    );
    await userEvent.click(await screen.findByRole('button', { name: 'Measure it again' }));
    expect(await screen.findByText('Nothing new to find.')).toHaveAttribute('role', 'alert');
    expect(server.requests).toContainEqual(expect.objectContaining({ path: paths.measureAgain(takeId) }));
  });
});
