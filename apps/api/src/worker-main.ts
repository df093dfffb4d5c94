import { NestFactory } from '@nestjs/core';
import { Logger } from 'nestjs-pino';
import { loadConfig } from './config/config';
import { isLostWord } from './queue/lost-word';
import { WorkerModule } from './worker.module';

async function main(): Promise<void> {
  const app = await NestFactory.createApplicationContext(WorkerModule.of(loadConfig()), { bufferLogs: true });
  const logger = app.get(Logger);
  app.useLogger(logger);
  app.enableShutdownHooks();
  process.on('unhandledRejection', (reason: unknown) => {
    if (!isLostWord(reason)) throw reason;
    logger.warn(reason, 'The database was away when a job ended; its sweep finds what is left to do');
  });
}

main().catch((error: unknown) => {
  process.stderr.write(
    `The worker did not start: ${error instanceof Error ? error.message : String(error)}\n`,
  );
  process.exit(1);
});
