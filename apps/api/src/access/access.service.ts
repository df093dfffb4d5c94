import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { validate } from 'uuid';
import { Take } from '../takes/entities/take.entity';
import { Viewer } from './viewer';

export type TakeRight = 'read' | 'listen' | 'download' | 'note' | 'change';
export type TakeRights = Record<TakeRight, boolean>;

const everything: TakeRights = { read: true, listen: true, download: true, note: true, change: true };
const nothing: TakeRights = { read: false, listen: false, download: false, note: false, change: false };

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
