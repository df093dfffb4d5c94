/** What we use of @20minutes/s3rver 4, which ships no types. */
declare module '@20minutes/s3rver' {
  import { type RequestListener } from 'node:http';

  interface S3rverOptions {
    directory: string;
    silent: boolean;
    allowMismatchedSignatures: boolean;
    vhostBuckets: boolean;
    configureBuckets: { name: string }[];
  }

  class S3rver {
    constructor(options: S3rverOptions);
    configureBuckets(): Promise<unknown>;
    callback(): RequestListener;
    on(event: 'error', listener: (error: Error & { status?: number }) => void): this;
  }
  export = S3rver;
}

declare module '@20minutes/s3rver/lib/models/account' {
  interface Account {
    createKeyPair(accessKeyId: string, secretAccessKey: string): void;
    revokeAccessKey(accessKeyId: string): void;
  }
  const models: { DUMMY_ACCOUNT: Account };
  export = models;
}
