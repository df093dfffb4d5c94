import { ZodError } from 'zod';
import { AppError } from './app-error';

/** One sentence, and one message a field; the first message of a field wins. */
export function invalidInput(error: ZodError): AppError {
  const fields: Record<string, string> = {};
  for (const issue of error.issues) fields[issue.path.join('.')] ??= issue.message;
  const message = error.issues[0]?.message ?? 'Something in this request is not as it should be.';
  return new AppError('bad-request', message, { details: { fields } });
}
