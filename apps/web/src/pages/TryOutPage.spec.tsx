import {
  paths,
  tryOutRankingResponse,
  tryOutResponse,
  type TryOutRankingResponse,
  type TryOutResponse,
} from '@thudline/contracts';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { measurement, sampleMe } from '../testing/sampleData';
import { listId, sampleList, sampleListItem } from '../testing/sampleList';
import { samplePlace, sampleRanking, sampleTryOut, tryOutId } from '../testing/sampleTryOut';
import { TryOutPage } from './TryOutPage';
import { TryOutsPage } from './TryOutsPage';

const answers = (tryOut: TryOutResponse, ranking: TryOutRankingResponse): FakeRoutes => ({
  [`GET ${paths.tryOut(tryOutId)}`]: json(tryOutResponse.parse(tryOut)),
  [`GET ${paths.tryOutRanking(tryOutId)}`]: json(tryOutRankingResponse.parse(ranking)),
});

function open(routes: FakeRoutes = answers(sampleTryOut(), sampleRanking())) {
  const server = fakeServer({
    [`GET ${paths.me}`]: json(sampleMe),
    [`GET ${paths.shares}`]: json({ items: [] }),
    ...routes,
  });
  const page = renderPage(
    [
      { path: '/tryouts/:tryOutId', element: <TryOutPage /> },
      { path: '/tryouts', element: <TryOutsPage /> },
    ],
    `/tryouts/${tryOutId}`,
  );
  return { ...server, ...page };
}

const winnerSetup = {
  id: listId(90),
  name: 'one overhead, high, overhead 100 cm',
  copiedFrom: { id: listId(91), name: 'one overhead, high' },
  isCurrent: true,
};

const line = () => screen.findByRole('heading', { level: 1 });

