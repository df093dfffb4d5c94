import {
  listRoomChangesResponse,
  paths,
  roomResponse,
  type ListRoomChangesResponse,
  type RoomResponse,
} from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';

/** A room with its log, newest change first. */
export function useRoom(roomId: string) {
  const room = useSWR<RoomResponse, Error>(paths.room(roomId), (path: string) =>
    requestJson(path, roomResponse),
  );
  const log = useSWR<ListRoomChangesResponse, Error>(paths.roomChanges(roomId), (path: string) =>
    requestJson(path, listRoomChangesResponse),
  );
  return {
    room: room.data,
    changes: log.data?.items,
    takes: log.data?.takes ?? [],
    error: errorToShow(room.data, room.error) ?? errorToShow(log.data, log.error),
    retry: () => {
      void room.mutate();
      void log.mutate();
    },
  };
}
