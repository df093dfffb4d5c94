import {
  paths,
  type ChangePasswordRequest,
  type ForgotRequest,
  type ResetRequest,
} from '@thudline/contracts';
import useSWR, { useSWRConfig } from 'swr';
import { requestNothing } from '../../../lib/apiClient';

/** Passwords, and what is done with the links that come by mail. */
export function useAccountLinks() {
  const { mutate } = useSWRConfig();
  return {
    /** Answered alike whether there is such an account or not. */
    forgot: (body: ForgotRequest) => requestNothing(paths.forgot, { method: 'POST', body }),
    /** Ends every session: makes stale who is signed in. */
    reset: async (body: ResetRequest) => {
      await requestNothing(paths.reset, { method: 'POST', body });
      await mutate(() => true, undefined, { revalidate: false });
      await mutate(paths.me);
    },
    /** Signs other devices out; this one stays. */
    changePassword: (body: ChangePasswordRequest) =>
      requestNothing(paths.changePassword, { method: 'POST', body }),
    /** Sends the mail that says an address is right once more. */
    resendVerification: () => requestNothing(paths.resendVerification, { method: 'POST' }),
  };
}

/** Redeems the link of a mail, once, however often the page is drawn. */
export function useVerification(token: string, path: string = paths.verify) {
  const { mutate } = useSWRConfig();
  const verify = async ([to]: [string, string]) => {
    await requestNothing(to, { method: 'POST', body: { token } });
    await mutate(paths.me);
    return 'verified' as const;
  };
  const {
    data,
    error,
    mutate: again,
  } = useSWR<'verified', Error, [string, string]>([path, token], verify, {
    revalidateIfStale: false,
    revalidateOnReconnect: false,
    revalidateOnFocus: false,
    shouldRetryOnError: false,
  });
  return { verified: data === 'verified', error, retry: () => void again() };
}
