import { listSharesResponse, paths, type ListSharesResponse, type ShareSubject } from '@thudline/contracts';
import useSWR from 'swr';
import { requestJson } from '../../../lib/apiClient';

/** The links to one subject, as their owner sees them. */
export function useShares(subject: ShareSubject) {
  const { data, error, mutate } = useSWR<ListSharesResponse, Error>(paths.sharesOf(subject), (path: string) =>
    requestJson(path, listSharesResponse),
  );
  return { shares: data?.items, error, retry: () => void mutate() };
}
