import { paths, takeResponse, type TakeResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';
import { useMeasurementEvents } from '../../takes/hooks/useMeasurementEvents';
import { isMeasuring } from '../../takes/rowWords';

/** One take, followed while it is being measured, or measured again in the background; null asks for none. */
export function useTake(takeId: string | null) {
  const { data, error, mutate } = useSWR<TakeResponse, Error>(takeId && paths.take(takeId), (path: string) =>
    requestJson(path, takeResponse),
  );
  const measuring = data !== undefined && isMeasuring(data.measurement);
  const renewing = data?.renewal === 'waiting';
  useMeasurementEvents({
    takeIds: data && (measuring || renewing) ? [data.id] : [],
    askAgain: () => void mutate(),
    patient: !measuring,
  });
  return { take: data, error: errorToShow(data, error), retry: () => void mutate() };
}
