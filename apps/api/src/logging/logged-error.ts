import { DriverException } from '@mikro-orm/core';
import { stdSerializers } from 'pino';

interface DatabaseError extends Error {
  /** SQLSTATE, or the system's code where the database wasn't reached. */
  code?: string;
  table?: string;
  constraint?: string;
}

/**
 * What is logged of an error. Those of the database carry the statement with its values (addresses, hashes of passwords),
 * in the message, in the details and in the first line of the stack, so only what names no value is kept.
 *
 * @param given - an error, or what pino has made of one, with the error as `raw`
 */
export function loggedError(given: Error | { raw?: unknown }): object {
  const error = 'raw' in given && given.raw instanceof Error ? given.raw : given;
  if (!(error instanceof Error) || !chainOf(error).some(isFromDatabase)) return errorAsItIs(error);
  const { stack, cause } = error;
  const told = isFromDatabase(error) ? databaseColumns(error) : { type: error.name, message: error.message };
  return {
    ...told,
    stack: framesOf(stack),
    ...(cause instanceof Error ? { cause: loggedError(cause) } : {}),
  };
}

/** What pino made already is handed on. */
const errorAsItIs = (error: object) => (error instanceof Error ? stdSerializers.err(error) : error);

const databaseColumns = ({ name, code, table, constraint }: DatabaseError) => ({
  type: name,
  code,
  table,
  constraint,
});

function chainOf(error: Error): Error[] {
  return error.cause instanceof Error ? [error, ...chainOf(error.cause)] : [error];
}

/** From MikroORM, from its query builder, or from the driver below both, which the queue uses by itself. */
function isFromDatabase(error: Error): error is DatabaseError {
  return error instanceof DriverException || 'bindings' in error || ('severity' in error && 'code' in error);
}

function framesOf(stack = ''): string {
  return stack
    .split('\n')
    .filter((line) => /^\s+at /.test(line))
    .join('\n');
}
