import {
  createdShareResponse,
  paths,
  shareResponse,
  type CreatedShareResponse,
  type CreateShareRequest,
} from '@thudline/contracts';
import { useSWRConfig } from 'swr';
import { requestJson, requestNothing } from '../../../lib/apiClient';

/** The list of all links, and those of each subject. */
const isListOfShares = (key: unknown) =>
  typeof key === 'string' && (key === paths.shares || key.startsWith(`${paths.shares}?`));

/** Making a link, ending one, and taking that back; each makes every list of links stale. */
export function useShareActions() {
  const { mutate } = useSWRConfig();
  return {
    create: async (body: CreateShareRequest): Promise<CreatedShareResponse> => {
      const created = await requestJson(paths.shares, createdShareResponse, { method: 'POST', body });
      await mutate(isListOfShares);
      return created;
    },
    end: async (shareId: string) => {
      await requestNothing(paths.share(shareId), { method: 'DELETE' });
      await mutate(isListOfShares);
    },
    restore: async (shareId: string) => {
      await requestJson(paths.restoreShare(shareId), shareResponse, { method: 'POST' });
      await mutate(isListOfShares);
    },
  };
}
