import { listTryOutsResponse, paths, type ListTryOutsResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';

export function useTryOuts() {
  const { data, error, mutate } = useSWR<ListTryOutsResponse, Error>(paths.tryOuts, (path: string) =>
    requestJson(path, listTryOutsResponse),
  );
  return { tryOuts: data?.items, error: errorToShow(data, error), retry: () => void mutate() };
}
