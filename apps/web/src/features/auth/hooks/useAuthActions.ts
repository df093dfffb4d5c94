import { meResponse, paths, type JoinRequest, type SignInRequest } from '@thudline/contracts';
import { useSWRConfig } from 'swr';
import { requestJson, requestNothing } from '../../../lib/apiClient';

/** Join, sign in and sign out; each leaves nothing of the last person in the cache. */
export function useAuthActions() {
  const { mutate } = useSWRConfig();
  const clear = () => mutate((key) => key !== paths.me, undefined, { revalidate: false });

  return {
    join: async (body: JoinRequest) => {
      const me = await requestJson(paths.join, meResponse, { method: 'POST', body });
      await clear();
      await mutate(paths.me, me, { revalidate: false });
    },
    signIn: async (body: SignInRequest) => {
      const me = await requestJson(paths.signIn, meResponse, { method: 'POST', body });
      await clear();
      await mutate(paths.me, me, { revalidate: false });
    },
    signOut: async () => {
      await requestNothing(paths.signOut, { method: 'POST' });
      await mutate(paths.me, null, { revalidate: false });
      await clear();
    },
  };
}
