import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { compareTakes, pooledTakes, roomChange, RoomChangeTold, TakeFacts } from '@thudline/dsp';
import { storedFacts } from '../reports/report-columns';
import { Report } from '../reports/entities/report.entity';
import { Take } from '../takes/entities/take.entity';
import { Sides } from './room-change-sides';

/** Tells what changes did, from the takes on both sides. */
@Injectable()
export class RoomComparisons {
  constructor(private readonly em: EntityManager) {}

  /** @returns by change id; none where a side has no measured take */
  async of(sides: Map<string, Sides>): Promise<Map<string, RoomChangeTold>> {
    const told = new Map<string, RoomChangeTold>();
    for (const [changeId, { before, after }] of sides) {
      const facts = { before: await this.factsOf(before), after: await this.factsOf(after) };
      if (facts.before.length === 0 || facts.after.length === 0) continue;
      const pooled = { before: pooledTakes(facts.before), after: pooledTakes(facts.after) };
      // How the preamps stood isn't known of a room: hits are not matched by strength.
      told.set(changeId, roomChange(compareTakes({ ...pooled, gainKnownSame: false })));
    }
    return told;
  }

  private async factsOf(takes: Take[]): Promise<TakeFacts[]> {
    const ids = takes.flatMap(({ currentReportId }) => currentReportId ?? []);
    if (ids.length === 0) return [];
    const em = this.em.fork();
    const reports = await em.find(Report, { measurement: { $in: ids } }, { populate: ['hits'] });
    const byId = new Map(reports.map((report) => [report.measurement.id, report]));
    return ids.flatMap((id) => {
      const report = byId.get(id);
      return report ? [storedFacts({ ...report, clipRuns: [] })] : [];
    });
  }
}
