import { ErrorCode, ErrorDetails } from '@thudline/contracts';

const statusOfCode: Record<ErrorCode, number> = {
  'bad-request': 400,
  'too-many-files': 400,
  'not-signed-in': 401,
  'wrong-sign-in': 401,
  'session-ended': 401,
  forbidden: 403,
  'read-only': 403,
  'passphrase-needed': 403,
  'wrong-passphrase': 403,
  'not-found': 404,
  'not-measured-yet': 404,
  conflict: 409,
  'email-taken': 409,
  'link-ended': 410,
  'too-large': 413,
  'range-not-satisfiable': 416,
  'wav-refused': 422,
  'rates-differ': 422,
  'photo-refused': 422,
  'too-many-requests': 429,
  internal: 500,
  'storage-unavailable': 503,
};

interface AppErrorOptions {
  details?: ErrorDetails;
  /** Sent with the answer, such as Retry-After. */
  headers?: Record<string, string>;
  cause?: unknown;
}

/** The one kind of error that people see: a code for programs, a sentence for people. */
export class AppError extends Error {
  readonly details: ErrorDetails | undefined;
  readonly headers: Record<string, string>;

  constructor(
    readonly code: ErrorCode,
    message: string,
    options: AppErrorOptions = {},
  ) {
    super(message, { cause: options.cause });
    this.name = 'AppError';
    this.details = options.details;
    this.headers = options.headers ?? {};
  }

  get status(): number {
    return statusOfCode[this.code];
  }
}

export const notFound = () => new AppError('not-found', 'There is nothing here, or it is not yours.');
