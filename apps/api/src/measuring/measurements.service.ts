import { EntityManager, LockMode } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { AppError } from '../errors/app-error';
import { Take } from '../takes/entities/take.entity';
import { Measurement, MeasurementState } from './entities/measurement.entity';
import { latestOf } from './latest-measurements';
import { MeasureQueue } from './measure-queue';
import { dspVersion, isOlder } from './dsp-version';

/** What takes and their owners may do with measurements; the worker's side is `MeasurementClaims`. */
@Injectable()
export class MeasurementsService {
  constructor(
    private readonly em: EntityManager,
    private readonly measureQueue: MeasureQueue,
  ) {}

  /** Adds a measurement and its job, in the transaction of `em`. */
  async queue(
    em: EntityManager,
    { take, ownerId, inputHash }: { take: Take; ownerId: string; inputHash: string },
  ) {
    const waiting = await em.count(Measurement, {
      take: { owner: ownerId },
      state: 'queued',
      renewal: false,
    });
    const measurement = em.create(Measurement, {
      take,
      dspVersion,
      inputHash,
      state: 'queued',
      progress: 0,
      attempt: 0,
      heartbeatAt: new Date(),
    });
    await em.flush();
    // Fairness: who has many waiting stands behind who has few.
    await this.measureQueue.send(em, { measurementId: measurement.id, priority: -waiting });
  }

  /**
   * Measures a take once more: one that failed or was cancelled, or whose sheet an older version of the measurements made.
   * What there was stays; the sheet changes when the new one is there. A renewal on its way is taken to the front instead.
   *
   * @throws {AppError} `conflict` where there is nothing new to find
   */
  async again(takeId: string): Promise<void> {
    await this.em.transactional(async (em) => {
      const take = await em.findOneOrFail(Take, { id: takeId }, { lockMode: LockMode.PESSIMISTIC_WRITE });
      const { state, inputHash } = await this.getLatest(takeId);
      if (state === 'queued' || state === 'running')
        throw new AppError('conflict', 'This take is being measured already.');
      const { currentReportId } = take;
      const shown = currentReportId ? await em.findOneOrFail(Measurement, currentReportId) : null;
      if (shown && !isOlder(shown.dspVersion))
        throw new AppError('conflict', 'This take was measured already, and the measurements are the same.');
      if (await this.takeToTheFront(em, takeId)) return;
      await this.queue(em, { take, ownerId: take.owner.id, inputHash });
    });
  }

  /** The one that somebody asked for: renewals go on behind the sheet, and don't change what it says of its take. */
  async getLatest(takeId: string): Promise<Measurement> {
    const asked = { take: takeId, renewal: false };
    return this.em.findOneOrFail(Measurement, asked, { orderBy: { id: 'desc' } });
  }

  /** @returns by take id, as `getLatest` */
  async latestOf(takeIds: string[]): Promise<Map<string, Measurement>> {
    return latestOf(this.em, takeIds);
  }

  private async takeToTheFront(em: EntityManager, takeId: string): Promise<boolean> {
    const unfinished: MeasurementState[] = ['queued', 'running'];
    const waiting = await em.findOne(Measurement, {
      take: takeId,
      renewal: true,
      state: { $in: unfinished },
    });
    if (!waiting) return false;
    waiting.renewal = false;
    await em.flush();
    await this.measureQueue.send(em, { measurementId: waiting.id });
    return true;
  }

  /** The worker notices at its next heartbeat. What has ended already stays as it is. */
  async cancel(takeId: string): Promise<void> {
    await this.em.nativeUpdate(
      Measurement,
      { take: takeId, state: { $in: ['queued', 'running'] } },
      { state: 'cancelled', stage: null },
    );
  }
}
