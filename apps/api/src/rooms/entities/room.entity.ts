import { defineEntity, InferEntity, p } from '@mikro-orm/core';
import { KitPlace, RoomShape, RoomSurface } from '@thudline/contracts';
import { identity } from '../../database/identity';
import { Photo } from '../../photos/entities/photo.entity';
import { User } from '../../users/entities/user.entity';

/** Where takes are recorded. Nothing sorts or looks by its measures, so they are JSON; lengths are metres. */
export const Room = defineEntity({
  name: 'Room',
  tableName: 'room',
  properties: {
    ...identity,
    owner: () => p.manyToOne(User).ref().index().deleteRule('cascade'),
    name: p.string().length(60),
    shape: p.json<RoomShape>(),
    surfaces: p.json<RoomSurface[]>(),
    temperatureC: p.double().$type<number>().nullable(),
    kit: p.json<KitPlace>().nullable(),
    photo: () => p.manyToOne(Photo).ref().nullable().index().deleteRule('set null'),
  },
});
export type Room = InferEntity<typeof Room>;
