import { EntityManager } from '@mikro-orm/postgresql';
import { AppError } from '../errors/app-error';
import { Room } from './entities/room.entity';

/** @returns the room a take was recorded in; null where none is named. @throws {AppError} `bad-request` where it isn't theirs */
export async function findRoom(
  em: EntityManager,
  ownerId: string,
  roomId: string | null | undefined,
): Promise<Room | null> {
  if (!roomId) return null;
  const room = await em.findOne(Room, { id: roomId, owner: ownerId });
  if (room) return room;
  throw new AppError('bad-request', 'This room is not there any more.', {
    details: { fields: { roomId: 'This room is not there any more.' } },
  });
}
