import PgBoss from 'pg-boss';

export const measureQueue = 'measure';
export const addedFileQueue = 'added-file';
export const exportQueue = 'export';
export const mailQueue = 'mail';

/**
 * A measuring job is only the knock on the door: state, attempts and progress live on `measurement`. So pg-boss retries
 * nothing, and a job that takes longer than an hour is given up (common practice, no source: ten minutes of sound take
 * seconds). The same holds for added files and exports.
 *
 * A mail is tried again for about half a day, with longer and longer waits (common practice, no source).
 */
const queues: PgBoss.Queue[] = [
  { name: measureQueue, policy: 'standard', retryLimit: 0, expireInSeconds: 3_600 },
  { name: addedFileQueue, policy: 'standard', retryLimit: 0, expireInSeconds: 3_600 },
  { name: exportQueue, policy: 'standard', retryLimit: 0, expireInSeconds: 6 * 3_600 },
  {
    name: mailQueue,
    policy: 'standard',
    retryLimit: 11,
    retryDelay: 15,
    retryBackoff: true,
    expireInSeconds: 120,
  },
];

export function createBoss(
  databaseUrl: string,
  part: 'sends' | 'works' | 'adds' | 'exports' | 'mails' | 'migrates',
): PgBoss {
  return new PgBoss({
    connectionString: databaseUrl,
    schema: 'pgboss',
    application_name: `thudline-queue-${part}`,
    migrate: part === 'migrates',
    supervise: part === 'works',
    schedule: false,
    maintenanceIntervalSeconds: 10,
    max: part === 'works' ? 4 : 2,
  });
}

export async function prepareQueue(databaseUrl: string): Promise<void> {
  const boss = createBoss(databaseUrl, 'migrates');
  const failed = new Promise<never>((_resolve, reject) => boss.on('error', reject));
  const prepare = async () => {
    await boss.start();
    for (const queue of queues) await boss.createQueue(queue.name, queue);
  };
  await Promise.race([prepare(), failed]);
  await boss.stop({ graceful: false });
}
