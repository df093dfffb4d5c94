import { z } from 'zod';
import { AppError } from '../errors/app-error';

/** The last row of a page: the next one begins below it. */
export interface TakeCursor {
  /** What the list is sorted by: milliseconds, or a figure of the report. */
  place: number;
  id: string;
}

const cursorShape = z.tuple([z.number(), z.uuid()]);

export function cursorText({ place, id }: TakeCursor): string {
  return Buffer.from(JSON.stringify([place, id])).toString('base64url');
}

export function parseCursor(text: string): TakeCursor {
  try {
    const [place, id] = cursorShape.parse(JSON.parse(Buffer.from(text, 'base64url').toString()));
    return { place, id };
  } catch (cause) {
    throw new AppError('bad-request', 'This place in the list is not known. Start from the top.', { cause });
  }
}
