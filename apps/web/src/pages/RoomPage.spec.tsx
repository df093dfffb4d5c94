import { paths, type RoomTrendResponse } from '@thudline/contracts';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { sampleMe } from '../testing/sampleData';
import { openChange, roomId, roomTakeId, sampleChange, sampleLog, sampleRoom } from '../testing/sampleRooms';
import { RoomPage } from './RoomPage';

const trend: RoomTrendResponse = {
  figure: 'decay-500',
  points: [
    {
      takeId: roomTakeId(1),
      number: 1,
      recordedAt: '2026-10-05T19:40:00.000Z',
      value: 0.62,
      iqr: 0.06,
      setup: null,
    },
    {
      takeId: roomTakeId(9),
      number: 9,
      recordedAt: '2026-12-01T19:40:00.000Z',
      value: 0.49,
      iqr: 0.05,
      setup: null,
    },
  ],
};
const served: FakeRoutes = {
  [`GET ${paths.me}`]: json(sampleMe),
  [`GET ${paths.shares}`]: json({ items: [] }),
  [`GET ${paths.room(roomId)}`]: json(sampleRoom()),
  [`GET ${paths.roomChanges(roomId)}?told=8`]: json(sampleLog()),
  [`GET ${paths.roomTrend(roomId)}`]: json(trend),
};

function open(routes: FakeRoutes = {}) {
  const server = fakeServer({ ...served, ...routes });
  renderPage([{ path: '/rooms/:roomId', element: <RoomPage /> }], `/rooms/${roomId}`);
  return server;
}

beforeAll(() => {
  HTMLDialogElement.prototype.showModal = function () {
    this.open = true;
  };
  HTMLDialogElement.prototype.close = function () {
    this.open = false;
  };
});

