import { z } from 'zod';
import { AppError } from '../errors/app-error';

/** The last row of a page: the next one begins below it. */
export interface TakeCursor {
  /** What the list is sorted by: milliseconds, or a figure of the report. */
  place: number;
  id: string;
}

/** As milliseconds the years 1 to 9999, which every database can tell; figures lie far within. */
const place = z.number().min(-62_135_596_800_000).max(253_402_300_799_999);
const cursorShape = z.tuple([place, z.uuid()]);

export function cursorText({ place, id }: TakeCursor): string {
  return Buffer.from(JSON.stringify([place, id])).toString('base64url');
}

export function parseCursor(text: string): TakeCursor {
  try {
    const [told, id] = cursorShape.parse(JSON.parse(Buffer.from(text, 'base64url').toString()));
    return { place: told, id };
  } catch (cause) {
    throw new AppError('bad-request', 'This place in the list is not known. Start from the top.', { cause });
  }
}
