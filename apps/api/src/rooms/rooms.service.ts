import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import {
  createRoomRequest,
  ListRoomsResponse,
  maxRooms,
  RoomResponse,
  RoomSurface,
  UpdateRoomRequest,
} from '@thudline/contracts';
import { absorptionTable } from '@thudline/dsp';
import { z } from 'zod';
import { Viewer } from '../access/viewer';
import { AppError } from '../errors/app-error';
import { User } from '../users/entities/user.entity';
import { Room } from './entities/room.entity';
import { ownRoom } from './own-room';
import { RoomUses } from './room-uses';
import { roomResponseOf } from './rooms.mapper';

@Injectable()
export class RoomsService {
  constructor(
    private readonly em: EntityManager,
    private readonly uses: RoomUses,
  ) {}

  /** The one that was recorded in last stands first. */
  async list({ user }: Viewer): Promise<ListRoomsResponse> {
    const rooms = await this.em.find(Room, { owner: user.id }, { orderBy: { id: 'desc' } });
    const uses = await this.uses.ofOwner(user.id);
    const items = rooms.map((room) => roomResponseOf(room, uses.get(room.id)));
    const lastUsed = ({ lastTakeAt }: RoomResponse) => (lastTakeAt ? Date.parse(lastTakeAt) : 0);
    return { items: items.sort((one, other) => lastUsed(other) - lastUsed(one)) };
  }

  /** For whoever may read it; the guard has asked. */
  async get(roomId: string): Promise<RoomResponse> {
    return this.whole(await this.em.findOneOrFail(Room, { id: roomId }));
  }

  async create(viewer: Viewer, fields: z.output<typeof createRoomRequest>): Promise<RoomResponse> {
    checkMaterials(fields.surfaces);
    if ((await this.em.count(Room, { owner: viewer.user.id })) >= maxRooms)
      throw new AppError('conflict', `You have ${maxRooms} rooms. Remove one that you don’t use any more.`);
    const owner = this.em.getReference(User, viewer.user.id);
    const room = this.em.create(Room, { owner, ...fields });
    await this.em.flush();
    return this.whole(room);
  }

  async update(viewer: Viewer, roomId: string, changes: UpdateRoomRequest): Promise<RoomResponse> {
    const room = await ownRoom(this.em, viewer, roomId);
    if (changes.surfaces) checkMaterials(changes.surfaces);
    this.em.assign(room, given(changes));
    await this.em.flush();
    return this.whole(room);
  }

  /** Its log goes with it; its takes stay, without a room. */
  async remove(viewer: Viewer, roomId: string): Promise<void> {
    await this.em.removeAndFlush(await ownRoom(this.em, viewer, roomId));
  }

  private async whole(room: Room): Promise<RoomResponse> {
    return roomResponseOf(room, (await this.uses.ofOwner(room.owner.id)).get(room.id));
  }
}

/** What a PATCH names: absent leaves as it is. */
const given = <Changes extends object>(changes: Changes): Partial<Changes> =>
  Object.fromEntries(Object.entries(changes).filter(([, value]) => value !== undefined)) as Partial<Changes>;

function checkMaterials(surfaces: readonly RoomSurface[]): void {
  const unknown = surfaces.find(({ materialId }) => !absorptionTable.some(({ id }) => id === materialId));
  if (unknown)
    throw new AppError('bad-request', 'This material is not in the table. Choose one that is.', {
      details: { fields: { surfaces: `“${unknown.materialId}” is not in the table.` } },
    });
}
