import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { MailChoice, mailSettings, paths } from '@thudline/contracts';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { isClosed } from '../users/closed-account';
import { User } from '../users/entities/user.entity';
import { settingsOf } from '../users/user-settings';
import { MailRefusal } from './entities/mail-refusal.entity';
import { emailHash, mailChoiceToken } from './mail-choice-token';
import { Mailer } from './mailer';
import { MailContent } from './templates/mail-content';
import { withWayOut } from './templates/way-out';

/**
 * The door for every mail that isn't about keeping an account safe: it goes only to whoever wants it, and carries the way
 * to want it no more.
 */
@Injectable()
export class ChosenMail {
  constructor(
    private readonly em: EntityManager,
    private readonly mailer: Mailer,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  toUser(user: User, choice: MailChoice, content: MailContent): Promise<void> {
    if (isClosed(user) || !settingsOf(user)[mailSettings[choice]]) return Promise.resolve();
    return this.send({ email: user.email, userId: user.id }, choice, content);
  }

  /** To whoever has an account under this address, or to the bare address. */
  async toAddress(email: string, choice: MailChoice, content: MailContent): Promise<void> {
    const em = this.em.fork();
    const user = await em.findOne(User, { emailLower: email.toLowerCase() });
    if (user) return this.toUser(user, choice, content);
    if ((await em.count(MailRefusal, { emailHash: emailHash(email), choice })) > 0) return;
    await this.send({ email, userId: null }, choice, content);
  }

  private async send(
    to: { email: string; userId: string | null },
    choice: MailChoice,
    content: MailContent,
  ): Promise<void> {
    const token = mailChoiceToken(this.config.jwtSecret, choice, to);
    const page = new URL(`/unsubscribe/${token}`, this.config.publicUrl).href;
    const oneClick = new URL(`${paths.stopMail}?token=${token}`, this.config.publicUrl).href;
    await this.mailer.send(to.email, withWayOut(content, choice, page), {
      'List-Unsubscribe': `<${oneClick}>`,
      'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click',
    });
  }
}
