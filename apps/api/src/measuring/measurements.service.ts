import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
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
