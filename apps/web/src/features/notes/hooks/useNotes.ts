import { listNotesResponse, paths, type ListNotesResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';
import { useNoteNews } from './useNoteNews';

/** How often to ask where nothing is told by itself; nobody waits for an answer with their eyes on the page. */
const askMs = 30_000;

/** The notes on a take, as far as they are the reader's to see. */
export function useNotes(takeId: string, { live = false } = {}) {
  const { data, error, mutate } = useSWR<ListNotesResponse, Error>(
    paths.notes(takeId),
    (path: string) => requestJson(path, listNotesResponse),
    { refreshInterval: askMs },
  );
  useNoteNews(takeId, live, () => void mutate());
  return { notes: data, error: errorToShow(data, error), retry: () => void mutate() };
}
