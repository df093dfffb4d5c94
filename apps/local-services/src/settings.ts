import { type ObjectStoreOptions } from './objectStore';

/**
 * Reads what this process needs from the environment.
 *
 * @throws {Error} with the name of the variable that is missing or not a port
 */
export function objectStoreSettings(environment: NodeJS.ProcessEnv): ObjectStoreOptions {
  const text = (name: string): string => {
    const value = environment[name];
    if (!value) throw new Error(`${name} is not set.`);
    return value;
  };
  const port = Number(text('S3_PORT'));
  if (!Number.isInteger(port) || port < 0 || port > 65_535) throw new Error('S3_PORT is not a port.');
  return {
    directory: text('OBJECT_STORE_DIR'),
    port,
    bucket: text('S3_BUCKET'),
    accessKey: text('S3_ACCESS_KEY'),
    secretKey: text('S3_SECRET_KEY'),
  };
}
