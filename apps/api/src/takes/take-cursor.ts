import { z } from 'zod';
import { AppError } from '../errors/app-error';

/** The last row of a page: the next one begins below it. */
export interface TakeCursor {
  recordedAt: Date;
  id: string;
}

const cursorShape = z.tuple([z.number().int(), z.uuid()]);

export function cursorText({ recordedAt, id }: TakeCursor): string {
  return Buffer.from(JSON.stringify([recordedAt.getTime(), id])).toString('base64url');
}

export function parseCursor(text: string): TakeCursor {
  try {
    const [timeMs, id] = cursorShape.parse(JSON.parse(Buffer.from(text, 'base64url').toString()));
    return { recordedAt: new Date(timeMs), id };
  } catch (cause) {
    throw new AppError('bad-request', 'This place in the list is not known. Start from the top.', { cause });
  }
}
