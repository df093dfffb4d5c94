import {
  addedFileResponse,
  listAddedFilesResponse,
  paths,
  type AddedFileResponse,
} from '@thudline/contracts';
import type { Choice } from '@thudline/dsp';
import { useState } from 'react';
import useSWR from 'swr';
import { errorToShow, requestJson, requestNothing } from '../../../lib/apiClient';

/** Making one takes seconds, and somebody looks on. */
const lookAgainMs = 700;

export const isBeingMade = ({ state }: AddedFileResponse) => state === 'queued' || state === 'running';

/** The added files of a take, followed while one is being made. */
export function useAddedFiles(takeId: string) {
  const path = paths.addedFiles(takeId);
  const { data, error, mutate } = useSWR<{ items: AddedFileResponse[] }, Error>(
    path,
    () => requestJson(path, listAddedFilesResponse),
    { refreshInterval: (latest) => (latest?.items.some(isBeingMade) ? lookAgainMs : 0) },
  );
  const [refusal, setRefusal] = useState<string | null>(null);
  const act = async (write: () => Promise<unknown>) => {
    setRefusal(null);
    try {
      await write();
    } catch (refused) {
      setRefusal(refused instanceof Error ? refused.message : 'This did not work. Try again.');
    }
    await mutate();
  };
  return {
    files: data?.items,
    error: errorToShow(data, error),
    retry: () => void mutate(),
    /** One sentence, where the last thing asked for was refused. */
    refusal,
    make: ({ flipped, shiftMs, gainDb }: Choice) =>
      act(() => requestJson(path, addedFileResponse, { method: 'POST', body: { flipped, shiftMs, gainDb } })),
    remove: (id: string) => act(() => requestNothing(paths.addedFile(takeId, id), { method: 'DELETE' })),
  };
}
