import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { Share } from '../shares/entities/share.entity';
import { ChosenMail } from './chosen-mail';
import { openedMail } from './templates/opened-mail';

/** Tells whoever sent a link that it was opened for the first time. */
@Injectable()
export class OpenedMailWriter {
  constructor(
    private readonly em: EntityManager,
    private readonly mail: ChosenMail,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async write(shareId: string): Promise<void> {
    const populate = ['owner', 'take', 'otherTake', 'tryOut', 'room'] as const;
    const share = await this.em.fork().findOne(Share, { id: shareId }, { populate });
    if (!share) return;
    const owner = share.owner.unwrap();
    // As every mail about what somebody did: to an address that is known to be theirs.
    if (!owner.emailVerifiedAt) return;
    const { what, path } = toldOf(share);
    const url = new URL(path, this.config.publicUrl).href;
    await this.mail.toUser(owner, 'opened', openedMail({ name: owner.name, what, url }));
  }
}

function toldOf({ take, otherTake, tryOut, room }: Share): { what: string; path: string } {
  const [before, after] = [take?.unwrap(), otherTake?.unwrap()];
  if (before && after)
    return {
      what: `the comparison of takes ${before.number} and ${after.number}`,
      path: `/compare/${before.id}/${after.id}`,
    };
  if (before) return { what: `the sheet of take ${before.number}`, path: `/takes/${before.id}` };
  if (room) return { what: `the log of ${room.unwrap().name}`, path: `/rooms/${room.id}` };
  return { what: 'the try-out', path: `/tryouts/${tryOut?.id ?? ''}` };
}
