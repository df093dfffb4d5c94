import { paths, takeResponse, type TakeResponse, type UpdateTakeRequest } from '@thudline/contracts';
import { useSWRConfig } from 'swr';
import { requestJson, requestNothing } from '../../../lib/apiClient';

const isTakesList = (key: unknown) =>
  typeof key === 'string' && (key === paths.takes || key.startsWith(`${paths.takes}?`));

/** Changes to one take; the item and every page of the list hear of them. */
export function useTakeEdits(take: TakeResponse) {
  const { mutate } = useSWRConfig();
  const key = paths.take(take.id);

  const update = async (body: UpdateTakeRequest) => {
    await mutate(key, requestJson(key, takeResponse, { method: 'PATCH', body }), {
      optimisticData: { ...take, ...body },
      rollbackOnError: true,
      revalidate: false,
    });
    await mutate(isTakesList);
  };

  const stopMeasuring = async () => {
    await requestNothing(paths.cancelMeasurement(take.id), { method: 'POST' });
    await mutate(key);
    await mutate(isTakesList);
  };

  return { update, stopMeasuring };
}
