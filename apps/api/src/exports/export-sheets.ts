import { Cell, csvOf } from '../zip/csv';

type Row = Record<string, Cell>;

/** Rows of a query, those columns of theirs that are named; what isn't there is left empty. */
export const csv = (rows: readonly Row[], columns: readonly string[]): string =>
  csvOf(
    columns,
    rows.map((row) => columns.map((column) => row[column] ?? null)),
  );

const levelColumns = [
  'kick_peak_dbfs',
  'overhead_peak_dbfs',
  'kick_noise_dbfs',
  'overhead_noise_dbfs',
  'low_end_db',
];
const levels = levelColumns.map((column) => `r.${column}`).join(', ');

export const takesCsv = Object.assign(
  (rows: Row[]) =>
    csv(rows, [
      'number',
      'title',
      'recorded_at',
      'room',
      'setup',
      'tags',
      'note',
      'verdict',
      ...levelColumns,
    ]),
  {
    query: `
      select t.number, t.title, t.recorded_at, ro.name as room, s.name as setup, array_to_string(t.tags, ' ') as tags,
        t.note, r.verdict, ${levels}
      from take t left join report r on r.measurement_id = t.current_report_id
        left join room ro on ro.id = t.room_id left join setup s on s.id = t.setup_id
      where t.owner_id = ? and t.deleted_at is null order by t.number`,
  },
);

export const tryOutsCsv = Object.assign(
  (rows: Row[]) =>
    csv(rows, [
      'made_at',
      'subject',
      'differs',
      'unit',
      'position',
      'label',
      'take',
      'title',
      'winner',
      'reason',
      ...levelColumns,
    ]),
  {
    query: `
      select o.created_at as made_at, o.subject, o.differs, o.unit, p.position, p.label, t.number as take, t.title,
        coalesce(o.winner_place_id = p.id, false) as winner, o.reason, ${levels}
      from try_out o join try_out_place p on p.try_out_id = o.id
        left join take t on t.owner_id = o.owner_id and t.upload_key = p.upload_key and t.deleted_at is null
        left join report r on r.measurement_id = t.current_report_id
      where o.owner_id = ? and o.deleted_at is null and p.removed_at is null order by o.id, p.rank`,
  },
);
