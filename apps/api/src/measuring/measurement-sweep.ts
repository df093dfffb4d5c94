import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { mostAttempts } from './measurement-claims';
import { MeasureQueue } from './measure-queue';

const gaveUp =
  'Measuring this take was broken off three times. Measure it again, or tell whoever runs this site.';

/** Silent for `?` milliseconds, by the database's clock. */
const silent = `heartbeat_at < now() - ? * interval '1 millisecond'`;

const failWorn = `
  update measurement set state = 'failed', stage = null, reason = ?
  where state = 'running' and attempt >= ? and ${silent} returning id`;

const requeueSilent = `
  update measurement set state = 'queued', stage = null, progress = 0, heartbeat_at = now()
  where id in (select id from measurement where state = 'running' and ${silent} for update skip locked)
  returning id, renewal`;

/** Waiting, though no job will knock: none is waiting, and none was taken a moment ago. */
const touchJobless = `
  update measurement set heartbeat_at = now()
  where id in (
    select id from measurement m where state = 'queued' and ${silent} and not exists (
      select 1 from pgboss.job j where j.name = 'measure' and j.singleton_key = m.id::text
        and (j.state < 'active' or j.state = 'active' and j.started_on > now() - ? * interval '1 millisecond'))
    for update skip locked)
  returning id, renewal`;

interface LeftBehind {
  id: string;
  renewal: boolean;
}

/** Takes up what dead workers left, and what waits without a job. Many workers may do this at the same time. */
@Injectable()
export class MeasurementSweep {
  private readonly silentMs: number;

  constructor(
    private readonly em: EntityManager,
    private readonly queue: MeasureQueue,
    @Inject(CONFIG) config: Config,
  ) {
    this.silentMs = config.measuring.silentAfterMs;
  }

  /** @returns how many measurements got a new job */
  async run(): Promise<number> {
    return this.em.fork().transactional(async (em) => {
      await em.execute(failWorn, [gaveUp, mostAttempts, this.silentMs]);
      const silentOnes = await em.execute<LeftBehind[]>(requeueSilent, [this.silentMs]);
      const joblessOnes = await em.execute<LeftBehind[]>(touchJobless, [this.silentMs, this.silentMs]);
      const found = [...silentOnes, ...joblessOnes];
      for (const { id, renewal } of found) await this.queue.send(em, { measurementId: id, renewal });
      return found.length;
    });
  }
}
