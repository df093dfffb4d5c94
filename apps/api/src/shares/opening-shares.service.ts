import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { OpenShareRequest } from '@thudline/contracts';
import { PasswordsService } from '../auth/passwords.service';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { AppError } from '../errors/app-error';
import { MailQueue } from '../mail/mail-queue';
import { ThrottleService } from '../throttle/throttle.service';
import { tokenHash } from '../tokens/random-token';
import { Share } from './entities/share.entity';
import { isOpen } from './open-shares';
import { withSubject } from './subject-name';

interface Opener {
  address: string;
  /** What is open in this browser already. */
  shareIds: string[];
}

/** What a guest does with a link: hands in its token, and its passphrase where it has one. */
@Injectable()
export class OpeningSharesService {
  constructor(
    private readonly em: EntityManager,
    private readonly throttle: ThrottleService,
    private readonly passwords: PasswordsService,
    private readonly mails: MailQueue,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /** @returns the share with its owner, counted as opened once more */
  async open({ token, passphrase }: OpenShareRequest, { address, shareIds }: Opener): Promise<Share> {
    const limit = this.config.limits.openLinkPerAddress;
    await this.throttle.count({ key: 'open-share', address, limit, windowS: 900 });
    const share = await this.findOpen(token);
    if (!share) throw linkEnded();
    // Whoever has it open in this browser gave the passphrase before: loading the page again doesn't ask anew.
    if (!shareIds.includes(share.id)) await this.checkPassphrase(share, passphrase, address);
    await this.countOpening(share.id);
    return share;
  }

  /** @returns null for a link that has ended or never was */
  async findOpen(token: string): Promise<Share | null> {
    const where = { $and: [{ tokenHash: tokenHash(token) }, isOpen()] };
    return this.em.findOne(Share, where, { populate: ['owner', ...withSubject] });
  }

  /** Of the first one the owner hears by mail. */
  private async countOpening(shareId: string): Promise<void> {
    await this.em.fork().transactional(async (em) => {
      const [counted] = await em.execute<{ open_count: number }[]>(
        'update share set opened_at = now(), open_count = open_count + 1 where id = ? returning open_count',
        [shareId],
      );
      if (counted?.open_count === 1) await this.mails.sendWith(em, { kind: 'opened', shareId });
    });
  }

  /** Tries are counted for the link from one place, so that nobody can shut others out of it, and over all places. */
  private async checkPassphrase(share: Share, given: string | undefined, address: string): Promise<void> {
    if (!share.passphraseHash) return;
    if (!given) throw new AppError('passphrase-needed', 'This link asks for a passphrase.');
    const key = `passphrase:${share.id}`;
    const { passphrasePerAddress, passphrasePerLink } = this.config.limits;
    await this.throttle.count({ key, address, limit: passphrasePerAddress, windowS: 900 });
    await this.throttle.count({ key, limit: passphrasePerLink, windowS: 86_400 });
    if (await this.passwords.matches(share.passphraseHash, given.trim())) return;
    throw new AppError('wrong-passphrase', 'This is not the passphrase. Ask whoever sent the link.');
  }
}

const linkEnded = () =>
  new AppError('link-ended', 'This link has ended, or is not whole. Ask whoever sent it for a new one.');
