import { paths, type ListNotesResponse, type NoteThread } from '@thudline/contracts';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { fakeEvents } from '../testing/fakeEvents';
import { fakeServer, json, refusal, type FakeRoutes } from '../testing/fakeServer';
import { renderPage } from '../testing/renderPage';
import { sampleMe, samplePeaks, takeId } from '../testing/sampleData';
import { noteId, sampleNote, sampleNotes, sampleThread } from '../testing/sampleNotes';
import { servedSheet } from '../testing/sampleSheet';
import { SheetPage } from './SheetPage';

/** jsdom has no canvas to draw outlines on. */
jest.mock('wavesurfer.js', () => ({
  __esModule: true,
  default: { create: () => ({ on() {}, destroy() {} }) },
}));

function open(notes: ListNotesResponse, routes: FakeRoutes = {}) {
  const server = fakeServer({
    [`GET ${paths.me}`]: json(sampleMe),
    ...servedSheet(),
    [`GET ${paths.peaks(takeId)}`]: () => samplePeaks(),
    [`GET ${paths.notes(takeId)}`]: json(notes),
    [`POST ${paths.readNotes(takeId)}`]: () => ({ status: 204 }),
    ...routes,
  });
  renderPage([{ path: '/takes/:takeId', element: <SheetPage /> }], `/takes/${takeId}`);
  return server;
}

const onFlip = sampleThread({
  nextItems: [{ id: noteId(50), text: 'Flip the overhead', doneAt: null, isNews: false }],
});
const onHit = sampleThread({
  id: noteId(2),
  pin: { kind: 'hit', timeS: 4.3 },
  body: 'Set the gain on *these*.',
});
const sent = ({ requests }: ReturnType<typeof open>, method: string, path: string) =>
  requests.filter((request) => request.method === method && request.path === path).map(({ body }) => body);

