import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import {
  createTryOutRequest,
  ListTryOutsResponse,
  TryOutResponse,
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
import { keyedPlaces } from './keyed-places';
import { FilledPlace, readersTryOut, tryOutListItemOf, tryOutResponseOf } from './try-outs.mapper';

/** What the mapper reads beside its own columns. */
const told = ['winnerSetup.copiedFrom', 'owner'] as const;

@Injectable()
export class TryOutsService {
  constructor(
    private readonly em: EntityManager,
    private readonly measurements: MeasurementsService,
  ) {}

  async list({ user }: Viewer): Promise<ListTryOutsResponse> {
    const tryOuts = await this.em.find(
      TryOut,
      { owner: user.id, deletedAt: null },
      { orderBy: { id: 'desc' }, limit: 200 },
    );
    const filled = await this.filled(user.id, tryOuts);
    return { items: tryOuts.map((tryOut) => tryOutListItemOf(tryOut, filled.get(tryOut.id) ?? [])) };
  }

  async create(
    viewer: Viewer,
    { places, currentIndex, ...about }: z.output<typeof createTryOutRequest>,
  ): Promise<TryOutResponse> {
    const keyed = await keyedPlaces(this.em, viewer.user.id, places);
    const tryOut = this.em.create(TryOut, { owner: viewer.user, reason: '', ...about });
    const rows = keyed.map((place, rank) => this.em.create(TryOutPlace, { tryOut, rank, ...place }));
    await this.em.flush();
    tryOut.currentPlaceId = currentIndex === null ? null : (rows[currentIndex]?.id ?? null);
    await this.em.flush();
    return this.getWhole(viewer, tryOut.id);
  }

  /** For whoever may read it; the guard has asked. */
  async get(id: string, { own }: TakeRights): Promise<TryOutResponse> {
    const whole = await this.whole(await this.em.findOneOrFail(TryOut, { id }, { populate: told }));
    return own ? whole : readersTryOut(whole);
  }

  /** For its owner. */
  async getWhole(viewer: Viewer, id: string): Promise<TryOutResponse> {
    return this.whole(await this.getOwn(viewer, id));
  }

  async update(
    viewer: Viewer,
    id: string,
    { winnerPlaceId, currentPlaceId, ...words }: z.output<typeof updateTryOutRequest>,
  ): Promise<TryOutResponse> {
    const tryOut = await this.getOwn(viewer, id);
    await this.checkPlaces(tryOut, [winnerPlaceId, currentPlaceId]);
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
    const tryOut = await this.getOwn(viewer, id);
    tryOut.deletedAt = new Date();
    await this.em.flush();
  }

  async restore(viewer: Viewer, id: string): Promise<TryOutResponse> {
    const tryOut = await this.findOwn(viewer, id);
    if (!tryOut) throw notFound();
    tryOut.deletedAt = null;
    await this.em.flush();
    return this.whole(tryOut);
  }

  /** @throws {AppError} `not-found` for another player's, as if there were none */
  async getOwn(viewer: Viewer, id: string): Promise<TryOut> {
    const tryOut = await this.findOwn(viewer, id);
    if (!tryOut || tryOut.deletedAt) throw notFound();
    return tryOut;
  }

  /** In the order they were played. */
  async placesOf(tryOut: TryOut): Promise<FilledPlace[]> {
    return (await this.filled(tryOut.owner.id, [tryOut])).get(tryOut.id) ?? [];
  }

  /** A deleted one, too. */
  private async findOwn({ user }: Viewer, id: string): Promise<TryOut | null> {
    return validate(id) ? this.em.findOne(TryOut, { id, owner: user.id }, { populate: told }) : null;
  }

  private async checkPlaces(tryOut: TryOut, placeIds: (string | null | undefined)[]): Promise<void> {
    const named = new Set(placeIds.filter((placeId) => typeof placeId === 'string'));
    const found = await this.em.count(TryOutPlace, { id: { $in: [...named] }, tryOut, removedAt: null });
    if (found < named.size) throw notFound();
  }

  private async whole(tryOut: TryOut): Promise<TryOutResponse> {
    return tryOutResponseOf(tryOut, await this.placesOf(tryOut));
  }

  /** Deleted takes leave their places, and come back into them when they are restored. */
  private async filled(ownerId: string, tryOuts: TryOut[]): Promise<Map<string, FilledPlace[]>> {
    const places = await this.em.find(
      TryOutPlace,
      { tryOut: { $in: tryOuts.map(({ id }) => id) }, removedAt: null },
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
}
