import { paths, type ListNotesResponse, type NoteResponse } from '@thudline/contracts';
import { useEffect, useRef, useState } from 'react';
import { requestNothing } from '../../../lib/apiClient';

/**
 * Tells the server up to when the notes were on the page, once for each that is new.
 *
 * @returns ids of what was new when it came on the page: it stays marked until the sheet is left
 */
export function useReadMark(takeId: string, list: ListNotesResponse | undefined): ReadonlySet<string> {
  const [seen, setSeen] = useState<ReadonlySet<string>>(new Set());
  const told = useRef('');
  const fresh = list && !list.needsName ? newsOf(list) : [];
  if (fresh.some(({ id }) => !seen.has(id))) setSeen(new Set([...seen, ...fresh.map(({ id }) => id)]));
  const until = latest(fresh);
  useEffect(() => {
    if (document.hidden || until <= told.current) return;
    told.current = until;
    // What could not be told now is still new the next time.
    requestNothing(paths.readNotes(takeId), { method: 'POST', body: { until } }).catch(() => undefined);
  }, [takeId, until]);
  return seen;
}

const newsOf = (list: ListNotesResponse): NoteResponse[] =>
  list.items
    .flatMap((thread): NoteResponse[] => [thread, ...thread.answers])
    .filter(({ isNew, nextItems }) => isNew || nextItems.some(({ isNews }) => isNews));

function latest(notes: NoteResponse[]): string {
  const times = notes.flatMap(({ createdAt, nextItems }) => [
    createdAt,
    ...nextItems.flatMap(({ doneAt }) => doneAt ?? []),
  ]);
  return times.sort().at(-1) ?? '';
}
