import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { validate } from 'uuid';
import { Take } from '../takes/entities/take.entity';
import { everything, nothing, TakeRights } from './take-rights';
import { Viewer } from './viewer';

/** The one place that knows who may see what. */
@Injectable()
export class AccessService {
  constructor(private readonly em: EntityManager) {}

  async take(viewer: Viewer, takeId: string): Promise<TakeRights> {
    if (!validate(takeId)) return nothing;
    const take = await this.em.findOne(Take, { id: takeId, owner: viewer.user.id, deletedAt: null });
    return take ? everything : nothing;
  }
}
