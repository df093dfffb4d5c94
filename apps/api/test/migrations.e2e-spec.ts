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
