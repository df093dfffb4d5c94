import { Injectable } from '@nestjs/common';
import { ComparisonResponse } from '@thudline/contracts';
import { TakeRights } from '../access/take-rights';
import { ReportsService } from '../reports/reports.service';
import { User } from '../users/entities/user.entity';
import { settingsOf } from '../users/user-settings';
import { comparisonResponseOf } from './comparisons.mapper';

interface Compared {
  beforeId: string;
  afterId: string;
  reader: User | null;
  /** What may be done with both takes. */
  rights: TakeRights;
}

@Injectable()
export class ComparisonsService {
  constructor(private readonly reports: ReportsService) {}

  /** Each take is judged by its owner's target and temperature; a guest's units are the later take's owner's. */
  async compare({ beforeId, afterId, reader, rights }: Compared): Promise<ComparisonResponse> {
    const before = await this.reports.getMeasured(beforeId);
    const after = await this.reports.getMeasured(afterId);
    return comparisonResponseOf({
      before,
      after,
      reader: reader ? settingsOf(reader) : after.owner,
      rights,
    });
  }
}
