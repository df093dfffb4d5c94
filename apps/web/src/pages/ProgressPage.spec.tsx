import { paths, type TakeProgress } from '@thudline/contracts';
import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { ProgressPage } from './ProgressPage';

const takeId = (number: number) => `01890000-0000-7000-8000-0000000003${String(number).padStart(2, '0')}`;
const progressOf = (number: number, day: string, part: Partial<TakeProgress> = {}): TakeProgress => ({
  takeId: takeId(number),
  number,
  title: '',
  recordedAt: `${day}T19:40:00.000Z`,
  levelSpreadDb: 4,
  cymbalsOverDrumsDb: null,
  headroomDb: 6,
  clipped: false,
  ...part,
});

function open(takes: TakeProgress[] | null) {
  const answer = takes ? json({ takes }) : refusal(500, 'internal', 'Something went wrong here.');
  fakeServer({ [`GET ${paths.progress}`]: answer });
  renderPage([{ path: '/progress', element: <ProgressPage /> }], '/progress');
}

const days = ['01', '05', '08', '12', '15', '19', '22', '26', '29'];
const months = ['2026-09', '2026-10'];
const manyDays = months.flatMap((month) => days.map((day) => `${month}-${day}`));

describe('progress', () => {
  it('tells a clear change of the newer takes against the older ones, week by week', async () => {
    open(
      manyDays.map((day, i) =>
        progressOf(i + 1, day, { levelSpreadDb: i < 9 ? 4 + (i % 3) / 10 : 2 + (i % 3) / 10 }),
      ),
    );
    expect(await screen.findByRole('heading', { level: 1 })).toHaveTextContent(
      'Your kicks are more even than they were: within 2.1 dB in your newer 9 takes, within 4.1 dB before.',
    );
    expect(
      screen.getByRole('img', {
        name: 'level spread of kicks of 18 takes, from 4.0 dB in take 1 to 2.2 dB in take 18.',
      }),
    ).toBeInTheDocument();
    const [, newest] = within(screen.getByRole('table')).getAllByRole('row');
    expect(newest).toHaveTextContent('26 Oct 20262.2take 17 2.1, take 18 2.2');
    expect(within(newest).getByRole('link', { name: 'take 18' })).toHaveAttribute(
      'href',
      `/takes/${takeId(18)}`,
    );
  });

  it('says where nothing clear changed', async () => {
    open(manyDays.map((day, i) => progressOf(i + 1, day, { levelSpreadDb: 3 + (i % 4) })));
    expect(await screen.findByRole('heading', { level: 1 })).toHaveTextContent(
      /^No clear change in level spread of kicks:/,
    );
  });

  it('says where it is too early, and shows what there is', async () => {
    open([progressOf(1, '2026-10-05')]);
    expect(await screen.findByRole('heading', { level: 1 })).toHaveTextContent(
      'Too early to tell. A change of level spread of kicks shows from 12 takes on; 1 take tells it so far.',
    );
    expect(screen.getByRole('table')).toBeInTheDocument();
  });

  it('shows another figure when asked, and says where no take tells it', async () => {
    open([progressOf(1, '2026-10-05', { headroomDb: null, clipped: true }), progressOf(2, '2026-10-15')]);
    await userEvent.selectOptions(await screen.findByLabelText('Figure'), 'headroom');
    expect(screen.getByRole('img', { name: /^headroom of the hardest kick of 1 take/ })).toBeInTheDocument();
    expect(screen.getByText(/A cross is a take that clipped\.$/)).toBeInTheDocument();
    await userEvent.selectOptions(screen.getByLabelText('Figure'), 'cymbals-over-drums');
    expect(screen.getByText(/No take tells it yet/)).toBeInTheDocument();
    expect(screen.queryByRole('table')).not.toBeInTheDocument();
  });

  it('leads to a first take where there is none', async () => {
    open([]);
    expect(await screen.findByText('No take is measured yet.')).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Add a take' })).toHaveAttribute('href', '/takes/new');
  });

  it('offers another try where it can’t be read', async () => {
    open(null);
    expect(await screen.findByText('Something went wrong here.')).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Try again' })).toBeInTheDocument();
  });
});
