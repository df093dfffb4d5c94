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
    response.status(error.status).set(error.headers).json(body);
  }
}

function appErrorOf(thrown: unknown): AppError {
  if (thrown instanceof AppError) return thrown;
  if (thrown instanceof ZodValidationException) return invalidInput(thrown.getZodError() as ZodError);
  if (thrown instanceof HttpException && thrown.getStatus() < 500) return clientError(thrown);
  return new AppError('internal', 'Something went wrong here. Nothing was changed; try again in a moment.', {
    cause: thrown,
  });
}

function clientError(exception: HttpException): AppError {
  if (exception.getStatus() === 404) return notFound();
  return new AppError(codeOfStatus[exception.getStatus()] ?? 'bad-request', exception.message);
}
