import { photoLimits } from '@thudline/contracts';
import { Request, Response } from 'express';
import multer, { MulterError } from 'multer';
import { AppError } from '../errors/app-error';

const tooLarge = () =>
  new AppError(
    'too-large',
    `A photo may have ${photoLimits.maxBytes / 1024 / 1024} MB. Make it smaller first.`,
  );

const receive = multer({
  storage: multer.memoryStorage(),
  limits: { fileSize: photoLimits.maxBytes, files: 1, fields: 0 },
}).single('photo');

/** @returns the bytes of the field `photo` of a multipart body */
export async function receivedPhoto(request: Request, response: Response): Promise<Buffer> {
  const lengthBytes = Number(request.get('Content-Length') ?? 0);
  if (lengthBytes > photoLimits.maxBytes + 64 * 1024) throw tooLarge();
  await new Promise<void>((resolve, reject) => {
    void receive(request, response, (error: unknown) => (error ? reject(uploadError(error)) : resolve()));
  });
  if (!request.file) throw new AppError('bad-request', 'Add one photo, in the field named photo.');
  return request.file.buffer;
}

function uploadError(thrown: unknown): AppError {
  if (thrown instanceof MulterError && thrown.code === 'LIMIT_FILE_SIZE') return tooLarge();
  return new AppError('bad-request', 'Add one photo, in the field named photo.', { cause: thrown });
}
