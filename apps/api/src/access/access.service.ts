import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { validate } from 'uuid';
import { sampleTakeId } from '../sample-sheet/sample-take';
import { Share } from '../shares/entities/share.entity';
import { isOpen } from '../shares/open-shares';
import { Take } from '../takes/entities/take.entity';
import { added, everything, nothing, TakeRights } from './take-rights';
import { Asker, Viewer } from './viewer';

/** The sheet that shows what this site does. */
const forEverybody: TakeRights = { ...nothing, read: true, listen: true };

const ownRights = ({ readOnly }: Viewer): TakeRights => ({ ...everything, change: !readOnly });

/** The one place that knows who may see what. */
@Injectable()
export class AccessService {
  constructor(private readonly em: EntityManager) {}

  async take({ viewer, shareIds }: Asker, takeId: string): Promise<TakeRights> {
    if (!validate(takeId)) return nothing;
    const take = await this.em.findOne(Take, { id: takeId, deletedAt: null });
    if (!take) return nothing;
    if (viewer && take.owner.id === viewer.user.id) return ownRights(viewer);
    const granted = await this.grants(shareIds, takeId);
    return (await sampleTakeId(this.em)) === takeId ? added(granted, forEverybody) : granted;
  }

  /** @returns those of the ids that are the viewer's own takes, in one query */
  async ownAmong({ user }: Viewer, takeIds: string[]): Promise<string[]> {
    const takes = await this.em.find(Take, { id: { $in: takeIds }, owner: user.id, deletedAt: null });
    return takes.map(({ id }) => id);
  }

  /** A player may bring back what they deleted; to everybody else it is gone. */
  async deletedTake({ viewer }: Asker, takeId: string): Promise<TakeRights> {
    if (!viewer || !validate(takeId)) return nothing;
    const isOwn = (await this.em.count(Take, { id: takeId, owner: viewer.user.id })) > 0;
    return isOwn ? ownRights(viewer) : nothing;
  }

  /** Asked of the database every time, so that a link that has ended ends for those who have it open. */
  private async grants(shareIds: string[], takeId: string): Promise<TakeRights> {
    if (shareIds.length === 0) return nothing;
    const shares = await this.em.find(Share, {
      id: { $in: shareIds },
      ...(isOpen() as object),
      take: { id: takeId, deletedAt: null },
    });
    return shares.reduce<TakeRights>(
      (rights, { canListen, canDownload }) =>
        added(rights, { ...nothing, read: true, listen: canListen, download: canDownload }),
      nothing,
    );
  }
}
