import { EntityManager, UniqueConstraintViolationException } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { ChangeEmailRequest } from '@thudline/contracts';
import { Viewer } from '../access/viewer';
import { AuditService } from '../audit/audit.service';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { AppError } from '../errors/app-error';
import { MailQueue } from '../mail/mail-queue';
import { ThrottleService } from '../throttle/throttle.service';
import { linkEnded, OneTimeTokensService } from '../tokens/one-time-tokens.service';
import { isClosed } from '../users/closed-account';
import { User } from '../users/entities/user.entity';
import { emailTaken } from './auth.service';
import { OwnPassword } from './own-password';

/** Another address for an account: confirmed from a mail to it, told to the address as it was. */
@Injectable()
export class EmailAddressService {
  constructor(
    private readonly em: EntityManager,
    private readonly tokens: OneTimeTokensService,
    private readonly mails: MailQueue,
    private readonly ownPassword: OwnPassword,
    private readonly throttle: ThrottleService,
    private readonly audit: AuditService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async ask({ user }: Viewer, { email, password }: ChangeEmailRequest): Promise<void> {
    await this.ownPassword.check(user, password);
    const limit = this.config.limits.mailsPerAccount;
    await this.throttle.count({ key: `new-address:${user.id}`, limit, windowS: 3_600 });
    const emailLower = email.toLowerCase();
    if (emailLower === user.emailLower) throw sameAddress();
    if ((await this.em.count(User, { emailLower })) > 0) throw emailTaken();
    await this.em.transactional(async (em) => {
      await this.mails.sendWith(em, { kind: 'new-address', userId: user.id, email });
      await this.mails.sendWith(em, {
        kind: 'address-notice',
        userId: user.id,
        email: user.email,
        newEmail: email,
      });
    });
  }

  /** The mail has shown whose address it is. Links that were sent to the old one end, since they name it. */
  async confirm(token: string, address: string): Promise<void> {
    const limit = this.config.limits.openLinkPerAddress;
    await this.throttle.count({ key: 'account-link', address, limit, windowS: 900 });
    const found = await this.tokens.find('new-address', token);
    const user = found?.user.unwrap();
    if (!found || !user || found.usedAt || isClosed(user)) throw linkEnded();
    found.usedAt = new Date();
    user.email = found.email;
    user.emailLower = found.email.toLowerCase();
    user.emailVerifiedAt = new Date();
    this.audit.record({ kind: 'address-changed', userId: user.id, address });
    try {
      await this.em.flush();
    } catch (error) {
      if (error instanceof UniqueConstraintViolationException) throw emailTaken();
      throw error;
    }
  }
}

const sameAddress = () =>
  new AppError('bad-request', 'That is your address already.', {
    details: { fields: { email: 'That is your address already.' } },
  });
