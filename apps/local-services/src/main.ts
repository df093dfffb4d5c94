import { startMailSink } from './mail/mailSink';
import { startObjectStore } from './objectStore';
import { mailSinkSettings, objectStoreSettings } from './settings';

async function main(): Promise<void> {
  const objectStore = await startObjectStore(objectStoreSettings(process.env));
  const mailSink = await startMailSink(mailSinkSettings(process.env));
  const stop = () => Promise.all([objectStore.stop(), mailSink.stop()]);
  for (const signal of ['SIGTERM', 'SIGINT'] as const) {
    process.once(signal, () => void stop().then(() => process.exit(0)));
  }
  process.stdout.write(
    `local services are ready: object store ${objectStore.url}, mail ${mailSink.smtpUrl} shown at ${mailSink.url}\n`,
  );
}

main().catch((error: unknown) => {
  const reason = error instanceof Error ? error.message : String(error);
  process.stderr.write(`The local services did not start: ${reason}\n`);
  process.exit(1);
});
