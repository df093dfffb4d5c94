import { MessageChannel } from 'node:worker_threads';
import { Inject, Injectable, OnApplicationShutdown } from '@nestjs/common';
import { MeasureJob, MeasureJobResult, MeasureProgress } from '@thudline/measure';
import { Piscina } from 'piscina';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';

interface RunOptions {
  job: Omit<MeasureJob, 'port'>;
  /** Aborting it ends the thread. */
  signal: AbortSignal;
  onProgress: (progress: MeasureProgress) => void;
}

/** Threads that measure, so that this process stays able to answer and to beat. */
@Injectable()
export class MeasurePool implements OnApplicationShutdown {
  readonly threads: number;
  private readonly pool: Piscina<MeasureJob, MeasureJobResult>;

  constructor(@Inject(CONFIG) config: Config) {
    this.threads = config.measuring.threads;
    this.pool = new Piscina({
      filename: require.resolve('@thudline/measure/worker'),
      name: 'measureJob',
      minThreads: 0,
      maxThreads: this.threads,
      idleTimeout: 60_000,
    });
  }

  async run({ job, signal, onProgress }: RunOptions): Promise<MeasureJobResult> {
    const { port1, port2 } = new MessageChannel();
    port1.on('message', onProgress);
    try {
      return await this.pool.run({ ...job, port: port2 }, { signal, transferList: [port2] });
    } finally {
      port1.close();
    }
  }

  async onApplicationShutdown(): Promise<void> {
    await this.pool.destroy();
  }
}
