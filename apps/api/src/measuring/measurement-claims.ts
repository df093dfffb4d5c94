import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { TakeFacts } from '@thudline/dsp';
import { pairSpectrumColumns, reportColumns } from '../reports/report-columns';
import { toldColumns } from '../reports/reports.mapper';
import { PairSpectrum } from '../reports/entities/pair-spectrum.entity';
import { Report } from '../reports/entities/report.entity';
import { Take } from '../takes/entities/take.entity';
import { settingsOf } from '../users/user-settings';
import { dspVersion } from './dsp-version';
import { Measurement, MeasurementStage } from './entities/measurement.entity';
import { MeasureQueue } from './measure-queue';

/** A measurement that this worker took up; everything it writes holds only while `attempt` still matches. */
export interface Claim {
  measurementId: string;
  attempt: number;
  takeId: string;
  renewal: boolean;
}

/** What a worker thread found. */
export interface Measured {
  facts: TakeFacts;
  /** Encoded, in the order of the pairs; null where a pair has no kick hit. */
  spectra: readonly (Uint8Array | null)[];
}

/** After this many a measurement has failed (common practice, no source). */
export const mostAttempts = 3;

/** How long the next attempt waits, for each one before it. A renewal has time, and should outlast a store that is down. */
const waitS = { fresh: 15, renewal: 300 };

interface ClaimedRow {
  attempt: number;
  take_id: string;
  renewal: boolean;
}

const running = ({ measurementId, attempt }: Claim) => ({
  id: measurementId,
  attempt,
  state: 'running' as const,
});

/** The worker's side of `measurement`. Times are the database's, so that workers' clocks don't matter. */
@Injectable()
export class MeasurementClaims {
  constructor(
    private readonly em: EntityManager,
    private readonly queue: MeasureQueue,
  ) {}

  /**
   * The version is that of the worker, whichever it was queued for: after an upgrade older ones may still wait.
   *
   * @returns null when somebody else has it, or it is over
   */
  async claim(measurementId: string): Promise<Claim | null> {
    const [row] = await this.em.getConnection().execute<ClaimedRow[]>(
      `update measurement set state = 'running', stage = 'fetching', progress = 0, attempt = attempt + 1,
         heartbeat_at = now(), dsp_version = ? where id = ? and state = 'queued' returning attempt, take_id, renewal`,
      [dspVersion, measurementId],
    );
    return row ? { measurementId, attempt: row.attempt, takeId: row.take_id, renewal: row.renewal } : null;
  }

  /** @returns false when the measurement isn't this worker's any more: cancelled, or given to another */
  async beat(claim: Claim, stage: MeasurementStage, progress: number): Promise<boolean> {
    const rows = await this.em.getConnection().execute<unknown[]>(
      `update measurement set heartbeat_at = now(), stage = ?, progress = ?
       where id = ? and attempt = ? and state = 'running' returning id`,
      [stage, progress, claim.measurementId, claim.attempt],
    );
    return rows.length === 1;
  }

  /** Report, pair spectra and state in one transaction. @returns false when nothing was written, see `beat` */
  async finish(claim: Claim, { facts, spectra }: Measured): Promise<boolean> {
    return this.em.fork().transactional(async (em) => {
      const done = { state: 'done', stage: null, progress: 1 } as const;
      if ((await em.nativeUpdate(Measurement, running(claim), done)) === 0) return false;
      const { owner } = await em.findOneOrFail(Take, { id: claim.takeId }, { populate: ['owner'] });
      const columns = reportColumns(facts);
      const report = em.create(Report, {
        measurement: claim.measurementId,
        take: claim.takeId,
        ...columns,
        ...toldColumns(facts, settingsOf(owner.unwrap())),
      });
      for (const spectrum of pairSpectrumColumns(facts, spectra))
        em.create(PairSpectrum, { report, ...spectrum });
      await em.flush();
      await em.nativeUpdate(Take, { id: claim.takeId }, { currentReportId: claim.measurementId });
      return true;
    });
  }

  async fail(claim: Claim, reason: string): Promise<void> {
    await this.em.fork().nativeUpdate(Measurement, running(claim), { state: 'failed', stage: null, reason });
  }

  /** Hands a measurement back unmeasured; this try doesn't count. */
  async giveBack(claim: Claim): Promise<void> {
    await this.requeue(claim, { attempt: claim.attempt - 1, afterS: 0 });
  }

  /** The take is not to blame for a store that is down: this try doesn't count, and the next one comes a little later. */
  async waitForStore(claim: Claim): Promise<void> {
    const afterS = waitS[claim.renewal ? 'renewal' : 'fresh'];
    await this.requeue(claim, { attempt: claim.attempt - 1, afterS });
  }

  /** Tries again after a while, or gives up after the last attempt. */
  async retryLater(claim: Claim, reason: string): Promise<void> {
    if (claim.attempt >= mostAttempts) return this.fail(claim, reason);
    const afterS = waitS[claim.renewal ? 'renewal' : 'fresh'] * claim.attempt;
    await this.requeue(claim, { attempt: claim.attempt, afterS });
  }

  private async requeue(
    claim: Claim,
    { attempt, afterS }: { attempt: number; afterS: number },
  ): Promise<void> {
    await this.em.fork().transactional(async (em) => {
      const queued = { state: 'queued', stage: null, progress: 0, attempt } as const;
      const changed = await em.nativeUpdate(Measurement, running(claim), queued);
      const { measurementId, renewal } = claim;
      if (changed > 0) await this.queue.send(em, { measurementId, renewal, afterS });
    });
  }
}
