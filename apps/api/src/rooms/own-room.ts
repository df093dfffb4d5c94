import { EntityManager } from '@mikro-orm/postgresql';
import { validate } from 'uuid';
import { Viewer } from '../access/viewer';
import { notFound } from '../errors/app-error';
import { Room } from './entities/room.entity';

/** @throws {AppError} `not-found` where it is somebody else's, too */
export async function ownRoom(em: EntityManager, { user }: Viewer, roomId: string): Promise<Room> {
  const room =
    validate(roomId) && (await em.findOne(Room, { id: roomId, owner: user.id }, { populate: ['photo'] }));
  if (!room) throw notFound();
  return room;
}
