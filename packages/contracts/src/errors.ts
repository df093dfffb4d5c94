import { z } from 'zod';

/** Every error code that crosses the wire; the sentence beside it is for people, the code for programs. */
export const errorCodes = [
  'bad-request',
  'not-signed-in',
  'forbidden',
  'not-found',
  'conflict',
  'email-taken',
  'wrong-sign-in',
  'session-ended',
  'link-ended',
  'passphrase-needed',
  'wrong-passphrase',
  'read-only',
  'too-large',
  'too-many-files',
  'too-many-requests',
  'wav-refused',
  'rates-differ',
  'photo-refused',
  'storage-unavailable',
  'not-measured-yet',
  'range-not-satisfiable',
  'internal',
] as const;

export const errorCode = z.enum(errorCodes);
export type ErrorCode = z.infer<typeof errorCode>;

/** Which part of a request an error speaks of, where it speaks of one. */
export const errorDetails = z.object({
  /** Index into the files of an upload, in the order they were sent. */
  fileIndex: z.int().nonnegative().optional(),
  fileName: z.string().optional(),
  /** Machine-readable reason of a refused file, such as `lossy` or `cut-off`. */
  reason: z.string().optional(),
  /** One message a field, keyed by the field's path. */
  fields: z.record(z.string(), z.string()).optional(),
});
export type ErrorDetails = z.infer<typeof errorDetails>;

export const errorResponse = z.object({
  code: errorCode,
  message: z.string(),
  details: errorDetails.optional(),
});
export type ErrorResponse = z.infer<typeof errorResponse>;
