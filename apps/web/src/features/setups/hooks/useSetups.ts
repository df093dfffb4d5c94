import { listSetupsResponse, paths, setupResponse } from '@thudline/contracts';
import type { ListSetupsResponse, SetupResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';

/** Every setup of the player; `asked` false asks for none. */
export function useSetups(asked = true) {
  const { data, error, mutate } = useSWR<ListSetupsResponse, Error>(
    asked ? paths.setups : null,
    (path: string) => requestJson(path, listSetupsResponse),
  );
  return {
    setups: data?.items,
    /** How things stand now. */
    currentId: data?.currentId ?? null,
    error: errorToShow(data, error),
    retry: () => void mutate(),
  };
}

/** One setup; null asks for none. */
export function useSetup(setupId: string | null) {
  const { data, error, mutate } = useSWR<SetupResponse, Error>(
    setupId && paths.setup(setupId),
    (path: string) => requestJson(path, setupResponse),
    // What is being written must not be overtaken by what was kept before.
    { revalidateOnFocus: false },
  );
  return { setup: data, error: errorToShow(data, error), retry: () => void mutate() };
}
