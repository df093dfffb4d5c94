import { paths } from '@thudline/contracts';
import useSWR, { useSWRConfig } from 'swr';
import { ApiError, requestNothing } from '../../../lib/apiClient';
import { useMe } from '../../auth/hooks/useMe';

const usedUpCodes = ['link-ended', 'not-found', 'bad-request'];

/** Whether a code lets nobody in: used, timed out, or not whole. */
export const isUsedUp = (error: Error) => error instanceof ApiError && usedUpCodes.includes(error.code);

/**
 * Lets a phone in by its link, once. A page loaded again finds the link used up and the phone already in: then who is
 * signed in decides.
 */
export function useOpenPhoneLink(token: string) {
  const { mutate } = useSWRConfig();
  const { me } = useMe();
  const {
    data,
    error,
    mutate: again,
  } = useSWR<true, Error>(
    [paths.openPhoneLink, token],
    async ([path]: [string, string]): Promise<true> => {
      await requestNothing(path, { method: 'POST', body: { token } });
      await mutate(paths.me);
      return true;
    },
    { revalidateOnFocus: false, revalidateOnReconnect: false, revalidateIfStale: false },
  );
  const used = error !== undefined && isUsedUp(error);
  return {
    isIn: data === true || (used && !!me),
    error: used && me === undefined ? undefined : error,
    retry: () => void again(),
  };
}
