import { DynamicModule, Module } from '@nestjs/common';
import { NestFactory } from '@nestjs/core';
import { loadConfig } from './config/config';
import { ConfigModule } from './config/config.module';
import { databaseModule } from './database/database.module';
import { StoreRepair } from './housekeeping/store-repair';
import { StorageModule } from './storage/storage.module';

@Module({})
class RepairModule {
  static of(): DynamicModule {
    return {
      module: RepairModule,
      imports: [ConfigModule.of(loadConfig()), databaseModule, StorageModule],
      providers: [StoreRepair],
    };
  }
}

/**
 * Run by hand: removes objects that no row stands on, tells rows whose object is gone, prints both as JSON, and fails where any
 * is gone. `--grace-hours=0` spares nothing; only for an installation that nobody is using.
 */
async function main(): Promise<void> {
  const hours = process.argv.find((argument) => argument.startsWith('--grace-hours='))?.split('=')[1];
  const app = await NestFactory.createApplicationContext(RepairModule.of(), { logger: ['error', 'warn'] });
  const graceMs = hours === undefined ? undefined : Number(hours) * 60 * 60 * 1000;
  const result = await app.get(StoreRepair).run({ now: new Date(), graceMs });
  await app.close();
  process.stdout.write(`${JSON.stringify(result)}\n`);
  if (result.missing.length > 0) process.exitCode = 1;
}

main().catch((error: unknown) => {
  process.stderr.write(`The repair stopped: ${error instanceof Error ? error.message : String(error)}\n`);
  process.exit(1);
});
