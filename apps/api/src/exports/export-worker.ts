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
import { exportQueue, createBoss } from '../queue/queue.schema';
import { ExportClaims } from './export-claims';
import { ExportJob } from './export-queue';
import { ExportRuns } from './export-runs';

/** Makes exports one after the other, and takes up what dead workers left. */
@Injectable()
export class ExportWorker implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly logger = new Logger('Exports');
  private readonly boss: PgBoss;
  private running: Promise<void> = Promise.resolve();
  private sweeping: NodeJS.Timeout | undefined;
  private isStopping = false;

  constructor(
    private readonly claims: ExportClaims,
    private readonly runs: ExportRuns,
    @Inject(CONFIG) private readonly config: Config,
  ) {
    this.boss = createBoss(config.databaseUrl, 'exports');
    this.boss.on('error', (error) => this.logger.error(error, 'The queue reports an error'));
  }

  async onApplicationBootstrap(): Promise<void> {
    await this.boss.start();
    const options = { batchSize: 1, pollingIntervalSeconds: 0.5 };
    await this.boss.work<ExportJob>(exportQueue, options, (jobs) => this.takeJobs(jobs));
    this.sweeping = setInterval(() => this.sweepOnce(), this.config.measuring.heartbeatMs);
  }

  /** What is running goes back to the queue, for a worker that stays. */
  async beforeApplicationShutdown(): Promise<void> {
    this.isStopping = true;
    clearInterval(this.sweeping);
    this.runs.stopAll();
    await this.running;
    await this.boss.stop({ graceful: false });
  }

  private async takeJobs(jobs: PgBoss.Job<ExportJob>[]): Promise<void> {
    for (const { data } of jobs) {
      // Left alone, the sweep of another worker finds it.
      if (this.isStopping) return;
      this.running = this.takeJob(data);
      await this.running;
    }
  }

  private async takeJob({ exportId }: ExportJob): Promise<void> {
    const claim = await this.claims.claim(exportId);
    if (!claim) return;
    await (this.isStopping ? this.claims.giveBack(claim) : this.runs.run(claim));
  }

  private sweepOnce(): void {
    this.claims.sweep().then(
      (count) => count > 0 && this.logger.warn(`${count} exports were left behind and wait again`),
      (error: unknown) => this.logger.error(error, 'The sweep failed'),
    );
  }
}
