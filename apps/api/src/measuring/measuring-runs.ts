import { Injectable, Inject, Logger } from '@nestjs/common';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { AppError } from '../errors/app-error';
import { ScratchService } from '../storage/scratch.service';
import { MeasurementStage } from './entities/measurement.entity';
import { MeasurePool } from './measure-pool';
import { Claim, MeasurementClaims } from './measurement-claims';
import { wholeProgress } from './measurement-progress';
import { TakeOutlines } from './take-outlines';
import { StoredBytesDiffer, TakeFetcher } from './take-fetcher';

const bytesDiffer = 'The stored recordings of this take are damaged. Upload it again.';
const broke = 'Measuring this take failed on our side. Measure it again, or tell whoever runs this site.';

/** Why a run was stopped from outside. */
type StopReason = 'lost' | 'shutting-down' | 'making-way';

/** One attempt at one measurement, from the claim to the report. */
@Injectable()
export class MeasuringRuns {
  private readonly logger = new Logger('Measuring');
  private readonly stops = new Map<AbortController, Claim>();

  constructor(
    private readonly claims: MeasurementClaims,
    private readonly fetcher: TakeFetcher,
    private readonly pool: MeasurePool,
    private readonly outlines: TakeOutlines,
    private readonly scratch: ScratchService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /** Never throws for what one take does: its measurement says what became of it. */
  async run(claim: Claim): Promise<void> {
    const stop = new AbortController();
    this.stops.set(stop, claim);
    const folder = await this.scratch.make('measuring');
    const pulse = this.pulse(claim, stop);
    try {
      await this.measure(claim, folder, { stop, pulse });
    } catch (error) {
      await this.settle(claim, stop, error);
    } finally {
      pulse.end();
      this.stops.delete(stop);
      await this.scratch.remove(folder);
    }
  }

  stopAll(): void {
    for (const stop of this.stops.keys()) stop.abort('shutting-down' satisfies StopReason);
  }

  get renewals(): AbortController[] {
    const running = [...this.stops].filter(([{ signal }, { renewal }]) => renewal && !signal.aborted);
    return running.map(([stop]) => stop);
  }

  /** Hands renewals back, for takes that somebody waits for. */
  makeWay(count: number): void {
    for (const stop of this.renewals.slice(0, count)) stop.abort('making-way' satisfies StopReason);
  }

  private async measure(
    claim: Claim,
    folder: string,
    { stop, pulse }: { stop: AbortController; pulse: ReturnType<MeasuringRuns['pulse']> },
  ): Promise<void> {
    const { signal } = stop;
    const job = await this.fetcher.fetch({ takeId: claim.takeId, folder, signal });
    const result = await this.pool.run({
      job,
      signal,
      onProgress: ({ stage, progress }) => pulse.at(stage, progress),
    });
    pulse.end();
    if (result.outcome === 'refused') {
      await this.claims.fail(claim, result.refusal.message);
      return;
    }
    await this.outlines.store(claim, result.peaks);
    const isWritten = await this.claims.finish(claim, result);
    this.logger.log({ ...claim, isWritten }, isWritten ? 'Measured' : 'Measured too late; nothing written');
  }

  /** Tells the database now and then that this run lives, and where it is; stops the run when it isn't ours any more. */
  private pulse(claim: Claim, stop: AbortController) {
    let stage: MeasurementStage = 'fetching';
    let within = 0;
    const beat = () => {
      this.claims.beat(claim, stage, wholeProgress(stage, within)).then(
        (isOurs) => {
          if (!isOurs) stop.abort('lost' satisfies StopReason);
        },
        (error: unknown) => this.logger.warn(error, 'A heartbeat was missed'),
      );
    };
    const timer = setInterval(beat, this.config.measuring.heartbeatMs);
    return {
      at: (newStage: MeasurementStage, progress: number) => {
        const isNew = newStage !== stage;
        [stage, within] = [newStage, progress];
        if (isNew) beat();
      },
      end: () => clearInterval(timer),
    };
  }

  private async settle(claim: Claim, stop: AbortController, error: unknown): Promise<void> {
    const { aborted } = stop.signal;
    const reason: unknown = stop.signal.reason;
    if (aborted && reason !== ('lost' satisfies StopReason)) return this.claims.giveBack(claim);
    if (aborted) return this.logger.log(claim, 'Stopped: cancelled, or taken over by another worker');
    this.logger.error(error, `Attempt ${claim.attempt} at measurement ${claim.measurementId} failed`);
    if (error instanceof StoredBytesDiffer) return this.claims.fail(claim, bytesDiffer);
    const isStoreDown = error instanceof AppError && error.code === 'storage-unavailable';
    return isStoreDown ? this.claims.waitForStore(claim) : this.claims.retryLater(claim, broke);
  }
}
