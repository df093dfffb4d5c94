import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { decodePeaks, encodeOutline, Outline, outlineOf } from '@thudline/dsp';
import { AppError } from '../errors/app-error';
import { Report } from '../reports/entities/report.entity';
import { objectKeys } from '../storage/object-keys';
import { ObjectStoreService } from '../storage/object-store.service';
import { TakeTrack } from '../takes/entities/take-track.entity';
import { Take } from '../takes/entities/take.entity';

export interface TakeOutline extends Outline {
  bytes: Uint8Array;
}

/** The outlines that were stored when a take was measured. */
@Injectable()
export class TakePeaksService {
  constructor(
    private readonly em: EntityManager,
    private readonly objects: ObjectStoreService,
  ) {}

  /** @returns the report that the outlines belong to: it never changes, and neither do they */
  async report(takeId: string): Promise<Report> {
    const { currentReportId } = await this.em.findOneOrFail(Take, { id: takeId });
    if (!currentReportId) throw new AppError('not-measured-yet', 'This take has not been measured yet.');
    return this.em.findOneOrFail(Report, { measurement: currentReportId }, { populate: ['measurement'] });
  }

  /** @throws {AppError} `not-found` for a take that was measured before outlines were stored */
  async outline({ take, measurement }: Report, steps: number): Promise<TakeOutline> {
    const orderBy = { position: 'asc' } as const;
    const tracks = await this.em.find(TakeTrack, { take: take.id }, { orderBy });
    const { id: measurementId, attempt } = measurement.unwrap();
    const stored = await Promise.all(
      tracks.map(({ id }) =>
        this.objects.readWhole(objectKeys.peaks({ takeId: take.id, measurementId, attempt }, id)),
      ),
    );
    const outline = outlineOf(
      stored.map((bytes) => decodePeaks(bytes ?? missing())),
      steps,
    );
    return { ...outline, bytes: encodeOutline(outline) };
  }
}

function missing(): never {
  throw new AppError('not-found', 'The outline of this take was not stored. Measure the take again.');
}
