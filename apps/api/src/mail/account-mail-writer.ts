import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { OneTimeTokenKind } from '../tokens/entities/one-time-token.entity';
import { OneTimeTokensService } from '../tokens/one-time-tokens.service';
import { isClosed } from '../users/closed-account';
import { User } from '../users/entities/user.entity';
import { MailJob } from './mail-jobs';
import { Mailer } from './mailer';
import { addressNoticeMail } from './templates/address-notice-mail';
import { deletionMail } from './templates/deletion-mail';
import { newAddressMail } from './templates/new-address-mail';
import { resetMail } from './templates/reset-mail';
import { verifyMail } from './templates/verify-mail';

export type AccountMailJob = Extract<
  MailJob,
  { kind: 'verify' | 'reset' | 'new-address' | 'address-notice' | 'deletion' }
>;

/** Mails that keep an account safe: they come whatever somebody has chosen. */
@Injectable()
export class AccountMailWriter {
  constructor(
    private readonly em: EntityManager,
    private readonly tokens: OneTimeTokensService,
    private readonly mailer: Mailer,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async write(job: AccountMailJob): Promise<void> {
    const em = this.em.fork();
    const user = await em.findOne(User, whose(job));
    if (!user || isClosed(user)) return;
    const { name } = user;
    const link = (kind: OneTimeTokenKind, email?: string) => this.link(em, { kind, user, email });
    const settingsUrl = new URL('/settings', this.config.publicUrl).href;
    switch (job.kind) {
      case 'verify':
        if (user.emailVerifiedAt) return;
        return this.mailer.send(user.email, verifyMail({ name, url: await link('verify') }));
      case 'reset':
        return this.mailer.send(user.email, resetMail({ name, url: await link('reset') }));
      case 'new-address':
        return this.mailer.send(
          job.email,
          newAddressMail({ name, url: await link('new-address', job.email) }),
        );
      case 'address-notice':
        return this.mailer.send(
          job.email,
          addressNoticeMail({ name, newEmail: job.newEmail, url: settingsUrl }),
        );
      case 'deletion':
        if (!user.deleteAfter) return;
        return this.mailer.send(
          user.email,
          deletionMail({ name, deleteAfter: user.deleteAfter, url: settingsUrl }),
        );
    }
  }

  private async link(
    em: EntityManager,
    { kind, user, email }: { kind: OneTimeTokenKind; user: User; email?: string },
  ): Promise<string> {
    const { token } = await this.tokens.make(kind, user, em, email);
    return new URL(`/${kind}/${token}`, this.config.publicUrl).href;
  }
}

const whose = (job: AccountMailJob) =>
  job.kind === 'reset' ? { emailLower: job.email.toLowerCase() } : { id: job.userId };
