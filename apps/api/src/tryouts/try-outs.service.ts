import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import {
  createTryOutRequest,
  ListTryOutsResponse,
  TryOutResponse,
  updateTryOutPlaceRequest,
  updateTryOutRequest,
} from '@thudline/contracts';
import { validate } from 'uuid';
import { z } from 'zod';
import { TakeRights } from '../access/take-rights';
import { Viewer } from '../access/viewer';
import { AppError, notFound } from '../errors/app-error';
import { MeasurementsService } from '../measuring/measurements.service';
import { Take } from '../takes/entities/take.entity';
import { TryOutPlace } from './entities/try-out-place.entity';
import { TryOut } from './entities/try-out.entity';
import { FilledPlace, readersTryOut, tryOutListItemOf, tryOutResponseOf } from './try-outs.mapper';

type PlaceRequest = z.output<typeof createTryOutRequest>['places'][number];

interface PlaceOfTryOut {
  id: string;
  placeId: string;
}

@Injectable()
export class TryOutsService {
  constructor(
    private readonly em: EntityManager,
    private readonly measurements: MeasurementsService,
  ) {}

  async list({ user }: Viewer): Promise<ListTryOutsResponse> {
    const tryOuts = await this.em.find(TryOut, { owner: user.id }, { orderBy: { id: 'desc' }, limit: 200 });
    const filled = await this.filled(user.id, tryOuts);
    return { items: tryOuts.map((tryOut) => tryOutListItemOf(tryOut, filled.get(tryOut.id) ?? [])) };
  }

  async create(
    viewer: Viewer,
    { places, currentIndex, ...about }: z.output<typeof createTryOutRequest>,
  ): Promise<TryOutResponse> {
    const keyed = await this.withKeys(viewer, places);
    const tryOut = this.em.create(TryOut, { owner: viewer.user, reason: '', ...about });
    const rows = keyed.map((place, rank) => this.em.create(TryOutPlace, { tryOut, rank, ...place }));
    await this.em.flush();
    tryOut.currentPlaceId = currentIndex === null ? null : (rows[currentIndex]?.id ?? null);
    await this.em.flush();
    return this.whole(tryOut);
  }

  /** For whoever may read it; the guard has asked. */
  async get(id: string, { own }: TakeRights): Promise<TryOutResponse> {
    const whole = await this.whole(await this.em.findOneOrFail(TryOut, { id }));
    return own ? whole : readersTryOut(whole);
  }

  async update(
    viewer: Viewer,
    id: string,
    { winnerPlaceId, currentPlaceId, ...words }: z.output<typeof updateTryOutRequest>,
  ): Promise<TryOutResponse> {
    const tryOut = await this.getOwn(viewer, id);
    for (const placeId of [winnerPlaceId, currentPlaceId]) if (placeId) await this.getPlace(tryOut, placeId);
    const changes = { ...words, winnerPlaceId, currentPlaceId };
    this.em.assign(
      tryOut,
      Object.fromEntries(Object.entries(changes).filter(([, value]) => value !== undefined)),
    );
    if (tryOut.subject === 'other' && !tryOut.differs)
      throw new AppError('bad-request', 'Say in a few words what differs.');
    await this.em.flush();
    return this.whole(tryOut);
  }

  async remove(viewer: Viewer, id: string): Promise<void> {
    await this.em.removeAndFlush(await this.getOwn(viewer, id));
  }

  async updatePlace(
    viewer: Viewer,
    { id, placeId }: PlaceOfTryOut,
    { position, label }: z.output<typeof updateTryOutPlaceRequest>,
  ): Promise<TryOutResponse> {
    const tryOut = await this.getOwn(viewer, id);
    const place = await this.getPlace(tryOut, placeId);
    if (position !== undefined) place.position = position;
    if (label !== undefined) place.label = label;
    await this.em.flush();
    return this.whole(tryOut);
  }

  async removePlace(viewer: Viewer, { id, placeId }: PlaceOfTryOut): Promise<TryOutResponse> {
    const tryOut = await this.getOwn(viewer, id);
    await this.em.removeAndFlush(await this.getPlace(tryOut, placeId));
    return this.whole(tryOut);
  }

  /** @throws {AppError} `not-found` for another player's, as if there were none */
  async getOwn({ user }: Viewer, id: string): Promise<TryOut> {
    const tryOut = validate(id) ? await this.em.findOne(TryOut, { id, owner: user.id }) : null;
    if (!tryOut) throw notFound();
    return tryOut;
  }

  /** In the order they were played. */
  async placesOf(tryOut: TryOut): Promise<FilledPlace[]> {
    return (await this.filled(tryOut.owner.id, [tryOut])).get(tryOut.id) ?? [];
  }

  private async whole(tryOut: TryOut): Promise<TryOutResponse> {
    return tryOutResponseOf(tryOut, await this.placesOf(tryOut));
  }

  private async getPlace(tryOut: TryOut, placeId: string): Promise<TryOutPlace> {
    const place = validate(placeId) ? await this.em.findOne(TryOutPlace, { id: placeId, tryOut }) : null;
    if (!place) throw notFound();
    return place;
  }

  /** Deleted takes leave their places, and come back into them when they are restored. */
  private async filled(ownerId: string, tryOuts: TryOut[]): Promise<Map<string, FilledPlace[]>> {
    const places = await this.em.find(
      TryOutPlace,
      { tryOut: { $in: tryOuts.map(({ id }) => id) } },
      { orderBy: { rank: 'asc' } },
    );
    const keys = places.map(({ uploadKey }) => uploadKey);
    const found = await this.em.find(Take, { owner: ownerId, uploadKey: { $in: keys } });
    const takes = new Map(found.map((take) => [take.uploadKey, take]));
    const measurements = await this.measurements.latestOf(found.map(({ id }) => id));
    const filled = new Map<string, FilledPlace[]>();
    for (const place of places) {
      const take = takes.get(place.uploadKey) ?? null;
      if (take?.deletedAt) continue;
      const of = filled.get(place.tryOut.id) ?? [];
      of.push({ place, take, measurement: take ? (measurements.get(take.id) ?? null) : null });
      filled.set(place.tryOut.id, of);
    }
    return filled;
  }

  /** Takes that are there already have the key they were uploaded with. */
  private async withKeys({ user }: Viewer, places: PlaceRequest[]) {
    const takeIds = places.flatMap(({ takeId }) => takeId ?? []);
    const takes = await this.em.find(Take, { id: { $in: takeIds }, owner: user.id, deletedAt: null });
    const keyOf = new Map(takes.map(({ id, uploadKey }) => [id, uploadKey]));
    const keyed = places.map(({ takeId, uploadKey = keyOf.get(takeId ?? ''), ...place }) => {
      if (!uploadKey) throw new AppError('bad-request', 'One of these takes is not there any more.');
      return { uploadKey, ...place };
    });
    if (new Set(keyed.map(({ uploadKey }) => uploadKey)).size < keyed.length)
      throw new AppError('bad-request', 'A take stands in a try-out only once.');
    return keyed;
  }
}
