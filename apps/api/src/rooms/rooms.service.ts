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
import { TakeRights } from '../access/take-rights';
import { Viewer } from '../access/viewer';
import { AppError } from '../errors/app-error';
import { PhotosService } from '../photos/photos.service';
import { User } from '../users/entities/user.entity';
import { RoomChange } from './entities/room-change.entity';
import { Room } from './entities/room.entity';
import { ownRoom } from './own-room';
import { RoomUses } from './room-uses';
import { roomResponseOf } from './rooms.mapper';

@Injectable()
export class RoomsService {
  constructor(
    private readonly em: EntityManager,
    private readonly uses: RoomUses,
    private readonly photos: PhotosService,
  ) {}

  /** The one that was recorded in last stands first. */
  async list({ user }: Viewer): Promise<ListRoomsResponse> {
    const rooms = await this.em.find(
      Room,
      { owner: user.id },
      { orderBy: { id: 'desc' }, populate: ['photo'] },
    );
    const uses = await this.uses.ofOwner(user.id);
    const items = rooms.map((room) => roomResponseOf(room, uses.get(room.id)));
    const lastUsed = ({ lastTakeAt }: RoomResponse) => (lastTakeAt ? Date.parse(lastTakeAt) : 0);
    return { items: items.sort((one, other) => lastUsed(other) - lastUsed(one)) };
  }

  /** For whoever may read it; the guard has asked. Photos are its player's. */
  async get(roomId: string, { own }: Pick<TakeRights, 'own'>): Promise<RoomResponse> {
    const room = await this.em.findOneOrFail(Room, { id: roomId }, { populate: ['photo'] });
    const whole = await this.whole(room);
    return own ? whole : { ...whole, photo: null };
  }

  /** @throws {AppError} `not-found` where it is somebody else's, too */
  async getOwn(viewer: Viewer, roomId: string): Promise<RoomResponse> {
    return this.whole(await ownRoom(this.em, viewer, roomId));
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

  /** Its log goes with it, and their photos; its takes stay, without a room. */
  async remove(viewer: Viewer, roomId: string): Promise<void> {
    const room = await ownRoom(this.em, viewer, roomId);
    const changes = await this.em.find(RoomChange, { room, photo: { $ne: null } }, { populate: ['photo'] });
    const photos = [room, ...changes].flatMap(({ photo }) => photo?.unwrap() ?? []);
    await this.em.removeAndFlush(room);
    for (const photo of photos) await this.photos.remove(photo);
  }

  async addPhoto(viewer: Viewer, roomId: string, received: Buffer): Promise<RoomResponse> {
    const room = await ownRoom(this.em, viewer, roomId);
    const old = room.photo?.unwrap() ?? null;
    await this.photos.replace(viewer, { received, old, use: (photo) => this.em.assign(room, { photo }) });
    return this.whole(room);
  }

  async removePhoto(viewer: Viewer, roomId: string): Promise<RoomResponse> {
    const room = await ownRoom(this.em, viewer, roomId);
    const photo = room.photo?.unwrap();
    room.photo = null;
    if (photo) await this.photos.remove(photo);
    return this.whole(room);
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
