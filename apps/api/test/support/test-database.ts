import { createHash, randomBytes } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { MikroORM } from '@mikro-orm/postgresql';
import { migrations } from '../../src/database/migrations';
import { migrate } from '../../src/database/migrate';
import { requireTestServices } from './test-config';

/** Any number: spec files that start at the same time make the template one after the other. */
const templateLock = 7_311_204;

export interface TestDatabase {
  url: string;
  drop(): Promise<void>;
}

/** A database of one spec file: a clone of a template that has been migrated once. */
export async function createTestDatabase(): Promise<TestDatabase> {
  const template = await withAdmin(templateDatabase);
  const name = `thudline_test_${randomBytes(6).toString('hex')}`;
  await withAdmin((run) => run(`create database ${name} template ${template}`));
  return {
    url: urlOf(name),
    drop: async () => {
      await withAdmin((run) => run(`drop database if exists ${name} with (force)`));
    },
  };
}

/** An empty database, for the tests of the migrations themselves. */
export async function createEmptyDatabase(): Promise<TestDatabase> {
  const name = `thudline_empty_${randomBytes(6).toString('hex')}`;
  await withAdmin((run) => run(`create database ${name} template template0`));
  return {
    url: urlOf(name),
    drop: async () => {
      await withAdmin((run) => run(`drop database if exists ${name} with (force)`));
    },
  };
}

type Run = (sql: string, values?: unknown[]) => Promise<Record<string, unknown>[]>;

async function templateDatabase(run: Run): Promise<string> {
  const snapshot = readFileSync(join(__dirname, '../../src/database/migrations/schema-snapshot.json'));
  const names = migrations.map((migration) => migration.name).join();
  const hash = createHash('sha256').update(snapshot).update(names).digest('hex').slice(0, 12);
  const name = `thudline_template_${hash}`;
  await run('select pg_advisory_lock(?)', [templateLock]);
  try {
    const found = await run('select 1 from pg_database where datname = ?', [name]);
    if (found.length > 0) return name;
    const making = `${name}_making`;
    await run(`drop database if exists ${making} with (force)`);
    await run(`create database ${making} template template0`);
    await migrate(urlOf(making));
    await run(`alter database ${making} rename to ${name}`);
    return name;
  } finally {
    await run('select pg_advisory_unlock(?)', [templateLock]);
  }
}

async function withAdmin<T>(use: (run: Run) => Promise<T>): Promise<T> {
  requireTestServices();
  const orm = await MikroORM.init({
    clientUrl: process.env.TEST_DATABASE_URL,
    entities: [],
    discovery: { warnWhenNoEntities: false },
    // One connection, so that the lock and what it guards share it.
    pool: { min: 1, max: 1 },
  });
  try {
    return await use((sql, values) => orm.em.getConnection().execute(sql, values));
  } finally {
    await orm.close(true);
  }
}

function urlOf(database: string): string {
  const url = new URL(process.env.TEST_DATABASE_URL ?? '');
  url.pathname = `/${database}`;
  return url.href;
}
