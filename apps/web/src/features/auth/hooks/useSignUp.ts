import { paths, signUpResponse, type SignUpResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { requestJson } from '../../../lib/apiClient';

/** Whether joining needs an invitation; where that isn't known yet, the answer to joining will say it. */
export function useSignUp() {
  const { data } = useSWR<SignUpResponse, Error>(paths.signUp, (path: string) =>
    requestJson(path, signUpResponse),
  );
  return { needsInvitation: data?.signUp === 'invited' };
}
