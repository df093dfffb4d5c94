import pg from 'pg';

export const takeCount = 500;
export const changeCount = 100;
/** Of others, so that the database has to look for what is asked. */
const otherTakes = 5000;

/**
 * A room with 500 takes and 100 changes, two takes on each side of each: the rows of a measured take of the demo, over and
 * over, on the days of three years.
 */
export async function fillRoom(client: pg.Client, templateTakeId: string): Promise<string> {
  const { rows } = await client.query<{ id: string }>(
    `insert into room (id, created_at, owner_id, name, shape, surfaces)
     select gen_random_uuid(), now(), owner_id, 'The busy room',
       '{"kind": "box", "lengthM": 6, "widthM": 4, "heightM": 2.5}', '[]' from take where id = $1 returning id`,
    [templateTakeId],
  );
  const roomId = rows[0]?.id;
  if (!roomId) throw new Error(`There is no take ${templateTakeId}.`);
  await copyTakes(client, templateTakeId, { roomId, count: takeCount, from: 10_000 });
  await copyTakes(client, templateTakeId, { roomId: null, count: otherTakes, from: 20_000 });
  await client.query(
    `insert into room_change (id, created_at, room_id, happened_on, rank, what, category, cost, note)
     select gen_random_uuid(), now(), $1, current_date - 10 * n, 0, 'Change ' || n, 'other', '', ''
     from generate_series(1, ${changeCount}) n`,
    [roomId],
  );
  for (const [side, sign, order] of [
    ['before', '<', 'desc'],
    ['after', '>=', 'asc'],
  ])
    await client.query(
      `insert into room_change_take (change_id, take_id, side)
       select c.id, t.id, '${side}' from room_change c cross join lateral (
         select id from take where room_id = c.room_id and recorded_at ${sign} c.happened_on
         order by recorded_at ${order} limit 2) t
       where c.room_id = $1`,
      [roomId],
    );
  await client.query('analyze');
  return roomId;
}

async function copyTakes(
  client: pg.Client,
  takeId: string,
  { roomId, count, from }: { roomId: string | null; count: number; from: number },
): Promise<void> {
  await client.query('drop table if exists copy_of');
  await client.query(
    `create temporary table copy_of as
     select n, gen_random_uuid() as take_id, gen_random_uuid() as measurement_id from generate_series(1, ${count}) n`,
  );
  await client.query(
    `insert into take select (jsonb_populate_record(t, jsonb_build_object('id', c.take_id, 'number', $2 + c.n,
       'upload_key', gen_random_uuid(), 'room_id', $3::uuid, 'recorded_at', now() - c.n * interval '50 hours',
       'follows_take_id', null, 'current_report_id', ${roomId ? 'c.measurement_id' : 'null'}))).*
     from take t, copy_of c where t.id = $1`,
    [takeId, from, roomId],
  );
  if (!roomId) return;
  await client.query(
    `insert into measurement select (jsonb_populate_record(m, jsonb_build_object('id', c.measurement_id,
       'take_id', c.take_id))).* from measurement m, copy_of c, take t
     where t.id = $1 and m.id = t.current_report_id`,
    [takeId],
  );
  await client.query(
    `insert into report select (jsonb_populate_record(r, jsonb_build_object('measurement_id', c.measurement_id,
       'take_id', c.take_id))).* from report r, copy_of c, take t
     where t.id = $1 and r.measurement_id = t.current_report_id`,
    [takeId],
  );
}
