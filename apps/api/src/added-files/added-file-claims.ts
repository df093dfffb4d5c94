import { EntityManager } from '@mikro-orm/postgresql';
import { Inject, Injectable } from '@nestjs/common';
import { AddedFacts } from '@thudline/measure';
import { Choice } from '@thudline/dsp';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { mostAttempts } from '../measuring/measurement-claims';
import { AddedFileQueue } from './added-file-queue';
import { AddedFile } from './entities/added-file.entity';

/** An added file that this worker took up; everything it writes holds only while `attempt` still matches. */
export interface AddedFileClaim {
  addedFileId: string;
  attempt: number;
  takeId: string;
  choice: Choice;
}

interface ClaimedRow {
  attempt: number;
  take_id: string;
  flipped: boolean;
  shift_ms: number;
  gain_db: number;
}

const gaveUp = 'Making this file was broken off three times. Try again, or tell whoever runs this site.';

/** Silent for `?` milliseconds, by the database's clock. */
const silent = `heartbeat_at < now() - ? * interval '1 millisecond'`;

const failWorn = `
  update added_file set state = 'failed', reason = ? where state = 'running' and attempt >= ? and ${silent}`;

const requeueSilent = `
  update added_file set state = 'queued', progress = 0, heartbeat_at = now()
  where id in (select id from added_file where state = 'running' and ${silent} for update skip locked)
  returning id`;

/** Waiting, though no job will knock: none is waiting, and none was taken a moment ago. */
const touchJobless = `
  update added_file set heartbeat_at = now()
  where id in (
    select id from added_file a where state = 'queued' and ${silent} and not exists (
      select 1 from pgboss.job j where j.name = 'added-file' and j.singleton_key = a.id::text
        and (j.state < 'active' or j.state = 'active' and j.started_on > now() - ? * interval '1 millisecond'))
    for update skip locked)
  returning id`;

const running = ({ addedFileId, attempt }: AddedFileClaim) => ({
  id: addedFileId,
  attempt,
  state: 'running' as const,
});

/** The worker's side of `added_file`. Times are the database's, so that workers' clocks don't matter. */
@Injectable()
export class AddedFileClaims {
  private readonly silentMs: number;

  constructor(
    private readonly em: EntityManager,
    private readonly queue: AddedFileQueue,
    @Inject(CONFIG) config: Config,
  ) {
    this.silentMs = config.measuring.silentAfterMs;
  }

  /** @returns null when somebody else has it, or it is over */
  async claim(addedFileId: string): Promise<AddedFileClaim | null> {
    const [row] = await this.em.getConnection().execute<ClaimedRow[]>(
      `update added_file set state = 'running', progress = 0, attempt = attempt + 1, heartbeat_at = now()
       where id = ? and state = 'queued' returning attempt, take_id, flipped, shift_ms, gain_db`,
      [addedFileId],
    );
    if (!row) return null;
    const choice = { flipped: row.flipped, shiftMs: row.shift_ms, gainDb: row.gain_db };
    return { addedFileId, attempt: row.attempt, takeId: row.take_id, choice };
  }

  /** @returns false when the file isn't this worker's any more: removed, or given to another */
  async beat({ addedFileId, attempt }: AddedFileClaim, progress: number): Promise<boolean> {
    const rows = await this.em.getConnection().execute<unknown[]>(
      `update added_file set heartbeat_at = now(), progress = ?
       where id = ? and attempt = ? and state = 'running' returning id`,
      [progress, addedFileId, attempt],
    );
    return rows.length === 1;
  }

  /** @returns false when nothing was written, see `beat` */
  async finish(claim: AddedFileClaim, facts: AddedFacts, objectKey: string): Promise<boolean> {
    const done = { state: 'done', progress: 1, reason: null, objectKey, ...facts } as const;
    return (await this.em.fork().nativeUpdate(AddedFile, running(claim), done)) > 0;
  }

  async fail(claim: AddedFileClaim, reason: string): Promise<void> {
    await this.em.fork().nativeUpdate(AddedFile, running(claim), { state: 'failed', reason });
  }

  /** Hands it back unmade, for a worker that stays. */
  async giveBack(claim: AddedFileClaim): Promise<void> {
    await this.requeue(claim, 0);
  }

  /** Tries again after a while, or gives up after the last attempt. */
  async retryLater(claim: AddedFileClaim, reason: string): Promise<void> {
    if (claim.attempt >= mostAttempts) return this.fail(claim, reason);
    await this.requeue(claim, 15 * claim.attempt);
  }

  /** Takes up what dead workers left, and what waits without a job. @returns how many wait again */
  async sweep(): Promise<number> {
    return this.em.fork().transactional(async (em) => {
      await em.execute(failWorn, [gaveUp, mostAttempts, this.silentMs]);
      const silentOnes = await em.execute<{ id: string }[]>(requeueSilent, [this.silentMs]);
      const joblessOnes = await em.execute<{ id: string }[]>(touchJobless, [this.silentMs, this.silentMs]);
      const found = [...silentOnes, ...joblessOnes];
      for (const { id } of found) await this.queue.send(em, id);
      return found.length;
    });
  }

  private async requeue(claim: AddedFileClaim, afterS: number): Promise<void> {
    await this.em.fork().transactional(async (em) => {
      const changed = await em.nativeUpdate(AddedFile, running(claim), { state: 'queued', progress: 0 });
      if (changed > 0) await this.queue.send(em, claim.addedFileId, afterS);
    });
  }
}
