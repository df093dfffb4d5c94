import {
  nextItem,
  noteThread,
  paths,
  type CreateComplaintRequest,
  type CreateNoteRequest,
  type ListNotesResponse,
  type NextItem,
  type NoteResponse,
  type NoteThread,
  type UpdateNoteRequest,
} from '@thudline/contracts';
import { useSWRConfig } from 'swr';
import { requestJson, requestNothing } from '../../../lib/apiClient';
import { isTakesKey } from '../../takes/hooks/takesKeys';

/** What can be done with the notes on a take; the list of takes, which counts them, hears of it. */
export function useNoteActions(takeId: string) {
  const { mutate } = useSWRConfig();
  const key = paths.notes(takeId);
  const keep = async (change: (list: ListNotesResponse) => ListNotesResponse) => {
    await mutate<ListNotesResponse>(key, (list) => list && change(list), { revalidate: false });
    await mutate(isTakesKey);
  };
  const send = async (path: string, method: 'POST' | 'PATCH', body?: unknown) => {
    const thread = await requestJson(path, noteThread, { method, body });
    await keep((list) => ({ ...list, items: withThread(list.items, thread) }));
    return thread;
  };
  return {
    write: (body: CreateNoteRequest) => send(key, 'POST', body),
    edit: ({ id }: NoteResponse, body: UpdateNoteRequest) => send(paths.note(takeId, id), 'PATCH', body),
    remove: async ({ id }: NoteResponse) => {
      await requestNothing(paths.note(takeId, id), { method: 'DELETE' });
      await mutate(key);
      await mutate(isTakesKey);
    },
    restore: ({ id }: NoteResponse) => send(paths.restoreNote(takeId, id), 'POST'),
    tick: async ({ id }: NextItem, done: boolean) => {
      const ticked = await requestJson(paths.nextItem(takeId, id), nextItem, {
        method: 'PATCH',
        body: { done },
      });
      await keep((list) => ({ ...list, items: list.items.map((thread) => withItem(thread, ticked)) }));
    },
    complain: (body: CreateComplaintRequest) =>
      requestNothing(paths.takeComplaints(takeId), { method: 'POST', body }),
  };
}

export type NoteActions = ReturnType<typeof useNoteActions>;

function withThread(threads: NoteThread[], changed: NoteThread): NoteThread[] {
  const others = threads.filter(({ id }) => id !== changed.id);
  return [...others, changed].sort((a, b) => a.createdAt.localeCompare(b.createdAt));
}

function withItem(thread: NoteThread, ticked: NextItem): NoteThread {
  const inNote = <T extends NoteResponse>(note: T): T => ({
    ...note,
    nextItems: note.nextItems.map((item) => (item.id === ticked.id ? ticked : item)),
  });
  return { ...inNote(thread), answers: thread.answers.map(inNote) };
}
