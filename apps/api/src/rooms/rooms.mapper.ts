import { RoomResponse } from '@thudline/contracts';
import { Room } from './entities/room.entity';
import { RoomUse } from './room-uses';

const unused: RoomUse = { takeCount: 0, firstTakeAt: null, lastTakeAt: null, changeCount: 0 };

export function roomResponseOf(room: Room, use: RoomUse = unused): RoomResponse {
  const { id, name, shape, surfaces, temperatureC, kit, createdAt } = room;
  return {
    id,
    name,
    shape,
    surfaces,
    temperatureC: temperatureC ?? null,
    kit: kit ?? null,
    createdAt: createdAt.toISOString(),
    ...use,
  };
}
