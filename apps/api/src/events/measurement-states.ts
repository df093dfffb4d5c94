import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { MeasurementEvent } from '@thudline/contracts';
import { Measurement } from '../measuring/entities/measurement.entity';
import { measurementResponseOf } from '../measuring/measurement.mapper';
import { Take } from '../takes/entities/take.entity';

/** Reads how far takes are; outside of any request, so with a view of the database of its own. */
@Injectable()
export class MeasurementStates {
  constructor(private readonly em: EntityManager) {}

  async of(takeIds: string[]): Promise<MeasurementEvent[]> {
    const em = this.em.fork();
    const takes = await em.find(Take, { id: { $in: takeIds }, deletedAt: null });
    const measurements = await em.find(Measurement, { take: { $in: takeIds } }, { orderBy: { id: 'asc' } });
    const latest = new Map(measurements.map((measurement) => [measurement.take.id, measurement]));
    return takes.flatMap((take) => {
      const measurement = latest.get(take.id);
      if (!measurement) return [];
      const hasReport = take.currentReportId != null;
      return { takeId: take.id, measurement: measurementResponseOf(measurement), hasReport };
    });
  }
}
