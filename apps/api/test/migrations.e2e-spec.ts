import { randomUUID } from 'node:crypto';
import { MikroORM } from '@mikro-orm/postgresql';
import { databaseConfig } from '../src/database/database.config';
import { migrate } from '../src/database/migrate';
import { createEmptyDatabase, TestDatabase } from './support/test-database';

describe('migrations', () => {
  let database: TestDatabase;
  let orm: MikroORM | undefined;

  beforeAll(async () => {
    database = await createEmptyDatabase();
    await migrate(database.url);
    orm = await MikroORM.init(databaseConfig(database.url));
  });

  afterAll(async () => {
    await orm?.close(true);
    await database?.drop();
  });

  it('bring an empty database to exactly what the entities say', async () => {
    expect(await orm!.getSchemaGenerator().getUpdateSchemaSQL({ wrap: false })).toBe('');
  });

  it('can run again and change nothing', async () => {
    await migrate(database.url);
    expect(await orm!.getMigrator().getPendingMigrations()).toEqual([]);
  });

  it('give takes and reports of before what lists ask for now', async () => {
    const ids = { user: randomUUID(), take: randomUUID(), measurement: randomUUID() };
    const run = (sql: string, values: unknown[] = []) => orm!.em.getConnection().execute(sql, values);
    await orm!.getMigrator().down({ to: '20261201091134-tags-and-followers' });
    await run(
      `insert into "user" (id, created_at, name, email, email_lower, password_hash, roles, settings)
       values (?, now(), 'Juno', 'j@example.org', 'j@example.org', 'x', '{player}', '{}')`,
      [ids.user],
    );
    await run(
      `insert into take (id, created_at, owner_id, number, title, note, recorded_at, upload_key, ticked_actions)
       values (?, now(), ?, 1, '', '', now(), ?, '[]')`,
      [ids.take, ids.user, randomUUID()],
    );
    await run(
      `insert into measurement (id, created_at, take_id, dsp_version, input_hash, state, progress, heartbeat_at)
       values (?, now(), ?, '1', 'x', 'done', 1, now())`,
      [ids.measurement, ids.take],
    );
    const summary = {
      tracks: [{ noiseFloorDbfs: -71.5 }, { noiseFloorDbfs: null }],
      pairs: [{ agreement: { sure: true } }],
    };
    await run(
      `insert into report (measurement_id, take_id, created_at, kick_clipped, overhead_clipped, verdict, summary,
         hits, clip_runs) values (?, ?, now(), false, false, 'flip', ?::jsonb, '[]', '[]')`,
      [ids.measurement, ids.take, JSON.stringify(summary)],
    );
    await orm!.getMigrator().up();
    expect(await run('select tags, done_actions from take')).toEqual([{ tags: [], done_actions: [] }]);
    expect(await run('select kick_noise_dbfs, overhead_noise_dbfs, adding_up, says from report')).toEqual([
      { kick_noise_dbfs: -71.5, overhead_noise_dbfs: null, adding_up: 'fix', says: '' },
    ]);
  });

  it('can be taken back, and brought forward again', async () => {
    await orm!.getMigrator().down({ to: 0 });
    const tables = await orm!.em
      .getConnection()
      .execute<{ tablename: string }[]>(`select tablename from pg_tables where schemaname = 'public'`);
    expect(tables.map((table) => table.tablename)).toEqual(['mikro_orm_migrations']);
    await orm!.getMigrator().up();
    expect(await orm!.getSchemaGenerator().getUpdateSchemaSQL({ wrap: false })).toBe('');
  });
});
