import { listSharesResponse, paths, type ListSharesResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { requestJson } from '../../../lib/apiClient';

/** The links to one take's sheet, as their owner sees them. */
export function useShares(takeId: string) {
  const { data, error, mutate } = useSWR<ListSharesResponse, Error>(paths.shares(takeId), (path: string) =>
    requestJson(path, listSharesResponse),
  );
  return { shares: data?.items, error, retry: () => void mutate() };
}
