import { AppError } from '../errors/app-error';

/** `start` inclusive, `end` exclusive. */
export interface ByteRange {
  start: number;
  end: number;
}

/**
 * The one range a request asks for (RFC 9110, section 14.2).
 *
 * @returns null where the whole is to be sent: no range, another unit, several ranges, or not well-formed
 * @throws {AppError} `range-not-satisfiable`
 */
export function byteRange(header: string | undefined, sizeBytes: number): ByteRange | null {
  const match = /^bytes=\s*(\d*)\s*-\s*(\d*)\s*$/.exec(header ?? '');
  const [, first = '', last = ''] = match ?? [];
  if (!match || (first === '' && last === '')) return null;
  const range = first === '' ? lastBytes(Number(last), sizeBytes) : fromTo(Number(first), last, sizeBytes);
  if (range && range.start >= range.end) throw notSatisfiable(sizeBytes);
  return range;
}

const lastBytes = (count: number, sizeBytes: number): ByteRange => ({
  start: Math.max(0, sizeBytes - count),
  end: sizeBytes,
});

function fromTo(start: number, last: string, sizeBytes: number): ByteRange | null {
  if (last !== '' && Number(last) < start) return null;
  const end = last === '' ? sizeBytes : Math.min(Number(last) + 1, sizeBytes);
  return { start: Math.min(start, sizeBytes), end };
}

const notSatisfiable = (sizeBytes: number) =>
  new AppError('range-not-satisfiable', `This sound ends at byte ${sizeBytes}.`, {
    headers: { 'Content-Range': `bytes */${sizeBytes}` },
  });
