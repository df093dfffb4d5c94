import { paths, tryOutResponse, type TryOutResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';
import { useMeasurementEvents } from '../../takes/hooks/useMeasurementEvents';
import { isMeasuring } from '../../takes/rowWords';

/** One try-out, followed while its takes are being measured. */
export function useTryOut(tryOutId: string) {
  const { data, error, mutate } = useSWR<TryOutResponse, Error>(paths.tryOut(tryOutId), (path: string) =>
    requestJson(path, tryOutResponse),
  );
  useMeasurementEvents({
    takeIds: (data?.places ?? []).flatMap(({ take }) =>
      take && isMeasuring(take.measurement) ? [take.id] : [],
    ),
    askAgain: () => void mutate(),
  });
  return { tryOut: data, error: errorToShow(data, error), retry: () => void mutate() };
}
