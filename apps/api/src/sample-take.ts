import { MikroORM } from '@mikro-orm/postgresql';
import { validate } from 'uuid';
import { loadConfig } from './config/config';
import { databaseConfig } from './database/database.config';
import { chooseSampleTake } from './sample-sheet/sample-take';

/** `node dist/sample-take.js <takeId>`: anybody may read and hear the sheet of this take, without an account. */
async function main(takeId: string | undefined): Promise<void> {
  if (!takeId || !validate(takeId)) throw new Error('Say which take: node dist/sample-take.js <takeId>.');
  const orm = await MikroORM.init(databaseConfig(loadConfig().databaseUrl));
  try {
    await chooseSampleTake(orm.em.fork(), takeId);
  } finally {
    await orm.close();
  }
}

main(process.argv[2]).catch((error: unknown) => {
  process.stderr.write(
    `The sample sheet was not chosen: ${error instanceof Error ? error.message : String(error)}\n`,
  );
  process.exitCode = 1;
});
