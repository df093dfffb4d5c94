import {
  BeforeApplicationShutdown,
  Inject,
  Injectable,
  Logger,
  OnApplicationBootstrap,
} from '@nestjs/common';
import PgBoss from 'pg-boss';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { createBoss, mailQueue } from '../queue/queue.schema';
import { MailJob } from './mail-jobs';
import { MailWriter } from './mail-writer';

/** Sends mails one after the other; what fails goes back to the queue and is tried again later. */
@Injectable()
export class MailWorker implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly logger = new Logger('Mail');
  private readonly boss: PgBoss;

  constructor(
    private readonly writer: MailWriter,
    @Inject(CONFIG) config: Config,
  ) {
    this.boss = createBoss(config.databaseUrl, 'mails');
    this.boss.on('error', (error) => this.logger.error(error, 'The queue reports an error'));
  }

  async onApplicationBootstrap(): Promise<void> {
    await this.boss.start();
    await this.boss.work<MailJob>(mailQueue, { batchSize: 1, pollingIntervalSeconds: 0.5 }, (jobs) =>
      this.send(jobs),
    );
  }

  async beforeApplicationShutdown(): Promise<void> {
    await this.boss.stop({ graceful: true, timeout: 5_000 });
  }

  private async send(jobs: PgBoss.Job<MailJob>[]): Promise<void> {
    for (const { data } of jobs) {
      try {
        await this.writer.write(data);
      } catch (error) {
        this.logger.warn(error, `A mail (${data.kind}) was not taken; it is tried again later`);
        throw error;
      }
    }
  }
}
