import { paths, type CreateRoomChangeRequest, type RoomTrendResponse } from '@thudline/contracts';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { sampleMe } from '../testing/sampleData';
import { roomId, roomTakeId, sampleChange, sampleRoom } from '../testing/sampleRooms';
import { RoomCalculatorPage } from './RoomCalculatorPage';

const trend: RoomTrendResponse = {
  figure: 'decay-1000',
  points: [
    {
      takeId: roomTakeId(8),
      number: 8,
      recordedAt: '2026-12-01T19:40:00.000Z',
      value: 0.38,
      iqr: 0.04,
      setup: null,
    },
  ],
};
const room = sampleRoom({ temperatureC: 20, kit: { xM: 3.45, yM: 1.5, turnedDeg: 0 } });
const served: FakeRoutes = {
  [`GET ${paths.me}`]: json(sampleMe),
  [`GET ${paths.room(roomId)}`]: json(room),
  [`GET ${paths.roomTrend(roomId)}`]: json(trend),
};

function open(routes: FakeRoutes = {}, search = '') {
  const server = fakeServer({ ...served, ...routes });
  const view = renderPage(
    [{ path: '/rooms/:roomId/calculator', element: <RoomCalculatorPage /> }],
    `/rooms/${roomId}/calculator${search}`,
  );
  return { ...server, ...view };
}

beforeAll(() => {
  HTMLDialogElement.prototype.showModal = function () {
    this.open = true;
  };
  HTMLDialogElement.prototype.close = function () {
    this.open = false;
  };
});

const head = () => screen.findByRole('heading', { level: 1 });

