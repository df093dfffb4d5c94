import { Logger } from '@nestjs/common';
import { loadConfig } from './config/config';
import { createApp } from './create-app';
import { ScratchService } from './storage/scratch.service';

async function main(): Promise<void> {
  const config = loadConfig();
  const app = await createApp(config);
  await app.get(ScratchService).sweep();
  await app.listen(config.port, config.host);
  new Logger('Main').log(`The API listens on ${await app.getUrl()}`);
}

main().catch((error: unknown) => {
  process.stderr.write(`The API did not start: ${error instanceof Error ? error.message : String(error)}\n`);
  process.exit(1);
});
