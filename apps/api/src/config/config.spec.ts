import { loadConfig } from './config';

const whole = {
  DATABASE_URL: 'postgres://somebody@127.0.0.1/thudline',
  S3_BUCKET: 'thudline',
  S3_ACCESS_KEY: 'key',
  S3_SECRET_KEY: 'secret',
  JWT_SECRET: 'a secret of more than thirty-two characters',
  PUBLIC_URL: 'https://drums.example.org/',
  SCRATCH_DIR: '/tmp/thudline',
};

describe('loadConfig', () => {
  it('fills in what may be left out', () => {
    expect(loadConfig(whole)).toMatchObject({
      host: '127.0.0.1',
      publicOrigin: 'https://drums.example.org',
      isHttps: true,
      trustProxy: false,
      maxFileBytes: 512 * 1024 * 1024,
      objectStore: { forcePathStyle: false, checksums: 'sdk-default' },
      measuring: { heartbeatMs: 5_000, silentAfterMs: 30_000 },
    });
  });

  it('names every setting that is missing or wrong, and no value', () => {
    const wrong = { ...whole, PORT: 'http', JWT_SECRET: 'short-secret', DATABASE_URL: undefined };
    const load = () => loadConfig(wrong);
    expect(load).toThrow(/DATABASE_URL.*JWT_SECRET.*PORT/);
    expect(load).not.toThrow(/short-secret/);
  });

  it.each([
    ['true', true],
    ['2', 2],
    ['loopback', 'loopback'],
  ])('reads TRUST_PROXY %s as Express understands it', (text, value) => {
    expect(loadConfig({ ...whole, TRUST_PROXY: text }).trustProxy).toBe(value);
  });
});
