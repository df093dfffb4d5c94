import { ArgumentsHost, Catch, ExceptionFilter, HttpException, Logger } from '@nestjs/common';
import { ErrorCode, ErrorResponse } from '@thudline/contracts';
import { Response } from 'express';
import { ZodValidationException } from 'nestjs-zod';
import { ZodError } from 'zod';
import { AppError, notFound } from './app-error';
import { invalidInput } from './invalid-input';

const codeOfStatus: Record<number, ErrorCode> = {
  401: 'not-signed-in',
  403: 'forbidden',
  404: 'not-found',
  413: 'too-large',
};

/** Every error leaves through here as `{ code, message, details? }`. */
@Catch()
export class AppErrorFilter implements ExceptionFilter {
  private readonly logger = new Logger('Errors');

  catch(thrown: unknown, host: ArgumentsHost): void {
    const response = host.switchToHttp().getResponse<Response>();
    const error = appErrorOf(thrown);
    if (error.status >= 500) this.logger.error(error.cause ?? thrown, error.message);
    if (response.headersSent) {
      response.destroy();
      return;
    }
    const { code, message, details } = error;
    const body: ErrorResponse = details ? { code, message, details } : { code, message };
    response.removeHeader('ETag');
    response.status(error.status).set(error.headers).type('json').send(JSON.stringify(body));
  }
}

function appErrorOf(thrown: unknown): AppError {
  if (thrown instanceof AppError) return thrown;
  if (thrown instanceof ZodValidationException) return invalidInput(thrown.getZodError() as ZodError);
  if (thrown instanceof HttpException && thrown.getStatus() < 500) return clientError(thrown.getStatus());
  if (isParserError(thrown)) return clientError(thrown.statusCode);
  return new AppError('internal', 'Something went wrong here. Nothing was changed; try again in a moment.', {
    cause: thrown,
  });
}

const sentences: Record<number, string> = {
  401: 'Sign in to go on.',
  403: 'This is not open to you.',
  413: 'This request is larger than it may be.',
};

/** The framework's own refusals speak of JSON and parsers; people get a sentence. */
function clientError(status: number): AppError {
  if (status === 404) return notFound();
  const message = sentences[status] ?? 'This request could not be read.';
  return new AppError(codeOfStatus[status] ?? 'bad-request', message);
}

/** What the body parsers throw before a route is found. */
function isParserError(thrown: unknown): thrown is { statusCode: number } {
  if (!(thrown instanceof Error) || !('statusCode' in thrown) || !('expose' in thrown)) return false;
  return thrown.expose === true && typeof thrown.statusCode === 'number' && thrown.statusCode < 500;
}
