import { NestFactory } from '@nestjs/core';
import { Logger } from 'nestjs-pino';
import { loadConfig } from './config/config';
import { WorkerModule } from './worker.module';

async function main(): Promise<void> {
  const app = await NestFactory.createApplicationContext(WorkerModule.of(loadConfig()), { bufferLogs: true });
  app.useLogger(app.get(Logger));
  app.enableShutdownHooks();
}

main().catch((error: unknown) => {
  process.stderr.write(
    `The worker did not start: ${error instanceof Error ? error.message : String(error)}\n`,
  );
  process.exit(1);
});
