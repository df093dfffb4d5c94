import { paths } from '@thudline/contracts';
import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { sampleMe } from '../testing/sampleData';
import { roomId, sampleRoom } from '../testing/sampleRooms';
import { RoomsPage } from './RoomsPage';

function open(routes: FakeRoutes) {
  const server = fakeServer({ [`GET ${paths.me}`]: json(sampleMe), ...routes });
  return { server, ...renderPage([{ path: '/rooms', element: <RoomsPage /> }], '/rooms') };
}

beforeAll(() => {
  HTMLDialogElement.prototype.showModal = function () {
    this.open = true;
  };
  HTMLDialogElement.prototype.close = function () {
    this.open = false;
  };
});

describe('the rooms', () => {
  it('stand in a ruled table with what was recorded in them', async () => {
    open({ [`GET ${paths.rooms}`]: json({ items: [sampleRoom()] }) });
    const row = await screen.findByRole('row', { name: /^The garage/ });
    expect(
      within(row)
        .getAllByRole('cell', { hidden: true })
        .map((cell) => cell.textContent),
    ).toEqual(['5.2 × 3.1 × 2.4 m', '2', '15', '1 Dec']);
    expect(within(row).getByRole('link')).toHaveAttribute('href', `/rooms/${roomId}`);
  });

  it('are loading, then say what a first one is for', async () => {
    open({ [`GET ${paths.rooms}`]: json({ items: [] }) });
    expect(screen.getByRole('status', { name: 'Loading the rooms' })).toBeInTheDocument();
    expect(await screen.findByText('Your first room needs a name.')).toBeInTheDocument();
  });

  it('offer another try where they can’t be read', async () => {
    let broken = true;
    open({
      [`GET ${paths.rooms}`]: () =>
        broken
          ? { status: 500, json: { code: 'internal', message: 'Something went wrong here.' } }
          : { json: { items: [sampleRoom()] } },
    });
    expect(await screen.findByRole('alert')).toHaveTextContent('Something went wrong here.');
    broken = false;
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByRole('row', { name: /^The garage/ })).toBeInTheDocument();
  });

  it('take another one and open it; a refusal stays in the form', async () => {
    let refuses = true;
    const { server, address } = open({
      [`GET ${paths.rooms}`]: json({ items: [] }),
      [`POST ${paths.rooms}`]: () =>
        refuses
          ? refusal(409, 'conflict', 'You have 50 rooms.')()
          : { status: 201, json: sampleRoom({ name: 'Cellar' }) },
    });
    await userEvent.click(await screen.findByRole('button', { name: 'Add a room' }));
    await userEvent.type(screen.getByLabelText('Name'), 'Cellar');
    await userEvent.type(screen.getByLabelText('Length, m'), '4,2');
    await userEvent.click(screen.getByRole('button', { name: 'Keep this room' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('You have 50 rooms.');
    refuses = false;
    await userEvent.click(screen.getByRole('button', { name: 'Keep this room' }));
    expect(await screen.findByText('elsewhere')).toBeInTheDocument();
    expect(address()).toBe(`/rooms/${roomId}`);
    const sent = server.requests.filter(({ method }) => method === 'POST').at(-1)?.body;
    expect(sent).toMatchObject({ name: 'Cellar', shape: { kind: 'box', lengthM: 4.2, widthM: null } });
  });

  it('refuses what is no number before it is sent', async () => {
    const { server } = open({ [`GET ${paths.rooms}`]: json({ items: [] }) });
    await userEvent.click(await screen.findByRole('button', { name: 'Add a room' }));
    await userEvent.type(screen.getByLabelText('Name'), 'Cellar');
    await userEvent.type(screen.getByLabelText('Height, m'), 'two');
    await userEvent.click(screen.getByRole('button', { name: 'Keep this room' }));
    expect(await screen.findByText('One of the numbers can’t be read.')).toBeInTheDocument();
    expect(server.requests.filter(({ method }) => method === 'POST')).toEqual([]);
  });
});
