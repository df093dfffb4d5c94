import { paths, type ListTakesResponse, type MeasurementEvent, type TakeResponse } from '@thudline/contracts';
import { useSWRConfig } from 'swr';
import { isMeasuring } from '../rowWords';
import { isTakesKey } from './takesKeys';

/** Puts what is told of one measurement into every list and into the take; at its end both are read again. */
export function useMeasurementNews() {
  const { mutate } = useSWRConfig();
  return ({ takeId, measurement, hasReport }: MeasurementEvent) => {
    // What the sheet says comes with the list only: until it is read again the row stays as it is.
    if (!isMeasuring(measurement)) {
      void mutate(paths.take(takeId));
      // Outlines that an earlier version didn't store are there after it was measured again.
      void mutate((key) => typeof key === 'string' && key.startsWith(`${paths.peaks(takeId)}?`));
      void mutate(isTakesKey);
      return;
    }
    void mutate<TakeResponse>(paths.take(takeId), (take) => take && { ...take, measurement, hasReport }, {
      revalidate: false,
    });
    void mutate<ListTakesResponse>(isTakesKey, (page) => page && withMeasurement(page, takeId, measurement), {
      revalidate: false,
    });
  };
}

const withMeasurement = (
  page: ListTakesResponse,
  takeId: string,
  measurement: MeasurementEvent['measurement'],
): ListTakesResponse => ({
  ...page,
  items: page.items.map((item) => (item.id === takeId ? { ...item, measurement } : item)),
});
