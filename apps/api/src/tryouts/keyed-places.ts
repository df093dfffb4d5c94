import { EntityManager } from '@mikro-orm/postgresql';
import { createTryOutRequest } from '@thudline/contracts';
import { z } from 'zod';
import { AppError } from '../errors/app-error';
import { Take } from '../takes/entities/take.entity';

type PlaceRequest = z.output<typeof createTryOutRequest>['places'][number];

/**
 * Takes that are there already have the key they were uploaded with.
 *
 * @throws {AppError} `bad-request` where one is gone, or stands there twice
 */
export async function keyedPlaces(em: EntityManager, ownerId: string, places: PlaceRequest[]) {
  const takeIds = places.flatMap(({ takeId }) => takeId ?? []);
  const takes = await em.find(Take, { id: { $in: takeIds }, owner: ownerId, deletedAt: null });
  const keyOf = new Map(takes.map(({ id, uploadKey }) => [id, uploadKey]));
  const keyed = places.map(({ takeId, uploadKey = keyOf.get(takeId ?? ''), ...place }) => {
    if (!uploadKey) throw new AppError('bad-request', 'One of these takes is not there any more.');
    return { uploadKey, ...place };
  });
  if (new Set(keyed.map(({ uploadKey }) => uploadKey)).size < keyed.length) throw standsTwice();
  return keyed;
}

export const standsTwice = () => new AppError('bad-request', 'A take stands in a try-out only once.');
