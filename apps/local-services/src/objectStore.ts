import { mkdir } from 'node:fs/promises';
import S3rver from '@20minutes/s3rver';
import accounts from '@20minutes/s3rver/lib/models/account';
import { serveOnLoopback, type RunningService } from './runningService';

export interface ObjectStoreOptions {
  /** Folder that holds the objects; made when missing. */
  directory: string;
  /** Loopback port; 0 takes a free one. */
  port: number;
  bucket: string;
  accessKey: string;
  secretKey: string;
}

/**
 * Starts a fake of an S3 service over a folder, for this machine only, with one bucket in it.
 *
 * Only the given key is known; the one s3rver ships with is withdrawn. Signatures are not enforced, because s3rver
 * computes them wrongly for calls on a bucket (list, head). We serve it ourselves: its own `run` never hears that a
 * port is taken.
 *
 * @throws {Error} the port is taken, or the folder can't be written
 */
export async function startObjectStore(options: ObjectStoreOptions): Promise<RunningService> {
  const { directory, port, bucket, accessKey, secretKey } = options;
  await mkdir(directory, { recursive: true });
  const fake = new S3rver({
    directory,
    silent: true,
    allowMismatchedSignatures: true,
    vhostBuckets: false,
    configureBuckets: [{ name: bucket }],
  });
  fake.on('error', (error) => {
    const isRefusal = error.status !== undefined && error.status < 500;
    if (!isRefusal) process.stderr.write(`object store: ${error.message}\n`);
  });
  accounts.DUMMY_ACCOUNT.revokeAccessKey('S3RVER');
  accounts.DUMMY_ACCOUNT.createKeyPair(accessKey, secretKey);
  await fake.configureBuckets();
  return serveOnLoopback(fake.callback(), port);
}