describe('a room’s log', () => {
  it('waits without jumping while it is loading', () => {
    open({ [`GET ${paths.room(roomId)}`]: () => new Promise(() => undefined) });
    expect(screen.getByRole('status', { name: 'Loading' })).toBeInTheDocument();
  });

  it('opens with what the newest comparable change did', async () => {
    open();
    expect(await screen.findByRole('heading', { level: 1 })).toHaveTextContent(
      'Moving blankets on the back wall: a snare dies 0.11 s sooner at 500 Hz.',
    );
    expect(screen.getByText('The garage · room log · 2 changes, 15 takes since 5 Oct')).toBeInTheDocument();
  });

  it('tells each change with its takes, its sentence and its figures', async () => {
    open();
    const [newest, oldest] = await screen
      .findAllByRole('listitem')
      .then((items) => items.filter((item) => item.tagName === 'LI'));
    expect(newest).toHaveTextContent('30 Nov');
    expect(newest).toHaveTextContent(
      'soft material · on the plan · 30 spent · before: take 7 · after: takes 8, 9',
    );
    expect(newest).toHaveTextContent('Sure: 22 hits before, 41 after.');
    expect(within(newest).getByText('0.60 → 0.49 s, shorter')).toBeInTheDocument();
    expect(
      within(newest).getByRole('img', {
        name: 'decay at 500 Hz: 0.60 s before, 0.49 s after (−18 %), shorter.',
      }),
    ).toBeInTheDocument();
    expect(within(newest).getAllByText('no clear change')).not.toHaveLength(0);
    expect(within(newest).getByRole('link', { name: 'take 7' })).toHaveAttribute(
      'href',
      `/takes/${roomTakeId(7)}`,
    );
    expect(oldest).toHaveTextContent('No take since then. Record one the way you recorded take 1');
    expect(within(oldest).getByRole('link', { name: 'Add the after take' })).toBeInTheDocument();
  });

  it('shows a long log at once, and what its older changes did after that', async () => {
    const did = { status: 'cannot-tell' as const, strong: 'Not measured yet.', rest: '' };
    const older = sampleChange({ number: 1, what: 'Rug', isTold: false, did, figures: [] });
    let tell: () => void = () => undefined;
    const whole = new Promise<void>((resolve) => (tell = resolve));
    open({
      [`GET ${paths.roomChanges(roomId)}?told=8`]: json(sampleLog([sampleChange(), older])),
      [`GET ${paths.roomChanges(roomId)}`]: async () => {
        await whole;
        return { json: sampleLog([sampleChange(), { ...older, isTold: true, did: sampleChange().did }]) };
      },
    });
    expect(await screen.findByText('Comparing its takes…')).toBeInTheDocument();
    tell();
    await waitFor(() => expect(screen.queryByText('Comparing its takes…')).not.toBeInTheDocument());
    expect(screen.getAllByText('A snare dies 0.11 s sooner at 500 Hz.')).toHaveLength(2);
  });

  it('says what lies between the takes as well, and where a photo shows it', async () => {
    const photo = { id: roomTakeId(77), widthPx: 640, heightPx: 480 };
    const change = sampleChange({ caveats: ['Change 1 lies between these takes as well.'], photo });
    open({ [`GET ${paths.roomChanges(roomId)}?told=8`]: json(sampleLog([change])) });
    expect(await screen.findByText('Change 1 lies between these takes as well.')).toBeInTheDocument();
    expect(screen.getByRole('img', { name: `Change 2: ${change.what}` })).toHaveAttribute(
      'src',
      paths.photo(photo.id),
    );
  });

  it('puts a change before another one of its day', async () => {
    const later = sampleChange({ number: 3, what: 'Curtain' });
    const server = open({
      [`GET ${paths.roomChanges(roomId)}?told=8`]: json(sampleLog([later, sampleChange()])),
      [`PATCH ${paths.roomChange(roomId, sampleChange().id)}`]: json(sampleChange()),
      [`PATCH ${paths.roomChange(roomId, later.id)}`]: json(later),
    });
    await userEvent.click(await screen.findByRole('button', { name: 'put change 3 earlier that day' }));
    await waitFor(() =>
      expect(
        server.requests.filter(({ method }) => method === 'PATCH').map(({ path, body }) => [path, body]),
      ).toEqual([[paths.roomChange(roomId, sampleChange().id), { rank: 1 }]]),
    );
    expect(screen.queryByRole('button', { name: 'put change 3 later that day' })).not.toBeInTheDocument();
  });

  it('draws a figure over time, and another when asked', async () => {
    const server = open();
    expect(
      await screen.findByRole('img', { name: /^decay at 500 Hz of 2 takes, from 0.62 s on 5 Oct to 0.49 s/ }),
    ).toBeInTheDocument();
    await userEvent.selectOptions(screen.getByLabelText('Figure'), 'noise-overhead');
    await waitFor(() =>
      expect(server.requests.map(({ path }) => path)).toContain(
        `${paths.roomTrend(roomId)}?figure=noise-overhead`,
      ),
    );
  });

  it('says where no take tells the figure yet, and offers another try where it can’t be read', async () => {
    open({ [`GET ${paths.roomTrend(roomId)}`]: json({ ...trend, points: [] }) });
    expect(await screen.findByText(/No take of this room tells decay at 500 Hz yet/)).toBeInTheDocument();
  });

  it('offers another try where the figure can’t be read', async () => {
    open({ [`GET ${paths.roomTrend(roomId)}`]: refusal(500, 'internal', 'Something went wrong here.') });
    expect(await screen.findByText('Something went wrong here.')).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Try again' })).toBeInTheDocument();
  });

  it('draws the plan to scale, in words for whoever can’t see it, beside the caution', async () => {
    open();
    expect(
      await screen.findByRole('img', {
        name: 'The garage from above, to scale, with the kit. Changes: 2, Moving blankets on the back wall.',
      }),
    ).toBeInTheDocument();
    expect(screen.getByText(/5.2 × 3.1 × 2.4 m · concrete or terrazzo floor/)).toBeInTheDocument();
    expect(screen.getByText(/Fix it so that it can’t fall/)).toBeInTheDocument();
  });

  it('says what to write down where there is no plan, and nothing of takes where there is no change', async () => {
    const shape = { kind: 'other' as const, volumeM3: 38, surfaceM2: null };
    open({
      [`GET ${paths.room(roomId)}`]: json(sampleRoom({ shape, changeCount: 0 })),
      [`GET ${paths.roomChanges(roomId)}?told=8`]: json(sampleLog([])),
    });
    expect(await screen.findByRole('heading', { level: 1 })).toHaveTextContent(
      'Nothing is written down yet.',
    );
    expect(screen.getByText(/Write down its length and width/)).toBeInTheDocument();
    expect(screen.queryByRole('heading', { name: /What changed/ })).not.toBeInTheDocument();
  });

  it('takes a change with the takes it suggests by day', async () => {
    const server = open({ [`POST ${paths.roomChanges(roomId)}`]: json(sampleChange(), 201) });
    await userEvent.click(await screen.findByRole('button', { name: 'I changed something' }));
    const form = screen.getByRole('dialog', { name: 'What did you change?' });
    await userEvent.type(within(form).getByLabelText('What you changed'), 'Rug');
    await userEvent.clear(within(form).getByLabelText('Day'));
    await userEvent.type(within(form).getByLabelText('Day'), '2026-11-25');
    expect(within(form).getByRole('checkbox', { name: /take 7/ })).toBeChecked();
    expect(within(form).getByRole('checkbox', { name: /take 8/ })).toBeChecked();
    expect(within(form).getByRole('checkbox', { name: /take 9/ })).not.toBeChecked();
    await userEvent.click(within(form).getByRole('checkbox', { name: /take 9/ }));
    await userEvent.click(within(form).getByRole('button', { name: 'Keep it in the log' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
    expect(server.requests).toContainEqual({
      method: 'POST',
      path: paths.roomChanges(roomId),
      body: {
        what: 'Rug',
        happenedOn: '2026-11-25',
        category: 'other',
        cost: '',
        note: '',
        place: null,
        beforeTakeIds: [roomTakeId(7)],
        afterTakeIds: [roomTakeId(8), roomTakeId(9)],
      },
    });
  });

  it('keeps the form open with the sentence where a change is refused', async () => {
    const path = paths.roomChange(roomId, openChange.id);
    open({ [`PATCH ${path}`]: refusal(400, 'bad-request', 'Say what you changed.') });
    await userEvent.click(await screen.findByRole('button', { name: 'edit change 1' }));
    const form = screen.getByRole('dialog', { name: 'Change 1' });
    await userEvent.click(within(form).getByRole('button', { name: 'Keep it in the log' }));
    expect(await within(form).findByRole('alert')).toHaveTextContent('Say what you changed.');
  });

  it('takes what is written down of the room, in the reader’s units', async () => {
    const me = { ...sampleMe, settings: { ...sampleMe.settings, lengthUnit: 'foot' as const } };
    const server = open({
      [`GET ${paths.me}`]: json(me),
      [`PATCH ${paths.room(roomId)}`]: json(sampleRoom()),
    });
    await userEvent.click(await screen.findByRole('button', { name: 'change what is written down' }));
    const form = screen.getByRole('dialog', { name: 'The garage' });
    const length = within(form).getByLabelText('Length, ft');
    expect(length).toHaveValue('17.06');
    await userEvent.clear(length);
    await userEvent.type(length, '16,4042');
    await userEvent.click(within(form).getByRole('button', { name: 'Keep this room' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
    const sent = server.requests.find(({ method }) => method === 'PATCH')?.body as {
      shape: { lengthM: number };
    };
    expect(sent.shape.lengthM).toBeCloseTo(5, 3);
  });

  it('takes parts of its sides and the place of the kit, by key and by number', async () => {
    const server = open({ [`PATCH ${paths.room(roomId)}`]: json(sampleRoom()) });
    await userEvent.click(await screen.findByRole('button', { name: 'change what is written down' }));
    const form = screen.getByRole('dialog', { name: 'The garage' });
    await userEvent.click(within(form).getByRole('button', { name: 'add a part to: Left wall' }));
    await userEvent.type(within(form).getByLabelText('Part, m²'), '2,1');
    const kit = within(form).getByRole('button', {
      name: /^Kit, 3.00 m from the left, 1.60 m from the front/,
    });
    kit.focus();
    await userEvent.keyboard('{ArrowLeft}{ArrowLeft}{ArrowUp}');
    expect(within(form).getByLabelText('From the left, m')).toHaveValue('2.8');
    await userEvent.clear(within(form).getByLabelText('Turned, °'));
    await userEvent.type(within(form).getByLabelText('Turned, °'), '90');
    await userEvent.click(within(form).getByRole('button', { name: 'Keep this room' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
    expect(server.requests.find(({ method }) => method === 'PATCH')?.body).toMatchObject({
      surfaces: [
        { place: 'floor', materialId: 'concrete-floor', areaM2: null },
        { place: 'left', materialId: 'timber-door', areaM2: 2.1 },
      ],
      kit: { xM: 2.8, yM: 1.7, turnedDeg: 90 },
    });
  });

  it('takes the kit off its plan, and puts it in the middle', async () => {
    open();
    await userEvent.click(await screen.findByRole('button', { name: 'change what is written down' }));
    const form = screen.getByRole('dialog', { name: 'The garage' });
    await userEvent.click(within(form).getByRole('button', { name: 'take the kit off the plan' }));
    expect(within(form).getByLabelText('From the left, m')).toHaveValue('');
    await userEvent.click(within(form).getByRole('button', { name: 'Put the kit on the plan' }));
    expect(within(form).getByRole('button', { name: /^Kit, 2.60 m from the left/ })).toBeInTheDocument();
  });

  it('on a phone that reads along can’t be written in', async () => {
    open({ [`GET ${paths.me}`]: json({ ...sampleMe, readOnly: true }) });
    await screen.findByRole('heading', { level: 1 });
    expect(screen.queryByRole('button', { name: /changed|edit|written down/ })).not.toBeInTheDocument();
  });

  it('says where there is no such room, and offers another try where it can’t be read', async () => {
    open({ [`GET ${paths.room(roomId)}`]: refusal(404, 'not-found', 'There is nothing here.') });
    expect(await screen.findByText('There is no such room here.')).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Go to your rooms' })).toHaveAttribute('href', '/rooms');
  });
});
