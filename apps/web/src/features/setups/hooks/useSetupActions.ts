import { paths, setupResponse, type CreateSetupRequest, type SetupFields } from '@thudline/contracts';
import type { SetupResponse } from '@thudline/contracts';
import { useSWRConfig } from 'swr';
import { parseJson, requestJson, requestNothing } from '../../../lib/apiClient';
import { isTakesKey } from '../../takes/hooks/takesKeys';
import { postPhoto } from '../../upload/api/postPhoto';

/** A take carries its setup's name. */
const isTakeKey = (key: unknown) => typeof key === 'string' && /^\/api\/takes\/[^/]+$/.test(key);

/** Writing setups; the setup, the list, and what names it hear of it. */
export function useSetupActions() {
  const { mutate } = useSWRConfig();

  const told = async (setup: SetupResponse): Promise<SetupResponse> => {
    await mutate(paths.setup(setup.id), setup, { revalidate: false });
    await mutate(paths.setups);
    return setup;
  };

  return {
    create: async (body: CreateSetupRequest) =>
      told(await requestJson(paths.setups, setupResponse, { method: 'POST', body })),
    update: async (setupId: string, fields: SetupFields) => {
      const setup = await told(
        await requestJson(paths.setup(setupId), setupResponse, { method: 'PATCH', body: fields }),
      );
      await mutate((key) => isTakesKey(key) || isTakeKey(key));
      return setup;
    },
    remove: async (setupId: string) => {
      await requestNothing(paths.setup(setupId), { method: 'DELETE' });
      await mutate(paths.setups);
    },
    addPhoto: async (setupId: string, file: File, signal: AbortSignal) => {
      const text = await postPhoto({ path: paths.setupPhoto(setupId), file, signal });
      await told(setupResponse.parse(parseJson(text)));
    },
    removePhoto: async (setupId: string) => {
      await told(await requestJson(paths.setupPhoto(setupId), setupResponse, { method: 'DELETE' }));
    },
  };
}
