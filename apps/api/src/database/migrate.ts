import { MikroORM } from '@mikro-orm/postgresql';
import { loadConfig } from '../config/config';
import { prepareQueue } from '../queue/queue.schema';
import { databaseConfig } from './database.config';

/** Brings the tables and the queue's own schema up to date; safe to run again. */
export async function migrate(databaseUrl: string): Promise<void> {
  const orm = await MikroORM.init(databaseConfig(databaseUrl));
  try {
    await orm.getMigrator().up();
  } finally {
    await orm.close();
  }
  await prepareQueue(databaseUrl);
}

if (require.main === module) {
  migrate(loadConfig().databaseUrl).catch((error: unknown) => {
    process.stderr.write(`The database could not be brought up to date: ${String(error)}\n`);
    process.exitCode = 1;
  });
}
