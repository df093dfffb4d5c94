import { rm } from 'node:fs/promises';
import { Server } from 'node:http';
import { EntityManager } from '@mikro-orm/postgresql';
import { NestExpressApplication } from '@nestjs/platform-express';
import { Config } from '../../src/config/config';
import { createApp } from '../../src/create-app';
import { createTestBucket, TestBucket } from './test-bucket';
import { createTestDatabase, TestDatabase } from './test-database';
import { testConfig } from './test-config';

export interface TestApp {
  app: NestExpressApplication;
  config: Config;
  server: Server;
  database: TestDatabase;
  bucket: TestBucket;
  /** A fresh view of the database. */
  em(): EntityManager;
  close(): Promise<void>;
}

/** The whole API on its own database and its own bucket of the real object store, listening on a free port. */
export async function startTestApp(changed: NodeJS.ProcessEnv = {}): Promise<TestApp> {
  const database = await createTestDatabase();
  const bucket = await createTestBucket();
  const config = testConfig(database.url, { S3_BUCKET: bucket.name, ...changed });
  const app = await createApp(config);
  await app.listen(0, '127.0.0.1');
  return {
    app,
    config,
    database,
    bucket,
    server: app.getHttpServer(),
    em: () => app.get(EntityManager).fork(),
    async close() {
      await app.close();
      await database.drop();
      await bucket.drop();
      await rm(config.scratchDir, { recursive: true, force: true });
    },
  };
}
