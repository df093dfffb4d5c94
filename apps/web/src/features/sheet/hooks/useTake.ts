import { paths, takeResponse, type TakeResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { requestJson } from '../../../lib/apiClient';
import { isMeasuring } from '../../takes/rowWords';

const pollMs = 700;

/** One take; asked again while it is being measured. */
export function useTake(takeId: string) {
  const { data, error, mutate } = useSWR<TakeResponse, Error>(
    paths.take(takeId),
    (path: string) => requestJson(path, takeResponse),
    { refreshInterval: (take) => (take && isMeasuring(take.measurement) ? pollMs : 0) },
  );
  return { take: data, error, retry: () => void mutate() };
}
