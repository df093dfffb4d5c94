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
import { createBoss, measureQueue } from '../queue/queue.schema';
import { ScratchService } from '../storage/scratch.service';
import { MeasureJob } from './measure-queue';
import { MeasurePool } from './measure-pool';
import { MeasurementClaims } from './measurement-claims';
import { MeasurementSweep } from './measurement-sweep';
import { MeasuringRuns } from './measuring-runs';

/** Takes jobs as they come, as many at a time as there are threads, and takes up what dead workers left. */
@Injectable()
export class MeasuringWorker implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly logger = new Logger('Worker');
  private readonly boss: PgBoss;
  private readonly running = new Set<Promise<void>>();
  private sweeping: NodeJS.Timeout | undefined;
  private isStopping = false;

  constructor(
    private readonly claims: MeasurementClaims,
    private readonly runs: MeasuringRuns,
    private readonly sweep: MeasurementSweep,
    private readonly pool: MeasurePool,
    private readonly scratch: ScratchService,
    @Inject(CONFIG) private readonly config: Config,
  ) {
    this.boss = createBoss(config.databaseUrl, 'works');
    this.boss.on('error', (error) => this.logger.error(error, 'The queue reports an error'));
  }

  async onApplicationBootstrap(): Promise<void> {
    await this.scratch.sweep();
    await this.boss.start();
    for (let thread = 0; thread < this.pool.threads; thread++) {
      await this.boss.work<MeasureJob>(measureQueue, { batchSize: 1, pollingIntervalSeconds: 0.5 }, (jobs) =>
        this.takeJobs(jobs),
      );
    }
    this.sweeping = setInterval(() => this.sweepOnce(), this.config.measuring.heartbeatMs);
    this.logger.log(`The worker measures with ${this.pool.threads} threads`);
  }

  /** What is running goes back to the queue, for a worker that stays. */
  async beforeApplicationShutdown(): Promise<void> {
    this.isStopping = true;
    clearInterval(this.sweeping);
    this.runs.stopAll();
    await Promise.allSettled(this.running);
    await this.boss.stop({ graceful: false });
  }

  private async takeJobs(jobs: PgBoss.Job<MeasureJob>[]): Promise<void> {
    for (const { data } of jobs) {
      // Left alone, the sweep of another worker finds it.
      if (this.isStopping) return;
      await this.tracked(this.takeJob(data));
    }
  }

  private async takeJob({ measurementId }: MeasureJob): Promise<void> {
    const claim = await this.claims.claim(measurementId);
    if (!claim) return;
    // Asked to stop while the claim was on its way, when nothing was running yet that could be stopped.
    await (this.isStopping ? this.claims.giveBack(claim) : this.runs.run(claim));
  }

  private async tracked(run: Promise<void>): Promise<void> {
    this.running.add(run);
    try {
      await run;
    } finally {
      this.running.delete(run);
    }
  }

  private sweepOnce(): void {
    this.sweep.run().then(
      (count) => count > 0 && this.logger.warn(`${count} measurements were left behind and wait again`),
      (error: unknown) => this.logger.error(error, 'The sweep failed'),
    );
  }
}
