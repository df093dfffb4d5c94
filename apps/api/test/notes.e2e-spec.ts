import { randomUUID } from 'node:crypto';
import { CreateNoteRequest, NoteThread, paths, TakeResponse } from '@thudline/contracts';
import { Note } from '../src/notes/entities/note.entity';
import { purgeNotes } from '../src/notes/note-purge';
import { Share } from '../src/shares/entities/share.entity';
import { listenAs } from './support/event-listener';
import { noteBy, notesFor, sendTo } from './support/notes';
import { Browser, joined, Person } from './support/person';
import { openedBy, sharedBy } from './support/shares';
import { startTestApp, TestApp } from './support/test-app';
import { until } from './support/until';

describe('notes on a take', () => {
  let test: TestApp;
  let juno: Person;
  let oda: Person;
  let tavi: Person;
  let take: TakeResponse;

  beforeAll(async () => {
    test = await startTestApp({ GUEST_NOTE_LIMIT_PER_ADDRESS: '1000' });
    juno = await joined(test, 'Juno');
    oda = await joined(test, 'Oda');
    tavi = await joined(test, 'Tavi');
  });
  beforeEach(async () => {
    take = await juno.makeTake();
  });
  afterAll(async () => test?.close());

  const bex = { guestName: 'Bex' };
  const guestOf = async (allowed: { canNote: boolean }, of = take) => {
    const guest = new Browser(test);
    const share = await sharedBy(juno, of, allowed);
    await openedBy(guest, share);
    return { guest, share };
  };

  describe('who may do what', () => {
    /** Everybody there is, to a take with one note by its player and one by the teacher it was sent to. */
    const everybody = async () => {
      await sendTo(test, take, { from: juno, to: oda });
      const [writing, reading] = [await guestOf({ canNote: true }), await guestOf({ canNote: false })];
      return {
        owner: juno,
        teacher: oda,
        'other player': tavi,
        'guest who may note': writing.guest,
        'guest who may read': reading.guest,
        'signed out': new Browser(test),
      };
    };
    type Who = keyof Awaited<ReturnType<typeof everybody>>;
    const asked: [string, (note: NoteThread, itemId: string) => (browser: Browser) => Promise<number>][] = [
      ['list', () => async (b) => (await b.get(paths.notes(take.id))).status],
      ['create', () => async (b) => (await b.post(paths.notes(take.id), { body: 'Hm.', ...bex })).status],
      [
        'edit somebody else’s',
        (note) => async (b) => (await b.patch(paths.note(take.id, note.id), { body: 'Mine now.' })).status,
      ],
      [
        'remove somebody else’s',
        (note) => async (b) => (await b.delete(paths.note(take.id, note.id))).status,
      ],
      [
        'restore somebody else’s',
        (note) => async (b) => (await b.post(paths.restoreNote(take.id, note.id))).status,
      ],
      [
        'mark as read',
        () => async (b) =>
          (await b.post(paths.readNotes(take.id), { until: new Date().toISOString() })).status,
      ],
      [
        'tick',
        (_note, itemId) => async (b) =>
          (await b.patch(paths.nextItem(take.id, itemId), { done: true })).status,
      ],
      [
        'report',
        (note) => async (b) =>
          (await b.post(paths.takeComplaints(take.id), { noteId: note.id, reason: 'Rude.' })).status,
      ],
    ];
    /** Of the note that a second teacher left. */
    const expected: Record<string, Record<Who, number>> = {
      list: row([200, 200, 404, 200, 200, 401]),
      create: row([201, 201, 404, 201, 403, 401]),
      'edit somebody else’s': row([403, 403, 404, 404, 403, 401]),
      'remove somebody else’s': row([204, 403, 404, 404, 403, 401]),
      'restore somebody else’s': row([200, 200, 404, 404, 403, 401]),
      'mark as read': row([204, 204, 404, 401, 401, 401]),
      tick: row([200, 403, 404, 403, 403, 401]),
      report: row([204, 204, 404, 404, 404, 401]),
    };
    function row([owner, teacher, other, writing, reading, out]: number[]): Record<Who, number> {
      return {
        owner,
        teacher,
        'other player': other,
        'guest who may note': writing,
        'guest who may read': reading,
        'signed out': out,
      };
    }

    it.each(asked)('%s', async (name, call) => {
      const wren = await joined(test, 'Wren');
      await sendTo(test, take, { from: juno, to: wren });
      const note = await noteBy(wren, take, { nextItems: ['Flip it'] });
      const people = await everybody();
      const found: Partial<Record<Who, number>> = {};
      // The owner comes last: what they remove is gone for the others.
      for (const who of Object.keys(people).reverse() as Who[])
        found[who] = await call(note, note.nextItems[0].id)(people[who]);
      expect(found).toEqual(expected[name]);
    });

    it('a teacher whose share has ended finds nothing', async () => {
      const shareId = await sendTo(test, take, { from: juno, to: oda });
      await noteBy(oda, take);
      await test.em().nativeUpdate(Share, { id: shareId }, { revokedAt: new Date() });
      await oda.get(paths.notes(take.id)).expect(404);
      await oda.post(paths.notes(take.id), { body: 'Hm.' }).expect(404);
    });

    it('a teacher who may only read reads the conversation and writes nothing', async () => {
      await sendTo(test, take, { from: juno, to: oda, canNote: false });
      await noteBy(juno, take);
      expect(await notesFor(oda, take)).toMatchObject({ mayNote: false, items: [{ isNew: false }] });
      await oda.post(paths.notes(take.id), { body: 'Hm.' }).expect(403);
    });
  });

  describe('writing', () => {
    it.each<[string, CreateNoteRequest['pin']]>([
      ['the whole take', { kind: 'take' }],
      ['a moment', { kind: 'time', timeS: 0.25 }],
      ['a hit', { kind: 'hit', timeS: 0.1 }],
      ['a finding', { kind: 'finding', topic: 'adding-up' }],
    ])('pins a note to %s', async (_, pin) => {
      const note = await noteBy(juno, take, { body: ' Here.\r\nAnd there. ', pin });
      expect(note).toMatchObject({
        body: 'Here.\nAnd there.',
        pin,
        from: { name: 'Juno', as: 'player' },
        editedAt: null,
        rights: { edit: true, remove: true, report: false },
      });
      expect((await notesFor(juno, take)).items).toEqual([note]);
    });

    it.each<[string, object, RegExp]>([
      ['nothing written', { body: '  ' }, /Write something/],
      ['too much', { body: 'x'.repeat(4001) }, /4,000/],
      ['an unknown finding', { body: 'x', pin: { kind: 'finding', topic: 'weather' } }, /./],
      ['a moment before the take', { body: 'x', pin: { kind: 'time', timeS: -1 } }, /moment/],
      ['a moment after its end', { body: 'x', pin: { kind: 'time', timeS: 4000 } }, /over by then/],
      ['six things to do', { body: 'x', nextItems: ['a', 'b', 'c', 'd', 'e', 'f'] }, /five/],
      ['characters nobody sees', { body: 'a\u0000b' }, /nobody sees/],
    ])('refuses %s with a sentence', async (_, body, message) => {
      const response = await juno.post(paths.notes(take.id), body).expect(400);
      expect((response.body as { message: string }).message).toMatch(message);
    });

    it('keeps markup as the text it is', async () => {
      const body = '<script>alert(1)</script> <img src=x onerror=alert(1)> [x](javascript:alert(1))';
      await noteBy(juno, take, { body });
      const response = await juno.get(paths.notes(take.id)).expect(200).expect('Content-Type', /json/);
      expect(response.body).toMatchObject({ items: [{ body }] });
    });

    it('answers in threads of one level, pinned where they began', async () => {
      await sendTo(test, take, { from: juno, to: oda });
      const root = await noteBy(oda, take, { pin: { kind: 'time', timeS: 0.2 } });
      const first = await noteBy(juno, take, { body: 'Why?', parentId: root.id });
      const [answer] = first.answers;
      const second = await noteBy(oda, take, { body: 'It rings.', parentId: answer.id });
      expect(second.answers).toMatchObject([
        { body: 'Why?', parentId: root.id, pin: root.pin },
        { body: 'It rings.', parentId: root.id },
      ]);
      expect((await notesFor(juno, take)).items).toHaveLength(1);
    });

    it('answers no note of another take', async () => {
      const elsewhere = await noteBy(juno, await juno.makeTake());
      await juno.post(paths.notes(take.id), { body: 'x', parentId: elsewhere.id }).expect(404);
      await juno.post(paths.notes(take.id), { body: 'x', parentId: randomUUID() }).expect(404);
      await juno.patch(paths.note(take.id, elsewhere.id), { body: 'x' }).expect(404);
    });

    it('edits leave a mark; the same words don’t', async () => {
      const note = await noteBy(juno, take, { body: 'Kick to loud.' });
      const path = paths.note(take.id, note.id);
      const same = await juno.patch(path, { body: 'Kick to loud.' }).expect(200);
      expect(same.body).toMatchObject({ editedAt: null });
      const edited = await juno.patch(path, { body: 'Kick too loud.' }).expect(200);
      expect(edited.body).toMatchObject({ body: 'Kick too loud.', editedAt: expect.any(String) as string });
    });

    it('a phone that reads along reads and ticks, and writes nothing', async () => {
      const note = await noteBy(juno, take, { nextItems: ['Flip it'] });
      const link = (await juno.post(paths.phoneLinks).expect(201)).body as { url: string };
      const phone = new Browser(test);
      await phone.post(paths.openPhoneLink, { token: link.url.split('/').at(-1) });
      expect(await notesFor(phone, take)).toMatchObject({ mayNote: false });
      await phone.post(paths.notes(take.id), { body: 'x' }).expect(403);
      await phone.patch(paths.nextItem(take.id, note.nextItems[0].id), { done: true }).expect(200);
    });
  });

  describe('a guest', () => {
    it('writes under a name, and may change and remove what they wrote', async () => {
      const { guest } = await guestOf({ canNote: true });
      const note = await noteBy(guest, take, { body: 'Nice room.', ...bex });
      expect(note).toMatchObject({
        from: { name: 'Bex', as: 'guest' },
        rights: { edit: true, remove: true },
      });
      const edited = await guest.patch(paths.note(take.id, note.id), { body: 'Nice, dry room.' }).expect(200);
      expect(edited.body).toMatchObject({ body: 'Nice, dry room.' });
      await guest.delete(paths.note(take.id, note.id)).expect(204);
      expect((await notesFor(juno, take)).items).toEqual([]);
      await guest.post(paths.restoreNote(take.id, note.id)).expect(200);
      expect((await notesFor(juno, take)).items).toMatchObject([{ from: { name: 'Bex', as: 'guest' } }]);
    });

    it('needs a name, and one without the address of a page', async () => {
      const { guest } = await guestOf({ canNote: true });
      const none = await guest.post(paths.notes(take.id), { body: 'x' }).expect(400);
      expect(none.body).toMatchObject({ details: { fields: { guestName: expect.any(String) as string } } });
      await guest.post(paths.notes(take.id), { body: 'x', guestName: 'http://x.test' }).expect(400);
    });

    it('puts nothing on the player’s list', async () => {
      const { guest } = await guestOf({ canNote: true });
      await guest.post(paths.notes(take.id), { body: 'x', ...bex, nextItems: ['Buy mine'] }).expect(403);
    });

    it('can’t change what another guest of the same link wrote', async () => {
      const { guest, share } = await guestOf({ canNote: true });
      const other = new Browser(test);
      await openedBy(other, share);
      const note = await noteBy(guest, take, bex);
      expect((await notesFor(other, take)).items).toMatchObject([{ id: note.id, rights: { edit: false } }]);
      await other.patch(paths.note(take.id, note.id), { body: 'Not I.' }).expect(403);
      await other.delete(paths.note(take.id, note.id)).expect(403);
    });

    it('is not believed to be another guest by a cookie of their own making', async () => {
      const { guest, share } = await guestOf({ canNote: true });
      const note = await noteBy(guest, take, bex);
      const stored = await test.em().findOneOrFail(Note, { id: note.id });
      const other = new Browser(test);
      await openedBy(other, share);
      const forged = other.patch(paths.note(take.id, note.id), { body: 'Not I.' });
      await forged.set('Cookie', `thudline_guest=${stored.guestId}.${'A'.repeat(43)}`).expect((answer) => {
        expect([401, 403]).toContain(answer.status);
      });
    });

    it('reads what the player wrote and what came through their own link, and no other conversation', async () => {
      await sendTo(test, take, { from: juno, to: oda });
      const [one, two] = [await guestOf({ canNote: true }), await guestOf({ canNote: true })];
      const players = await noteBy(juno, take, { body: 'Mine.' });
      const teachers = await noteBy(oda, take, { body: 'For Juno only.' });
      await noteBy(juno, take, { body: 'Thanks, Oda.', parentId: teachers.id });
      const ones = await noteBy(one.guest, take, { body: 'From one.', ...bex });
      await noteBy(one.guest, take, { body: 'One on yours.', parentId: players.id, ...bex });
      await noteBy(two.guest, take, { body: 'From two.', guestName: 'Wren' });
      await noteBy(juno, take, { body: 'Thanks, Bex.', parentId: ones.id });
      const told = async (browser: Browser) => {
        const { items } = await notesFor(browser, take);
        return items.flatMap(({ body, answers }) => [body, ...answers.map((answer) => answer.body)]);
      };
      expect(await told(one.guest)).toEqual(['Mine.', 'One on yours.', 'From one.', 'Thanks, Bex.']);
      expect(await told(two.guest)).toEqual(['Mine.', 'From two.']);
      expect(await told(juno)).toHaveLength(7);
      expect(await told(oda)).toHaveLength(7);
      await two.guest.post(paths.notes(take.id), { body: 'x', parentId: ones.id, ...bex }).expect(404);
    });

    it('writes nothing more once the link has ended', async () => {
      const { guest, share } = await guestOf({ canNote: true });
      const note = await noteBy(guest, take, bex);
      await juno.delete(paths.share(share.id)).expect(204);
      await guest.post(paths.notes(take.id), { body: 'x', ...bex }).expect(404);
      await guest.patch(paths.note(take.id, note.id), { body: 'x' }).expect(404);
      expect((await notesFor(juno, take)).items).toHaveLength(1);
    });
  });

  describe('removing', () => {
    it('can be undone by whoever did it, and by nobody else', async () => {
      const { guest } = await guestOf({ canNote: true });
      const note = await noteBy(guest, take, bex);
      await juno.delete(paths.note(take.id, note.id)).expect(204);
      await juno.delete(paths.note(take.id, note.id)).expect(204);
      expect((await notesFor(guest, take)).items).toEqual([]);
      await guest.post(paths.restoreNote(take.id, note.id)).expect(404);
      await juno.post(paths.restoreNote(take.id, note.id)).expect(200);
      expect((await notesFor(guest, take)).items).toHaveLength(1);
    });

    it('leaves the answers of others, and not a word of what was removed', async () => {
      await sendTo(test, take, { from: juno, to: oda });
      const root = await noteBy(oda, take, { body: 'Secret.', nextItems: ['Secret, too'] });
      await noteBy(juno, take, { body: 'I see.', parentId: root.id });
      await oda.delete(paths.note(take.id, root.id)).expect(204);
      const response = await juno.get(paths.notes(take.id)).expect(200);
      expect(response.body).toMatchObject({
        items: [{ isRemoved: true, body: '', nextItems: [], answers: [{ body: 'I see.' }] }],
      });
      expect(response.text).not.toContain('Secret');
      await juno.post(paths.notes(take.id), { body: 'x', parentId: root.id }).expect(404);
    });

    it('is for good after 30 days', async () => {
      const [gone, answered] = [await noteBy(juno, take), await noteBy(juno, take, { body: 'Old words.' })];
      await noteBy(juno, take, { body: 'An answer.', parentId: answered.id });
      const long = new Date(Date.now() - 31 * 24 * 60 * 60 * 1000);
      for (const { id } of [gone, answered])
        await test.em().nativeUpdate(Note, { id }, { deletedAt: long, removedBy: 'author' });
      await juno.post(paths.restoreNote(take.id, gone.id)).expect(404);
      await purgeNotes(test.em(), new Date());
      const left = await test.em().find(Note, { take: take.id }, { orderBy: { id: 'asc' } });
      expect(left.map(({ body }) => body)).toEqual(['', 'An answer.']);
    });
  });

  describe('what is new', () => {
    it('is what others wrote since one looked last, for each reader', async () => {
      await sendTo(test, take, { from: juno, to: oda });
      const note = await noteBy(oda, take);
      expect((await notesFor(juno, take)).items).toMatchObject([{ isNew: true }]);
      expect((await notesFor(oda, take)).items).toMatchObject([{ isNew: false }]);
      await juno.post(paths.readNotes(take.id), { until: note.createdAt }).expect(204);
      expect((await notesFor(juno, take)).items).toMatchObject([{ isNew: false }]);
      await noteBy(oda, take, { parentId: note.id });
      expect((await notesFor(juno, take)).items).toMatchObject([
        { isNew: false, answers: [{ isNew: true }] },
      ]);
    });

    it('never goes back, and never ahead of now', async () => {
      const { guest } = await guestOf({ canNote: true });
      const first = await noteBy(guest, take, bex);
      const second = await noteBy(guest, take, bex);
      const read = (until: string) => juno.post(paths.readNotes(take.id), { until }).expect(204);
      await read(second.createdAt);
      await read(first.createdAt);
      await read('2099-01-01T00:00:00.000Z');
      expect((await notesFor(juno, take)).items).toMatchObject([{ isNew: false }, { isNew: false }]);
      await noteBy(guest, take, bex);
      expect((await notesFor(juno, take)).items.at(-1)).toMatchObject({ isNew: true });
    });

    it('is counted in the list of takes', async () => {
      const { guest } = await guestOf({ canNote: true });
      await noteBy(juno, take);
      const note = await noteBy(guest, take, bex);
      const counts = async () => {
        const { items } = (await juno.get(paths.takes).expect(200)).body as { items: { id: string }[] };
        return items.find(({ id }) => id === take.id);
      };
      expect(await counts()).toMatchObject({ notes: 2, newNotes: 1 });
      await juno.post(paths.readNotes(take.id), { until: note.createdAt }).expect(204);
      expect(await counts()).toMatchObject({ notes: 2, newNotes: 0 });
      await juno.delete(paths.note(take.id, note.id)).expect(204);
      expect(await counts()).toMatchObject({ notes: 1, newNotes: 0 });
    });

    it('is told to the player’s open pages at once', async () => {
      const listener = await listenAs(test, juno, [take.id]);
      try {
        const { guest } = await guestOf({ canNote: true });
        await noteBy(guest, take, bex);
        await until(() => Promise.resolve(listener.notes().includes(take.id)));
      } finally {
        listener.close();
      }
    });
  });

  describe('what to do next', () => {
    it('is ticked by the player, and whoever asked for it sees so', async () => {
      await sendTo(test, take, { from: juno, to: oda });
      const note = await noteBy(oda, take, { nextItems: ['Flip it', 'Play eight bars'] });
      expect(note.nextItems.map(({ text, doneAt }) => [text, doneAt])).toEqual([
        ['Flip it', null],
        ['Play eight bars', null],
      ]);
      await oda.post(paths.readNotes(take.id), { until: new Date().toISOString() }).expect(204);
      const path = paths.nextItem(take.id, note.nextItems[0].id);
      const ticked = await juno.patch(path, { done: true }).expect(200);
      expect(ticked.body).toMatchObject({ doneAt: expect.any(String) as string });
      expect((await notesFor(oda, take)).items[0].nextItems).toMatchObject([
        { isNews: true },
        { doneAt: null, isNews: false },
      ]);
      await juno.patch(path, { done: false }).expect(200);
      expect((await notesFor(oda, take)).items[0].nextItems[0].doneAt).toBeNull();
    });

    it('keeps its tick when the note is written anew with the same words', async () => {
      const note = await noteBy(juno, take, { nextItems: ['Flip it', 'Rest'] });
      await juno.patch(paths.nextItem(take.id, note.nextItems[0].id), { done: true }).expect(200);
      const path = paths.note(take.id, note.id);
      const edited = await juno.patch(path, { nextItems: ['Breathe', 'Flip it'] }).expect(200);
      expect(edited.body).toMatchObject({
        nextItems: [
          { text: 'Breathe', doneAt: null },
          { text: 'Flip it', doneAt: expect.any(String) as string },
        ],
      });
    });

    it('is none of another take, nor of a note that was removed', async () => {
      const note = await noteBy(juno, take, { nextItems: ['Flip it'] });
      const other = await juno.makeTake();
      const [{ id }] = note.nextItems;
      await juno.patch(paths.nextItem(other.id, id), { done: true }).expect(404);
      await juno.patch(paths.nextItem(take.id, 'nonsense'), { done: true }).expect(404);
      await juno.delete(paths.note(take.id, note.id)).expect(204);
      await juno.patch(paths.nextItem(take.id, id), { done: true }).expect(404);
    });
  });
});

it('a guest is asked to wait after too many notes, and players write on', async () => {
  const test = await startTestApp({ GUEST_NOTE_LIMIT_PER_ADDRESS: '2' });
  try {
    const juno = await joined(test);
    const take = await juno.makeTake();
    const guest = new Browser(test);
    await openedBy(guest, await sharedBy(juno, take, { canNote: true }));
    const body = { body: 'x', guestName: 'Bex' };
    for (let i = 0; i < 2; i++) await guest.post(paths.notes(take.id), body).expect(201);
    const refused = await guest.post(paths.notes(take.id), body).expect(429);
    expect(Number(refused.get('Retry-After'))).toBeGreaterThan(0);
    await noteBy(juno, take);
  } finally {
    await test.close();
  }
});
