import {
  BeforeApplicationShutdown,
  Inject,
  Injectable,
  Logger,
  OnApplicationBootstrap,
} from '@nestjs/common';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { ReportTelling } from '../reports/report-telling';
import { MeasurementRenewals } from './measurement-renewals';
import { MeasuringRuns } from './measuring-runs';

/** Soon enough that nobody notices a renewal was in the way. */
const lookMs = 1_000;

/** Heartbeats from one look to the next where nothing was left: what is restored, say, can wait minutes. */
const restBeats = 60;

/** Keeps renewals coming while there are sheets of earlier versions, and out of the way of takes that somebody waits for. */
@Injectable()
export class RenewalWorker implements OnApplicationBootstrap, BeforeApplicationShutdown {
  private readonly logger = new Logger('Renewals');
  private timers: NodeJS.Timeout[] = [];
  private isBusy = false;
  private restingBeats = 0;
  private lastWords = '';

  constructor(
    private readonly renewals: MeasurementRenewals,
    private readonly runs: MeasuringRuns,
    private readonly telling: ReportTelling,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  onApplicationBootstrap(): void {
    this.told(this.telling.tellUntold());
    this.timers = [
      setInterval(() => this.told(this.beat()), this.config.measuring.heartbeatMs),
      setInterval(() => this.told(this.makeWay()), lookMs),
    ];
  }

  beforeApplicationShutdown(): void {
    this.timers.forEach(clearInterval);
  }

  private async beat(): Promise<void> {
    if (this.isBusy || this.restingBeats-- > 0) return;
    this.isBusy = true;
    try {
      const { isEverything } = await this.renewals.fill();
      this.restingBeats = isEverything ? restBeats : 0;
      if (isEverything) await this.tell();
    } finally {
      this.isBusy = false;
    }
  }

  private async makeWay(): Promise<void> {
    if (this.runs.renewals.length === 0) return;
    this.runs.makeWay(await this.renewals.overdueTakes());
  }

  private async tell(): Promise<void> {
    const counts = await this.renewals.counts();
    const words = `${counts.old} sheets of earlier versions: ${counts.unfinished} on their way, ${counts.failed} could not be measured again`;
    if (words !== this.lastWords) this.logger.log(words);
    this.lastWords = words;
  }

  private told(work: Promise<void>): void {
    work.catch((error: unknown) =>
      this.logger.error(error, 'Sheets could not be renewed; the next beat tries again'),
    );
  }
}
