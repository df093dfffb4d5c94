import { listTakesResponse, type ListTakesResponse, type TakeListItem } from '@thudline/contracts';
import useSWR from 'swr';
import { requestJson } from '../../../lib/apiClient';
import { takesKey } from '../../takes/hooks/takesPageKey';
import { useMeasurementEvents } from '../../takes/hooks/useMeasurementEvents';

/** The list is in the order of recording; a take added last may have been recorded a little before others. */
const looked = 5;

/** The take that was added last, kept up to date; null while there is none, undefined while asking. */
export function useNewestTake() {
  const { data, error, mutate } = useSWR<ListTakesResponse, Error>(
    takesKey({ limit: looked }),
    (path: string) => requestJson(path, listTakesResponse),
  );
  const newest = data && newestOf(data.items);
  useMeasurementEvents({
    takeIds: newest ? [newest.id] : [],
    askAgain: () => void mutate(),
    waitForAdded: true,
  });
  return { newest, newestMeasured: data && newestOf(data.items.filter(isMeasured)), error };
}

export const isMeasured = (take: TakeListItem) => take.summary !== null;

const newestOf = (items: readonly TakeListItem[]): TakeListItem | null =>
  items.reduce<TakeListItem | null>((best, item) => (best && best.number > item.number ? best : item), null);
