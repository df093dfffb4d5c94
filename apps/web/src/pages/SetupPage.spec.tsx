import { paths, setupResponse, type SetupResponse } from '@thudline/contracts';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { sampleMe } from '../testing/sampleData';
import { sampleSetup } from '../testing/sampleSetups';
import { NewSetupPage } from './NewSetupPage';
import { SetupPage } from './SetupPage';

const setup = sampleSetup();
const answer = (value: SetupResponse) => json(setupResponse.parse(value));

function open(routes: FakeRoutes, at = `/setups/${setup.id}`) {
  const server = fakeServer({ [`GET ${paths.me}`]: json(sampleMe), ...routes });
  const pages = [
    { path: '/setups/new', element: <NewSetupPage /> },
    { path: '/setups/:setupId', element: <SetupPage /> },
  ];
  return { ...server, ...renderPage(pages, at) };
}
const opened = (value = setup, more: FakeRoutes = {}) =>
  open({ [`GET ${paths.setup(setup.id)}`]: answer(value), ...more });
const field = (name: string) => screen.findByRole('textbox', { name });
const headline = () => screen.getByRole('heading', { level: 1 });
const rewrite = async (name: string, text: string) => {
  await userEvent.clear(await field(name));
  if (text) await userEvent.type(await field(name), text);
};