describe('a try-out', () => {
  it('keeps its place while it is loading', () => {
    open({ [`GET ${paths.tryOut(tryOutId)}`]: () => new Promise(() => undefined) });
    expect(screen.getByRole('status', { name: 'Loading' })).toBeInTheDocument();
  });

  it('says what went wrong and opens it again', async () => {
    let working = false;
    const routes = answers(sampleTryOut(), sampleRanking());
    open({
      ...routes,
      [`GET ${paths.tryOut(tryOutId)}`]: (body) =>
        working ? routes[`GET ${paths.tryOut(tryOutId)}`](body) : refusal(503, 'internal', 'Away.')(),
    });
    expect(await line()).toHaveTextContent('The try-out could not be opened. Away.');
    working = true;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    await waitFor(async () => expect(await line()).toHaveTextContent(/^Raise the overhead/));
  });

  it('is told apart from one that isn’t there', async () => {
    open({});
    expect(await line()).toHaveTextContent('There is no such try-out here.');
    expect(screen.getByRole('link', { name: 'Go to your try-outs' })).toHaveAttribute('href', '/tryouts');
  });

  it('says what to do, ranks the takes and says of each how it stands against the first', async () => {
    open();
    expect(await line()).toHaveTextContent(
      'Raise the overhead to 100 cm: the kick gets 0.8 dB fuller than now. 110 may be as good.',
    );
    const table = screen.getByRole('table', { name: 'The takes, best first' });
    const [, first, second, third] = within(table).getAllByRole('row');
    expect(first).toHaveTextContent(/^1100 cm take 18.*\+1\.9 dBfullest/);
    expect(second).toHaveTextContent(/110 cm.*no clear difference/);
    expect(third).toHaveTextContent(/90 cm.*stands here now.*clearly thinner.*\+3\.2 dB \(watch\)/);
    expect(screen.getByRole('img', { name: /5 takes against their position/ })).toBeInTheDocument();
    expect(screen.getByText(/At 90 cm and 80 cm the cymbals pass it/)).toBeInTheDocument();
  });

  it('asks for the ranking by another measure, and by two', async () => {
    const { requests } = open();
    await line();
    await userEvent.selectOptions(screen.getByRole('combobox', { name: 'Rank by' }), 'attack');
    await userEvent.selectOptions(screen.getByRole('combobox', { name: 'Weighted with' }), 'evenness');
    await waitFor(() =>
      expect(requests.map(({ path }) => path)).toContain(
        `${paths.tryOutRanking(tryOutId)}?measure=attack&polarity=best-polarity&also=evenness`,
      ),
    );
  });

  it('has its figures as a table', async () => {
    open();
    await line();
    await userEvent.click(screen.getByRole('button', { name: 'as a table' }));
    expect(screen.getByRole('row', { name: '110 cm 19 +1.7 dB +1.4 to +1.9 16' })).toBeInTheDocument();
  });

  it('hides which is which until one is chosen, makes that one the setup with a reason, and takes it back', async () => {
    const { requests } = open({
      ...answers(sampleTryOut(), sampleRanking()),
      [`POST ${paths.tryOutSetup(tryOutId)}`]: (body) => ({
        status: 201,
        json: sampleTryOut({ ...(body as object), winnerSetup }),
      }),
      [`DELETE ${paths.tryOutSetup(tryOutId)}`]: () => ({
        json: sampleTryOut({ winnerPlaceId: sampleTryOut().places[2].id }),
      }),
    });
    await line();
    await userEvent.click(screen.getByRole('button', { name: 'shuffle and hide the heights' }));
    expect(screen.queryByRole('table')).not.toBeInTheDocument();
    expect(screen.queryByText(/100/)).not.toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'C is best' }));
    const chosen = await screen.findByRole('radio', { checked: true });
    const name = /^(\d+ cm)/.exec(chosen.getAttribute('aria-label') ?? '')?.[1] ?? '';
    await userEvent.type(screen.getByLabelText(`Why ${name} wins, in your words`), 'Fullest.');
    await userEvent.click(screen.getByRole('button', { name: `Make ${name} the setup` }));
    expect(await screen.findByText(`${name} is the setup now.`)).toBeInTheDocument();
    expect(screen.getByRole('link', { name: winnerSetup.name })).toHaveAttribute(
      'href',
      `/setups/${winnerSetup.id}`,
    );
    expect(screen.queryByRole('button', { name: /^Make / })).not.toBeInTheDocument();
    const winner = sampleTryOut().places.find(({ position }) => `${position} cm` === name);
    expect(requests.find(({ method }) => method === 'POST')?.body).toEqual({
      winnerPlaceId: winner?.id,
      reason: 'Fullest.',
    });
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }));
    await waitFor(() => expect(screen.queryByText(/is the setup now/)).not.toBeInTheDocument());
    expect(requests.at(-1)).toMatchObject({ method: 'DELETE', path: paths.tryOutSetup(tryOutId) });
  });

  it('chooses what is heard with the keys', async () => {
    open();
    await line();
    const heard = () => screen.getByRole('group', { name: 'Which take is heard' });
    await userEvent.keyboard('4');
    expect(within(heard()).getByRole('button', { pressed: true })).toHaveTextContent('110');
    await userEvent.keyboard('{ArrowLeft}');
    expect(within(heard()).getByRole('button', { pressed: true })).toHaveTextContent('100');
    await userEvent.keyboard('?');
    expect(await screen.findByRole('dialog', { name: 'Keys' })).toHaveTextContent('play all takes in step');
  });

  it('tells how far all measurements are together', async () => {
    const waiting = samplePlace(1);
    const take = {
      ...waiting.take!,
      hasReport: false,
      measurement: measurement({ state: 'running', progress: 0.5 }),
    };
    const places = [samplePlace(0), { ...waiting, take }];
    open(answers(sampleTryOut({ places }), sampleRanking({ rows: [] })));
    expect(await line()).toHaveTextContent('The takes are being measured.');
    expect(screen.getByRole('progressbar', { name: 'Measuring the takes' })).toHaveAttribute(
      'aria-valuenow',
      '75',
    );
    expect(screen.getByText('1 of 2 takes measured')).toBeInTheDocument();
  });

  it('says which pairs never arrived, and leaves them out when asked', async () => {
    const lost = samplePlace(1, { take: null, fileNames: ['k2.wav', 'o2.wav'] });
    const { requests } = open({
      ...answers(sampleTryOut({ places: [samplePlace(0), lost] }), sampleRanking({ rows: [] })),
      [`DELETE ${paths.tryOutPlace(tryOutId, lost.id)}`]: json(sampleTryOut({ places: [samplePlace(0)] })),
    });
    expect(await screen.findByText('1 pair wasn’t sent yet:')).toBeInTheDocument();
    expect(screen.getByText('k2.wav and o2.wav')).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'leave it out' }));
    await waitFor(() => expect(requests.some(({ method }) => method === 'DELETE')).toBe(true));
  });

  it('moves its takes, takes them out and back in, and takes more in', async () => {
    const all = sampleTryOut();
    const [first] = all.places;
    const without = sampleTryOut({ places: all.places.slice(1) });
    const other = sampleListItem({ id: listId(40), number: 40, title: 'at noon' });
    const { requests } = open({
      ...answers(all, sampleRanking()),
      [`GET ${paths.takes}`]: json(sampleList([other])),
      [`PATCH ${paths.tryOutPlace(tryOutId, first.id)}`]: json(all),
      [`DELETE ${paths.tryOutPlace(tryOutId, first.id)}`]: json(without),
      [`POST ${paths.restoreTryOutPlace(tryOutId, first.id)}`]: json(all),
      [`POST ${paths.tryOutPlaces(tryOutId)}`]: json(all, 201),
    });
    await line();
    await userEvent.click(screen.getByRole('button', { name: 'change its takes' }));
    const position = screen.getByLabelText('Overhead at, take 1');
    await userEvent.clear(position);
    await userEvent.type(position, 'high');
    expect(screen.getByText('Write the position as a number.')).toBeInTheDocument();
    await userEvent.clear(position);
    await userEvent.type(position, '82{Enter}');
    await waitFor(() => expect(requests.at(-1)?.body).toEqual({ position: 82, label: '' }));
    await userEvent.click(screen.getByRole('button', { name: 'Take out take 16' }));
    expect(await screen.findByText(/take 16 is out of this try-out/)).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Take out take 16' })).not.toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }));
    expect(await screen.findByRole('button', { name: 'Take out take 16' })).toBeInTheDocument();
    await userEvent.selectOptions(screen.getByLabelText('Add a take that is there'), 'take 40, at noon');
    await waitFor(() =>
      expect(requests.find(({ path }) => path === paths.tryOutPlaces(tryOutId))?.body).toEqual({
        places: [{ takeId: other.id }],
      }),
    );
    expect(screen.getByRole('link', { name: 'new recordings' })).toHaveAttribute(
      'href',
      `/tryouts/new?to=${tryOutId}`,
    );
  });

  it('is deleted at once, and can be brought back where its list is', async () => {
    const { requests } = open({
      ...answers(sampleTryOut(), sampleRanking()),
      [`GET ${paths.takes}`]: json(sampleList([])),
      [`GET ${paths.tryOuts}`]: json({ items: [] }),
      [`DELETE ${paths.tryOut(tryOutId)}`]: () => ({ status: 204 }),
      [`POST ${paths.restoreTryOut(tryOutId)}`]: json(sampleTryOut()),
    });
    await line();
    await userEvent.click(screen.getByRole('button', { name: 'change its takes' }));
    await userEvent.click(screen.getByRole('button', { name: 'Delete this try-out' }));
    expect(await screen.findByText('The try-out is deleted. Its takes stay.')).toBeInTheDocument();
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }));
    expect(await screen.findByText('The try-out is back.')).toBeInTheDocument();
    expect(requests.some(({ path }) => path === paths.restoreTryOut(tryOutId))).toBe(true);
  });

  it('changes nothing on a phone that may only read', async () => {
    open({
      ...answers(sampleTryOut(), sampleRanking()),
      [`GET ${paths.me}`]: json({ ...sampleMe, readOnly: true }),
    });
    await line();
    expect(screen.queryByRole('radio')).not.toBeInTheDocument();
    expect(screen.queryByRole('button', { name: /the setup$/ })).not.toBeInTheDocument();
  });
});
