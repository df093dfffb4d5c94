import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { tryOutRankingRequest, TryOutRankingResponse } from '@thudline/contracts';
import { rankTryOut } from '@thudline/dsp';
import { z } from 'zod';
import { storedFacts } from '../reports/report-columns';
import { Report } from '../reports/entities/report.entity';
import { tryOutRankingResponseOf } from './try-out-ranking.mapper';
import { TryOut } from './entities/try-out.entity';
import { TryOutsService } from './try-outs.service';

/** Two measures count alike. */
const alsoShare = 0.5;

/** Ranks what is measured of a try-out, from the stored facts. */
@Injectable()
export class TryOutRankingService {
  constructor(
    private readonly em: EntityManager,
    private readonly tryOuts: TryOutsService,
  ) {}

  /** For whoever may read the try-out; the guard has asked. */
  async rank(
    id: string,
    { measure, polarity, also }: z.output<typeof tryOutRankingRequest>,
  ): Promise<TryOutRankingResponse> {
    const places = await this.tryOuts.placesOf(await this.em.findOneOrFail(TryOut, { id }));
    const reportIds = places.flatMap(({ take }) => take?.currentReportId ?? []);
    const reports = await this.em.find(
      Report,
      { measurement: { $in: reportIds } },
      { populate: ['hits', 'clipRuns'] },
    );
    const reportOf = new Map(reports.map((report) => [report.take.id, report]));
    const measured = places.flatMap(({ place, take }) => {
      const report = take && reportOf.get(take.id);
      return report ? [{ placeId: place.id, facts: storedFacts(report) }] : [];
    });
    // The same measure twice is one measure.
    const other = also && also !== measure ? also : null;
    const ranking = rankTryOut(measured, {
      measure,
      choiceRule: polarity,
      ...(other ? { and: { measure: other, share: alsoShare } } : {}),
    });
    return { measure, polarity, also: other, ...tryOutRankingResponseOf(measured, ranking) };
  }
}
