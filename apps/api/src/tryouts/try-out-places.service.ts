import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import {
  addTryOutPlacesRequest,
  tryOutLimits,
  TryOutResponse,
  updateTryOutPlaceRequest,
} from '@thudline/contracts';
import { validate } from 'uuid';
import { z } from 'zod';
import { Viewer } from '../access/viewer';
import { AppError, notFound } from '../errors/app-error';
import { TryOutPlace } from './entities/try-out-place.entity';
import { TryOut } from './entities/try-out.entity';
import { keyedPlaces, standsTwice } from './keyed-places';
import { TryOutsService } from './try-outs.service';

interface PlaceOfTryOut {
  id: string;
  placeId: string;
}

/** The takes of a try-out: more of them, other positions, fewer of them. */
@Injectable()
export class TryOutPlacesService {
  constructor(
    private readonly em: EntityManager,
    private readonly tryOuts: TryOutsService,
  ) {}

  /** At the end; a take that was taken out of this try-out comes back with what is said of it now. */
  async add(
    viewer: Viewer,
    id: string,
    { places }: z.output<typeof addTryOutPlacesRequest>,
  ): Promise<TryOutResponse> {
    const tryOut = await this.tryOuts.getOwn(viewer, id);
    const keyed = await keyedPlaces(this.em, viewer.user.id, places);
    const there = await this.em.find(TryOutPlace, { tryOut }, { orderBy: { rank: 'asc' } });
    const present = there.filter(({ removedAt }) => !removedAt);
    if (present.length + keyed.length > tryOutLimits.mostTakes)
      throw new AppError('bad-request', `A try-out has at most ${tryOutLimits.mostTakes} takes.`);
    const firstRank = (there.at(-1)?.rank ?? -1) + 1;
    for (const [i, place] of keyed.entries()) {
      const known = there.find(({ uploadKey }) => uploadKey === place.uploadKey);
      if (known && !known.removedAt) throw standsTwice();
      const said = { ...place, rank: firstRank + i };
      if (known) this.em.assign(known, { ...said, removedAt: null });
      else this.em.create(TryOutPlace, { tryOut, ...said });
    }
    await this.em.flush();
    return this.tryOuts.getWhole(viewer, id);
  }

  async update(
    viewer: Viewer,
    { id, placeId }: PlaceOfTryOut,
    { position, label }: z.output<typeof updateTryOutPlaceRequest>,
  ): Promise<TryOutResponse> {
    const place = await this.getPlace(await this.tryOuts.getOwn(viewer, id), placeId);
    if (position !== undefined) place.position = position;
    if (label !== undefined) place.label = label;
    await this.em.flush();
    return this.tryOuts.getWhole(viewer, id);
  }

  /** The row stays, so that it can be undone. */
  async remove(viewer: Viewer, { id, placeId }: PlaceOfTryOut): Promise<TryOutResponse> {
    const place = await this.getPlace(await this.tryOuts.getOwn(viewer, id), placeId);
    place.removedAt = new Date();
    await this.em.flush();
    return this.tryOuts.getWhole(viewer, id);
  }

  async restore(viewer: Viewer, { id, placeId }: PlaceOfTryOut): Promise<TryOutResponse> {
    const tryOut = await this.tryOuts.getOwn(viewer, id);
    const place = await this.findPlace(tryOut, placeId);
    if (!place) throw notFound();
    place.removedAt = null;
    await this.em.flush();
    return this.tryOuts.getWhole(viewer, id);
  }

  /** @throws {AppError} `not-found` where this try-out has no such place */
  async getPlace(tryOut: TryOut, placeId: string): Promise<TryOutPlace> {
    const place = await this.findPlace(tryOut, placeId);
    if (!place || place.removedAt) throw notFound();
    return place;
  }

  private async findPlace(tryOut: TryOut, placeId: string): Promise<TryOutPlace | null> {
    return validate(placeId) ? this.em.findOne(TryOutPlace, { id: placeId, tryOut }) : null;
  }
}
