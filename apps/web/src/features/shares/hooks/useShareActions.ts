import {
  createdShareResponse,
  paths,
  type CreatedShareResponse,
  type CreateShareRequest,
} from '@thudline/contracts';
import { useSWRConfig } from 'swr';
import { requestJson, requestNothing } from '../../../lib/apiClient';

/** Making a link and ending one; both make the take's list of links stale. */
export function useShareActions(takeId: string) {
  const { mutate } = useSWRConfig();
  const listKey = paths.shares(takeId);
  return {
    create: async (body: CreateShareRequest): Promise<CreatedShareResponse> => {
      const created = await requestJson(listKey, createdShareResponse, { method: 'POST', body });
      await mutate(listKey);
      return created;
    },
    end: async (shareId: string) => {
      await requestNothing(paths.share(shareId), { method: 'DELETE' });
      await mutate(listKey);
    },
  };
}
