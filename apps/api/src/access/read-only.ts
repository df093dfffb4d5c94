import { SetMetadata } from '@nestjs/common';
import { AppError } from '../errors/app-error';

export const OPEN_TO_READ_ONLY = Symbol('open to read-only sessions');

/** A route that writes and still may be called from a phone that reads along; it looks itself at what is written. */
export const OpenToReadOnly = () => SetMetadata(OPEN_TO_READ_ONLY, true);

export const readOnly = () =>
  new AppError('read-only', 'This phone only reads along. Change it on the computer.');
