import { EntityManager, LockMode } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { v7 } from 'uuid';
import { measureQueue } from '../queue/queue.schema';
import { Take } from '../takes/entities/take.entity';
import { dspVersion } from './dsp-version';
import { MeasureQueue, renewalPriority } from './measure-queue';

/** Unfinished at a time over all workers: enough to keep one busy between two looks (common practice, no source). */
export const mostUnfinished = 10;

/** Any number, the same for every worker: one at a time fills up. */
const fillLock = 7_311_205;

const current = Number(dspVersion);
const isOld = `substring(m.dsp_version from '^[0-9]+$')::int < ?`;
const unfinished = `o.state in ('queued', 'running')`;
const hasFailed = `o.state = 'failed' and o.dsp_version = ?`;
const measurementsThat = (fit: string) => `select 1 from measurement o where o.take_id = t.id and (${fit})`;

/** Sheets of an earlier version whose player hasn't deleted them. */
const oldSheets = `
  from take t join measurement m on m.id = t.current_report_id
  where t.deleted_at is null and ${isOld}`;

/** The newest take of each owner before the second newest of any; owners in random order, so that none is always last. */
const candidates = `
  select t.id, m.input_hash as "inputHash" ${oldSheets}
    and not exists (${measurementsThat(`${unfinished} or ${hasFailed}`)})
  order by row_number() over (partition by t.owner_id order by t.recorded_at desc, t.id desc), random()
  limit ?`;

const insert = `
  insert into measurement (id, created_at, take_id, dsp_version, input_hash, state, progress, attempt, heartbeat_at, renewal)
  select ?, now(), t.id, ?, ?, 'queued', 0, 0, now(), true from take t
  where t.id = ? and not exists (${measurementsThat(unfinished)})
  on conflict do nothing returning id`;

const counts = `
  select count(*)::int as old,
    count(*) filter (where exists (${measurementsThat(unfinished)}))::int as unfinished,
    count(*) filter (where exists (${measurementsThat(hasFailed)}))::int as failed ${oldSheets}`;

/** For as long a fresh take waits only where every thread is busy: free ones look twice a second. */
const overdue = `
  select count(*)::int as count from pgboss.job where name = ? and state < 'active' and priority > ?
    and start_after < now() - interval '1 second'`;

interface Candidate {
  id: string;
  inputHash: string;
}

export interface Filled {
  added: number;
  /** Nothing more was there to be added. */
  isEverything: boolean;
}
const nothing: Filled = { added: 0, isEverything: false };

export interface RenewalCounts {
  /** Sheets that an earlier version made. */
  old: number;
  /** Of those: waiting or being measured at this moment. */
  unfinished: number;
  /** Of those: could not be measured again, and stay as they are until the next version. */
  failed: number;
}

/** After an upgrade: measures again what an earlier version of the measurements made a sheet of, a few at a time. */
@Injectable()
export class MeasurementRenewals {
  constructor(
    private readonly em: EntityManager,
    private readonly queue: MeasureQueue,
  ) {}

  /** Many workers may do this at the same time. */
  async fill(): Promise<Filled> {
    return this.em.fork().transactional(async (em) => {
      const [lock] = await em.execute<{ free: boolean }[]>('select pg_try_advisory_xact_lock(?) as free', [
        fillLock,
      ]);
      if (!lock?.free) return nothing;
      const room = mostUnfinished - (await this.unfinished(em));
      if (room <= 0) return nothing;
      const found = await em.execute<Candidate[]>(candidates, [current, dspVersion, room]);
      let added = 0;
      for (const candidate of found) added += await this.add(em, candidate);
      return { added, isEverything: found.length < room };
    });
  }

  async counts(): Promise<RenewalCounts> {
    const [row] = await this.em
      .fork()
      .getConnection()
      .execute<RenewalCounts[]>(counts, [dspVersion, current]);
    return row ?? { old: 0, unfinished: 0, failed: 0 };
  }

  /** @returns how many takes that somebody waits for find no free thread */
  async overdueTakes(): Promise<number> {
    const [row] = await this.em
      .fork()
      .getConnection()
      .execute<{ count: number }[]>(overdue, [measureQueue, renewalPriority]);
    return row?.count ?? 0;
  }

  /** Behind the take's lock, since its player may have it measured again, or delete it, at this moment. */
  private async add(em: EntityManager, { id, inputHash }: Candidate): Promise<number> {
    const lockMode = LockMode.PESSIMISTIC_PARTIAL_WRITE;
    if (!(await em.findOne(Take, { id, deletedAt: null }, { lockMode }))) return 0;
    const rows = await em.execute<{ id: string }[]>(insert, [v7(), dspVersion, inputHash, id]);
    for (const row of rows) await this.queue.send(em, { measurementId: row.id, renewal: true });
    return rows.length;
  }

  private async unfinished(em: EntityManager): Promise<number> {
    const [row] = await em.execute<{ count: number }[]>(
      `select count(*)::int as count from measurement where state in ('queued', 'running') and renewal`,
    );
    return row?.count ?? 0;
  }
}
