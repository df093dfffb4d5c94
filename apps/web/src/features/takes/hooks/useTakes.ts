import { listTakesResponse, type ListTakesResponse } from '@thudline/contracts';
import useSWR, { useSWRConfig } from 'swr';
import { requestJson } from '../../../lib/apiClient';
import { isMeasuring } from '../rowWords';
import type { TakesQuery } from '../takesQuery';
import { takesKey } from './takesPageKey';
import { useMeasurementEvents } from './useMeasurementEvents';

const readPage = (path: string) => requestJson(path, listTakesResponse);

/** One page of the player's takes; followed while any of them is being measured. */
export function useTakes(query: TakesQuery, cursor: string | null) {
  const key = takesKey({ query, cursor });
  const { cache } = useSWRConfig();
  const { data, error, mutate } = useSWR<ListTakesResponse, Error>(
    key,
    readPage,
    // While another sentence is being asked for, the rows of the last one stay where they are.
    { keepPreviousData: true },
  );
  const measuring = data?.items.filter((take) => isMeasuring(take.measurement)) ?? [];
  useMeasurementEvents({
    takeIds: measuring.map(({ id }) => id),
    askAgain: () => void mutate(),
  });
  const stale = data !== undefined && cache.get(key)?.data === undefined;
  return {
    page: stale && error ? undefined : data,
    error: stale || !data ? error : undefined,
    stale,
    retry: () => void mutate(),
  };
}

/** How many takes fit a sentence, and up to `limit` of them. Null asks nothing. */
export function useTakesFitting(query: TakesQuery | null, limit: number) {
  const { data, error, mutate } = useSWR<ListTakesResponse, Error>(
    query && takesKey({ query, limit }),
    readPage,
  );
  return { page: data, error, retry: () => void mutate() };
}
