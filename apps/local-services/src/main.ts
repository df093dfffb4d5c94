import { startObjectStore } from './objectStore';
import { objectStoreSettings } from './settings';

async function main(): Promise<void> {
  const objectStore = await startObjectStore(objectStoreSettings(process.env));
  for (const signal of ['SIGTERM', 'SIGINT'] as const) {
    process.once(signal, () => void objectStore.stop().then(() => process.exit(0)));
  }
  process.stdout.write(`local services are ready: object store ${objectStore.url}\n`);
}

main().catch((error: unknown) => {
  const reason = error instanceof Error ? error.message : String(error);
  process.stderr.write(`The local services did not start: ${reason}\n`);
  process.exitCode = 1;
});
