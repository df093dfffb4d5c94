import { S3Client } from '@aws-sdk/client-s3';
import { Config } from '../config/config';

const nothing = () => {};
const silent = { trace: nothing, debug: nothing, info: nothing, warn: nothing, error: nothing };

export function createS3Client(settings: Config['objectStore']): S3Client {
  // Fakes of S3 store corrupt bytes, or refuse, with the SDK's default checksums; our own SHA-256 guards every file.
  const checksums =
    settings.checksums === 'when-required'
      ? ({
          requestChecksumCalculation: 'WHEN_REQUIRED',
          responseChecksumValidation: 'WHEN_REQUIRED',
        } as const)
      : {};
  return new S3Client({
    endpoint: settings.endpoint,
    region: settings.region,
    forcePathStyle: settings.forcePathStyle,
    credentials: { accessKeyId: settings.accessKey, secretAccessKey: settings.secretKey },
    maxAttempts: 2,
    // Failures are logged once, where they are told to somebody.
    logger: silent,
    requestHandler: { connectionTimeout: 3_000, requestTimeout: 30_000 },
    ...checksums,
  });
}
