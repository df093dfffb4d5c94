import { EntityManager } from '@mikro-orm/postgresql';
import { BeforeApplicationShutdown, Injectable, Logger, OnApplicationBootstrap } from '@nestjs/common';
import { mailSettings } from '@thudline/contracts';
import { MailQueue } from './mail-queue';
import { weekEnd } from './week';

const hourMs = 60 * 60 * 1000;

/** Looks every hour whether a week is over that somebody wants to be told of. Any worker may do it. */
@Injectable()
export class Digests implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly logger = new Logger('Mail');
  private timer: NodeJS.Timeout | undefined;

  constructor(
    private readonly em: EntityManager,
    private readonly mails: MailQueue,
  ) {}

  onApplicationBootstrap(): void {
    this.timer = setInterval(() => {
      this.run(new Date()).catch((error: unknown) => this.logger.error(error, 'No week could be told'));
    }, hourMs);
  }

  beforeApplicationShutdown(): void {
    clearInterval(this.timer);
  }

  /** Each week once, whoever looks; the week in which it was switched on is the first. */
  async run(now: Date): Promise<void> {
    const until = weekEnd(now);
    await this.em.fork().transactional(async (em) => {
      const wanting = `settings->>'${mailSettings.digest}' = 'true' and email_verified_at is not null`;
      const told = await em.execute<{ id: string; is_first: boolean }[]>(
        `with due as (
           select id, digest_at from "user"
           where ${wanting} and locked_at is null and delete_after is null and (digest_at is null or digest_at < ?)
           for update skip locked)
         update "user" u set digest_at = ? from due where u.id = due.id
         returning u.id, due.digest_at is null as is_first`,
        [until, until],
      );
      for (const { id, is_first: isFirst } of told) {
        if (!isFirst)
          await this.mails.sendWith(em, { kind: 'digest', userId: id, until: until.toISOString() });
      }
    });
  }
}
