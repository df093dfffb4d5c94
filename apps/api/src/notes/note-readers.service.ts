import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { Share } from '../shares/entities/share.entity';
import { isOpen } from '../shares/open-shares';
import { Take } from '../takes/entities/take.entity';
import { Asked } from './asked';
import { ReadMark } from './entities/read-mark.entity';
import { guestIdOf } from './guest-cookie';
import { NoteReader } from './note-reader';

/** Finds out what somebody is to the notes on a take. */
@Injectable()
export class NoteReadersService {
  constructor(
    private readonly em: EntityManager,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async of({ takeId, asker: { viewer, shareIds }, rights, request }: Asked): Promise<NoteReader> {
    const take = await this.em.findOneOrFail(Take, { id: takeId });
    const userId = viewer?.user.id ?? null;
    const mark = userId ? await this.em.findOne(ReadMark, { user: userId, take: takeId }) : null;
    return {
      takeId,
      ownerId: take.owner.id,
      userId,
      guestId: guestIdOf(request, this.config.jwtSecret),
      shareIds,
      seesAll: userId !== null && (take.owner.id === userId || (await wasSentTo(this.em, userId, takeId))),
      mayNote: rights.note && !viewer?.readOnly,
      readAt: mark?.readAt ?? null,
    };
  }
}

/** Whether the take's sheet, and not only something that speaks of it, was sent to them by name. */
export async function wasSentTo(em: EntityManager, userId: string, takeId: string): Promise<boolean> {
  const toThem = { grantee: userId, take: takeId, otherTake: null };
  return (await em.count(Share, { $and: [isOpen(), toThem] })) > 0;
}
