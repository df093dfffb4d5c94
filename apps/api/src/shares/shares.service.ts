import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { createShareRequest, CreatedShareResponse, ListSharesResponse } from '@thudline/contracts';
import { validate } from 'uuid';
import { z } from 'zod';
import { Viewer } from '../access/viewer';
import { AuditService } from '../audit/audit.service';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { AppError, notFound } from '../errors/app-error';
import { ThrottleService } from '../throttle/throttle.service';
import { randomToken, tokenHash } from '../tokens/random-token';
import { Share } from './entities/share.entity';
import { isOpen } from './open-shares';
import { shareResponseOf } from './shares.mapper';

const dayMs = 24 * 60 * 60 * 1000;

@Injectable()
export class SharesService {
  constructor(
    private readonly em: EntityManager,
    private readonly throttle: ThrottleService,
    private readonly audit: AuditService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async create(
    { user }: Viewer,
    takeId: string,
    { expiresInDays, ...rest }: z.output<typeof createShareRequest>,
  ): Promise<CreatedShareResponse> {
    const token = randomToken();
    const expiresAt = expiresInDays === null ? null : new Date(Date.now() + expiresInDays * dayMs);
    const share = this.em.create(Share, {
      owner: user,
      take: takeId,
      tokenHash: tokenHash(token),
      openCount: 0,
      expiresAt,
      ...rest,
    });
    await this.em.flush();
    this.audit.record({ kind: 'share-made', userId: user.id, subjectId: share.id });
    await this.em.flush();
    return { ...shareResponseOf(share), url: new URL(`/s/${token}`, this.config.publicUrl).href };
  }

  async list(takeId: string): Promise<ListSharesResponse> {
    const shares = await this.em.find(Share, { take: takeId }, { orderBy: { id: 'desc' } });
    return { items: shares.map(shareResponseOf) };
  }

  /** Whoever has the sheet open can't read on. Safe to call twice. */
  async end({ user }: Viewer, shareId: string): Promise<void> {
    const share = validate(shareId) ? await this.em.findOne(Share, { id: shareId, owner: user.id }) : null;
    if (!share) throw notFound();
    if (share.revokedAt) return;
    share.revokedAt = new Date();
    this.audit.record({ kind: 'share-ended', userId: user.id, subjectId: share.id });
    await this.em.flush();
  }

  /** @returns the share with its owner, counted as opened once more */
  async open(token: string, address: string): Promise<Share> {
    await this.throttle.count({
      key: 'open-share',
      address,
      limit: this.config.limits.openLinkPerAddress,
      windowS: 900,
    });
    const share = await this.findOpen(token);
    if (!share) throw linkEnded();
    await this.em
      .getConnection()
      .execute('update share set opened_at = now(), open_count = open_count + 1 where id = ?', [share.id]);
    return share;
  }

  /** @returns null for a link that has ended or never was */
  async findOpen(token: string): Promise<Share | null> {
    return this.em.findOne(
      Share,
      { tokenHash: tokenHash(token), ...(isOpen() as object) },
      { populate: ['owner', 'take'] },
    );
  }
}

const linkEnded = () =>
  new AppError('link-ended', 'This link has ended, or is not whole. Ask whoever sent it for a new one.');
