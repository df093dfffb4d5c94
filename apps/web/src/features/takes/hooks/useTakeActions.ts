import { paths, takeResponse, type UpdateTakeRequest } from '@thudline/contracts';
import { useSWRConfig } from 'swr';
import { requestJson, requestNothing } from '../../../lib/apiClient';
import { isKeyOfTake, isTakesKey } from './takesKeys';

type EachSetup = { takeId: string; setupId: string | null }[];
type EachTags = { takeId: string; tags: string[] }[];

/** What can be done to takes from the list; the list is stale after each, and so is what is known of the take. */
export function useTakeActions() {
  const { mutate } = useSWRConfig();
  const forget = (takeIds: readonly string[]) =>
    mutate((key) => takeIds.some((takeId) => isKeyOfTake(takeId)(key)), undefined, { revalidate: false });

  const setTags = (takeId: string, tags: string[]) => change(takeId, { tags });
  const change = async (takeId: string, body: UpdateTakeRequest) => {
    const path = paths.take(takeId);
    await mutate(path, requestJson(path, takeResponse, { method: 'PATCH', body }), {
      populateCache: true,
      revalidate: false,
    });
  };

  const tellMeasuring = async (takeId: string, path: string) => {
    await requestNothing(path, { method: 'POST' });
    await mutate((key) => isTakesKey(key) || isKeyOfTake(takeId)(key));
  };

  return {
    /** They can be brought back for 30 days. @returns which are gone, and what went wrong with the one after them */
    remove: async (takeIds: readonly string[]): Promise<{ gone: string[]; error?: unknown }> => {
      const gone: string[] = [];
      try {
        await eachOf(takeIds, async (takeId) => {
          await requestNothing(paths.take(takeId), { method: 'DELETE' });
          gone.push(takeId);
        });
        return { gone };
      } catch (error) {
        return { gone, error };
      } finally {
        await forget(gone);
        await mutate(isTakesKey);
      }
    },
    restore: async (takeIds: readonly string[]) => {
      await eachOf(takeIds, (takeId) =>
        requestNothing(paths.restoreTake(takeId), { method: 'POST' }),
      ).finally(() => mutate(isTakesKey));
    },
    setTags: async (takeId: string, tags: string[]) => {
      await setTags(takeId, tags);
      await mutate(isTakesKey);
    },
    /**
     * Each keeps the tags it has; they are read first, since the list may be older than they are.
     *
     * @returns the tags of before
     */
    addTags: async (takeIds: readonly string[], tags: readonly string[]): Promise<EachTags> => {
      const before: EachTags = [];
      await eachOf(takeIds, async (takeId) => {
        const take = await requestJson(paths.take(takeId), takeResponse);
        await setTags(takeId, [...new Set([...take.tags, ...tags])]);
        before.push({ takeId, tags: take.tags });
      }).finally(() => mutate(isTakesKey));
      return before;
    },
    setEachTags: (all: EachTags) =>
      eachOf(all, ({ takeId, tags }) => setTags(takeId, tags)).finally(() => mutate(isTakesKey)),
    /** @returns the setups of before */
    setSetup: async (takeIds: readonly string[], setupId: string | null): Promise<EachSetup> => {
      const before: EachSetup = [];
      await eachOf(takeIds, async (takeId) => {
        const take = await requestJson(paths.take(takeId), takeResponse);
        await change(takeId, { setupId });
        before.push({ takeId, setupId: take.setup?.id ?? null });
      }).finally(() => mutate(isTakesKey));
      return before;
    },
    setEachSetup: (all: EachSetup) =>
      eachOf(all, ({ takeId, setupId }) => change(takeId, { setupId })).finally(() => mutate(isTakesKey)),
    stopMeasuring: (takeId: string) => tellMeasuring(takeId, paths.cancelMeasurement(takeId)),
    measureAgain: (takeId: string) => tellMeasuring(takeId, paths.measureAgain(takeId)),
  };
}

/** One after the other; the first that fails is told, with those before it done. */
async function eachOf<Each>(all: readonly Each[], act: (each: Each) => Promise<void>): Promise<void> {
  for (const each of all) await act(each);
}
