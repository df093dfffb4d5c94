import { mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Config, loadConfig } from '../../src/config/config';

const needed = ['TEST_DATABASE_URL', 'S3_ENDPOINT', 'S3_BUCKET', 'S3_ACCESS_KEY', 'S3_SECRET_KEY'] as const;

/** A test without its database or object store fails; it must not pass by running nothing. */
export function requireTestServices(): void {
  const missing = needed.filter((name) => !process.env[name]);
  if (missing.length > 0)
    throw new Error(`API tests need ${missing.join(', ')}: run ./docker-free-dev.sh test`);
}

/** The environment of a process under test: cheap passwords, own scratch, the test's database. */
export function testEnvironment(databaseUrl: string, changed: NodeJS.ProcessEnv = {}): NodeJS.ProcessEnv {
  requireTestServices();
  return {
    ...process.env,
    DATABASE_URL: databaseUrl,
    S3_FORCE_PATH_STYLE: process.env.S3_FORCE_PATH_STYLE ?? 'true',
    S3_CHECKSUMS: process.env.S3_CHECKSUMS ?? 'when-required',
    JWT_SECRET: 'a secret for tests only, 32 characters at least',
    PUBLIC_URL: 'http://thudline.test',
    SCRATCH_DIR: mkdtempSync(join(tmpdir(), 'thudline-test-')),
    ARGON2_MEMORY_KIB: '1024',
    ARGON2_TIME: '1',
    JOIN_LIMIT_PER_ADDRESS: '1000',
    MAIL_LIMIT_PER_ADDRESS: '1000',
    OPEN_LINK_LIMIT_PER_ADDRESS: '1000',
    LOG_LEVEL: 'silent',
    WEB_DIST: undefined,
    ...changed,
  };
}

export function testConfig(databaseUrl: string, changed: NodeJS.ProcessEnv = {}): Config {
  return loadConfig(testEnvironment(databaseUrl, changed));
}
