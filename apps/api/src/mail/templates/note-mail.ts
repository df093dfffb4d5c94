import { FindingTopic, NotePin } from '@thudline/contracts';
import { linkMail, MailContent } from './mail-content';

const mostQuoted = 600;
/** Addresses of pages and whatever a mail program would make one of. */
const addresses = /\b[a-z][a-z0-9+.-]*:\/\/\S+|\b[\w-]+(\.[\w-]+)*\.[a-z]{2,}\b(\/\S*)?/gi;

const sections: Record<FindingTopic, string> = {
  files: 'the files',
  'late-start': 'Adding up',
  'kick-level': 'Levels',
  'overhead-level': 'Levels',
  noise: 'Levels',
  hum: 'Levels',
  'dc-offset': 'Levels',
  flattened: 'Levels',
  overs: 'Levels',
  dropouts: 'Levels',
  arrival: 'Adding up',
  'adding-up': 'Adding up',
  balance: 'Drums and cymbals',
  room: 'Room',
};

export interface NoteMail {
  kind: 'note' | 'answer';
  /** Who gets it, and who wrote the note. */
  name: string;
  from: string;
  take: { number: number; title: string };
  pin: NotePin;
  body: string;
  nextItems: string[];
  url: string;
}

/** Somebody wrote on a sheet, or answered there. */
export function noteMail({ kind, name, from, take, pin, body, nextItems, url }: NoteMail): MailContent {
  const did = kind === 'note' ? 'wrote on' : 'answered on';
  const about = aboutWords(pin);
  return linkMail({
    subject: `${from} ${did} take ${take.number}`,
    greeting: `Hello ${name},`,
    request: `${from} ${did} ${takeWords(take)}${about && `, about ${about}`}:`,
    quote: [quoted(body), ...nextItems.map((item) => `To do next: ${withoutAddresses(item)}`)],
    link: { words: 'Read it on the sheet', url },
    remark: 'You can answer there.',
  });
}

interface TickedMail {
  name: string;
  player: string;
  take: { number: number; title: string };
  /** Words of what was done. */
  done: string[];
  url: string;
}

/** The player did what a note asked for. */
export function tickedMail({ name, player, take, done, url }: TickedMail): MailContent {
  return linkMail({
    subject: `${player} did what you asked for`,
    greeting: `Hello ${name},`,
    request: `${player} ticked on ${takeWords(take)}:`,
    quote: done,
    link: { words: 'See it on the sheet', url },
    remark: 'More can be asked for there.',
  });
}

const takeWords = ({ number, title }: NoteMail['take']) => `take ${number}${title && ` (${title})`}`;

function aboutWords(pin: NotePin): string {
  if (pin.kind === 'take') return '';
  if (pin.kind === 'finding') return sections[pin.topic];
  const tenths = Math.round(pin.timeS * 10);
  const seconds = ((tenths % 600) / 10).toFixed(1).padStart(4, '0');
  return `${Math.floor(tenths / 600)}:${seconds}`;
}

/** Whoever wrote it may be anybody who holds a link: no mail of ours carries their addresses. */
const withoutAddresses = (text: string) => text.replace(addresses, '(a link)');

function quoted(body: string): string {
  const text = withoutAddresses(body);
  return text.length > mostQuoted ? `${text.slice(0, mostQuoted).trimEnd()} …` : text;
}
