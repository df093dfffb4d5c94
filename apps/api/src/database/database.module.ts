import { MikroOrmModule } from '@mikro-orm/nestjs';
import { PostgreSqlDriver } from '@mikro-orm/postgresql';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { databaseConfig } from './database.config';

/** Every request gets its own identity map. */
export const databaseModule = MikroOrmModule.forRootAsync({
  driver: PostgreSqlDriver,
  inject: [CONFIG],
  useFactory: (config: Config) => ({ ...databaseConfig(config.databaseUrl), registerRequestContext: true }),
});
