import type { ExportResponse, MyExportResponse } from '@thudline/contracts';
import { bytes, plural } from '../../lib/format';
import { relativeDate } from '../takes/relativeDate';

/** "20 takes, 3 rooms, 12 notes: one ZIP of about 310.0 MB." */
export function holdsWords({ takes, rooms, notes, bytes: size }: MyExportResponse['holds']): string {
  const kinds = [
    takes > 0 && plural(takes, 'take'),
    rooms > 0 && plural(rooms, 'room'),
    notes > 0 && plural(notes, 'note'),
  ].filter(Boolean);
  if (kinds.length === 0) return 'Your settings; there is no take yet.';
  return `${kinds.join(', ')}: one ZIP of about ${bytes(size)}.`;
}

/** How far it is, as one says it. */
export const progressWords = ({ state, progress }: ExportResponse): string =>
  state === 'queued' ? 'It waits for its turn.' : `${Math.floor(progress * 100)} % is in it.`;

/** "Made today 19:40. It can be fetched until 8 Dec." */
export function madeWords({ createdAt, file }: ExportResponse, now: Date): string {
  const until = file ? relativeDate(file.expiresAt, now) : '';
  return `Made ${relativeDate(createdAt, now)}; it stays until ${until}.`;
}
