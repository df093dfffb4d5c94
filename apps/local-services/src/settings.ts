import { type MailSinkOptions } from './mail/mailSink';
import { type ObjectStoreOptions } from './objectStore';

/**
 * Reads where to keep objects and who may reach them from the environment.
 *
 * @throws {Error} with the name of the variable that is missing or not a port
 */
export function objectStoreSettings(environment: NodeJS.ProcessEnv): ObjectStoreOptions {
  return {
    directory: text(environment, 'OBJECT_STORE_DIR'),
    port: port(environment, 'S3_PORT'),
    bucket: text(environment, 'S3_BUCKET'),
    accessKey: text(environment, 'S3_ACCESS_KEY'),
    secretKey: text(environment, 'S3_SECRET_KEY'),
  };
}

/**
 * Reads where mail arrives and where it is shown from the environment.
 *
 * @throws {Error} with the name of the variable that is missing or not a port
 */
export function mailSinkSettings(environment: NodeJS.ProcessEnv): MailSinkOptions {
  return {
    directory: text(environment, 'MAIL_DIR'),
    smtpPort: port(environment, 'SMTP_PORT'),
    pagePort: port(environment, 'MAIL_PAGE_PORT'),
  };
}

function text(environment: NodeJS.ProcessEnv, name: string): string {
  const value = environment[name];
  if (!value) throw new Error(`${name} is not set.`);
  return value;
}

function port(environment: NodeJS.ProcessEnv, name: string): number {
  const value = Number(text(environment, name));
  if (!Number.isInteger(value) || value < 0 || value > 65_535) throw new Error(`${name} is not a port.`);
  return value;
}
