import { paths } from '@thudline/contracts';
import { useSWRConfig } from 'swr';
import { requestNothing } from '../../../lib/apiClient';
import { isTakesKey } from './takesKeys';

/** What can be done to a take from the list. */
export function useTakeActions() {
  const { mutate } = useSWRConfig();
  return {
    /** Makes stale: every page of the list; the take's own answers are forgotten. */
    remove: async (takeId: string) => {
      await requestNothing(paths.take(takeId), { method: 'DELETE' });
      await mutate((key) => typeof key === 'string' && key.startsWith(paths.take(takeId)), undefined, {
        revalidate: false,
      });
      await mutate(isTakesKey);
    },
    /** Makes stale: every page of the list and the take's own answers. */
    stopMeasuring: async (takeId: string) => {
      await requestNothing(paths.cancelMeasurement(takeId), { method: 'POST' });
      await mutate(
        (key) => isTakesKey(key) || (typeof key === 'string' && key.startsWith(paths.take(takeId))),
      );
    },
  };
}
