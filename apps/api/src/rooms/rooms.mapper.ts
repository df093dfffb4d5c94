import { RoomResponse } from '@thudline/contracts';
import { photoResponseOf } from '../photos/photos.mapper';
import { Room } from './entities/room.entity';
import { RoomUse } from './room-uses';

const unused: RoomUse = { takeCount: 0, firstTakeAt: null, lastTakeAt: null, changeCount: 0 };

/** @param room - with its photo */
export function roomResponseOf(room: Room, use: RoomUse = unused): RoomResponse {
  const { id, name, shape, surfaces, temperatureC, kit, createdAt, photo } = room;
  return {
    id,
    name,
    shape,
    surfaces,
    temperatureC: temperatureC ?? null,
    kit: kit ?? null,
    createdAt: createdAt.toISOString(),
    ...use,
    photo: photo ? photoResponseOf(photo.unwrap()) : null,
  };
}
