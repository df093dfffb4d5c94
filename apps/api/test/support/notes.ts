import {
  CreateNoteRequest,
  listNotesResponse,
  ListNotesResponse,
  noteThread,
  NoteThread,
  paths,
  TakeResponse,
} from '@thudline/contracts';
import { Share } from '../../src/shares/entities/share.entity';
import { Browser, Person } from './person';
import { TestApp } from './test-app';

export async function noteBy(
  browser: Browser,
  take: TakeResponse,
  request: Partial<CreateNoteRequest> = {},
): Promise<NoteThread> {
  const response = await browser
    .post(paths.notes(take.id), { body: 'Play it again.', ...request })
    .expect(201);
  return noteThread.parse(response.body);
}

export async function notesFor(browser: Browser, take: TakeResponse): Promise<ListNotesResponse> {
  return listNotesResponse.parse((await browser.get(paths.notes(take.id)).expect(200)).body);
}

/** The sheet is open to somebody by name, as a player's teacher has it. */
export async function sendTo(
  test: TestApp,
  take: TakeResponse,
  { from, to, canNote = true }: { from: Person; to: Person; canNote?: boolean },
): Promise<string> {
  const em = test.em();
  const share = em.create(Share, {
    owner: from.me.id,
    take: take.id,
    grantee: to.me.id,
    label: '',
    question: '',
    canListen: true,
    canDownload: false,
    canNote,
    openCount: 0,
  });
  await em.flush();
  return share.id;
}
