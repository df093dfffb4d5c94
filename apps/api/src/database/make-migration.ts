import { resolve } from 'node:path';
import { MikroORM } from '@mikro-orm/postgresql';
import { loadConfig } from '../config/config';
import { databaseConfig } from './database.config';

/** For developers: writes the migration (and the snapshot) that brings the tables to what the entities say. */
async function main(): Promise<void> {
  const name = process.argv[2];
  if (!name || !/^[a-z][a-zA-Z]+$/.test(name))
    throw new Error('Say what the migration does: takesAndSheets, for example.');
  const orm = await MikroORM.init({
    ...databaseConfig(loadConfig().databaseUrl),
    migrations: {
      path: resolve(__dirname, '../../src/database/migrations'),
      emit: 'ts',
      snapshot: true,
      snapshotName: 'schema-snapshot',
      fileName: (timestamp: string, given?: string) => `${timestamp}-${kebab(given ?? '')}`,
    },
  });
  const made = await orm.getMigrator().createMigration(undefined, false, false, name);
  await orm.close();
  process.stdout.write(`${made.fileName}\nAdd it to migrations/index.ts.\n`);
}

const kebab = (camel: string) => camel.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`);

void main();
