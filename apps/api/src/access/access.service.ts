import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { validate } from 'uuid';
import { Room } from '../rooms/entities/room.entity';
import { sampleTakeId } from '../sample-sheet/sample-take';
import { Share } from '../shares/entities/share.entity';
import { isOpen } from '../shares/open-shares';
import { Take } from '../takes/entities/take.entity';
import { TryOut } from '../tryouts/entities/try-out.entity';
import { isSheet, rightsThrough } from './shared-takes';
import { added, everything, nothing, shared, TakeRights } from './take-rights';
import { Asker, Viewer } from './viewer';

/** The sheet that shows what this site does. */
const forEverybody: TakeRights = { ...nothing, read: true, figures: true, listen: true };

const ownRights = ({ readOnly }: Viewer): TakeRights => ({ ...everything, change: !readOnly });

/** A comparison, a try-out or a room log that was sent. */
const sentRights = ({ canListen }: Share): TakeRights => ({ ...nothing, read: true, listen: canListen });

/** The one place that knows who may see what. */
@Injectable()
export class AccessService {
  constructor(private readonly em: EntityManager) {}

  async take(asker: Asker, takeId: string): Promise<TakeRights> {
    if (!validate(takeId)) return nothing;
    const take = await this.em.findOne(Take, { id: takeId, deletedAt: null });
    if (!take) return nothing;
    if (asker.viewer && take.owner.id === asker.viewer.user.id) return ownRights(asker.viewer);
    const granted = await rightsThrough(this.em, await this.openTo(asker), takeId);
    return (await sampleTakeId(this.em)) === takeId ? added(granted, forEverybody) : granted;
  }

  /** Whoever may read both sheets may compare them; so may whoever was sent this comparison. */
  async comparison(asker: Asker, takeId: string, otherTakeId: string): Promise<TakeRights> {
    const rights = shared(await this.take(asker, takeId), await this.take(asker, otherTakeId));
    if (rights.read || !validate(takeId) || !validate(otherTakeId)) return rights;
    const sent = await this.openTo(asker, { take: takeId, otherTake: otherTakeId });
    return sent.map(sentRights).reduce(added, rights);
  }

  async tryOut(asker: Asker, tryOutId: string): Promise<TakeRights> {
    if (!validate(tryOutId)) return nothing;
    const tryOut = await this.em.findOne(TryOut, { id: tryOutId, deletedAt: null });
    return this.ownOrSent(asker, tryOut, { tryOut: tryOutId });
  }

  /** A room with its log. */
  async room(asker: Asker, roomId: string): Promise<TakeRights> {
    if (!validate(roomId)) return nothing;
    const room = await this.em.findOne(Room, { id: roomId });
    return this.ownOrSent(asker, room, { room: roomId });
  }

  /** @returns the newest share by which a note may be left on a take; null for its player and where there is none */
  async shareToNoteBy(asker: Asker, takeId: string): Promise<Share | null> {
    if (!validate(takeId)) return null;
    const shares = await this.openTo(asker, { take: takeId, canNote: true });
    return shares.filter(isSheet).at(-1) ?? null;
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

  private async ownOrSent(asker: Asker, subject: TryOut | Room | null, about: object): Promise<TakeRights> {
    if (!subject) return nothing;
    if (asker.viewer && subject.owner.id === asker.viewer.user.id) return ownRights(asker.viewer);
    return (await this.openTo(asker, about)).map(sentRights).reduce(added, nothing);
  }

  /**
   * What a link opened in this browser, or a share with this person, opens. Asked of the database every time, so that a
   * link that has ended ends for those who have it open.
   */
  private async openTo({ viewer, shareIds }: Asker, about: object = {}): Promise<Share[]> {
    const theirs = [
      ...(shareIds.length > 0 ? [{ id: { $in: shareIds } }] : []),
      ...(viewer ? [{ grantee: viewer.user.id }] : []),
    ];
    if (theirs.length === 0) return [];
    const where = { $and: [isOpen(), { $or: theirs }, about] };
    return this.em.find(Share, where, { orderBy: { id: 'asc' } });
  }
}
