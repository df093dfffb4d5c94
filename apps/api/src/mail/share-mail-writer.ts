import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { Share } from '../shares/entities/share.entity';
import { isOpen } from '../shares/open-shares';
import { subjectOf } from '../shares/share-subject';
import { randomToken, tokenHash } from '../tokens/random-token';
import { isClosed } from '../users/closed-account';
import { ChosenMail } from './chosen-mail';
import { shareMail } from './templates/share-mail';

/** Writes the mail that brings a link to somebody. */
@Injectable()
export class ShareMailWriter {
  constructor(
    private readonly em: EntityManager,
    private readonly mail: ChosenMail,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /** The token is made here and kept as its hash; a mail that is tried again brings another one. */
  async write(shareId: string): Promise<void> {
    const em = this.em.fork();
    const where = { $and: [{ id: shareId }, isOpen()] };
    const share = await em.findOne(Share, where, { populate: ['owner'] });
    const owner = share?.owner.unwrap();
    if (!share?.mailedTo || !owner || isClosed(owner)) return;
    const token = randomToken();
    share.tokenHash = tokenHash(token);
    await em.flush();
    const content = shareMail({
      from: owner.name,
      kind: subjectOf(share).kind,
      question: share.question,
      expiresAt: share.expiresAt ?? null,
      hasPassphrase: Boolean(share.passphraseHash),
      url: new URL(`/s/${token}`, this.config.publicUrl).href,
    });
    await this.mail.toAddress(share.mailedTo, 'sent', content);
  }
}
