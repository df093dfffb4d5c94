import { paths, type CreateTryOutRequest } from '@thudline/contracts';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { fakeUploads } from '../testing/fakeXhr';
import { renderPage } from '../testing/renderPage';
import { sampleMe, sampleTake } from '../testing/sampleData';
import { listId } from '../testing/sampleList';
import { sampleTryOut, tryOutId } from '../testing/sampleTryOut';
import { toneFile } from '../testing/sampleWav';
import { NewTryOutPage } from './NewTryOutPage';
import { TryOutsPage } from './TryOutsPage';

function open(routes: FakeRoutes = {}, at = '/tryouts/new') {
  const server = fakeServer({
    [`GET ${paths.me}`]: json(sampleMe),
    [`POST ${paths.tryOuts}`]: json(sampleTryOut(), 201),
    ...routes,
  });
  const page = renderPage(
    [
      { path: '/tryouts/new', element: <NewTryOutPage /> },
      { path: '/tryouts', element: <TryOutsPage /> },
    ],
    at,
  );
  return { ...server, ...page };
}

const posted = (requests: { method: string; body: unknown }[]) =>
  requests.find(({ method }) => method === 'POST')?.body as CreateTryOutRequest | undefined;

describe('starting a try-out', () => {
  it('pairs many files, lets pairs be put right, and sends them two at a time', async () => {
    const uploads = fakeUploads();
    const { requests, address } = open();
    const names = ['kick 90cm.wav', 'oh 90cm.wav', 'kick 100cm.wav', 'oh 100cm.wav'];
    await userEvent.upload(
      await screen.findByLabelText('WAV files'),
      names.map((name) => toneFile(name)),
    );
    expect(await screen.findByRole('heading', { name: /^Two pairs are here\./ })).toBeInTheDocument();
    const rows = within(screen.getByRole('list', { name: 'Takes of the try-out' })).getAllByRole('listitem');
    expect(rows).toHaveLength(2);
    expect(screen.getByLabelText('Overhead at, take 1')).toHaveValue('90');
    const overhead = screen.getByRole('combobox', { name: 'Overhead file of pair 1' });
    await userEvent.selectOptions(overhead, 'oh 100cm.wav');
    expect(screen.getByRole('combobox', { name: 'Overhead file of pair 2' })).toHaveDisplayValue(
      'oh 90cm.wav',
    );
    await userEvent.click(screen.getByRole('radio', { name: 'Take 2 is how things stand now' }));
    await userEvent.clear(screen.getByLabelText('Overhead at, take 1'));
    await userEvent.type(screen.getByLabelText('Overhead at, take 1'), '85');
    await userEvent.click(screen.getByRole('button', { name: 'Send and rank them' }));
    await waitFor(() => expect(address()).toBe(`/tryouts/${tryOutId}`));
    expect(posted(requests)).toMatchObject({
      subject: 'overhead-height',
      currentIndex: 1,
      places: [
        { position: 85, fileNames: ['kick 90cm.wav', 'oh 100cm.wav'] },
        { position: 100, fileNames: ['kick 100cm.wav', 'oh 90cm.wav'] },
      ],
    });
    expect(uploads.map(({ form }) => form?.get('uploadKey'))).toEqual(
      posted(requests)?.places.map(({ uploadKey }) => uploadKey),
    );
  });

  it('says what is missing, and keeps what was refused by the server', async () => {
    const { address } = open({ [`POST ${paths.tryOuts}`]: refusal(400, 'bad-request', 'No.') });
    await userEvent.click(await screen.findByRole('button', { name: 'Make the try-out' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('A try-out needs at least two takes.');
    await userEvent.upload(
      screen.getByLabelText('WAV files'),
      ['k1.wav', 'oh1.wav', 'k2.wav', 'oh2.wav'].map((name) => toneFile(name)),
    );
    await screen.findByRole('heading', { name: /^Two pairs are here\./ });
    await userEvent.click(screen.getByRole('button', { name: 'Send and rank them' }));
    expect(await screen.findByText('No.')).toBeInTheDocument();
    expect(address()).toBe('/tryouts/new');
  });

  it('is made of takes that are there', async () => {
    const ids = [16, 17].map(listId);
    const { requests, address } = open(
      {
        [`GET ${paths.take(ids[0])}`]: json(sampleTake({ id: ids[0], number: 16, title: 'felt' })),
        [`GET ${paths.take(ids[1])}`]: json(sampleTake({ id: ids[1], number: 17, title: 'wood' })),
      },
      `/tryouts/new?takes=${ids.join(',')}`,
    );
    await userEvent.selectOptions(await screen.findByRole('combobox', { name: 'What differs' }), 'other');
    await userEvent.type(screen.getByLabelText('What differs, in a few words'), 'the beater');
    await userEvent.type(screen.getByLabelText('The beater, take 1'), 'felt');
    await userEvent.click(screen.getByRole('button', { name: 'Make the try-out' }));
    await waitFor(() => expect(address()).toBe(`/tryouts/${tryOutId}`));
    expect(posted(requests)).toMatchObject({
      differs: 'the beater',
      unit: 'label',
      places: [{ takeId: ids[0], label: 'felt' }, { takeId: ids[1] }],
    });
  });
});

describe('the list of try-outs', () => {
  const { places, ...head } = sampleTryOut();
  const item = { ...head, takeCount: 5, winner: places[2], winnerPlaceId: places[2].id };

  it('says what differed and who won', async () => {
    open({ [`GET ${paths.tryOuts}`]: json({ items: [item] }) }, '/tryouts');
    const row = await screen.findByRole('listitem');
    expect(row).toHaveTextContent(/^How high the overhead hangs5 takes100 cm won4 Dec/);
    expect(within(row).getByRole('link')).toHaveAttribute('href', `/tryouts/${tryOutId}`);
  });

  it('invites where there is none, and tries again where it could not be read', async () => {
    let working = false;
    open(
      {
        [`GET ${paths.tryOuts}`]: () =>
          working ? json({ items: [] })() : refusal(503, 'internal', 'Away.')(),
      },
      '/tryouts',
    );
    expect(await screen.findByRole('alert')).toHaveTextContent('The try-outs could not be read. Away.');
    working = true;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByRole('link', { name: 'Start a try-out' })).toHaveAttribute(
      'href',
      '/tryouts/new',
    );
  });
});
