import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { makeTryOutSetupRequest, TryOutResponse } from '@thudline/contracts';
import { v7 } from 'uuid';
import { z } from 'zod';
import { Viewer } from '../access/viewer';
import { AppError } from '../errors/app-error';
import { Setup } from '../setups/entities/setup.entity';
import { fieldsOf } from '../setups/setups.mapper';
import { Take } from '../takes/entities/take.entity';
import { settingsOf } from '../users/user-settings';
import { User } from '../users/entities/user.entity';
import { TryOut } from './entities/try-out.entity';
import { TryOutPlace } from './entities/try-out-place.entity';
import { TryOutPlacesService } from './try-out-places.service';
import { TryOutsService } from './try-outs.service';
import { winnerSetupFields } from './winner-setup';

/** Makes a winner how things stand from now on, and takes it back. */
@Injectable()
export class TryOutSetupService {
  constructor(
    private readonly em: EntityManager,
    private readonly tryOuts: TryOutsService,
    private readonly places: TryOutPlacesService,
  ) {}

  /** Asked again, it starts from what stood before, so that no copy of a copy grows. */
  async make(
    viewer: Viewer,
    id: string,
    { winnerPlaceId, reason }: z.output<typeof makeTryOutSetupRequest>,
  ): Promise<TryOutResponse> {
    const tryOut = await this.tryOuts.getOwn(viewer, id);
    const place = await this.places.getPlace(tryOut, winnerPlaceId);
    const owner = await this.em.findOneOrFail(User, viewer.user.id);
    await this.takeBack(owner, tryOut);
    const base = await this.recordedWith(owner, place);
    const { subject, differs, unit } = tryOut;
    const varied = { subject, differs, unit, position: place.position ?? null, label: place.label };
    const fields = winnerSetupFields(base && fieldsOf(base), varied, settingsOf(owner).lengthUnit);
    const setup = this.em.create(Setup, { id: v7(), owner, ...fields, copiedFrom: base });
    this.em.assign(tryOut, {
      winnerPlaceId,
      reason,
      winnerSetup: setup,
      setupBeforeId: owner.currentSetupId,
    });
    owner.currentSetupId = setup.id;
    await this.em.flush();
    return this.tryOuts.getWhole(viewer, id);
  }

  async undo(viewer: Viewer, id: string): Promise<TryOutResponse> {
    const tryOut = await this.tryOuts.getOwn(viewer, id);
    const owner = await this.em.findOneOrFail(User, viewer.user.id);
    if (!tryOut.winnerSetup) throw new AppError('conflict', 'No setup was made of this try-out’s winner.');
    await this.takeBack(owner, tryOut);
    await this.em.flush();
    return this.tryOuts.getWhole(viewer, id);
  }

  /** What takes were recorded with stays; where another setup stands by now, that one stays the current one. */
  private async takeBack(owner: User, tryOut: TryOut): Promise<void> {
    const setup = tryOut.winnerSetup?.unwrap();
    if (!setup) return;
    if (owner.currentSetupId === setup.id) owner.currentSetupId = tryOut.setupBeforeId ?? null;
    this.em.assign(tryOut, { winnerSetup: null, setupBeforeId: null });
    const isUsed = (await this.em.count(Take, { setup: setup.id })) > 0;
    const isKept = isUsed || (await this.em.count(Setup, { copiedFrom: setup.id })) > 0;
    if (!isKept) this.em.remove(setup);
  }

  /** The winner's own setup, or how things stood when nothing was written down with it. */
  private async recordedWith(owner: User, { uploadKey }: TryOutPlace): Promise<Setup | null> {
    const take = await this.em.findOne(Take, { owner, uploadKey, deletedAt: null });
    const setupId = take?.setup?.id ?? owner.currentSetupId;
    return setupId ? this.em.findOne(Setup, { id: setupId, owner }) : null;
  }
}
