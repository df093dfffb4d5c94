import { randomBytes } from 'node:crypto';
import {
  CreateBucketCommand,
  DeleteBucketCommand,
  DeleteObjectCommand,
  ListObjectsV2Command,
  PutObjectCommand,
} from '@aws-sdk/client-s3';
import { createS3Client } from '../../src/storage/s3-client';
import { testConfig } from './test-config';

export interface TestBucket {
  name: string;
  keys(): Promise<string[]>;
  overwrite(key: string, bytes: Uint8Array): Promise<void>;
  drop(): Promise<void>;
}

/** A bucket of one spec file on the real object store, reached without the application. */
export async function createTestBucket(): Promise<TestBucket> {
  const client = createS3Client(testConfig('postgres://127.0.0.1/none').objectStore);
  const name = `thudline-test-${randomBytes(6).toString('hex')}`;
  await client.send(new CreateBucketCommand({ Bucket: name }));
  const keys = async () => {
    const listed = await client.send(new ListObjectsV2Command({ Bucket: name }));
    return (listed.Contents ?? []).map((object) => object.Key ?? '');
  };
  return {
    name,
    keys,
    overwrite: async (key, bytes) => {
      await client.send(new PutObjectCommand({ Bucket: name, Key: key, Body: bytes }));
    },
    drop: async () => {
      for (const key of await keys()) await client.send(new DeleteObjectCommand({ Bucket: name, Key: key }));
      await client.send(new DeleteBucketCommand({ Bucket: name }));
      client.destroy();
    },
  };
}
