import { EntityManager, LockMode } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { AppError } from '../errors/app-error';
import { Take } from '../takes/entities/take.entity';
import { Measurement } from './entities/measurement.entity';
import { MeasureQueue } from './measure-queue';
import { dspVersion } from './dsp-version';

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
    const waiting = await em.count(Measurement, { take: { owner: ownerId }, state: 'queued' });
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
   * What there was stays; the sheet changes when the new one is there.
   *
   * @throws {AppError} `conflict` where there is nothing new to find
   */
  async again(takeId: string): Promise<void> {
    await this.em.transactional(async (em) => {
      const take = await em.findOneOrFail(Take, { id: takeId }, { lockMode: LockMode.PESSIMISTIC_WRITE });
      const latest = await this.getLatest(takeId);
      const { state, inputHash } = latest;
      if (state === 'queued' || state === 'running')
        throw new AppError('conflict', 'This take is being measured already.');
      if (state === 'done' && latest.dspVersion === dspVersion)
        throw new AppError('conflict', 'This take was measured already, and the measurements are the same.');
      await this.queue(em, { take, ownerId: take.owner.id, inputHash });
    });
  }

  async getLatest(takeId: string): Promise<Measurement> {
    return this.em.findOneOrFail(Measurement, { take: takeId }, { orderBy: { id: 'desc' } });
  }

  /** @returns by take id */
  async latestOf(takeIds: string[]): Promise<Map<string, Measurement>> {
    const found = await this.em.find(Measurement, { take: { $in: takeIds } }, { orderBy: { id: 'asc' } });
    return new Map(found.map((measurement) => [measurement.take.id, measurement]));
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
