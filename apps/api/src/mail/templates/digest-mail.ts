import { TakeListItem } from '@thudline/contracts';
import { linkMail, MailContent } from './mail-content';

export interface Week {
  takes: { number: number; title: string; summary: TakeListItem['summary'] }[];
  /** Written by others on the player's takes. */
  notes: number;
  /** Links of the player's that were opened. */
  opened: number;
  changes: { what: string; room: string }[];
}

export function digestMail({ name, week, url }: { name: string; week: Week; url: string }): MailContent {
  return linkMail({
    subject: subjectOf(week),
    greeting: `Hello ${name},`,
    request: ['this was your week.', takesTold(week), changesTold(week), othersTold(week)]
      .filter(Boolean)
      .join(' '),
    link: { words: 'Go to your takes', url },
    remark: 'Weeks run from Monday to Monday. One in which nothing happened is not told.',
  });
}

const plural = (count: number, one: string) => `${count} ${one}${count === 1 ? '' : 's'}`;

function subjectOf({ takes, notes, changes, opened }: Week): string {
  const parts = [
    takes.length > 0 && plural(takes.length, 'take'),
    changes.length > 0 && plural(changes.length, 'change'),
    notes > 0 && plural(notes, 'note'),
    opened > 0 && `${plural(opened, 'sheet')} opened`,
  ];
  return `Your week: ${parts.filter(Boolean).join(', ')}`;
}

/** "You recorded 3 takes. Take 15, Loud chorus, says: Flip the overhead." */
function takesTold({ takes }: Week): string {
  const last = takes.at(-1);
  if (!last) return '';
  const named = last.title ? `take ${last.number}, ${last.title},` : `take ${last.number}`;
  const count = `You recorded ${plural(takes.length, 'take')}.`;
  if (!last.summary) return count;
  const { strong, rest } = last.summary;
  const said = [strong, rest].filter(Boolean).join(' ');
  return `${count} The ${takes.length > 1 ? 'newest, ' : 'sheet of '}${named} says: ${said}`;
}

function changesTold({ changes }: Week): string {
  if (changes.length === 0) return '';
  const each = changes.map(({ what, room }) => `${what} (${room})`).join(', ');
  return `In your ${changes.length > 1 ? 'rooms’ logs' : 'room’s log'}: ${each}.`;
}

function othersTold({ notes, opened }: Week): string {
  const parts = [
    notes > 0 && `${plural(notes, 'note')} ${notes === 1 ? 'was' : 'were'} left on your sheets`,
    opened > 0 && `${plural(opened, 'sheet')} you sent ${opened === 1 ? 'was' : 'were'} opened`,
  ].filter(Boolean);
  if (parts.length === 0) return '';
  const told = parts.join(', and ');
  return `${told.charAt(0).toUpperCase()}${told.slice(1)}.`;
}
