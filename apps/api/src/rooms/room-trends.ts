import { EntityManager } from '@mikro-orm/postgresql';
import { Injectable } from '@nestjs/common';
import { RoomTrendRequest, RoomTrendResponse, TrendFigure, TrendPoint } from '@thudline/contracts';
import { validate } from 'uuid';
import { TakeRights } from '../access/take-rights';
import { Viewer } from '../access/viewer';
import { notFound } from '../errors/app-error';
import { Setup } from '../setups/entities/setup.entity';

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
  brightness: whole(
    `(select percentile_cont(0.5) within group (order by d::float8) from jsonb_array_elements_text(r.summary #> '{room,brightnessPerHitDb}') d)`,
  ),
  'noise-kick': whole('r.kick_noise_dbfs'),
  'noise-overhead': whole('r.overhead_noise_dbfs'),
  'cymbals-over-drums': whole(`(r.summary #>> '{balance,differenceDb}')::float8`),
  'hardest-kick': whole('r.kick_peak_dbfs'),
  'hardest-overhead': whole('r.overhead_peak_dbfs'),
  'low-end': whole('r.low_end_db'),
  arrival: {
    value: `(r.summary #>> '{pairs,0,arrival,arrivalMs}')::float8`,
    iqr: `(r.summary #>> '{pairs,0,arrival,arrivalIqrMs}')::float8`,
  },
};

type Of = 'room_id' | 'setup_id';

const pointsOf = ({ value, iqr }: Place, of: Of) => `
  select * from (
    select t.id as "takeId", t.number, t.recorded_at as "recordedAt", ${value} as value, ${iqr} as iqr,
      s.id as "setupId", s.name as "setupName"
    from take t join report r on r.measurement_id = t.current_report_id left join setup s on s.id = t.setup_id
    where t.${of} = ? and t.deleted_at is null) points
  where value is not null order by "recordedAt", "takeId"`;

interface PointRow extends Pick<TrendPoint, 'takeId' | 'number' | 'value' | 'iqr'> {
  recordedAt: string | Date;
  setupId: string | null;
  setupName: string | null;
}

/** One figure of every take of a room, or of a setup, over time. */
@Injectable()
export class RoomTrends {
  constructor(private readonly em: EntityManager) {}

  /** For whoever may read the room; the guard has asked. Setups are their player's. */
  async get(
    roomId: string,
    { figure }: RoomTrendRequest,
    { own }: Pick<TakeRights, 'own'>,
  ): Promise<RoomTrendResponse> {
    const points = await this.points(figure, 'room_id', roomId);
    return { figure, points: own ? points : points.map((point) => ({ ...point, setup: null })) };
  }

  /** @throws {AppError} `not-found` where the setup is somebody else's, too */
  async ofSetup({ user }: Viewer, setupId: string, { figure }: RoomTrendRequest): Promise<RoomTrendResponse> {
    const own = validate(setupId) && (await this.em.count(Setup, { id: setupId, owner: user.id })) === 1;
    if (!own) throw notFound();
    return { figure, points: await this.points(figure, 'setup_id', setupId) };
  }

  async points(figure: TrendFigure, of: Of, id: string): Promise<TrendPoint[]> {
    const rows = await this.em.getConnection().execute<PointRow[]>(pointsOf(places[figure], of), [id]);
    return rows.map(({ setupId, setupName, recordedAt, ...row }) => ({
      ...row,
      recordedAt: new Date(recordedAt).toISOString(),
      setup: setupId && setupName !== null ? { id: setupId, name: setupName } : null,
    }));
  }
}
