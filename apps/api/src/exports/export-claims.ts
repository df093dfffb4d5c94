import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { exportKeptDays } from '@thudline/contracts';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { mostAttempts } from '../measuring/measurement-claims';
import { StoredStream } from '../storage/object-store.service';
import { Export } from './entities/export.entity';
import { ExportQueue } from './export-queue';

/** An export that this worker took up; everything it writes holds only while `attempt` still matches. */
export interface ExportClaim {
  exportId: string;
  attempt: number;
  ownerId: string;
}

const gaveUp = 'Making the archive was broken off three times. Try again, or tell whoever runs this site.';

const failWorn = `
  update export set state = 'failed', reason = ?
  where state = 'running' and attempt >= ? and heartbeat_at < now() - ? * interval '1 millisecond'`;

/** Left by a dead worker, or waiting though no job will knock. */
const requeueSilent = `
  update export set state = 'queued', progress = 0, heartbeat_at = now()
  where id in (
    select id from export e
    where state in ('queued', 'running') and heartbeat_at < now() - ? * interval '1 millisecond'
      and not exists (select 1 from pgboss.job j where j.name = 'export' and j.singleton_key = e.id::text
        and j.state < 'active')
    for update skip locked)
  returning id`;

const running = ({ exportId, attempt }: ExportClaim) => ({
  id: exportId,
  attempt,
  state: 'running' as const,
});

/** The worker's side of `export`. Times are the database's, so that workers' clocks don't matter. */
@Injectable()
export class ExportClaims {
  private readonly silentMs: number;

  constructor(
    private readonly em: EntityManager,
    private readonly queue: ExportQueue,
    @Inject(CONFIG) config: Config,
  ) {
    this.silentMs = config.measuring.silentAfterMs;
  }

  /** @returns null when somebody else has it, or it is over */
  async claim(exportId: string): Promise<ExportClaim | null> {
    const [row] = await this.em.getConnection().execute<{ attempt: number; owner_id: string }[]>(
      `update export set state = 'running', progress = 0, attempt = attempt + 1, heartbeat_at = now()
       where id = ? and state = 'queued' returning attempt, owner_id`,
      [exportId],
    );
    return row ? { exportId, attempt: row.attempt, ownerId: row.owner_id } : null;
  }

  /** @returns false when the export isn't this worker's any more: removed, or given to another */
  async beat({ exportId, attempt }: ExportClaim, progress: number): Promise<boolean> {
    const rows = await this.em.getConnection().execute<unknown[]>(
      `update export set heartbeat_at = now(), progress = ?
       where id = ? and attempt = ? and state = 'running' returning id`,
      [progress, exportId, attempt],
    );
    return rows.length === 1;
  }

  /** @returns false when nothing was written, see `beat` */
  async finish(claim: ExportClaim, { bytes, sha256 }: StoredStream, objectKey: string): Promise<boolean> {
    const expiresAt = new Date(Date.now() + exportKeptDays * 24 * 60 * 60 * 1000);
    const done = { state: 'done', progress: 1, reason: null, objectKey, bytes, sha256, expiresAt } as const;
    return (await this.em.fork().nativeUpdate(Export, running(claim), done)) > 0;
  }

  /** Hands it back unmade, for a worker that stays. */
  giveBack(claim: ExportClaim): Promise<void> {
    return this.requeue(claim, 0);
  }

  /** Tries again after a while, or gives up after the last attempt. */
  async retryLater(claim: ExportClaim, reason: string): Promise<void> {
    if (claim.attempt < mostAttempts) return this.requeue(claim, 15 * claim.attempt);
    await this.em.fork().nativeUpdate(Export, running(claim), { state: 'failed', reason });
  }

  /** Takes up what dead workers left, and what waits without a job. @returns how many wait again */
  async sweep(): Promise<number> {
    return this.em.fork().transactional(async (em) => {
      await em.execute(failWorn, [gaveUp, mostAttempts, this.silentMs]);
      const found = await em.execute<{ id: string }[]>(requeueSilent, [this.silentMs]);
      for (const { id } of found) await this.queue.send(em, id);
      return found.length;
    });
  }

  private async requeue(claim: ExportClaim, afterS: number): Promise<void> {
    await this.em.fork().transactional(async (em) => {
      const changed = await em.nativeUpdate(Export, running(claim), { state: 'queued', progress: 0 });
      if (changed > 0) await this.queue.send(em, claim.exportId, afterS);
    });
  }
}
