import { ascii } from './byteWindow';

/** What a recorder wrote about a file into its `bext` chunk; null where it wrote nothing, or nothing that can be so. */
export interface BroadcastFacts {
  /** At most 256 characters, without control characters. */
  readonly description: string | null;
  /** Who or what recorded it, at most 32 characters. */
  readonly originator: string | null;
  /** Of the recorder's clock, in its own time zone: `2026-11-30`. */
  readonly date: string | null;
  /** `18:05:09` */
  readonly time: string | null;
  /** Where the first sample lies, in samples since midnight. */
  readonly timeReferenceSamples: number | null;
}

/** Where each field of the chunk's body begins, and its bytes (EBU Tech 3285 v2, 2.3). */
const fields = {
  description: [0, 256],
  originator: [256, 32],
  date: [320, 10],
  time: [330, 8],
  timeReference: [338, 8],
} as const;

/** As much of the body as is read here. */
export const broadcastBytes = 346;

/**
 * Reads the body of a `bext` chunk. Nothing in it is trusted: text is cut at its first zero and cleaned of control
 * characters and of marks that turn its direction, a date must be one of the calendar.
 *
 * @param body - may be shorter than the standard has it
 * @returns null where it says nothing at all
 * @see EBU Tech 3285 v2 (2011), 2.3 and 2.4
 */
export function broadcastFacts(body: DataView): BroadcastFacts | null {
  const date = dateOf(ascii(body, ...fields.date));
  const facts: BroadcastFacts = {
    description: textOf(body, fields.description),
    originator: textOf(body, fields.originator),
    date,
    time: timeOf(ascii(body, ...fields.time)),
    timeReferenceSamples: timeReferenceOf(body),
  };
  const says = facts.description ?? facts.originator ?? facts.date;
  return says === null && !facts.timeReferenceSamples ? null : facts;
}

/** The standard says ASCII; programs write UTF-8 too, older ones Latin-1. */
function textOf(body: DataView, [start, length]: readonly [number, number]): string | null {
  const available = Math.max(0, Math.min(length, body.byteLength - start));
  const bytes = new Uint8Array(body.buffer, body.byteOffset + Math.min(start, body.byteLength), available);
  const zero = bytes.indexOf(0);
  const text = decoded(zero < 0 ? bytes : bytes.subarray(0, zero));
  return text.replace(unwanted, ' ').replace(/\s+/g, ' ').trim() || null;
}

/** Control characters, and the marks that make text run the other way round or hide in it (Unicode 15, UAX 9). */
const unwanted = /[\p{Cc}\p{Cf}\p{Zl}\p{Zp}\ufffd]/gu;

function decoded(bytes: Uint8Array): string {
  try {
    // A field that is full may end within a character: `stream` leaves that one out.
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes, { stream: true });
  } catch {
    return String.fromCharCode(...bytes);
  }
}

/** The standard's separators are `-`, `_`, `:`, space and full stop; a slash is met too. */
function dateOf(text: string): string | null {
  const [, year, month, day] = /^(\d{4})[-_:. /](\d\d)[-_:. /](\d\d)$/.exec(text) ?? [];
  if (year === undefined || Number(year) < 1) return null;
  const daysOfMonth = new Date(Date.UTC(Number(year), Number(month), 0)).getUTCDate();
  const isDay = Number(month) >= 1 && Number(month) <= 12 && Number(day) >= 1 && Number(day) <= daysOfMonth;
  return isDay ? `${year}-${month}-${day}` : null;
}

function timeOf(text: string): string | null {
  const [, hours, minutes, seconds] = /^([01]\d|2[0-3])[-_:. ]([0-5]\d)[-_:. ]([0-5]\d)$/.exec(text) ?? [];
  return hours === undefined ? null : `${hours}:${minutes}:${seconds}`;
}

function timeReferenceOf(body: DataView): number | null {
  const [start, length] = fields.timeReference;
  if (body.byteLength < start + length) return null;
  const samples = body.getUint32(start, true) + body.getUint32(start + 4, true) * 2 ** 32;
  return Number.isSafeInteger(samples) ? samples : null;
}
