import { randomUUID } from 'node:crypto';
import { listComplaintsResponse, paths, TakeResponse } from '@thudline/contracts';
import { User } from '../src/users/entities/user.entity';
import { noteBy, notesFor } from './support/notes';
import { Browser, joined, Person } from './support/person';
import { openedBy, sharedBy } from './support/shares';
import { startTestApp, TestApp } from './support/test-app';

describe('complaints', () => {
  let test: TestApp;
  let juno: Person;
  let admin: Person;
  let take: TakeResponse;
  let guest: Browser;

  beforeAll(async () => {
    test = await startTestApp({ COMPLAINT_LIMIT_PER_ADDRESS: '8' });
    juno = await joined(test, 'Juno');
    admin = await joined(test, 'Ada');
    await test.em().nativeUpdate(User, { id: admin.me.id }, { roles: ['player', 'admin'] });
  });
  beforeEach(async () => {
    take = await juno.makeTake();
    guest = new Browser(test);
    await openedBy(guest, await sharedBy(juno, take, { canNote: true }));
  });
  afterAll(async () => test?.close());

  const listed = async () =>
    listComplaintsResponse.parse((await admin.get(paths.complaints).expect(200)).body).items;
  const complain = (browser: Browser, body: object) => browser.post(paths.takeComplaints(take.id), body);

  it('of a note or a sheet reach whoever runs the installation, newest first', async () => {
    const note = await noteBy(guest, take, { body: 'Buy my pills.', guestName: 'Bex' });
    await complain(juno, { noteId: note.id, reason: 'An advertisement.' }).expect(204);
    await complain(guest, { reason: 'That is my recording.' }).expect(204);
    const of = { id: take.id, number: take.number, player: 'Juno' };
    expect((await listed()).slice(0, 2)).toMatchObject([
      { reason: 'That is my recording.', from: null, take: of, note: null, settledAt: null },
      { from: 'Juno', take: of, note: { id: note.id, name: 'Bex', body: 'Buy my pills.', isRemoved: false } },
    ]);
  });

  it('are settled, and the note goes where it has to', async () => {
    const note = await noteBy(guest, take, { body: 'Buy my pills.', guestName: 'Bex' });
    await complain(juno, { noteId: note.id, reason: 'An advertisement.' }).expect(204);
    const [{ id }] = await listed();
    await admin.patch(paths.complaint(id), { removeNote: true }).expect(204);
    expect((await listed()).find((item) => item.id === id)).toMatchObject({
      note: { isRemoved: true },
      settledAt: expect.any(String) as string,
    });
    expect((await notesFor(juno, take)).items).toEqual([]);
    for (const browser of [guest, juno]) await browser.post(paths.restoreNote(take.id, note.id)).expect(404);
  });

  it('need a reason, and a note that their writer can see', async () => {
    const empty = await complain(juno, { reason: ' ' }).expect(400);
    expect((empty.body as { message: string }).message).toBe('Write what is wrong with it.');
    await complain(juno, { noteId: randomUUID(), reason: 'x' }).expect(404);
  });

  it('are nobody’s to read but an admin’s', async () => {
    await juno.get(paths.complaints).expect(403);
    await juno.patch(paths.complaint(randomUUID()), {}).expect(403);
    await new Browser(test).get(paths.complaints).expect(401);
    await admin.patch(paths.complaint(randomUUID()), {}).expect(404);
  });

  it('are counted for each address', async () => {
    const last = async () => (await complain(guest, { reason: 'x' })).status;
    const statuses = [];
    for (let i = 0; i < 9; i++) statuses.push(await last());
    expect(statuses.at(-1)).toBe(429);
  });
});
