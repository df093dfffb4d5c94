import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { invitationDays, invitationToken } from '../auth/invitation-token';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { User } from '../users/entities/user.entity';
import { MailJob } from './mail-jobs';
import { Mailer } from './mailer';
import { joinInvitationMail } from './templates/join-invitation-mail';

/** Nothing to whoever has an account by now. */
@Injectable()
export class InvitationMailWriter {
  constructor(
    private readonly em: EntityManager,
    private readonly mailer: Mailer,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async write({ email, fromUserId }: Extract<MailJob, { kind: 'join-invitation' }>): Promise<void> {
    const em = this.em.fork();
    const from = await em.findOne(User, { id: fromUserId, lockedAt: null });
    if (!from || (await em.count(User, { emailLower: email.toLowerCase() })) > 0) return;
    const url = new URL('/join', this.config.publicUrl);
    url.searchParams.set('invitation', invitationToken(this.config.jwtSecret, email));
    await this.mailer.send(
      email,
      joinInvitationMail({ from: from.name, days: invitationDays, url: url.href }),
    );
  }
}