describe('notes on the sheet', () => {
  it('stand in the margin beside what they speak of, with a letter behind its sentence', async () => {
    open(sampleNotes([onFlip, onHit]));
    const mark = await screen.findByRole('link', { name: 'Note a, Oda' });
    expect(mark.closest('section')).toBe(screen.getByRole('region', { name: 'Levels: hot' }));
    const levels = within(screen.getByRole('region', { name: 'Levels: hot' }));
    expect(levels.getByText(/loudest kick, 0:04.3/)).toBeInTheDocument();
    expect(levels.getByText('these').tagName).toBe('EM');
    const adding = within(screen.getByRole('region', { name: 'Adding up: flip' }));
    expect(adding.getByText('Flip it and play eight bars again.')).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Notes 2' })).toHaveAttribute('href', '#notes');
  });

  it('say so where nobody has written, and the sheet stays when they can’t be loaded', async () => {
    open(sampleNotes());
    expect(await screen.findByText('Nobody has written on this sheet yet.')).toBeInTheDocument();
  });

  it('can be asked for again', async () => {
    let working = false;
    open(sampleNotes(), {
      [`GET ${paths.notes(takeId)}`]: () =>
        working ? json(sampleNotes())() : refusal(500, 'internal', 'Try again in a moment.')(),
    });
    expect(await screen.findByText(/The notes could not be loaded./)).toBeInTheDocument();
    expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent('Flip the overhead:');
    working = true;
    const section = within(screen.getByRole('region', { name: 'Notes' }));
    await userEvent.click(section.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByText('Nobody has written on this sheet yet.')).toBeInTheDocument();
  });

  it('are pins on the whole take, which play from there', async () => {
    open(sampleNotes([onHit]));
    const pins = await screen.findByRole('group', { name: 'Notes on the take' });
    expect(
      within(pins).getByRole('button', { name: 'Play from note a, Oda, loudest kick, 0:04.3' }),
    ).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Play from there' })).toBeInTheDocument();
  });

  it('marks what is new, and tells the server that it was on the page', async () => {
    const note = sampleThread({ isNew: true });
    const server = open(sampleNotes([note]));
    expect(await screen.findByRole('link', { name: /^Notes 1 ?, 1 new$/ })).toBeInTheDocument();
    await waitFor(() =>
      expect(sent(server, 'POST', paths.readNotes(takeId))).toEqual([{ until: note.createdAt }]),
    );
  });

  it('puts what a teacher asks for before the next take, to tick', async () => {
    const done = '2026-12-03T10:00:00.000Z';
    const server = open(sampleNotes([onFlip]), {
      [`PATCH ${paths.nextItem(takeId, noteId(50))}`]: json({ ...onFlip.nextItems[0], doneAt: done }),
    });
    const list = within(await screen.findByRole('region', { name: 'Before the next take' }));
    await userEvent.click(
      await list.findByRole('checkbox', { name: 'Flip the overhead Oda asks for this.' }),
    );
    expect(sent(server, 'PATCH', paths.nextItem(takeId, noteId(50)))).toEqual([{ done: true }]);
    await waitFor(() => expect(list.getByRole('checkbox', { name: /^Flip the overhead/ })).toBeChecked());
  });

  it('are written about what is chosen, with things to do', async () => {
    const made: NoteThread = sampleThread({ id: noteId(9), body: 'Try felt.', pin: { kind: 'take' } });
    const server = open(sampleNotes(), { [`POST ${paths.notes(takeId)}`]: json(made, 201) });
    const box = await screen.findByRole('form', { name: 'Your note' });
    await userEvent.selectOptions(within(box).getByLabelText('What the note is about'), 'Levels');
    await userEvent.type(within(box).getByRole('textbox', { name: 'Your note' }), 'Try felt.');
    await userEvent.click(within(box).getByRole('button', { name: 'Put something on your list' }));
    await userEvent.type(within(box).getByLabelText('To do next'), 'Buy felt');
    await userEvent.click(within(box).getByRole('button', { name: 'Keep the note' }));
    expect(await screen.findByText('Try felt.')).toBeInTheDocument();
    expect(sent(server, 'POST', paths.notes(takeId))).toEqual([
      { body: 'Try felt.', pin: { kind: 'finding', topic: 'kick-level' }, nextItems: ['Buy felt'] },
    ]);
    expect(within(box).getByRole('textbox', { name: 'Your note' })).toHaveValue('');
  });

  it('keep what was written when it could not be sent', async () => {
    open(sampleNotes(), {
      [`POST ${paths.notes(takeId)}`]: refusal(429, 'too-many-requests', 'Wait a minute.'),
    });
    const box = await screen.findByRole('form', { name: 'Your note' });
    await userEvent.type(within(box).getByRole('textbox', { name: 'Your note' }), 'Try felt.');
    await userEvent.click(within(box).getByRole('button', { name: 'Keep the note' }));
    expect(await within(box).findByRole('alert')).toHaveTextContent('Wait a minute.');
    expect(within(box).getByRole('textbox', { name: 'Your note' })).toHaveValue('Try felt.');
  });

  it('are answered in place', async () => {
    const answer = sampleNote({
      id: noteId(9),
      parentId: noteId(1),
      body: 'I will.',
      from: { name: 'Juno', as: 'player' },
    });
    const server = open(sampleNotes([onFlip]), {
      [`POST ${paths.notes(takeId)}`]: json({ ...onFlip, answers: [answer] }, 201),
    });
    await userEvent.click(await screen.findByRole('button', { name: 'Answer' }));
    const box = screen.getByRole('form', { name: 'Your answer' });
    expect(within(box).getByRole('textbox', { name: 'Your answer' })).toHaveFocus();
    await userEvent.type(within(box).getByRole('textbox', { name: 'Your answer' }), 'I will.');
    await userEvent.click(within(box).getByRole('button', { name: 'Send the answer' }));
    expect(await screen.findByText('I will.')).toBeInTheDocument();
    expect(sent(server, 'POST', paths.notes(takeId))).toEqual([
      { body: 'I will.', nextItems: [], parentId: noteId(1) },
    ]);
  });

  it('can be edited by whoever wrote them', async () => {
    const mine = sampleThread({ rights: { edit: true, remove: true, report: false }, body: 'Kick to loud.' });
    const edited = { ...mine, body: 'Kick too loud.', editedAt: '2026-12-02T20:20:00.000Z' };
    open(sampleNotes([mine]), { [`PATCH ${paths.note(takeId, mine.id)}`]: json(edited) });
    await userEvent.click(await screen.findByRole('button', { name: 'Edit' }));
    const field = screen.getByRole('textbox', { name: 'Write it anew' });
    expect(field).toHaveValue('Kick to loud.');
    await userEvent.clear(field);
    await userEvent.type(field, 'Kick too loud.');
    await userEvent.click(screen.getByRole('button', { name: 'Keep it' }));
    expect(await screen.findByText('Kick too loud.')).toBeInTheDocument();
    expect(screen.getByText(', edited')).toBeInTheDocument();
  });

  it('can be removed, and brought back', async () => {
    let there = true;
    const server = open(sampleNotes(), {
      [`GET ${paths.notes(takeId)}`]: () => json(sampleNotes(there ? [onFlip] : []))(),
      [`DELETE ${paths.note(takeId, onFlip.id)}`]: () => {
        there = false;
        return { status: 204 };
      },
      [`POST ${paths.restoreNote(takeId, onFlip.id)}`]: json(onFlip),
    });
    await userEvent.click(await screen.findByRole('button', { name: 'Remove' }));
    await waitFor(() => expect(screen.queryByText(onFlip.body)).not.toBeInTheDocument());
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }));
    expect(await screen.findByText(onFlip.body)).toBeInTheDocument();
    expect(sent(server, 'POST', paths.restoreNote(takeId, onFlip.id))).toHaveLength(1);
  });

  it('can be reported', async () => {
    const server = open(sampleNotes([onFlip]), {
      [`POST ${paths.takeComplaints(takeId)}`]: () => ({ status: 204 }),
    });
    await userEvent.click(await screen.findByRole('button', { name: 'Report' }));
    await userEvent.type(screen.getByLabelText('What is wrong with this note?'), 'Rude.');
    await userEvent.click(screen.getByRole('button', { name: 'Report it' }));
    expect(await screen.findByText(/Whoever runs this site looks at it/)).toBeInTheDocument();
    expect(sent(server, 'POST', paths.takeComplaints(takeId))).toEqual([
      { noteId: onFlip.id, reason: 'Rude.' },
    ]);
  });

  it('fold to three beside one section', async () => {
    const many = [1, 2, 3, 4, 5].map((n) => sampleThread({ id: noteId(n), body: `Note number ${n}` }));
    open(sampleNotes(many));
    await userEvent.click(await screen.findByRole('button', { name: '2 more' }));
    expect(screen.getByText('Note number 5')).toBeInTheDocument();
  });

  it('come by themselves while the page is looked at', async () => {
    const events = fakeEvents();
    let list = sampleNotes();
    open(list, { [`GET ${paths.notes(takeId)}`]: () => json(list)() });
    await screen.findByText('Nobody has written on this sheet yet.');
    list = sampleNotes([onFlip]);
    await events.streams[0].tell('notes', { takeId });
    expect(await screen.findByText(onFlip.body)).toBeInTheDocument();
    events.restore();
  });

  it('begin with N, where single keys act', async () => {
    open(sampleNotes());
    const box = await screen.findByRole('textbox', { name: 'Your note' });
    await userEvent.keyboard('n');
    expect(box).toHaveFocus();
    await userEvent.keyboard('n');
    expect(box).toHaveValue('n');
  });
});
