import { Writable } from 'node:stream';
import { pinoHttp } from 'pino-http';
import { Client } from 'pg';
import { AppError } from '../src/errors/app-error';
import { httpLogging } from '../src/logging/logger.module';
import { Throttle } from '../src/throttle/entities/throttle.entity';
import { startTestApp, TestApp } from './support/test-app';

describe('what is logged of an error', () => {
  let test: TestApp;
  let lines: string;

  beforeAll(async () => {
    test = await startTestApp();
  });
  beforeEach(() => (lines = ''));
  afterAll(async () => test?.close());

  const logged = (error: unknown) => {
    const stream = new Writable({
      write(chunk: Buffer, _encoding, done) {
        lines += chunk.toString();
        done();
      },
    });
    const { logger } = pinoHttp(httpLogging({ ...test.config, logLevel: 'info' }), stream);
    logger.error({ err: error }, 'Something went wrong');
    return (JSON.parse(lines) as { err: Record<string, unknown> }).err;
  };
  const failed = (work: Promise<unknown>) =>
    work.then(
      () => Promise.reject(new Error('This should have failed.')),
      (error: unknown) => error,
    );
  const twice = async () => {
    const row = { key: 'a secret key', windowStart: new Date(), count: 1 };
    await test.em().upsert(Throttle, row);
    return failed(test.em().insert(Throttle, row));
  };

  it('holds no value of an insert that failed, but what failed and where', async () => {
    const err = logged(await twice());
    expect(lines).not.toMatch(/secret|insert into/);
    expect(err).toMatchObject({
      type: 'UniqueConstraintViolationException',
      code: '23505',
      table: 'throttle',
    });
    expect(err.constraint).toEqual(expect.stringContaining('throttle'));
    expect(err.stack).toMatch(/^\s+at .*\n\s+at /);
  });

  it('holds none of it when it is the cause of another', async () => {
    const err = logged(new AppError('internal', 'Something went wrong here.', { cause: await twice() }));
    expect(lines).not.toMatch(/secret|insert into/);
    expect(err).toMatchObject({ message: 'Something went wrong here.', cause: { code: '23505' } });
  });

  it('holds none of what the driver itself refuses, as the queue meets it', async () => {
    const client = new Client({ connectionString: test.database.url });
    await client.connect();
    const error = await failed(client.query('select $1::uuid', ['a secret value']));
    await client.end();
    expect(logged(error)).toMatchObject({ code: '22P02' });
    expect(lines).not.toContain('secret');
  });

  it('tells any other error whole', () => {
    const err = logged(new Error('The store is away.', { cause: new Error('No route.') }));
    expect(err).toMatchObject({ type: 'Error', message: expect.stringContaining('No route.') as string });
  });
});
