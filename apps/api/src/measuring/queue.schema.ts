import PgBoss from 'pg-boss';

export const measureQueue = 'measure';

/**
 * A job is only the knock on the door: state, attempts and progress live on `measurement`. So pg-boss retries nothing,
 * and a job that takes longer than an hour is given up (common practice, no source: ten minutes of sound take seconds).
 */
const queueOptions = {
  name: measureQueue,
  policy: 'standard',
  retryLimit: 0,
  expireInSeconds: 3_600,
} as const;

export function createBoss(databaseUrl: string, part: 'sends' | 'works' | 'migrates'): PgBoss {
  return new PgBoss({
    connectionString: databaseUrl,
    schema: 'pgboss',
    application_name: `thudline-queue-${part}`,
    migrate: part === 'migrates',
    supervise: part === 'works',
    schedule: false,
    maintenanceIntervalSeconds: 10,
    max: part === 'sends' ? 2 : 4,
  });
}

export async function prepareQueue(databaseUrl: string): Promise<void> {
  const boss = createBoss(databaseUrl, 'migrates');
  const failed = new Promise<never>((_resolve, reject) => boss.on('error', reject));
  await Promise.race([boss.start().then(() => boss.createQueue(measureQueue, queueOptions)), failed]);
  await boss.stop({ graceful: false });
}
