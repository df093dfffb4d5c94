import { listRoomsResponse, paths, type ListRoomsResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';

/** The player's rooms, the one recorded in last first. */
export function useRooms() {
  const { data, error, mutate } = useSWR<ListRoomsResponse, Error>(paths.rooms, (path: string) =>
    requestJson(path, listRoomsResponse),
  );
  return { rooms: data?.items, error: errorToShow(data, error), retry: () => void mutate() };
}
