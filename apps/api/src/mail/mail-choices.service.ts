import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { MailChoiceResponse, mailSettings } from '@thudline/contracts';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { ThrottleService } from '../throttle/throttle.service';
import { linkEnded } from '../tokens/one-time-tokens.service';
import { User } from '../users/entities/user.entity';
import { settingsOf } from '../users/user-settings';
import { MailRefusal } from './entities/mail-refusal.entity';
import { MailChoiceOf, readMailChoiceToken } from './mail-choice-token';

interface Asked {
  token: string;
  /** In the net, of whoever asks. */
  address: string;
}

/** What the link at the foot of a mail does, for whoever holds it. */
@Injectable()
export class MailChoicesService {
  constructor(
    private readonly em: EntityManager,
    private readonly throttle: ThrottleService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async read(asked: Asked): Promise<MailChoiceResponse> {
    const of = await this.opened(asked);
    return { choice: of.choice, wanted: await this.isWanted(of) };
  }

  /** Safe to call twice. */
  async set(asked: Asked, wanted: boolean): Promise<MailChoiceResponse> {
    const of = await this.opened(asked);
    const { choice, userId, emailHash } = of;
    if (userId) {
      const merged = 'update "user" set settings = settings || ?::jsonb where id = ?';
      const changed = JSON.stringify({ [mailSettings[choice]]: wanted });
      await this.em.getConnection().execute(merged, [changed, userId]);
    } else if (emailHash && wanted) await this.em.nativeDelete(MailRefusal, { emailHash, choice });
    else if (emailHash) await this.em.upsert(MailRefusal, { emailHash, choice, createdAt: new Date() });
    return { choice, wanted };
  }

  private async opened({ token, address }: Asked): Promise<MailChoiceOf> {
    const limit = this.config.limits.openLinkPerAddress;
    await this.throttle.count({ key: 'mail-choice', address, limit, windowS: 900 });
    const of = readMailChoiceToken(this.config.jwtSecret, token);
    if (!of || (of.userId && (await this.em.count(User, { id: of.userId })) === 0)) throw linkEnded();
    return of;
  }

  private async isWanted({ choice, userId, emailHash }: MailChoiceOf): Promise<boolean> {
    if (userId) return settingsOf(await this.em.findOneOrFail(User, userId))[mailSettings[choice]];
    return (await this.em.count(MailRefusal, { emailHash, choice })) === 0;
  }
}
