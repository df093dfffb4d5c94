import { paths, roomResponse, type RoomResponse } from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';

/** What is written down of one room, without its log. */
export function useOneRoom(roomId: string) {
  const { data, error, mutate } = useSWR<RoomResponse, Error>(paths.room(roomId), (path: string) =>
    requestJson(path, roomResponse),
  );
  return { room: data, error: errorToShow(data, error), retry: () => void mutate() };
}
