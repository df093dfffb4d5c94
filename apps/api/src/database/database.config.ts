import { Migrator } from '@mikro-orm/migrations';
import { defineConfig, Options, ReflectMetadataProvider } from '@mikro-orm/postgresql';
import { entities } from './entities';
import { migrations } from './migrations';

/** Used by the API, the worker, the migrations and their tests alike. */
export function databaseConfig(databaseUrl: string): Options {
  return defineConfig({
    clientUrl: databaseUrl,
    entities,
    metadataProvider: ReflectMetadataProvider,
    extensions: [Migrator],
    discovery: { warnWhenNoEntities: false },
    migrations: {
      migrationsList: migrations,
      path: `${__dirname}/migrations`,
      snapshot: false,
      silent: true,
      disableForeignKeys: false,
    },
    schemaGenerator: { disableForeignKeys: false, ignoreSchema: ['pgboss'] },
    pool: { min: 0, max: 10 },
    forceUtcTimezone: true,
  });
}
