import { meResponse, paths, type MeResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { ApiError, requestJson } from '../../../lib/apiClient';

async function fetchMe(path: string): Promise<MeResponse | null> {
  try {
    return await requestJson(path, meResponse);
  } catch (error) {
    if (error instanceof ApiError && error.code === 'not-signed-in') return null;
    throw error;
  }
}

/** Who is signed in; `me` is null for a guest and undefined while asking. */
export function useMe() {
  const { data, error, mutate } = useSWR<MeResponse | null, Error>(paths.me, fetchMe, {
    revalidateOnFocus: false,
  });
  return { me: data, error, retry: () => void mutate() };
}
