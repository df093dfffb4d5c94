import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { OneTimeTokensService } from '../tokens/one-time-tokens.service';
import { User } from '../users/entities/user.entity';
import { MailJob } from './mail-jobs';
import { Mailer } from './mailer';
import { resetMail } from './templates/reset-mail';
import { verifyMail } from './templates/verify-mail';

/** Turns a job into a mail, or into nothing where there is nobody to write to any more. */
@Injectable()
export class MailWriter {
  constructor(
    private readonly em: EntityManager,
    private readonly tokens: OneTimeTokensService,
    private readonly mailer: Mailer,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async write(job: MailJob): Promise<void> {
    const em = this.em.fork();
    const user = await em.findOne(User, whose(job));
    if (!user || user.lockedAt || (job.kind === 'verify' && user.emailVerifiedAt)) return;
    const { token } = await this.tokens.make(job.kind, user, em);
    const url = new URL(`/${job.kind}/${token}`, this.config.publicUrl).href;
    const template = job.kind === 'verify' ? verifyMail : resetMail;
    await this.mailer.send(user.email, template({ name: user.name, url }));
  }
}

const whose = (job: MailJob) =>
  job.kind === 'verify' ? { id: job.userId } : { emailLower: job.email.toLowerCase() };