describe('the room calculator', () => {
  it('waits without jumping while the room is loading', () => {
    open({ [`GET ${paths.room(roomId)}`]: () => new Promise(() => undefined) });
    expect(screen.getByRole('status', { name: 'Loading' })).toBeInTheDocument();
  });

  it('opens with what a plan would do, and says that it is an estimate', async () => {
    open();
    expect(await head()).toHaveTextContent(/^8 m² of wool would calm 500 Hz: .* The boom at 65 Hz stays.$/);
    expect(
      screen.getByText(/an estimate before you spend anything · 5.20 × 3.10 × 2.40 m/),
    ).toBeInTheDocument();
    expect(screen.getByText('A box with hard walls, sound spread evenly.')).toBeInTheDocument();
    expect(screen.getByText(/Nobody wrote down what the walls and the ceiling are/)).toBeInTheDocument();
    expect(screen.getByText(/Local codes come first/)).toBeInTheDocument();
  });

  it('follows every word of its sentence, which stands in the address', async () => {
    const { address } = open();
    const before = (await head()).textContent;
    const area = screen.getByRole('spinbutton', { name: 'How much, m²' });
    await userEvent.clear(area);
    await userEvent.type(area, '4,5 m²{Enter}');
    expect(await head()).toHaveTextContent(/^4.5 m² of wool/);
    expect((await head()).textContent).not.toBe(before);
    await userEvent.selectOptions(screen.getByLabelText('Material'), 'curtain');
    expect(screen.queryByLabelText('Thickness')).not.toBeInTheDocument();
    await userEvent.selectOptions(screen.getByLabelText('Where'), 'back');
    expect(address()).toBe(`/rooms/${roomId}/calculator?m2=4.5&of=curtain&on=back`);
    await userEvent.type(area, '{ArrowUp}');
    expect(address()).toContain('m2=5&');
  });

  it('keeps a plan inside its spot, and says so', async () => {
    open({}, '?m2=500&of=carpet&on=floor');
    expect(await head()).toHaveTextContent(/^16.1 m² of carpet/);
    expect(screen.getByText('That is all there is: 16.1 m².')).toBeInTheDocument();
  });

  it('says how the kit stands to the chosen mode, and draws another by key', async () => {
    open();
    expect(
      await screen.findByText(
        'At 66 Hz the kit stands where the room gives nothing; try half a metre toward the right wall.',
      ),
    ).toBeInTheDocument();
    expect(
      screen.getByRole('img', {
        name: /none at 25 %, 75 % of the way from the left.*wool is drawn on both long/,
      }),
    ).toBeInTheDocument();
    expect(
      screen.getByRole('img', { name: /64.4 and 66.0 Hz: two close together, a boom/ }),
    ).toBeInTheDocument();
    await userEvent.click(screen.getByRole('radio', { name: '71.5 Hz, height' }));
    expect(screen.getByText(/72 Hz stands between floor and ceiling/)).toBeInTheDocument();
    expect(screen.getByRole('img', { name: /is the same everywhere on the plan/ })).toBeInTheDocument();
    const few = screen.getAllByRole('radio').length;
    await userEvent.click(screen.getByRole('button', { name: 'all modes' }));
    expect(screen.getAllByRole('radio').length).toBeGreaterThan(few);
  });

  it('tells the tails as a picture in words and as a table, beside what was measured', async () => {
    open();
    expect(
      await screen.findByRole('img', { name: /^125 Hz: .* s now, .* s with it. 250 Hz/ }),
    ).toBeInTheDocument();
    const table = screen.getByRole('table', { hidden: true });
    expect(within(table).getAllByRole('row', { hidden: true })).toHaveLength(7);
    expect(await screen.findByText(/^Take 8’s snare dies in 0.38 s at 1 kHz/)).toBeInTheDocument();
  });

  it('puts the plan into the room log as what it is', async () => {
    const { requests } = open({ [`POST ${paths.roomChanges(roomId)}`]: json(sampleChange(), 201) });
    await userEvent.click(await screen.findByRole('button', { name: 'Put this plan in the room log' }));
    expect(await screen.findByText(/marked as planned/)).toBeInTheDocument();
    const sent = requests.find(({ method }) => method === 'POST')?.body as CreateRoomChangeRequest;
    expect(sent).toMatchObject({
      what: 'Planned: 8 m² of mineral wool, 48 kg/m³, 10 cm thick, on both long walls',
      category: 'soft-material',
      afterTakeIds: [],
    });
    expect(sent.note).toContain('Not built yet.');
    expect(screen.getByRole('button', { name: 'Put this plan in the room log' })).toBeDisabled();
    await userEvent.click(screen.getByRole('button', { name: 'Try another' }));
    await waitFor(() =>
      expect(screen.getByRole('button', { name: 'Put this plan in the room log' })).toBeEnabled(),
    );
    expect(await head()).toHaveTextContent(/^4 m² of wool/);
  });

  it('says why where the log refuses it', async () => {
    open({ [`POST ${paths.roomChanges(roomId)}`]: refusal(409, 'conflict', 'Remove one first.') });
    await userEvent.click(await screen.findByRole('button', { name: 'Put this plan in the room log' }));
    expect(await screen.findByRole('alert')).toHaveTextContent('Remove one first.');
  });

  it('asks for the measures it needs, and takes them', async () => {
    const bare = sampleRoom({ shape: { kind: 'box', lengthM: 5, widthM: null, heightM: null } });
    const { requests } = open({
      [`GET ${paths.room(roomId)}`]: json(bare),
      [`PATCH ${paths.room(roomId)}`]: json(room),
    });
    expect(await head()).toHaveTextContent('Measure its width and height first.');
    await userEvent.click(screen.getByRole('button', { name: 'Write it down' }));
    const form = screen.getByRole('dialog', { name: 'The garage' });
    await userEvent.type(within(form).getByLabelText('Width, m'), '3.1');
    await userEvent.click(within(form).getByRole('button', { name: 'Keep this room' }));
    await waitFor(() => expect(requests.map(({ method }) => method)).toContain('PATCH'));
  });

  it('says that resonances can’t be told of a room that is no box, and tells its tails', async () => {
    const shape = { kind: 'other' as const, volumeM3: 40, surfaceM2: 85 };
    open({ [`GET ${paths.room(roomId)}`]: json(sampleRoom({ shape })) });
    expect(await screen.findByText(/Can’t tell: this room is not a box/)).toBeInTheDocument();
    expect(screen.getByRole('img', { name: /^125 Hz/ })).toBeInTheDocument();
    expect(screen.queryByLabelText('Where')).not.toBeInTheDocument();
  });

  it('on a phone that reads along can’t be written in', async () => {
    open({ [`GET ${paths.me}`]: json({ ...sampleMe, readOnly: true }) });
    await head();
    expect(screen.queryByRole('button', { name: /room log/ })).not.toBeInTheDocument();
  });

  it('says where there is no such room', async () => {
    open({ [`GET ${paths.room(roomId)}`]: refusal(404, 'not-found', 'There is nothing here.') });
    expect(await screen.findByText('There is no such room here.')).toBeInTheDocument();
  });

  it('offers another try where the room can’t be read', async () => {
    open({ [`GET ${paths.room(roomId)}`]: refusal(500, 'internal', 'Something went wrong here.') });
    expect(await screen.findByText('Something went wrong here.')).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Try again' })).toBeInTheDocument();
  });
});
