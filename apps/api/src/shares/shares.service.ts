import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import {
  createShareRequest,
  CreatedShareResponse,
  ListSharesRequest,
  ListSharesResponse,
  shareLimits,
  ShareResponse,
  ShareSubject,
  shareSubject,
} from '@thudline/contracts';
import { validate } from 'uuid';
import { z } from 'zod';
import { Viewer } from '../access/viewer';
import { AuditService } from '../audit/audit.service';
import { PasswordsService } from '../auth/passwords.service';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { AppError, notFound } from '../errors/app-error';
import { MailQueue } from '../mail/mail-queue';
import { Room } from '../rooms/entities/room.entity';
import { Take } from '../takes/entities/take.entity';
import { ThrottleService } from '../throttle/throttle.service';
import { randomToken, tokenHash } from '../tokens/random-token';
import { TryOut } from '../tryouts/entities/try-out.entity';
import { User } from '../users/entities/user.entity';
import { Share } from './entities/share.entity';
import { expiryOf } from './share-expiry';
import { isAbout, subjectColumns } from './share-subject';
import { withSubject } from './subject-name';
import { shareResponseOf } from './shares.mapper';

/** A player's own links. */
@Injectable()
export class SharesService {
  constructor(
    private readonly em: EntityManager,
    private readonly audit: AuditService,
    private readonly passwords: PasswordsService,
    private readonly throttle: ThrottleService,
    private readonly mails: MailQueue,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async create(
    viewer: Viewer,
    { subject, passphrase, expiresInDays, expiresAt, mailTo, ...rest }: z.output<typeof createShareRequest>,
  ): Promise<CreatedShareResponse> {
    const owner = viewer.user;
    await this.checkOwn(viewer, subject);
    if ((await this.em.count(Share, { owner: owner.id })) >= shareLimits.most)
      throw new AppError('conflict', `You have made ${shareLimits.most} links, and no more can be kept.`);
    if (mailTo) await this.checkMayMail(viewer);
    const token = mailTo ? null : randomToken();
    const row = {
      ...subjectColumns(subject),
      tokenHash: token && tokenHash(token),
      mailedTo: mailTo ?? null,
      passphraseHash: passphrase === undefined ? null : await this.passwords.hash(passphrase),
      openCount: 0,
      expiresAt: expiryOf({ expiresInDays, expiresAt }),
      ...rest,
    };
    const share = await this.em.transactional(async (em) => {
      const made = em.create(Share, { owner: em.getReference(User, owner.id), ...row });
      await em.flush();
      this.audit.record({ kind: 'share-made', userId: owner.id, subjectId: made.id });
      if (mailTo) await this.mails.sendWith(em, { kind: 'share', shareId: made.id });
      return em.populate(made, withSubject);
    });
    return { ...shareResponseOf(share), url: token && new URL(`/s/${token}`, this.config.publicUrl).href };
  }

  async list(viewer: Viewer, { kind, ...ids }: ListSharesRequest): Promise<ListSharesResponse> {
    const parsed = kind && shareSubject.safeParse({ kind, ...ids });
    if (parsed && !parsed.success)
      throw new AppError('bad-request', 'Say which take, comparison, try-out or room the links are to.');
    if (parsed) await this.checkOwn(viewer, parsed.data);
    const about = parsed ? isAbout(parsed.data) : {};
    const where = { $and: [{ owner: viewer.user.id }, about] };
    const shares = await this.em.find(Share, where, { orderBy: { id: 'desc' }, populate: withSubject });
    return { items: shares.map(shareResponseOf) };
  }

  /** Whoever has the sheet open can't read on. Safe to call twice. */
  async end(viewer: Viewer, shareId: string): Promise<void> {
    const share = await this.getOwn(viewer, shareId);
    if (share.revokedAt) return;
    share.revokedAt = new Date();
    this.audit.record({ kind: 'share-ended', userId: viewer.user.id, subjectId: share.id });
    await this.em.flush();
  }

  /** Takes its ending back: the address that was told opens it again, if its time isn't over. */
  async restore(viewer: Viewer, shareId: string): Promise<ShareResponse> {
    const share = await this.getOwn(viewer, shareId);
    if (share.revokedAt) {
      share.revokedAt = null;
      this.audit.record({ kind: 'share-reopened', userId: viewer.user.id, subjectId: share.id });
      await this.em.flush();
    }
    return shareResponseOf(share);
  }

  /** Mails go to people who never asked for them: only from an address that is known to be somebody's, and not without end. */
  private async checkMayMail({ user }: Viewer): Promise<void> {
    if (!user.emailVerifiedAt)
      throw new AppError(
        'forbidden',
        'First open the link in the mail we sent you, so that we know your address is yours. Or make a link and send it yourself.',
      );
    const limit = this.config.limits.shareMailsPerAccount;
    await this.throttle.count({ key: `share-mail:${user.id}`, limit, windowS: 86_400 });
  }

  private async getOwn({ user }: Viewer, shareId: string): Promise<Share> {
    const share = validate(shareId)
      ? await this.em.findOne(Share, { id: shareId, owner: user.id }, { populate: withSubject })
      : null;
    if (!share) throw notFound();
    return share;
  }

  /** @throws {AppError} `not-found` where any of it is somebody else's, as if there were none */
  private async checkOwn({ user }: Viewer, subject: ShareSubject): Promise<void> {
    const owner = user.id;
    const { take, otherTake, tryOut, room } = subjectColumns(subject);
    for (const id of [take, otherTake])
      if (id && !(await this.em.count(Take, { id, owner, deletedAt: null }))) throw notFound();
    if (tryOut && !(await this.em.count(TryOut, { id: tryOut, owner, deletedAt: null }))) throw notFound();
    if (room && !(await this.em.count(Room, { id: room, owner }))) throw notFound();
  }
}
