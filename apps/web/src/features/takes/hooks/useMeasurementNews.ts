import {
  paths,
  type ListTakesResponse,
  type MeasurementEvent,
  type TakeResponse,
  type TryOutResponse,
} from '@thudline/contracts';
import { useSWRConfig } from 'swr';
import { isTryOutKey } from '../../tryouts/hooks/tryOutKeys';
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
      void mutate(isTryOutKey);
      return;
    }
    void mutate<TakeResponse>(paths.take(takeId), (take) => take && { ...take, measurement, hasReport }, {
      revalidate: false,
    });
    void mutate<ListTakesResponse>(isTakesKey, (page) => page && withMeasurement(page, takeId, measurement), {
      revalidate: false,
    });
    void mutate<TryOutResponse>(isTryOutKey, (of) => of && inTryOut(of, { takeId, measurement }), {
      revalidate: false,
    });
  };
}

/** The list of try-outs has no measurements. */
function inTryOut(
  of: TryOutResponse,
  { takeId, measurement }: Pick<MeasurementEvent, 'takeId' | 'measurement'>,
): TryOutResponse {
  if (!('places' in of)) return of;
  const places = of.places.map((place) =>
    place.take?.id === takeId ? { ...place, take: { ...place.take, measurement } } : place,
  );
  return { ...of, places };
}

const withMeasurement = (
  page: ListTakesResponse,
  takeId: string,
  measurement: MeasurementEvent['measurement'],
): ListTakesResponse => ({
  ...page,
  items: page.items.map((item) => (item.id === takeId ? { ...item, measurement } : item)),
});
