import { listTakesResponse, type ListTakesResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { requestJson } from '../../../lib/apiClient';
import { isMeasuring } from '../rowWords';
import { takesKey } from './takesKeys';

/** While something is being measured the list is asked again this often; a stage takes about a second. */
const pollMs = 1500;

/** One page of the player's takes, newest first; followed while any of them is being measured. */
export function useTakes(cursor: string | null = null) {
  const { data, error, mutate } = useSWR<ListTakesResponse, Error>(
    takesKey(cursor),
    (path: string) => requestJson(path, listTakesResponse),
    { refreshInterval: (page) => (page?.items.some((take) => isMeasuring(take.measurement)) ? pollMs : 0) },
  );
  return { page: data, error, retry: () => void mutate() };
}
