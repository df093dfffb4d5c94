import { listSharesResponse, paths, type ListSharesResponse, type ShareSubject } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';

/** The links to one subject, or all there are, as their owner sees them. */
export function useShares(subject?: ShareSubject) {
  const key = subject ? paths.sharesOf(subject) : paths.shares;
  const { data, error, mutate } = useSWR<ListSharesResponse, Error>(key, (path: string) =>
    requestJson(path, listSharesResponse),
  );
  return { shares: data?.items, error: errorToShow(data, error), retry: () => void mutate() };
}
