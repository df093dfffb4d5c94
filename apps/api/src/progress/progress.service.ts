import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { maxProgressTakes, ProgressResponse, TakeProgress } from '@thudline/contracts';
import { FEWEST_HITS } from '@thudline/dsp';

/** `evennessDb` of dsp as SQL, so that a thousand takes' hits stay where they are. */
const levelSpread = `(
  select case when count(*) >= ${FEWEST_HITS}
    then percentile_cont(0.75) within group (order by peak) - percentile_cont(0.25) within group (order by peak) end
  from (
    select (h -> 'peaksDbfs' ->> coalesce((r.summary #>> '{pairs,0,a}')::int, 0))::float8 as peak
    from jsonb_array_elements(r.hits) h
    where h ->> 'kind' = 'kick') kicks
  where peak is not null)`;

const newestTakes = `
  select t.id as "takeId", t.number, t.title, t.recorded_at as "recordedAt",
    ${levelSpread} as "levelSpreadDb",
    (r.summary #>> '{balance,differenceDb}')::float8 as "cymbalsOverDrumsDb",
    -r.kick_peak_dbfs as "headroomDb", r.kick_clipped as clipped
  from take t join report r on r.measurement_id = t.current_report_id
  where t.owner_id = ? and t.deleted_at is null
  order by t.recorded_at desc, t.id desc limit ${maxProgressTakes}`;

type Row = Omit<TakeProgress, 'recordedAt'> & { recordedAt: string | Date };

/** What a person's takes tell of their playing, over time. */
@Injectable()
export class ProgressService {
  constructor(private readonly em: EntityManager) {}

  async of(ownerId: string): Promise<ProgressResponse> {
    const rows = await this.em.getConnection().execute<Row[]>(newestTakes, [ownerId]);
    const takes = rows.map((row) => ({ ...row, recordedAt: new Date(row.recordedAt).toISOString() }));
    return { takes: takes.reverse() };
  }
}
