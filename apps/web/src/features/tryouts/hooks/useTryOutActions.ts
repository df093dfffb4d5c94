import {
  paths,
  tryOutResponse,
  type AddTryOutPlacesRequest,
  type CreateTryOutRequest,
  type MakeTryOutSetupRequest,
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
  const ask = (method: 'POST' | 'PATCH' | 'DELETE', path: string, body?: object) =>
    kept(requestJson(path, tryOutResponse, { method, body }));
  /** What is ranked changes with the places. */
  const placed = async (answer: Promise<TryOutResponse>) => {
    const tryOut = await answer;
    await mutate(isRankingOf(tryOut.id));
    return tryOut;
  };
  const setUp = async (answer: Promise<TryOutResponse>) => {
    const tryOut = await answer;
    await mutate(paths.setups);
    return tryOut;
  };
  return {
    create: (body: CreateTryOutRequest) => ask('POST', paths.tryOuts, body),
    update: (id: string, body: UpdateTryOutRequest) => ask('PATCH', paths.tryOut(id), body),
    /** The winner becomes how things stand from now on. */
    makeSetup: (id: string, body: MakeTryOutSetupRequest) => setUp(ask('POST', paths.tryOutSetup(id), body)),
    undoSetup: (id: string) => setUp(ask('DELETE', paths.tryOutSetup(id))),
    addPlaces: (id: string, body: AddTryOutPlacesRequest) =>
      placed(ask('POST', paths.tryOutPlaces(id), body)),
    updatePlace: (id: string, placeId: string, body: UpdateTryOutPlaceRequest) =>
      ask('PATCH', paths.tryOutPlace(id, placeId), body),
    removePlace: (id: string, placeId: string) => placed(ask('DELETE', paths.tryOutPlace(id, placeId))),
    restorePlace: (id: string, placeId: string) => placed(ask('POST', paths.restoreTryOutPlace(id, placeId))),
    remove: async (id: string) => {
      await requestNothing(paths.tryOut(id), { method: 'DELETE' });
      await mutate(paths.tryOuts);
    },
    restore: (id: string) => ask('POST', paths.restoreTryOut(id)),
  };
}

/** Its rankings by whatever measure; they are asked for with the number of sheets beside the address. */
const isRankingOf = (tryOutId: string) => (key: unknown) =>
  Array.isArray(key) && typeof key[0] === 'string' && key[0].startsWith(paths.tryOutRanking(tryOutId));
