import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { MeasurementEvent } from '@thudline/contracts';
import { latestOf } from '../measuring/latest-measurements';
import { measurementResponseOf } from '../measuring/measurement.mapper';
import { Take } from '../takes/entities/take.entity';

/** Reads how far takes are; outside of any request, so with a view of the database of its own. */
@Injectable()
export class MeasurementStates {
  constructor(private readonly em: EntityManager) {}

  async of(takeIds: string[]): Promise<MeasurementEvent[]> {
    const em = this.em.fork();
    const takes = await em.find(Take, { id: { $in: takeIds }, deletedAt: null });
    const latest = await latestOf(em, takeIds);
    return takes.flatMap((take) => {
      const measurement = latest.get(take.id);
      if (!measurement) return [];
      const hasReport = take.currentReportId != null;
      return { takeId: take.id, measurement: measurementResponseOf(measurement), hasReport };
    });
  }
}
