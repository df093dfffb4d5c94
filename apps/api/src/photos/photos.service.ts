import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { validate, v7 } from 'uuid';
import { Viewer } from '../access/viewer';
import { notFound } from '../errors/app-error';
import { objectKeys } from '../storage/object-keys';
import { ObjectStoreService } from '../storage/object-store.service';
import { User } from '../users/entities/user.entity';
import { Photo } from './entities/photo.entity';
import { keptPhoto } from './kept-photo';

/** Photos of setups and rooms: stored drawn anew, read by their owner. */
@Injectable()
export class PhotosService {
  constructor(
    private readonly em: EntityManager,
    private readonly objects: ObjectStoreService,
  ) {}

  /**
   * Stores a photo and has `use` hang it onto what it belongs to; the one it takes the place of goes.
   *
   * @throws {AppError} `photo-refused`
   */
  async replace(
    { user }: Viewer,
    { received, old, use }: { received: Buffer; old: Photo | null; use: (photo: Photo) => void },
  ): Promise<void> {
    const { bytes, widthPx, heightPx } = await keptPhoto(received);
    const id = v7();
    const objectKey = objectKeys.photo(id);
    await this.objects.put(objectKey, bytes);
    try {
      const owner = this.em.getReference(User, user.id);
      use(this.em.create(Photo, { id, owner, objectKey, bytes: bytes.length, widthPx, heightPx }));
      if (old) this.em.remove(old);
      await this.em.flush();
    } catch (error) {
      await this.objects.remove([objectKey]);
      throw error;
    }
    if (old) await this.objects.remove([old.objectKey]);
  }

  /** The row goes first: an object without a row is found later, a row without an object is a broken picture. */
  async remove(photo: Photo): Promise<void> {
    await this.em.removeAndFlush(photo);
    await this.objects.remove([photo.objectKey]);
  }

  /** @throws {AppError} `not-found` where it is somebody else's, too */
  async read({ user }: Viewer, photoId: string): Promise<Uint8Array> {
    const photo = validate(photoId) && (await this.em.findOne(Photo, { id: photoId, owner: user.id }));
    const bytes = photo && (await this.objects.readWhole(photo.objectKey));
    if (!bytes) throw notFound();
    return bytes;
  }
}
