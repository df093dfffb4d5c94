import {
  listFailedWorkResponse,
  paths,
  type FailedWork,
  type ListFailedWorkResponse,
} from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson, requestNothing } from '../../../lib/apiClient';
import { useRefusal } from '../../settings/hooks/useRefusal';

/** What failed and stayed so. */
export function useFailedWork() {
  const { data, error, mutate } = useSWR<ListFailedWorkResponse, Error>(paths.adminWork, (path: string) =>
    requestJson(path, listFailedWorkResponse),
  );
  const { refusal, act } = useRefusal(mutate);
  return {
    work: data?.items,
    error: errorToShow(data, error),
    retry: () => void mutate(),
    refusal,
    doAgain: ({ kind, id }: FailedWork) =>
      act(() => requestNothing(paths.adminRetry(kind, id), { method: 'POST' })),
  };
}
