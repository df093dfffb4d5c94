import {
  listRoomChangesResponse,
  paths,
  roomResponse,
  type ListRoomChangesResponse,
  type RoomResponse,
} from '@thudline/contracts';
import useSWR from 'swr';
import { errorToShow, requestJson } from '../../../lib/apiClient';

/** As many changes as are seen at first; comparing takes time, so the others are told after them. */
const toldFirst = 8;

const readLog = (path: string) => requestJson(path, listRoomChangesResponse);

/** A room with its log, newest change first. */
export function useRoom(roomId: string) {
  const room = useSWR<RoomResponse, Error>(paths.room(roomId), (path: string) =>
    requestJson(path, roomResponse),
  );
  const query = new URLSearchParams({ told: String(toldFirst) }).toString();
  const log = useSWR<ListRoomChangesResponse, Error>(`${paths.roomChanges(roomId)}?${query}`, readLog);
  const isLong = log.data?.items.some(({ isTold }) => !isTold) ?? false;
  const whole = useSWR<ListRoomChangesResponse, Error>(isLong && paths.roomChanges(roomId), readLog, {
    keepPreviousData: true,
  });
  const { items, takes } = (isLong && whole.data) || (log.data ?? {});
  return {
    room: room.data,
    changes: items,
    takes: takes ?? [],
    error: errorToShow(room.data, room.error) ?? errorToShow(log.data, log.error),
    retry: () => {
      void room.mutate();
      void log.mutate();
    },
  };
}
