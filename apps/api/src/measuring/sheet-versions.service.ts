import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { SheetVersion, TakeResponse } from '@thudline/contracts';
import { Take } from '../takes/entities/take.entity';
import { dspVersion, isOlder } from './dsp-version';
import { Measurement } from './entities/measurement.entity';

const reportsOfTake = `
  select m.dsp_version as version, r.created_at as "measuredAt"
  from report r join measurement m on m.id = r.measurement_id
  where r.take_id = ? order by (r.measurement_id = ?) desc, r.measurement_id desc`;

interface VersionRow {
  version: string;
  measuredAt: string;
}

export type SheetVersions = Pick<TakeResponse, 'sheetVersions' | 'renewal'>;

/** Which versions of the measurements a take was measured with, and whether a newer one is coming. */
@Injectable()
export class SheetVersionsService {
  constructor(private readonly em: EntityManager) {}

  async of(take: Take): Promise<SheetVersions> {
    if (!take.currentReportId) return { sheetVersions: [], renewal: 'none' };
    const rows = await this.em
      .getConnection()
      .execute<VersionRow[]>(reportsOfTake, [take.id, take.currentReportId]);
    const sheetVersions: SheetVersion[] = rows.map(({ version, measuredAt }) => ({
      version,
      measuredAt: new Date(measuredAt).toISOString(),
    }));
    return { sheetVersions, renewal: await this.renewalOf(take, sheetVersions) };
  }

  private async renewalOf(take: Take, [shown]: SheetVersion[]): Promise<TakeResponse['renewal']> {
    if (!shown || !isOlder(shown.version)) return 'none';
    const failed = await this.em.count(Measurement, { take, dspVersion, state: 'failed' });
    return failed > 0 ? 'failed' : 'waiting';
  }
}
