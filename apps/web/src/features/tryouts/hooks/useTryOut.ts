import { paths, tryOutResponse, type TryOutResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';
import { useMeasurementEvents } from '../../takes/hooks/useMeasurementEvents';
import { isMeasuring } from '../../takes/rowWords';

/** One try-out as it is, or none. */
export function useTryOutOnce(tryOutId: string | null) {
  const { data, error, mutate } = useSWR<TryOutResponse, Error>(
    tryOutId && paths.tryOut(tryOutId),
    (path: string) => requestJson(path, tryOutResponse),
  );
  return { tryOut: data, error: errorToShow(data, error), retry: () => void mutate() };
}

/** One try-out, followed while its takes are being measured. */
export function useTryOut(tryOutId: string) {
  const { tryOut, error, retry } = useTryOutOnce(tryOutId);
  useMeasurementEvents({
    takeIds: (tryOut?.places ?? []).flatMap(({ take }) =>
      take && isMeasuring(take.measurement) ? [take.id] : [],
    ),
    askAgain: retry,
  });
  return { tryOut, error, retry };
}
