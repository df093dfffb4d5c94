import { ApiError } from '../../lib/apiClient';

const endedCodes = ['link-ended', 'not-found', 'not-signed-in', 'bad-request'];

/** Whether a link opens nothing: ended, timed out, mistyped; the guest can't tell and needn't. */
export const isEnded = (error: Error) => error instanceof ApiError && endedCodes.includes(error.code);
