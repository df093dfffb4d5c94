import type { ShareResponse } from '@thudline/contracts';
import { relativeDate } from '../takes/relativeDate';
import { openUntilWords } from './openUntilWords';

export const exampleQuestion = 'What would you change first?';

export const isOpen = ({ revokedAt, expiresAt }: ShareResponse, now: Date): boolean =>
  revokedAt === null && (expiresAt === null || new Date(expiresAt) > now);

function timesWords(count: number): string {
  if (count <= 1) return '';
  return count === 2 ? ', twice so far' : `, ${count} times so far`;
}

/** "Opened today 20:15, twice so far." */
export function openedWords({ openedAt, openCount }: ShareResponse, now: Date): string {
  if (!openedAt) return 'Not opened yet.';
  return `Opened ${relativeDate(openedAt, now)}${timesWords(openCount)}.`;
}

/** "Open until 11 Dec, with listening." */
export function rightsWords(share: ShareResponse): string {
  const rights = [
    share.canListen && 'listening',
    share.canNote && 'notes',
    share.canDownload && 'the files',
    share.hasPassphrase && 'a passphrase',
  ].filter((right) => right !== false);
  const until = openUntilWords(share);
  const capital = until.charAt(0).toUpperCase() + until.slice(1);
  return `${capital}, ${rights.length > 0 ? `with ${listed(rights)}` : 'to read only'}.`;
}

/** "Oda has it.", "Mailed to bex@example.org."; empty for a link that was only copied. */
export function whoHasItWords({ label, mailedTo }: Pick<ShareResponse, 'label' | 'mailedTo'>): string {
  return [label && `${label} has it.`, mailedTo && `Mailed to ${mailedTo}.`].filter(Boolean).join(' ');
}

/** "read, hear and download it" */
export function mayDoWords({ canListen, canNote, canDownload }: ShareResponse): string {
  const may = [
    'read',
    canListen && 'hear',
    canNote && 'leave notes on',
    canDownload && 'download the files of',
  ].filter((right) => right !== false);
  return `${listed(may)} it`;
}

function listed(words: readonly string[]): string {
  const last = words[words.length - 1] ?? '';
  return words.length > 1 ? `${words.slice(0, -1).join(', ')} and ${last}` : last;
}
