import { paths, progressResponse, type ProgressResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';

/** What the player's takes tell of the playing, oldest first. */
export function useProgress() {
  const { data, error, mutate } = useSWR<ProgressResponse, Error>(paths.progress, (path: string) =>
    requestJson(path, progressResponse),
  );
  return { takes: data?.takes, error: errorToShow(data, error), retry: () => void mutate() };
}
