import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { RoomTrendRequest, RoomTrendResponse, TrendFigure } from '@thudline/contracts';

/** Where a figure stands in a report, as SQL: its value and the distance between its quartiles. */
interface Place {
  value: string;
  iqr: string;
}

const band = (hz: number) =>
  `(select b from jsonb_array_elements(r.summary #> '{room,bands}') b where (b ->> 'centreHz')::float8 = ${hz})`;
const spread = (hz: number, figure: 't20S' | 'earlyToLateDb'): Place => ({
  value: `(${band(hz)} #>> '{${figure},median}')::float8`,
  iqr: `(${band(hz)} #>> '{${figure},iqr}')::float8`,
});
const whole = (value: string): Place => ({ value, iqr: 'null::float8' });

const places: Record<TrendFigure, Place> = {
  'decay-500': spread(500, 't20S'),
  'decay-1000': spread(1000, 't20S'),
  'decay-2000': spread(2000, 't20S'),
  'decay-4000': spread(4000, 't20S'),
  'early-to-late-500': spread(500, 'earlyToLateDb'),
  'noise-kick': whole('r.kick_noise_dbfs'),
  'noise-overhead': whole('r.overhead_noise_dbfs'),
  'cymbals-over-drums': whole(`(r.summary #>> '{balance,differenceDb}')::float8`),
  'hardest-kick': whole('r.kick_peak_dbfs'),
};

const pointsOf = ({ value, iqr }: Place) => `
  select * from (
    select t.id as "takeId", t.number, t.recorded_at as "recordedAt", ${value} as value, ${iqr} as iqr
    from take t join report r on r.measurement_id = t.current_report_id
    where t.room_id = ? and t.deleted_at is null) points
  where value is not null order by "recordedAt", "takeId"`;

interface PointRow {
  takeId: string;
  number: number;
  recordedAt: string | Date;
  value: number;
  iqr: number | null;
}

/** One figure of every take of a room, over time. */
@Injectable()
export class RoomTrends {
  constructor(private readonly em: EntityManager) {}

  /** For whoever may read the room; the guard has asked. */
  async get(roomId: string, { figure }: RoomTrendRequest): Promise<RoomTrendResponse> {
    const rows = await this.em.getConnection().execute<PointRow[]>(pointsOf(places[figure]), [roomId]);
    const points = rows.map((row) => ({ ...row, recordedAt: new Date(row.recordedAt).toISOString() }));
    return { figure, points };
  }
}
