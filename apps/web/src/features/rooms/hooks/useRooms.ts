import { listRoomsResponse, paths, type ListRoomsResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';

/** The player's rooms, the one recorded in last first; read once they are asked for. */
export function useRooms(asked = true) {
  const { data, error, mutate } = useSWR<ListRoomsResponse, Error>(asked && paths.rooms, (path: string) =>
    requestJson(path, listRoomsResponse),
  );
  return { rooms: data?.items, error: errorToShow(data, error), retry: () => void mutate() };
}
