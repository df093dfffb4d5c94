import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { PhoneLinkResponse } from '@thudline/contracts';
import { Viewer } from '../access/viewer';
import { AuditService } from '../audit/audit.service';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { ThrottleService } from '../throttle/throttle.service';
import { OneTimeTokensService } from '../tokens/one-time-tokens.service';
import { User } from '../users/entities/user.entity';

/** "Show on my phone": a link to scan that works once and lets the phone read along. */
@Injectable()
export class PhoneLinksService {
  constructor(
    private readonly em: EntityManager,
    private readonly tokens: OneTimeTokensService,
    private readonly throttle: ThrottleService,
    private readonly audit: AuditService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async make({ user }: Viewer): Promise<PhoneLinkResponse> {
    const limit = this.config.limits.phoneLinksPerAccount;
    await this.throttle.count({ key: `phone-link:${user.id}`, limit, windowS: 3_600 });
    const { token, expiresAt } = await this.tokens.make('phone', user);
    return {
      url: new URL(`/phone/${token}`, this.config.publicUrl).href,
      expiresAt: expiresAt.toISOString(),
    };
  }

  /** @throws {AppError} `link-ended` */
  async open(token: string, address: string): Promise<User> {
    const limit = this.config.limits.openLinkPerAddress;
    await this.throttle.count({ key: 'open-phone-link', address, limit, windowS: 900 });
    const user = await this.tokens.use('phone', token);
    this.audit.record({ kind: 'phone-let-in', userId: user.id, address });
    await this.em.flush();
    return user;
  }
}
