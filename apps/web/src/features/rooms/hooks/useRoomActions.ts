import {
  paths,
  roomChangeResponse,
  roomResponse,
  type CreateRoomChangeRequest,
  type CreateRoomRequest,
  type RoomResponse,
  type UpdateRoomChangeRequest,
  type UpdateRoomRequest,
} from '@thudline/contracts';
import { useSWRConfig } from 'swr';
import { requestJson, requestNothing } from '../../../lib/apiClient';
import { postPhoto } from '../../upload/api/postPhoto';
import type { Ranked } from '../ordersOfDay';
import { isRoomsKey } from './roomsKeys';

/** What can be done to rooms and their logs; whatever is known of the room is read again after. */
export function useRoomActions() {
  const { mutate } = useSWRConfig();
  const stale = (roomId?: string) => mutate(isRoomsKey(roomId));
  return {
    create: async (body: CreateRoomRequest): Promise<RoomResponse> => {
      const room = await requestJson(paths.rooms, roomResponse, { method: 'POST', body });
      await stale();
      return room;
    },
    update: async (roomId: string, body: UpdateRoomRequest) => {
      await requestJson(paths.room(roomId), roomResponse, { method: 'PATCH', body });
      await stale(roomId);
    },
    remove: async (roomId: string) => {
      await requestNothing(paths.room(roomId), { method: 'DELETE' });
      await mutate((key) => key !== paths.rooms && isRoomsKey(roomId)(key), undefined, { revalidate: false });
      await stale();
    },
    addChange: async (roomId: string, body: CreateRoomChangeRequest) => {
      await requestJson(paths.roomChanges(roomId), roomChangeResponse, { method: 'POST', body });
      await stale(roomId);
    },
    updateChange: async (roomId: string, changeId: string, body: UpdateRoomChangeRequest) => {
      const path = paths.roomChange(roomId, changeId);
      await requestJson(path, roomChangeResponse, { method: 'PATCH', body });
      await stale(roomId);
    },
    /** One after the other: the log is read again once, at the end. */
    putInOrder: async (roomId: string, order: readonly Ranked[]) => {
      for (const { id, rank } of order)
        await requestJson(paths.roomChange(roomId, id), roomChangeResponse, {
          method: 'PATCH',
          body: { rank },
        });
      await stale(roomId);
    },
    addPhoto: async (roomId: string, file: File, signal: AbortSignal) => {
      await postPhoto({ path: paths.roomPhoto(roomId), file, signal });
      await stale(roomId);
    },
    removePhoto: async (roomId: string) => {
      await requestJson(paths.roomPhoto(roomId), roomResponse, { method: 'DELETE' });
      await stale(roomId);
    },
    addChangePhoto: async (roomId: string, changeId: string, file: File, signal: AbortSignal) => {
      await postPhoto({ path: paths.roomChangePhoto(roomId, changeId), file, signal });
      await stale(roomId);
    },
    removeChangePhoto: async (roomId: string, changeId: string) => {
      const path = paths.roomChangePhoto(roomId, changeId);
      await requestJson(path, roomChangeResponse, { method: 'DELETE' });
      await stale(roomId);
    },
    removeChange: async (roomId: string, changeId: string) => {
      await requestNothing(paths.roomChange(roomId, changeId), { method: 'DELETE' });
      await stale(roomId);
    },
  };
}
