import { MessageChannel } from 'node:worker_threads';
import { Inject, Injectable, OnApplicationShutdown } from '@nestjs/common';
import { AddJob, AddJobResult, MeasureJob, MeasureJobResult, MeasureProgress } from '@thudline/measure';
import { Piscina } from 'piscina';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';

interface RunOptions<Job, Progress> {
  job: Omit<Job, 'port'>;
  /** Aborting it ends the thread. */
  signal: AbortSignal;
  onProgress: (progress: Progress) => void;
}

/** Threads that measure, so that this process stays able to answer and to beat. */
@Injectable()
export class MeasurePool implements OnApplicationShutdown {
  readonly threads: number;
  private readonly pool: Piscina;

  constructor(@Inject(CONFIG) config: Config) {
    this.threads = config.measuring.threads;
    this.pool = new Piscina({
      filename: require.resolve('@thudline/measure/worker'),
      minThreads: 0,
      maxThreads: this.threads,
      idleTimeout: 60_000,
    });
  }

  run(options: RunOptions<MeasureJob, MeasureProgress>): Promise<MeasureJobResult> {
    return this.inThread('measureJob', options);
  }

  /** Makes an added file. */
  add(options: RunOptions<AddJob, number>): Promise<AddJobResult> {
    return this.inThread('addJob', options);
  }

  /** @param name - what the worker module exports */
  private async inThread<Job, Progress, Result>(
    name: string,
    { job, signal, onProgress }: RunOptions<Job, Progress>,
  ): Promise<Result> {
    const { port1, port2 } = new MessageChannel();
    port1.on('message', onProgress);
    try {
      const options = { name, signal, transferList: [port2] };
      return (await this.pool.run({ ...job, port: port2 }, options)) as Result;
    } finally {
      port1.close();
    }
  }

  async onApplicationShutdown(): Promise<void> {
    await this.pool.destroy();
  }
}
