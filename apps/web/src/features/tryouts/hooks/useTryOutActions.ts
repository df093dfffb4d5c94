import {
  paths,
  tryOutResponse,
  type CreateTryOutRequest,
  type TryOutResponse,
  type UpdateTryOutPlaceRequest,
  type UpdateTryOutRequest,
} from '@thudline/contracts';
import { useSWRConfig } from 'swr';
import { requestJson, requestNothing } from '../../../lib/apiClient';

/** Everything that changes a try-out; each makes the list and the item fresh. */
export function useTryOutActions() {
  const { mutate } = useSWRConfig();
  const kept = async (answer: Promise<TryOutResponse>) => {
    const tryOut = await answer;
    await mutate(paths.tryOut(tryOut.id), tryOut, { revalidate: false });
    void mutate(paths.tryOuts);
    return tryOut;
  };
  return {
    create: (body: CreateTryOutRequest) =>
      kept(requestJson(paths.tryOuts, tryOutResponse, { method: 'POST', body })),
    update: (id: string, body: UpdateTryOutRequest) =>
      kept(requestJson(paths.tryOut(id), tryOutResponse, { method: 'PATCH', body })),
    updatePlace: (id: string, placeId: string, body: UpdateTryOutPlaceRequest) =>
      kept(requestJson(paths.tryOutPlace(id, placeId), tryOutResponse, { method: 'PATCH', body })),
    removePlace: (id: string, placeId: string) =>
      kept(requestJson(paths.tryOutPlace(id, placeId), tryOutResponse, { method: 'DELETE' })),
    remove: async (id: string) => {
      await requestNothing(paths.tryOut(id), { method: 'DELETE' });
      await mutate(paths.tryOuts);
    },
  };
}
