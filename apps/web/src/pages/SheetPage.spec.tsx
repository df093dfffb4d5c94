import { ChakraProvider } from '@chakra-ui/react';
import { paths } from '@thudline/contracts';
import { render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { SWRConfig } from 'swr';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import {
  measurement,
  sampleExcerpt,
  sampleMe,
  samplePairSpectrumBytes,
  samplePeaks,
  sampleReport,
  sampleTake,
  takeId,
} from '../testing/sampleData';
import { sampleNotes } from '../testing/sampleNotes';
import { sampleSetupItem } from '../testing/sampleSetups';
import { system } from '../theme/system';
import { SheetPage } from './SheetPage';

/** jsdom has no canvas to draw outlines on. */
jest.mock('wavesurfer.js', () => ({
  __esModule: true,
  default: { create: () => ({ on() {}, destroy() {} }) },
}));

const report = sampleReport();
const served: FakeRoutes = {
  [`GET ${paths.me}`]: json(sampleMe),
  [`GET ${paths.take(takeId)}`]: json(sampleTake()),
  [`GET ${paths.sharesOf({ kind: 'take', takeId })}`]: json({ items: [] }),
  [`GET ${paths.report(takeId)}`]: json(report),
  [`GET ${paths.pairSpectrum(takeId)}`]: () => ({ bytes: samplePairSpectrumBytes(report.pairSpectrum!) }),
  [`GET ${paths.excerpt(takeId)}`]: () => sampleExcerpt(),
  [`GET ${paths.peaks(takeId)}`]: () => samplePeaks(),
  [`GET ${paths.addedFiles(takeId)}`]: json({ items: [] }),
  [`GET ${paths.notes(takeId)}`]: json(sampleNotes()),
};

function open(routes: FakeRoutes) {
  const server = fakeServer({ ...served, ...routes });
  const router = createMemoryRouter([{ path: '/takes/:takeId', element: <SheetPage /> }], {
    initialEntries: [`/takes/${takeId}`],
  });
  render(
    <ChakraProvider value={system}>
      <SWRConfig value={{ provider: () => new Map(), shouldRetryOnError: false, dedupingInterval: 0 }}>
        <RouterProvider router={router} />
      </SWRConfig>
    </ChakraProvider>,
  );
  return server;
}

describe('the sheet', () => {
  it('waits without jumping while it is loading', () => {
    open({ [`GET ${paths.take(takeId)}`]: () => new Promise(() => undefined) });
    expect(screen.getByRole('status', { name: 'Loading' })).toBeInTheDocument();
  });

  it('says what the take was recorded with, which can be changed', async () => {
    const [low, high] = [
      sampleSetupItem({ id: takeId, name: 'low' }),
      sampleSetupItem({ name: 'one overhead, high' }),
    ];
    const withSetup = ({ id, name }: typeof low) => sampleTake({ setup: { id, name } });
    let take = withSetup(low);
    const { requests } = open({
      [`GET ${paths.take(takeId)}`]: () => json(take)(),
      [`GET ${paths.setups}`]: json({ items: [high, low], currentId: null }),
      [`PATCH ${paths.take(takeId)}`]: () => {
        take = withSetup(take.setup?.id === low.id ? high : low);
        return json(take)();
      },
    });
    expect(await screen.findByRole('link', { name: 'low' })).toHaveAttribute('href', `/setups/${low.id}`);
    await userEvent.click(screen.getByRole('button', { name: 'Recorded with: change' }));
    await userEvent.selectOptions(
      await screen.findByRole('combobox', { name: 'Recorded with' }),
      'one overhead, high',
    );
    expect(await screen.findByRole('link', { name: 'one overhead, high' })).toBeInTheDocument();
    await userEvent.click(await screen.findByRole('button', { name: 'Undo' }));
    expect(await screen.findByRole('link', { name: 'low' })).toBeInTheDocument();
    const patches = requests.filter(({ method }) => method === 'PATCH').map(({ body }) => body);
    expect(patches).toEqual([{ setupId: high.id }, { setupId: low.id }]);
  });

  it('opens with the line, then what to do before the next take', async () => {
    open({});
    const line = await screen.findByRole('heading', { level: 1 });
    expect(line).toHaveTextContent(
      'Flip the overhead: the kick gets 1.4 dB of its low end back. Turn the kick down:',
    );
    const boxes = screen.getAllByRole('checkbox');
    expect(boxes).toHaveLength(3);
    expect(screen.getByRole('heading', { name: 'Levels: hot' })).toBeInTheDocument();
    expect(screen.getByRole('heading', { name: 'Adding up: flip' })).toBeInTheDocument();
  });

  it('tells drums against cymbals, in words, as a picture and under all figures', async () => {
    open({});
    const section = await screen.findByRole('region', { name: /^Drums and cymbals/ });
    expect(section).toHaveTextContent('Drums and cymbals: cymbals louder');
    expect(
      within(section).getByRole('img', { name: /cymbals are 4.6 dB louder than drums/ }),
    ).toBeInTheDocument();
    expect(screen.getByRole('row', { name: /^Cymbals against drums/ })).toHaveTextContent('+4.60');
    expect(screen.getByRole('link', { name: /^Drums and cymbals/ })).toHaveAttribute('href', '#drums');
  });

  it('tells how a snare dies away in the room, band by band', async () => {
    open({});
    const section = await screen.findByRole('region', { name: /^Room/ });
    expect(section).toHaveTextContent('Room: 0.38 s');
    expect(section).toHaveTextContent(
      '500 Hz 0.42, 1 kHz 0.38, 2 kHz 0.34, 4 kHz 0.30. Below 500 Hz not judged',
    );
    expect(screen.getByRole('row', { name: /^Decay .*0.42 0.38 0.34 0.30 s$/ })).toBeInTheDocument();
    expect(screen.getByRole('link', { name: /^Room/ })).toHaveAttribute('href', '#room');
  });

  it('says where the room can’t be told', async () => {
    const bands = [{ centreHz: 500, t20S: null, earlyS: null, earlyToLateDb: null }];
    const room = { snareHits: 2, decayS: null, earlyS: null, bands, reason: 'too-few-snares' };
    open({ [`GET ${paths.report(takeId)}`]: json(sampleReport({ room })) });
    const section = await screen.findByRole('region', { name: /^Room/ });
    expect(section).toHaveTextContent('Room: can’t tell');
    expect(section).not.toHaveTextContent('Seconds per 60 dB');
  });

  it('leaves out what an older report doesn’t hold', async () => {
    open({ [`GET ${paths.report(takeId)}`]: json(sampleReport({ balance: null, room: null })) });
    await screen.findByRole('heading', { name: 'Levels: hot' });
    expect(screen.queryByText(/Drums and cymbals|^Room/)).not.toBeInTheDocument();
  });

  it('tells the levels in words where the picture can’t be seen', async () => {
    open({});
    const strip = await screen.findByRole('img', { name: /Kick: hardest hit -2.7 dBFS, hot/ });
    expect(strip).toBeInTheDocument();
    expect(
      within(screen.getByRole('group', { name: 'kick hits by level' })).getAllByRole('button'),
    ).toHaveLength(3);
    expect(
      within(screen.getByRole('group', { name: 'overhead hits by level' })).getAllByRole('button'),
    ).toHaveLength(4);
  });

  it('keeps a tick', async () => {
    const server = open({
      [`PATCH ${paths.take(takeId)}`]: (body) => ({ json: { ...sampleTake(), ...(body as object) } }),
    });
    await userEvent.click(await screen.findByRole('checkbox', { name: /Press the polarity switch/ }));
    await waitFor(() =>
      expect(server.requests).toContainEqual({
        method: 'PATCH',
        path: paths.take(takeId),
        body: { tickedActions: ['flip-overhead'] },
      }),
    );
    expect(screen.getByRole('checkbox', { name: /Press the polarity switch/ })).toBeChecked();
  });

  it('takes a tick back and says so when it could not be kept', async () => {
    open({ [`PATCH ${paths.take(takeId)}`]: refusal(500, 'internal', 'Something went wrong here.') });
    await userEvent.click(await screen.findByRole('checkbox', { name: /Press the polarity switch/ }));
    expect(await screen.findByRole('alert')).toHaveTextContent('Something went wrong here.');
    expect(screen.getByRole('checkbox', { name: /Press the polarity switch/ })).not.toBeChecked();
  });

  it('lets every picture follow the choice', async () => {
    open({});
    const asRecorded = await screen.findByRole('button', { name: 'as recorded' });
    expect(
      await screen.findByRole('img', { name: /Low end of the two added.*flipped \+/ }),
    ).toBeInTheDocument();
    await userEvent.click(asRecorded);
    expect(asRecorded).toHaveAttribute('aria-pressed', 'true');
    expect(screen.getByRole('img', { name: /as recorded −[\d.]+ dB; as recorded/ })).toBeInTheDocument();
    expect(
      await screen.findByRole('img', { name: /Kick and overhead around this hit, as recorded/ }),
    ).toBeInTheDocument();
  });

  it('walks from kick hit to kick hit', async () => {
    open({});
    expect(await screen.findByRole('heading', { name: 'Hit 2, low end only' })).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Hit after' }));
    expect(screen.getByRole('heading', { name: 'Hit 3, low end only' })).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Hit after' })).toBeDisabled();
  });

  it('shows how far a measurement has come', async () => {
    open({
      [`GET ${paths.take(takeId)}`]: json(
        sampleTake({
          hasReport: false,
          measurement: measurement({ state: 'running', stage: 'hits', progress: 0.5 }),
        }),
      ),
    });
    expect(await screen.findByRole('progressbar', { name: 'Measuring' })).toHaveAttribute(
      'aria-valuenow',
      '50',
    );
    expect(screen.getByText('Measuring: finding the hits, step 3 of 5')).toBeInTheDocument();
  });

  it('says why there is no sheet', async () => {
    const failed = measurement({ state: 'failed', progress: 0, reason: 'the files could not be read.' });
    open({ [`GET ${paths.take(takeId)}`]: json(sampleTake({ hasReport: false, measurement: failed })) });
    expect(await screen.findByRole('heading', { level: 1 })).toHaveTextContent(
      'the files could not be read.',
    );
    expect(screen.getByRole('button', { name: 'Measure it again' })).toBeInTheDocument();
  });

  it('measures a take again', async () => {
    const failed = measurement({ state: 'failed', progress: 0, reason: 'the files could not be read.' });
    const server = open({
      [`GET ${paths.take(takeId)}`]: json(sampleTake({ hasReport: false, measurement: failed })),
      [`POST ${paths.measureAgain(takeId)}`]: () => ({ status: 204 }),
    });
    await userEvent.click(await screen.findByRole('button', { name: 'Measure it again' }));
    await waitFor(() =>
      expect(server.requests.filter(({ path }) => path === paths.take(takeId)).length).toBeGreaterThan(1),
    );
    expect(server.requests).toContainEqual({
      method: 'POST',
      path: paths.measureAgain(takeId),
      body: undefined,
    });
  });

  it('says that a take of somebody else is not here', async () => {
    open({ [`GET ${paths.take(takeId)}`]: refusal(404, 'not-found', 'There is no such take.') });
    expect(await screen.findByRole('alert')).toHaveTextContent('There is no such sheet here.');
  });

  it('offers to try again after an error', async () => {
    let answers = 0;
    open({
      [`GET ${paths.report(takeId)}`]: () =>
        answers++ === 0
          ? { status: 503, json: { code: 'storage-unavailable', message: 'Try again soon.' } }
          : { json: report },
    });
    await userEvent.click(await screen.findByRole('button', { name: 'Try again' }));
    expect(await screen.findByRole('heading', { name: 'Levels: hot' })).toBeInTheDocument();
  });

  it('lets the choice be set as a sentence, and knows a named one again', async () => {
    open({});
    const shift = await screen.findByRole('spinbutton', { name: 'Overhead earlier, ms' });
    await userEvent.clear(shift);
    await userEvent.type(shift, '1.0');
    expect(
      screen.getByRole('img', { name: /Low end of the two added.*flipped, 1.00 ms earlier/ }),
    ).toBeInTheDocument();
    await userEvent.clear(shift);
    await userEvent.type(shift, '1,62');
    expect(screen.getByRole('button', { name: 'flipped, 1.6 ms earlier' })).toHaveAttribute(
      'aria-pressed',
      'true',
    );
    await userEvent.selectOptions(screen.getByRole('combobox', { name: 'Unit of the shift' }), 'samples');
    expect(screen.getByRole('spinbutton', { name: 'Overhead earlier, samples' })).toHaveValue('78');
  });

  it('chooses and walks by single keys, and only while they are switched on', async () => {
    open({});
    await screen.findByRole('img', { name: /Low end of the two added/ });
    await userEvent.keyboard('1');
    expect(screen.getByRole('button', { name: 'as recorded' })).toHaveAttribute('aria-pressed', 'true');
    await userEvent.keyboard('{ArrowLeft}');
    expect(screen.getByRole('heading', { name: 'Hit 1, low end only' })).toBeInTheDocument();
  });

  it('leaves single keys alone for those who switched them off', async () => {
    open({
      [`GET ${paths.me}`]: json({ ...sampleMe, settings: { ...sampleMe.settings, singleKeys: false } }),
    });
    await screen.findByRole('img', { name: /Low end of the two added/ });
    await userEvent.keyboard('1');
    expect(screen.getByRole('button', { name: 'flipped' })).toHaveAttribute('aria-pressed', 'true');
  });

  it('zooms the pair trace by key and shows it as it was again', async () => {
    open({});
    const trace = await screen.findByRole('group', { name: /Pair trace/ });
    trace.focus();
    await userEvent.keyboard('+');
    await userEvent.click(screen.getByRole('button', { name: 'as it was' }));
    expect(screen.queryByRole('button', { name: 'as it was' })).not.toBeInTheDocument();
  });

  it('says what became of the changes since the take before', async () => {
    const outcomes = [
      {
        actionId: 'flip-overhead',
        status: 'good' as const,
        strong: 'The flip worked:',
        rest: '1.3 dB of low end came back; we expected 1.4.',
      },
    ];
    const follows = { id: takeId, number: 13, title: '' };
    open({
      [`GET ${paths.take(takeId)}`]: json(sampleTake({ follows })),
      [`GET ${paths.report(takeId)}`]: json(sampleReport({ outcomes })),
    });
    expect(await screen.findByRole('heading', { name: 'Since take 13' })).toBeInTheDocument();
    expect(screen.getByText('The flip worked:')).toBeInTheDocument();
  });

  it('offers nothing to change to a reader who may only read', async () => {
    open({
      [`GET ${paths.take(takeId)}`]: json(
        sampleTake({ rights: { change: false, listen: false, download: false } }),
      ),
    });
    await screen.findByRole('heading', { name: 'Levels: hot' });
    expect(screen.queryByRole('checkbox')).not.toBeInTheDocument();
    expect(screen.queryByRole('link', { name: 'Add the next take' })).not.toBeInTheDocument();
    expect(screen.queryByRole('button', { name: /Hear this take/ })).not.toBeInTheDocument();
  });
});
