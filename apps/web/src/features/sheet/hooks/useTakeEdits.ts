import { paths, takeResponse, type TakeResponse, type UpdateTakeRequest } from '@thudline/contracts';
import { useSWRConfig } from 'swr';
import { requestJson, requestNothing } from '../../../lib/apiClient';
import { isTakesKey } from '../../takes/hooks/takesKeys';

/** Changes to one take; the item and every page of the list hear of them. */
export function useTakeEdits(take: TakeResponse) {
  const { mutate } = useSWRConfig();
  const key = paths.take(take.id);

  const update = async (body: UpdateTakeRequest) => {
    // The name of another setup or room is the server's to tell.
    const { setupId, roomId, ...known } = body;
    await mutate(key, requestJson(key, takeResponse, { method: 'PATCH', body }), {
      optimisticData: setupId === undefined && roomId === undefined ? { ...take, ...known } : take,
      rollbackOnError: true,
      revalidate: false,
    });
    await mutate(isTakesKey);
  };

  const post = async (path: string) => {
    await requestNothing(path, { method: 'POST' });
    await mutate(key);
    await mutate(isTakesKey);
  };

  return {
    update,
    stopMeasuring: () => post(paths.cancelMeasurement(take.id)),
    measureAgain: () => post(paths.measureAgain(take.id)),
  };
}
