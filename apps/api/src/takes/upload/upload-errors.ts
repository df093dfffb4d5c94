import { uploadLimits } from '@thudline/contracts';
import { MulterError } from 'multer';
import { AppError } from '../../errors/app-error';

const mebibyte = 1024 * 1024;

export function tooLarge(maxFileBytes: number, fileName?: string, fileIndex?: number): AppError {
  const limit = `${Math.floor(maxFileBytes / mebibyte)} MB`;
  const message = fileName
    ? `${fileName} is larger than the ${limit} a file may have. Export a shorter take.`
    : `This upload is larger than the ${limit} a file may have. Export a shorter take.`;
  return new AppError('too-large', message, { details: { fileName, fileIndex } });
}

/** What went wrong while an upload was received, as a sentence; faults of ours stay as they are. */
export function uploadError(thrown: unknown, maxFileBytes: number, fileIndex: number): Error {
  if (thrown instanceof AppError) return thrown;
  if (thrown instanceof MulterError) return limitError(thrown, maxFileBytes, fileIndex);
  if (isParserError(thrown)) return notWholeUpload(thrown);
  return new Error('An upload could not be received.', { cause: thrown });
}

function limitError(
  error: MulterError & { filename?: string },
  maxFileBytes: number,
  fileIndex: number,
): AppError {
  switch (error.code) {
    case 'LIMIT_FILE_SIZE':
      return tooLarge(maxFileBytes, error.filename, fileIndex);
    case 'LIMIT_FILE_COUNT':
      return new AppError('too-many-files', `A take has at most ${uploadLimits.maxFiles} files.`);
    case 'LIMIT_UNEXPECTED_FILE':
      return new AppError('bad-request', 'The recordings go into the field named files.');
    default:
      return new AppError('bad-request', 'The fields of this upload are not as they should be.', {
        cause: error,
      });
  }
}

const notWholeUpload = (cause: Error) =>
  new AppError('bad-request', 'The upload did not arrive whole, so nothing was stored. Try again.', {
    cause,
  });

/** Multer and busboy throw plain errors at bodies that are malformed or cut off; the system's errors name a call. */
function isParserError(thrown: unknown): thrown is Error {
  return thrown instanceof Error && thrown.name === 'Error' && !('syscall' in thrown);
}
