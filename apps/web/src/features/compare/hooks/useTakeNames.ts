import { listTakesResponse, paths, type ListTakesResponse, type TakeListItem } from '@thudline/contracts';
import useSWR from 'swr';
import { requestJson } from '../../../lib/apiClient';

/** The player's newest measured takes, to compare with; empty until they are there, and where they can't be had. */
export function useTakeNames(): Pick<TakeListItem, 'id' | 'number' | 'title'>[] {
  const { data } = useSWR<ListTakesResponse, Error>(`${paths.takes}?limit=100`, (path: string) =>
    requestJson(path, listTakesResponse),
  );
  return (data?.items ?? []).filter(({ summary }) => summary !== null);
}