describe('a setup', () => {
  it('keeps its place while it is loading', () => {
    open({ [`GET ${paths.setup(setup.id)}`]: () => new Promise(() => undefined) });
    expect(screen.getByRole('status', { name: 'Loading' })).toBeInTheDocument();
  });

  it('says what went wrong and is read again', async () => {
    let working = false;
    open({
      [`GET ${paths.setup(setup.id)}`]: () =>
        working ? answer(setup)() : refusal(503, 'storage-unavailable', 'The store is away.')(),
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('The store is away.');
    working = true;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await field('Name')).toHaveValue('one overhead, high');
  });

  it('that isn’t there leads to those that are', async () => {
    open({});
    expect(await screen.findByRole('alert')).toHaveTextContent('There is no such setup here.');
    expect(screen.getByRole('link', { name: 'Go to your setups' })).toHaveAttribute('href', '/setups');
  });

  it('asks before what was written is lost, and not when nothing was', async () => {
    opened();
    await rewrite('Above the snare', '95');
    await userEvent.click(screen.getByRole('link', { name: 'Setups' }));
    const question = await screen.findByRole('alertdialog', { name: 'This setup isn’t kept yet' });
    await userEvent.click(within(question).getByRole('button', { name: 'Stay here' }));
    expect(await field('Above the snare')).toHaveValue('95');
    await rewrite('Above the snare', '90');
    await userEvent.click(screen.getByRole('link', { name: 'Setups' }));
    await waitFor(() => expect(screen.queryByRole('textbox')).not.toBeInTheDocument());
  });

  it('sets the tape beside the sound, in words and in the picture', async () => {
    opened();
    expect(await field('Above the snare')).toHaveValue('90');
    expect(headline()).toHaveTextContent('One overhead, high. The tape and the sound agree within 3 cm.');
    expect(
      screen.getByRole('img', {
        name: 'From where the beater strikes: kick microphone 33 cm; overhead 129 cm.',
      }),
    ).toBeInTheDocument();
    expect(
      screen.getByRole('img', {
        name: 'take 17 measured 93 cm, 2.7 ms; the numbers say 96 cm, 2.8 ms',
      }),
    ).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'used by take 17' })).toHaveAttribute(
      'href',
      `/takes?setup=${setup.id}`,
    );
  });

  it('is drawn anew with each number that is typed', async () => {
    opened();
    await rewrite('Above the snare', '150');
    expect(headline()).toHaveTextContent('The tape and the sound are 62 cm apart.');
    expect(screen.getByText(/^A microphone was moved/)).toBeInTheDocument();
    await rewrite('Height', '');
    expect(screen.getByText('For the distance, still empty: height.')).toBeInTheDocument();
    expect(screen.getByRole('img', { name: /kick microphone not drawn as a whole/ })).toBeInTheDocument();
  });

  it('says where a number is none, and keeps the one before', async () => {
    opened();
    await rewrite('Height', 'knee');
    expect(await screen.findByRole('alert')).toHaveTextContent('Write a number.');
  });

  it('is written in inches for whoever reads inches', async () => {
    const inches = { ...sampleMe, settings: { ...sampleMe.settings, lengthUnit: 'foot' as const } };
    opened(setup, { [`GET ${paths.me}`]: json(inches) });
    expect(await field('Above the snare')).toHaveValue('35.4');
    expect(headline()).toHaveTextContent('agree within 1 in.');
  });

  it('is kept as a whole, and says so', async () => {
    let kept = setup;
    const { requests } = opened(setup, {
      [`PATCH ${paths.setup(setup.id)}`]: (body) => {
        kept = { ...kept, ...(body as Partial<SetupResponse>) };
        return answer(kept)();
      },
    });
    await rewrite('Height', '30');
    expect(screen.getByText('Not kept yet.')).toBeInTheDocument();
    expect(screen.getByText(/^Used by take 17, which will say the new numbers too/)).toBeInTheDocument();
    await userEvent.click(screen.getByRole('checkbox', { name: 'kick low cut' }));
    await userEvent.click(screen.getByRole('button', { name: 'Keep this setup' }));
    expect(await screen.findByText('Kept.')).toBeInTheDocument();
    expect(requests.find(({ method }) => method === 'PATCH')?.body).toMatchObject({
      kick: { heightCm: 30, insideCm: 8 },
      kickPreamp: { lowCut: true, pad: true },
    });
  });

  it('keeps what is written when it could not be kept', async () => {
    opened(setup, {
      [`PATCH ${paths.setup(setup.id)}`]: refusal(400, 'bad-request', 'A distance lies elsewhere.'),
    });
    await rewrite('Height', '450');
    await userEvent.click(screen.getByRole('button', { name: 'Keep this setup' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('A distance lies elsewhere.');
    expect(await field('Height')).toHaveValue('450');
  });

  it('is copied with what was changed, and nothing is written before it is kept', async () => {
    const copy = sampleSetup({ id: '01890000-0000-7000-8000-000000000052', name: 'lower' });
    const { requests, address } = opened(setup, {
      [`POST ${paths.setups}`]: () => ({ status: 201, json: copy }),
      [`GET ${paths.setup(copy.id)}`]: answer(copy),
    });
    await rewrite('Above the snare', '70');
    await userEvent.click(screen.getByRole('button', { name: 'Copy with changes' }));
    await waitFor(() => expect(address()).toBe(`/setups/new?from=${setup.id}`));
    expect(await field('Above the snare')).toHaveValue('70');
    expect(requests.some(({ method }) => method !== 'GET')).toBe(false);
    await userEvent.type(await field('Name'), 'lower');
    await userEvent.click(screen.getByRole('button', { name: 'Keep this setup' }));
    await waitFor(() => expect(address()).toBe(`/setups/${copy.id}`));
    expect(requests.find(({ method }) => method === 'POST')?.body).toMatchObject({
      name: 'lower',
      copiedFromId: setup.id,
      overhead: { aboveSnareCm: 70 },
    });
  });

  it('is removed where no take has it', async () => {
    const unused = sampleSetup({ takeCount: 0, takes: [], measured: null });
    const { address } = opened(unused, { [`DELETE ${paths.setup(setup.id)}`]: () => ({ status: 204 }) });
    await userEvent.click(await screen.findByRole('button', { name: 'Remove it' }));
    await waitFor(() => expect(address()).toBe('/setups'));
  });

  it('shows its photo, and lets go of it', async () => {
    const photo = { id: '01890000-0000-7000-8000-000000000077', widthPx: 1024, heightPx: 768 };
    opened(sampleSetup({ photo }), { [`DELETE ${paths.setupPhoto(setup.id)}`]: answer(setup) });
    expect(await screen.findByRole('img', { name: 'How “one overhead, high” stood' })).toHaveAttribute(
      'src',
      paths.photo(photo.id),
    );
    await userEvent.click(screen.getByRole('button', { name: 'Take it off' }));
    expect(await screen.findByRole('button', { name: 'Add a photo' })).toBeInTheDocument();
  });

  it('is only read on a phone that reads along', async () => {
    opened(setup, { [`GET ${paths.me}`]: json({ ...sampleMe, readOnly: true }) });
    await field('Name');
    expect(screen.queryByRole('button')).not.toBeInTheDocument();
  });
});

describe('a new setup', () => {
  it('may stay empty', async () => {
    const { requests, address } = open(
      {
        [`POST ${paths.setups}`]: () => ({ status: 201, json: setup }),
        [`GET ${paths.setup(setup.id)}`]: answer(setup),
      },
      '/setups/new',
    );
    await field('Name');
    expect(headline()).toHaveTextContent('A new setup. Write down what you measured with a tape.');
    await userEvent.click(screen.getByRole('button', { name: 'Keep this setup' }));
    await waitFor(() => expect(address()).toBe(`/setups/${setup.id}`));
    expect(requests.find(({ method }) => method === 'POST')?.body).toMatchObject({
      name: '',
      kick: { insideCm: null },
    });
  });
});
